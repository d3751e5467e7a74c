import { tailwheelBrakedLoad, tricycleBrakedLoad } from '../../physics/braking-friction.ts';
import type { StandingDefault } from './standing-default.ts';

const degree = Math.PI / 180;

/**
 * What a landing takes for the members that a configuration leaves out: ratios, coefficients, radians and seconds.
 *
 * @see references.Raymer for touchdown speed, flare and free roll; references.Judgement for the rest
 */
export const landingDefaults = {
  touchdownStallRatio: {
    value: 1.15,
    otherEnd: 1.2,
    because: 'no touchdown speed is stated; 1.10 to 1.20 of the stall speed is usual',
    source: 'Raymer',
  },
  approachAngle: {
    value: 3 * degree,
    otherEnd: 2.5 * degree,
    kind: 'angle',
    because: 'no approach angle is stated; certification allows no steeper one than 3°',
    source: 'Cfr23s75',
  },
  flareLoadFactor: {
    value: 1.2,
    otherEnd: 1.1,
    because: 'no load factor of the flare is stated; 1.1 to 1.2 is usual',
    source: 'Raymer',
  },
  floatDecelerationRatio: {
    value: 0.12,
    otherEnd: 0.1,
    because: 'no deceleration while floating is stated; about 0.12 of gravity is usual with landing flap at idle',
    source: 'Judgement',
  },
  freeRollTime: {
    value: 2,
    otherEnd: 3,
    kind: 'time',
    because:
      'no time from touchdown to braking is stated; 1 s to 2 s is usual for a light aeroplane, 3 s for a large one',
    source: 'Raymer',
  },
  groundLiftClean: {
    value: 0.35,
    otherEnd: 0.5,
    because: 'no lift coefficient of the roll is stated; 0.20 to 0.40 is usual without flap',
    source: 'Judgement',
  },
  groundLiftFlap: {
    value: 0.6,
    otherEnd: 0.8,
    because: 'no lift coefficient of the roll is stated; 0.20 to 0.60 is usual with landing flap',
    source: 'Judgement',
  },
  groundDragIncrement: {
    value: 0,
    otherEnd: 0.05,
    because: 'no drag of flap and gear on the ground is stated beside the zero-lift drag; more would shorten the roll',
    source: 'Judgement',
  },
  airDragClean: {
    value: 0,
    otherEnd: 0.01,
    because: 'no drag of flap and gear in the air is stated beside the zero-lift drag; it counts in the climb only',
    source: 'Judgement',
  },
  airDragFlap: {
    value: 0.065,
    otherEnd: 0.075,
    because:
      'no drag of flap and gear in the air is stated beside the zero-lift drag; 0.055 to 0.075 is usual of landing flap, and it counts in the climb only',
    source: 'Judgement',
  },
} as const satisfies Record<string, StandingDefault>;

/** Idle thrust over the full static thrust, where no idle thrust is stated. @see references.Judgement */
export const idleThrustShare = {
  value: 0.06,
  otherEnd: 0.08,
  because:
    'no idle thrust is stated; 2 % to 8 % of the full static thrust is usual of jets, and propellers at idle give less',
  source: 'Judgement',
} as const satisfies StandingDefault;

/** Steepest approach without data of the flight manual for it [rad]. @see references.Judgement */
export const steepestWithoutData = 4 * degree;

/** Height of the screen of every landing [m]: 50 ft. @see references.Cfr23s75; references.Cfr25s125 */
export const landingScreenHeight = 50 * 0.3048;

/** Part of the weight on the braked wheels by the arrangement of the wheels. @see references.HouseFriction */
export const brakedLoad: Readonly<
  Record<'tricycle' | 'tailwheel' | 'unknown', { readonly value: number; readonly because: string }>
> = {
  tricycle: { value: tricycleBrakedLoad, because: 'not stated; 0.85 to 0.92 is usual with a nose wheel' },
  tailwheel: { value: tailwheelBrakedLoad, because: 'not stated; about 0.80 is usual with a tail wheel' },
  unknown: {
    value: tailwheelBrakedLoad,
    because: 'not stated, nor whether the third wheel is at the nose or at the tail; the less of 0.85 and 0.80',
  },
};

/** Tyre pressure where none is stated [Pa]: 100 psi, 200 psi for jets; a lower one brakes better on a wet runway. @see references.Judgement */
export function assumedTyrePressure(isJet: boolean): { readonly value: number; readonly text: string } {
  return isJet ? { value: 200 * psi, text: '200 psi' } : { value: 100 * psi, text: '100 psi' };
}
const psi = 6894.757293168361;
