import { describe, expect, it } from 'vitest';
import {
  type ClimbOnRemaining,
  oneEngineClimb,
  oneEngineClimbAfterTakeoff,
} from '../../../src/performance/engine-failure/one-engine-climb.ts';
import { withFailure } from '../../support/engine-failure-runs.ts';
import { expectNear } from '../../support/near.ts';
import { plainRun, quadraticThrust } from '../../support/plain-run.ts';

const g = 9.80665;
/** 60 t at 80 m/s: pressure 3920 Pa times 100 m2; lift coefficient 1.50101. */
const jet: ClimbOnRemaining = {
  mass: 60_000,
  wingArea: 100,
  inducedDragFactor: 0.04,
  zeroLiftDragCoefficient: 0.03,
  dragIncrementCoefficient: 0.005,
  density: 1.225,
  airspeed: 80,
  remainingThrust: quadraticThrust(80_000),
};

function climbOf(climb: ClimbOnRemaining) {
  const found = oneEngineClimb(climb);
  if (found.outcome !== 'climb') throw new Error(found.outcome);
  return found;
}

describe('oneEngineClimb', () => {
  it('is what the thrust that remains leaves over the drag, the dead engine included, by hand', () => {
    const pressed = 392_000;
    const lift = (60_000 * g) / pressed;
    const sine = (80_000 - pressed * (0.035 + 0.04 * lift * lift)) / (60_000 * g);
    expectNear(climbOf(jet).rate, 80 * sine, 1e-9);
    expectNear(climbOf(jet).gradient, Math.tan(Math.asin(sine)), 1e-12);
    expectNear(climbOf(jet).gradient, 0.0527, 1e-4);
  });

  it('sinks by the same law', () => {
    const { gradient, rate } = climbOf({ ...jet, remainingThrust: quadraticThrust(40_000) });
    expect(gradient).toBeLessThan(0);
    expect(rate).toBeLessThan(0);
    expectNear(climbOf(jet).rate - rate, (80 * 40_000) / (60_000 * g), 1e-9);
  });

  it('names thrust that is not known', () => {
    const remainingThrust = { ...jet.remainingThrust, domain: [0, 70] as const };
    expect(oneEngineClimb({ ...jet, remainingThrust })).toEqual({
      outcome: 'outside-stated-data',
      airspeed: 80,
      bound: 70,
    });
  });

  it('is after the takeoff of the run: at its screen speed with its flap and gear unless others are asked', () => {
    const run = withFailure(
      plainRun({
        mass: 60_000,
        wingArea: 100,
        inducedDragFactor: 0.04,
        airDragCoefficient: 0.03,
        density: 1.225,
        liftOffSpeed: 80,
        thrust: quadraticThrust(160_000),
      }),
      { dragIncrementCoefficient: 0.005 },
    );
    expect(oneEngineClimbAfterTakeoff(run)).toEqual(oneEngineClimb(jet));
    const clean = { ...jet, airspeed: 90, zeroLiftDragCoefficient: 0.02 };
    expect(oneEngineClimbAfterTakeoff(run, 90, 0.02)).toEqual(oneEngineClimb(clean));
  });
});
