import type { StandingDefault } from './standing-default.ts';

/**
 * What a takeoff takes for the members that a configuration leaves out: ratios, coefficients and seconds.
 *
 * @see references.Raymer for speeds and rotation; references.Judgement for the rest
 */
export const takeoffDefaults = {
  liftOffStallRatio: {
    value: 1.15,
    otherEnd: 1.2,
    because: 'no lift-off speed is stated; 1.10 to 1.20 of the stall speed is usual',
    source: 'Raymer',
  },
  screenStallRatio: {
    value: 1.2,
    otherEnd: 1.3,
    because: 'no speed at the screen is stated; 1.20 of the stall speed is the least that certification allows',
    source: 'Cfr23s51',
  },
  rotationTime: {
    value: 0,
    otherEnd: 1,
    kind: 'time',
    because: 'no rotation time is stated, so lift-off comes with rotation; about 1 s is usual for a light aeroplane',
    source: 'Raymer',
  },
  groundLiftClean: {
    value: 0.35,
    otherEnd: 0.2,
    because: 'no lift coefficient of the roll is stated; 0.20 to 0.40 is usual without flap',
    source: 'Judgement',
  },
  groundLiftFlap: {
    value: 0.5,
    otherEnd: 0.3,
    because: 'no lift coefficient of the roll is stated; 0.30 to 0.60 is usual with takeoff flap',
    source: 'Judgement',
  },
  pullUpLoadFactor: {
    value: 1.1,
    otherEnd: 1.05,
    because: 'no load factor of the pull-up is stated; 1.05 to 1.20 is usual',
    source: 'Judgement',
  },
  groundDragIncrement: {
    value: 0,
    otherEnd: 0.01,
    because: 'no drag of flap and gear on the ground is stated beside the zero-lift drag',
    source: 'Judgement',
  },
  airDragIncrement: {
    value: 0,
    otherEnd: 0.01,
    because: 'no drag of flap and gear in the air is stated beside the zero-lift drag',
    source: 'Judgement',
  },
} as const satisfies Record<string, StandingDefault>;
