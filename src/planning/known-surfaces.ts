import { type BrakingFriction, brakingFriction, type SurfaceBraking } from '../physics/braking-friction.ts';
import { rollingFriction } from '../physics/friction.ts';
import type { RunwayConditionCode } from '../physics/runway-condition-code.ts';
import { deepContaminant } from '../physics/runway-surface.ts';
import type { ReferenceKey } from '../references.ts';
import { gripOn } from './grip-on.ts';
import { contaminantKinds, type Surface, surfaceKinds } from './question.ts';
import { assumedTyrePressure } from './rules/landing-defaults.ts';
import { ruleSets } from './rules/rule-sets.ts';
import { runwayCondition } from './runway-condition.ts';
import { type SurfaceInRules, surfaceInRules } from './surface-in-rules.ts';

interface Default {
  readonly because: string;
  readonly source: ReferenceKey;
}

/** A surface, and what is taken of it where a question does not say more. */
export interface KnownSurface {
  readonly surface: Surface;
  readonly conditionCode?: RunwayConditionCode;
  /** why nothing is computed on it, and why no light aeroplane is */
  readonly refused?: string;
  readonly refusedForLight?: string;
  /** free-rolling friction, also of a jet; with displacement the drag of what the wheels push aside comes on top */
  readonly rolling?: Default & { readonly coefficient: number; readonly ofJet: number; readonly displacement: boolean };
  /** braking friction without anti-skid system, at rest and at 50 kt over the ground, before the share of weight on the wheels */
  readonly braking?: Default & { readonly atRest: number; readonly atFiftyKnots: number };
  readonly inRules: readonly SurfaceInRules[];
}

const fiftyKnots = (50 * 1852) / 3600;
/** A depth that every aeroplane is computed in, and deeper than a film [m]. */
const shownDepth = 0.01;
/** Where nothing is said of the day. */
const standardTemperature = 288.15;

const light = { category: 'twin-piston', masses: { maximumTakeoff: 2000 } } as const;
const heavy = { category: 'twin-jet', masses: { maximumTakeoff: 9000 } } as const;
const tyrePressure = assumedTyrePressure(false).value;
const dryPavement = brakingFriction({ kind: 'paved', state: 'dry' }, 'none', tyrePressure);
if (dryPavement === 'no-data') throw new Error('dry pavement has no braking friction');
const dryBraking = dryPavement.at(0);

/** Every kind and state of surface that a question can name, one of each contaminant on pavement, and what is known of it. */
export function knownSurfaces(): readonly KnownSurface[] {
  return [...bareSurfaces(), ...underContaminants()].map(knownSurface);
}

function bareSurfaces(): readonly Surface[] {
  return surfaceKinds.flatMap((kind) =>
    (['dry', 'damp', 'wet', 'flooded'] as const).flatMap((state): readonly Surface[] => {
      if (kind === 'paved' || kind === 'ice' || kind === 'snow') return [{ kind, state }];
      const soft: Surface = { kind, state, firmness: 'soft' };
      if (kind !== 'grass') return [{ kind, state, firmness: 'firm' }, soft];
      return [
        { kind, state, grass: 'short', firmness: 'firm' },
        { kind, state, grass: 'long', firmness: 'firm' },
        soft,
      ];
    }),
  );
}

function underContaminants(): readonly Surface[] {
  return contaminantKinds.map((kind) => {
    const isLoose = kind === 'water' || kind === 'slush' || kind === 'wet-snow' || kind === 'dry-snow';
    return {
      kind: 'paved',
      state: 'contaminated',
      contaminant: isLoose ? { kind, depth: shownDepth } : { kind },
    };
  });
}

function knownSurface(surface: Surface): KnownSurface {
  const rolling = rollingFriction(surface, false, 'added');
  const ofJet = rollingFriction(surface, true, 'added');
  const place = { runway: { surface }, weather: { temperature: standardTemperature } };
  const { codes, isSlippery, refusal } = runwayCondition({ ...place, aeroplane: heavy });
  const { refusal: refusalForLight } = runwayCondition({ ...place, aeroplane: light });
  const conditionCode = codes?.[0];
  const found = brakingFriction(surface, 'none', tyrePressure);
  const grip = gripOn(found, conditionCode, { dry: dryBraking, antiSkid: 'none', tyrePressure });
  return {
    surface,
    ...(conditionCode === undefined ? {} : { conditionCode }),
    ...(refusal === undefined ? {} : { refused: refusal.reason }),
    ...(refusalForLight === undefined || refusal !== undefined ? {} : { refusedForLight: refusalForLight.reason }),
    ...(refusal !== undefined || rolling === 'no-data' || ofJet === 'no-data'
      ? {}
      : {
          rolling: {
            coefficient: rolling.coefficient,
            ofJet: ofJet.coefficient,
            displacement: deepContaminant(surface) !== undefined,
            because: rolling.because,
            source: rolling.source,
          },
        }),
    ...(refusal !== undefined || grip === 'no-data' ? {} : { braking: brakingOf(found, grip, conditionCode) }),
    inRules:
      refusal === undefined ? ruleSets.flatMap((set) => surfaceInRules(set, surface, isSlippery, conditionCode)) : [],
  };
}

function brakingOf(
  found: SurfaceBraking | 'no-data',
  grip: BrakingFriction,
  conditionCode: RunwayConditionCode | undefined,
): NonNullable<KnownSurface['braking']> {
  const figures = { atRest: grip.at(0), atFiftyKnots: grip.at(fiftyKnots) };
  const isByCode =
    found === 'no-data' || found.at(0) !== figures.atRest || found.at(fiftyKnots) !== figures.atFiftyKnots;
  return isByCode
    ? { ...figures, because: `the poorer of condition code ${conditionCode} and the surface`, source: 'Ac25s31' }
    : { ...figures, because: found.because, source: found.source };
}
