import { veryShortWetGrass, veryShortWetGrassFactor } from '../rules/very-short-wet-grass.ts';
import { percentText } from '../sentences/measure-text.ts';
import { textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';
import type { LandingContext } from './landing-context.ts';

/** Wet grass that may be far more slippery than what is counted. */
export const veryShortWetGrassCaution: CautionTest<LandingContext> = {
  code: 'very-short-wet-grass',
  severity: 'caution',
  meaning:
    'Very short wet grass on firm subsoil may lengthen the landing by up to 60 %, and no factor of the rules asked for counts that.',
  source: 'EuAirOps335Gm1',
  test: (context) => {
    const { question, runwayFactors = [], stated } = context;
    const { surface } = question.runway;
    if (surface.kind !== 'grass' || (surface.state !== 'wet' && surface.state !== 'damp')) return undefined;
    if (surface.grass === 'long') return undefined;
    if (runwayFactors.some(({ code }) => code === veryShortWetGrass)) return undefined;
    const pavement = { braking: context.dryPavementBraking, stretches: undefined, contaminantDrag: undefined };
    const dry = stated && context.landedWith(pavement)?.landingDistance;
    const effect =
      dry === undefined
        ? ''
        : `: ${textIn(context, 'distance', dry * veryShortWetGrassFactor)} where ${textIn(context, 'distance', stated?.landingDistance ?? 0)} is computed`;
    return {
      message: `The grass is ${surface.state}. Where it is very short on firm subsoil, landings take up to ${percentText(veryShortWetGrassFactor - 1)} more than on dry pavement${effect}.`,
      at: '/runway/surface/grass',
      value: veryShortWetGrassFactor,
    };
  },
};
