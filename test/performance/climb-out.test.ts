import { describe, expect, it } from 'vitest';
import { type ClimbOut, climbOut, pathHeight } from '../../src/performance/climb-out.ts';
import { steadyClimb } from '../../src/performance/steady-climb.ts';
import { expectNear, expectRatio } from '../support/near.ts';

const still: ClimbOut = {
  mass: 1000,
  wingArea: 16,
  inducedDragFactor: 0.06,
  from: { distance: 600, height: 15.24 },
  rise: 400,
  stages: [{ zeroLiftDragCoefficient: 0.03 }],
  stateAt: () => ({ density: 1.225, airspeed: 35, thrust: 1800 }),
  headwind: 0,
};

function climbing(climb: ClimbOut) {
  const path = climbOut(climb);
  if (path.outcome !== 'climbs') throw new Error(path.outcome);
  return path;
}

describe('climbOut', () => {
  const { gradient, rate } = steadyClimb({
    mass: 1000,
    wingArea: 16,
    inducedDragFactor: 0.06,
    zeroLiftDragCoefficient: 0.03,
    density: 1.225,
    airspeed: 35,
    thrust: 1800,
  });

  it('is a straight line where nothing changes with height: rise over gradient', () => {
    const path = climbing(still);
    expectRatio(path.distances.at(-1) as number, 600 + 400 / gradient, 1e-12);
    expectRatio(pathHeight(path, 600 + 123 / gradient), 15.24 + 123, 1e-12);
  });

  it('loses the way that a tailwind adds and gains what a headwind takes: rise over rate times the wind', () => {
    for (const headwind of [-4, 5]) {
      const path = climbing({ ...still, headwind });
      expectRatio(path.distances.at(-1) as number, 600 + 400 / gradient - (headwind * 400) / rate, 1e-12);
    }
  });

  it('is the exact integral of a thrust that falls with height, to 2 in 1 000 for small angles [logarithm, by hand]', () => {
    // gradient g0 (1 - h/H) at small angles: distance = -(H/g0) ln(1 - h/H)
    const fall = 0.4e-3;
    const path = climbing({
      ...still,
      from: { distance: 0, height: 0 },
      stateAt: (height) => ({ density: 1.225, airspeed: 35, thrust: 840.79 + 200 * (1 - fall * height) }),
    });
    const g0 = 200 / 9806.65;
    expectRatio(path.distances.at(-1) as number, -Math.log(1 - fall * 400) / (fall * g0), 2e-3);
  });

  it('changes drag at the height of a stage and nowhere else', () => {
    const stages = [{ upTo: 115.24, zeroLiftDragCoefficient: 0.045 }, { zeroLiftDragCoefficient: 0.03 }];
    const dirty = climbing({ ...still, stages: [{ zeroLiftDragCoefficient: 0.045 }] });
    const path = climbing({ ...still, stages });
    const until = dirty.distances.at(-1) as number;
    const share = 600 + ((until - 600) * 100) / 400;
    expectNear(pathHeight(path, share), 115.24, 1e-6);
    expectRatio((path.distances.at(-1) as number) - share, 300 / gradient, 1e-9);
  });

  it('has no height before it begins and ends at its last height', () => {
    const path = climbing(still);
    expect(() => pathHeight(path, 599)).toThrow('distance');
    expectRatio(pathHeight(path, 600), 15.24, 1e-12);
    expectRatio(pathHeight(path, 1e6), 415.24, 1e-12);
  });

  it('names a path that does not climb, and one that makes no way over the ground', () => {
    const weak = climbOut({ ...still, stateAt: () => ({ density: 1.225, airspeed: 35, thrust: 700 }) });
    expect(weak.outcome).toBe('does-not-climb');
    expect('gradient' in weak && weak.gradient).toBeLessThan(0);
    expect(climbOut({ ...still, headwind: 36 }).outcome).toBe('does-not-climb');
  });
});
