import { figures } from './figures.ts';

/**
 * The balanced field of a twin jet: constant thrust, parabolic polar, sea level, one engine out, no thrust in the stop, no reaction
 * time, 35 ft.
 */
export const balancedFieldAeroplane = {
  mass: 79_015.6,
  thrustOfBoth: 240_204,
  density: 1.225,
  wingArea: 124.7,
  aspectRatio: 9.45,
  span: 35.7,
  oswaldFactor: 0.801,
  zeroLiftDrag: 0.03,
  groundLift: 0.5,
  maximumLift: 2,
  greatestIncidenceDegrees: 10,
  wingHeight: 1,
  rollingFriction: 0.03,
  brakingFriction: 0.3,
  screenHeight: 10.668,
} as const;

const problem = {
  source: 'Dymos (NASA), Aircraft Balanced Field Length Calculation and its regression test',
  section: 'docs/dymos_book/examples/balanced_field',
  unit: 'm',
} as const;

export const balancedFieldLength = figures({ ...problem, status: 'read', quantity: 'balanced field length' }, [
  { id: 'whole-field', inputs: {}, expected: 2197, tolerance: 22 },
]);

/** Exact integrals of V dV/(A - B V^2) with the problem's figures: no optimiser in them. */
export const balancedFieldLegs = figures({ ...problem, status: 'computed', quantity: 'leg', note: 'closed form' }, [
  { id: 'both-engines', inputs: { from: 0, to: 70 }, expected: 906.6, tolerance: 906.6 * 2e-5 },
  { id: 'stop', inputs: { from: 70, to: 0 }, expected: 922.51, tolerance: 922.51 * 2e-5 },
  { id: 'one-engine', inputs: { from: 70, to: 1.2 * 71.222 }, expected: 1075.11, tolerance: 1075.11 * 2e-5 },
]);
