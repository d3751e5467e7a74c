import { type BrakingFriction, constantBraking } from './braking-friction.ts';
import { greatestWetBrakingSpeed } from './braking-polynomial.ts';
import { poorerBraking } from './poorer-braking.ts';
import type { RunwayConditionCode } from './runway-condition-code.ts';
import { type AntiSkidKind, antiSkidEfficiency, groovedBrakingCurve, wetBrakingCurve } from './wet-braking.ts';

/** What of an aeroplane decides how it brakes on a runway of a code. */
export interface CodeBrakes {
  /** its own coefficient on dry pavement, before the share of the weight on the braked wheels */
  readonly dry: number;
  readonly antiSkid: AntiSkidKind;
  /** for the wet curve [Pa]; the higher, the poorer */
  readonly tyrePressure: number;
  /** of the phase [m/s]; absent: of a tyre pressure that nobody stated, and code 2 is hydroplaning throughout */
  readonly hydroplaningSpeed?: number | undefined;
  /** of the pavement, for code 5; unknown counts as smooth */
  readonly texture?: 'smooth' | 'grooved' | undefined;
}

/**
 * The most that wheels brake by code with fully modulating anti-skid. Code 1 is 0.08 in the circular, and 0.07 here until the
 * European figure has been read.
 *
 * @see references.Ac25s31, table 2; references.HouseContaminant for code 1
 */
const most = { 4: 0.2, 3: 0.16, 2: 0.16, 1: 0.07 } as const;
/** Wheel braking in more than 3 mm of water or slush from 85 % of the hydroplaning speed on. @see references.Ac25s31 */
const hydroplaning = 0.05;
const hydroplaningFrom = 0.85;
/** Share of the wet figure that is left there below that speed. @see references.Ac25s31 */
const deepShare = 0.5;
/** Share of dry braking that grooves may be credited with. @see references.Cfr25s109, (d)(1) */
const groovedShare = 0.7;

/** What another anti-skid system makes of those figures: 0.50 and 0.30 over 0.80; none counts as on-off. @see references.Ac25s31 */
const scales: Readonly<Record<AntiSkidKind, number>> = {
  none: 0.375,
  'on-off': 0.375,
  'quasi-modulating': 0.625,
  'fully-modulating': 1,
};

/** Factor on the figures of codes 4 to 1 for an anti-skid system. @see references.Ac25s31, note to table 2 */
export function codeAntiSkidScale(kind: AntiSkidKind): number {
  return scales[kind];
}

/**
 * Braking friction on a runway of a code: at each speed the code's own figure, or that of any better code where it is poorer.
 *
 * 6 the aeroplane's own dry braking; 5 the wet curve times the anti-skid efficiency, on grooves not above 70 % of dry; 4 0.20;
 * 3 0.16; 2 half the wet figure and at most 0.16 below 85 % of V_P, 0.05 from there on; 1 0.07; 4 to 1 times 1 fully modulating,
 * 0.625 quasi-modulating, 0.375 on-off or none.
 *
 * @param code - 6 to 0
 * @param brakes - of the aeroplane
 * @returns the friction before the share of the weight on the braked wheels, or 'no-data' for code 0
 * @remarks Taking the poorer of all better codes keeps a worse code from ever being the shorter: alone, code 1 would beat code 2
 * above 85 % of V_P, and code 4 a wet runway at high speed and pressure.
 * @see references.Ac25s31, table 2; references.Ac25s32, table 2; references.Cfr25s109, (c) and (d); references.HouseContaminant
 */
export function codeBraking(code: RunwayConditionCode, brakes: CodeBrakes): BrakingFriction | 'no-data' {
  const { dry, antiSkid } = brakes;
  if (code === 0) return 'no-data';
  if (code === 6) return constantBraking(dry);
  const isGrooved = brakes.texture === 'grooved';
  const cap = isGrooved ? groovedShare * dry : dry;
  const efficiency = antiSkidEfficiency(antiSkid);
  if (code === 5) {
    return cappedCurve(cap, efficiency, (isGrooved ? groovedBrakingCurve : wetBrakingCurve)(brakes.tyrePressure));
  }
  // what lies on the runway fills its grooves
  const curve = wetBrakingCurve(brakes.tyrePressure);
  const scale = codeAntiSkidScale(antiSkid);
  const codeCap = Math.min(cap, scale * most[code]);
  if (code > 2) return cappedCurve(codeCap, efficiency, curve);

  const sliding = cappedCurve(Math.min(codeCap, scale * hydroplaning), efficiency, curve);
  const slideFrom = hydroplaningFrom * (brakes.hydroplaningSpeed ?? 0);
  if (slideFrom === 0) return sliding;
  const rolling = cappedCurve(codeCap, deepShare * efficiency, curve);
  return {
    at: (groundSpeed) => (groundSpeed < slideFrom ? rolling : sliding).at(groundSpeed),
    kinks: [slideFrom, ...rolling.kinks, ...sliding.kinks],
  };
}

function cappedCurve(cap: number, factor: number, curve: (groundSpeed: number) => number): BrakingFriction {
  const at = (groundSpeed: number) => factor * curve(groundSpeed);
  return poorerBraking({ at, kinks: [greatestWetBrakingSpeed] }, constantBraking(cap));
}
