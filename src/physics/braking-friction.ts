import type { ReferenceKey } from '../references.ts';
import { greatestWetBrakingSpeed } from './braking-polynomial.ts';
import { poorerBraking } from './poorer-braking.ts';
import { runwayConditionCode } from './runway-condition-code.ts';
import { filmAsWet, looseContaminant, type RunwaySurface } from './runway-surface.ts';
import { type AntiSkidKind, antiSkidEfficiency, wetBrakingCurve } from './wet-braking.ts';

/** Braking friction against ground speed. */
export interface BrakingFriction {
  /** coefficient at a ground speed [m/s], 0 or more */
  readonly at: (groundSpeed: number) => number;
  /** ground speeds [m/s] at which the slope jumps */
  readonly kinks: readonly number[];
}

/** Braking friction of a surface with the reason for it. */
export interface SurfaceBraking extends BrakingFriction {
  /** the surface as it was read, for a sentence: 'short wet grass' */
  readonly because: string;
  readonly source: ReferenceKey;
}

/** Share of the weight on the braked wheels of a tricycle, and of a tailwheel aeroplane. @see references.HouseFriction */
export const tricycleBrakedLoad = 0.85;
export const tailwheelBrakedLoad = 0.8;

/** A coefficient that is the same at every speed. */
export function constantBraking(coefficient: number): BrakingFriction {
  if (!(coefficient >= 0)) throw new RangeError(`coefficient must be 0 or more: ${coefficient}`);
  return { at: () => coefficient, kinks: [] };
}

/** The same friction times a factor: the share of the weight on the braked wheels, applied once. */
export function scaledBraking(braking: BrakingFriction, factor: number): BrakingFriction {
  if (!(factor >= 0)) throw new RangeError(`factor must be 0 or more: ${factor}`);
  return { at: (groundSpeed) => factor * braking.at(groundSpeed), kinks: braking.kinks };
}

const fixed = (coefficient: number, because: string): SurfaceBraking => ({
  ...constantBraking(coefficient),
  because,
  source: 'HouseFriction',
});

const dryPavement = fixed(0.35, 'dry pavement, no modulated anti-skid');
const dryPavementModulated = fixed(0.4, 'dry pavement, modulated anti-skid');
const firmGround = fixed(0.3, 'firm gravel or dirt');
const shortDryGrass = fixed(0.25, 'short dry grass');
const longDryGrass = fixed(0.2, 'long dry grass');
const wetGrass = fixed(0.12, 'wet grass');
const softGround = fixed(0.1, 'soft ground');
const compactedSnow = fixed(0.1, 'compacted snow');
const looseSnow = fixed(0.08, 'loose snow');
const ice = fixed(0.05, 'ice');
/** The most that a wet pavement gives without a modulated system. @see references.HouseFriction */
const wetPavementCap = 0.2;

/**
 * Braking friction of a surface on the braked wheels: the end of the published range that gives the longer stop.
 *
 * Paved dry 0.35 (0.40 with modulated anti-skid); paved wet the wet curve of the tyre pressure times the anti-skid efficiency,
 * and not above 0.20 without a modulated system; firm gravel and dirt 0.30; grass dry 0.25 short, 0.20 long, wet 0.12; soft
 * 0.10; compacted snow 0.10; loose snow 0.08; ice 0.05. Damp counts as wet, grass of unstated length as long, frost on pavement
 * and no more than 3 mm of a loose contaminant as wet, wet dirt as soft.
 *
 * @param surface - in plain words
 * @param antiSkid - of the aeroplane
 * @param tyrePressure - [Pa]
 * @returns the friction before the share of the weight on the braked wheels, or 'no-data': under water or slush, wet ice and
 * whatever else has condition code 0, and contaminated by nobody says what
 * @see references.Cfr25s109, (c); references.GudmundssonGa, table 17-3; references.HouseFriction
 */
export function brakingFriction(
  surface: RunwaySurface,
  antiSkid: AntiSkidKind,
  tyrePressure: number,
): SurfaceBraking | 'no-data' {
  const read = filmAsWet(surface);
  const described = runwayConditionCode(read);
  if (described !== 'no-data' && described.code === 0) return 'no-data';
  const { kind, state, firmness, grass } = read;
  const contaminant = read.contaminant?.kind;
  const loose = looseContaminant(read);
  if (loose === 'wet-snow' || loose === 'dry-snow') return looseSnow;
  if (loose !== undefined || state === 'flooded') return 'no-data';
  if (contaminant === 'compacted-snow') return compactedSnow;
  if (kind === 'ice' || contaminant === 'ice') return ice;
  if (kind === 'snow') return looseSnow;
  if (contaminant === 'frost') return kind === 'paved' ? wetPavement(antiSkid, tyrePressure) : 'no-data';
  if (state === 'contaminated') return 'no-data';
  const dry = state === 'dry';
  if (kind === 'paved') {
    if (!dry) return wetPavement(antiSkid, tyrePressure);
    return modulates(antiSkid) ? dryPavementModulated : dryPavement;
  }
  if (firmness === 'soft' || (kind === 'dirt' && !dry)) return softGround;
  if (kind !== 'grass') return firmGround;
  if (!dry) return wetGrass;
  return grass === 'short' ? shortDryGrass : longDryGrass;
}

function modulates(antiSkid: AntiSkidKind): boolean {
  return antiSkid === 'quasi-modulating' || antiSkid === 'fully-modulating';
}

function wetPavement(antiSkid: AntiSkidKind, tyrePressure: number): SurfaceBraking {
  const curve = wetBrakingCurve(tyrePressure);
  const efficiency = antiSkidEfficiency(antiSkid);
  const wet = { at: (speed: number) => efficiency * curve(speed), kinks: [greatestWetBrakingSpeed] };
  const braking = modulates(antiSkid) ? wet : poorerBraking(wet, constantBraking(wetPavementCap));
  return { ...braking, because: 'wet pavement', source: 'Cfr25s109' };
}
