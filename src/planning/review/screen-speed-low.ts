import type { CertificationBasis } from '../../performance/aeroplane.ts';
import { minimumToOneG } from '../../performance/speeds/maximum-lift-coefficient.ts';
import type { ReferenceKey } from '../../references.ts';
import type { FindingTest } from './finding-test.ts';
import { overStall } from './over-stall.ts';
import { configurationsOf } from './review-context.ts';

/** Least speed at the screen over the stall speed, of the minimum speed where the basis means that. */
const rules: Readonly<
  Record<CertificationBasis, { readonly ratio: number; readonly source: ReferenceKey } | undefined>
> = {
  'cs-23-amendment-4': { ratio: 1.2, source: 'Cfr23s51' },
  'cs-23-commuter': { ratio: 1.2, source: 'Cfr23s51' },
  'cs-25': { ratio: 1.13, source: 'Cfr25s103' },
  none: undefined,
};

/** A speed at the screen below the least that the certification basis allows. */
export const screenSpeedLow: FindingTest = {
  code: 'screen-speed-low',
  severity: 'caution',
  meaning:
    'The speed at the screen is below what the certification basis asks for: 1.2 times the stall speed, transport 1.13 times the 1-g stall speed.',
  test: (context) => {
    const rule = rules[context.aeroplane.certification.basis];
    if (rule === undefined) return [];
    return configurationsOf(context, 'takeoff').flatMap(({ id, configuration, at }) => {
      const screen = configuration.speeds?.screen;
      if (screen === undefined) return [];
      const { maximumLift } = configuration;
      const ofMinimum = maximumLift.kind === 'stall-speed' && maximumLift.definition === 'minimum';
      const ratio = overStall(screen, context.aeroplane, configuration) / (ofMinimum ? minimumToOneG : 1);
      if (ratio >= rule.ratio * (1 - 1e-3)) return [];
      return [
        {
          message: `The speed at the screen in ${id} is ${ratio.toFixed(2)} times the stall speed; the certification basis asks for ${rule.ratio}.`,
          at: `${at}/speeds/screen`,
          value: ratio,
          threshold: rule.ratio,
          source: rule.source,
          hint: 'One of the two speeds may be indicated, or of another mass.',
        },
      ];
    });
  },
};
