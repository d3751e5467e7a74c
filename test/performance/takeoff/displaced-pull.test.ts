import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { displacedPull } from '../../../src/performance/takeoff/displaced-pull.ts';
import { groundRoll } from '../../../src/performance/takeoff/ground-roll.ts';
import { meanAccelerationRoll } from '../../../src/performance/takeoff/mean-acceleration-roll.ts';
import { takeoff } from '../../../src/performance/takeoff/takeoff.ts';
import { takeoffEstimate } from '../../../src/performance/takeoff/takeoff-estimate.ts';
import type { TakeoffRun } from '../../../src/performance/takeoff/takeoff-run.ts';
import { contaminantDrag } from '../../../src/physics/contaminant-drag.ts';
import { lightSingle } from '../../support/light-single.ts';
import { expectNear, expectRatio } from '../../support/near.ts';
import { odeRoll } from '../../support/ode-takeoff.ts';
import { plainRun, quadraticThrust } from '../../support/plain-run.ts';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

function roll(run: TakeoffRun): number {
  const result = groundRoll(run);
  return result.outcome === 'lifts-off' ? result.distance : Number.POSITIVE_INFINITY;
}

describe('displacedPull', () => {
  it('takes k (V - w)^2 off the thrust, one by one and in a row, and keeps the rest', () => {
    const thrust = { ...quadraticThrust(900, -0.2), kinks: [12], squareRootAtRest: true };
    const pull = displacedPull(thrust, 0.5, 4);
    expectNear(pull.at(24), 900 - 0.2 * 576 - 0.5 * 400, 1e-9);
    const out = new Float64Array(2);
    pull.fill(Float64Array.of(4, 14), 2, out);
    expectNear(out[0], 900 - 0.2 * 16, 1e-9);
    expectNear(out[1], 900 - 0.2 * 196 - 50, 1e-9);
    expect(pull.kinks).toEqual([12]);
    expect(pull.squareRootAtRest).toBe(true);
    expect(() => displacedPull(thrust, Number.NaN, 0)).toThrow(/contaminantDrag/);
  });
});

describe('a takeoff roll through a loose contaminant', () => {
  it('s = -ln(1 - k u^2/T)/(2 k/m), u = V_LOF - w: the wheels feel the ground speed [closed form; computed]', () => {
    for (const headwind of [-6, 0, 8]) {
      const u = 30 - headwind;
      const run = plainRun({ contaminantDrag: 1e-3, headwind });
      expectRatio(roll(run), -Math.log1p((-1e-3 * u * u) / 2) / 2e-3, 1e-9);
    }
  });

  it('agrees to 1e-7 with a general ODE library in wind [odex 2.0.4, forces written out again; computed]', () => {
    fc.assert(
      fc.property(between(0, 1.2), between(-8, 15), between(-0.02, 0.01), (k, headwind, slope) => {
        const run = lightSingle({ contaminantDrag: k, headwind, slope });
        const found = groundRoll(run);
        if (found.outcome !== 'lifts-off') throw new Error(found.outcome);
        const [distance, time] = odeRoll(run, 1e-11, [0]);
        expectRatio(found.distance, distance, 1e-7);
        expectRatio(found.time, time, 1e-7);
      }),
      { numRuns: 50 },
    );
  });

  it('without a contaminant is the roll it was, to the last bit', () => {
    expect(roll(lightSingle({ contaminantDrag: 0 }))).toBe(roll(lightSingle()));
    expect(roll(lightSingle({ contaminantDrag: undefined }))).toBe(roll(lightSingle()));
  });

  it('is longer the deeper the slush, and ends by never lifting off', () => {
    const gear = { tyres: 3, tyreWidth: 0.16, tyreDeflection: 0.02, sprayLength: 3 };
    const deep = [0, 0.004, 0.008, 0.012].map((depth) =>
      roll(lightSingle({ contaminantDrag: contaminantDrag('slush', depth, gear) })),
    );
    for (let i = 1; i < deep.length; i++) expect(deep[i]).toBeGreaterThan(deep[i - 1] as number);
    const stuck = groundRoll(lightSingle({ contaminantDrag: contaminantDrag('slush', 0.05, gear) }));
    expect(stuck).toMatchObject({ outcome: 'never-reaches-lift-off-speed' });
    // thrust 2366 - 0.2507 V^2, drag 0.4 V^2, friction 307 - 0.1 V^2 and k V^2 balance between 10 and 29 m/s
    expect((stuck as { atAirspeed: number }).atAirspeed).toBeGreaterThan(10);
  });

  it('leaves the air path alone and reaches the estimates', () => {
    const run = lightSingle({ contaminantDrag: 0.3 });
    const [dry, wet] = [takeoff(lightSingle()), takeoff(run)];
    if (dry.outcome !== 'reaches-screen' || wet.outcome !== 'reaches-screen') throw new Error('no screen');
    expect(wet.airDistance).toBe(dry.airDistance);
    expectRatio(meanAccelerationRoll(run), wet.groundRoll, 0.02);
    expectRatio(takeoffEstimate(run).groundRoll, wet.groundRoll, 0.02);
    expect(wet.groundRoll / dry.groundRoll).toBeGreaterThan(1.05);
  });
});
