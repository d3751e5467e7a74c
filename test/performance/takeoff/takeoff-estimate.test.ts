import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { takeoff } from '../../../src/performance/takeoff/takeoff.ts';
import { takeoffEstimate } from '../../../src/performance/takeoff/takeoff-estimate.ts';
import type { TakeoffRun } from '../../../src/performance/takeoff/takeoff-run.ts';
import { measuredThrust } from '../../../src/physics/thrust/measured.ts';
import { executiveJet } from '../../support/executive-jet.ts';
import { standardAir } from '../../support/standard-air.ts';
import { easyFigures, type Figures, runOf } from '../../support/takeoff-runs.ts';

describe('takeoffEstimate', () => {
  it('is within 2 % of the roll above 0.06 g and 12 % of the air distance above a gradient of 0.05 [computed]', () => {
    fc.assert(
      fc.property(easyFigures, (figures) => {
        const run = runOf({ ...figures, headwindRatio: figures.headwindRatio / 3 });
        const found = takeoff(run);
        fc.pre(
          found.outcome === 'reaches-screen' && found.leastAccelerationRatio > 0.06 && found.leastClimbGradient > 0.05,
        );
        if (found.outcome !== 'reaches-screen') return;
        const estimated = takeoffEstimate(run);
        expect(Math.abs(estimated.groundRoll / found.groundRoll - 1)).toBeLessThan(0.02);
        expect(Math.abs(estimated.airDistance / found.airDistance - 1)).toBeLessThan(0.12);
      }),
      { numRuns: 400 },
    );
  });

  const changes: Record<string, (run: TakeoffRun) => TakeoffRun> = {
    mass: (run) => ({
      ...run,
      mass: run.mass * 1.01,
      liftOffSpeed: run.liftOffSpeed * 1.005,
      screenSpeed: run.screenSpeed * 1.005,
    }),
    'lift-off speed': (run) => ({ ...run, liftOffSpeed: run.liftOffSpeed * 1.01, screenSpeed: run.screenSpeed * 1.01 }),
    friction: (run) => ({ ...run, rollingFriction: run.rollingFriction + 0.005 }),
    headwind: (run) => ({ ...run, headwind: run.headwind + 0.5 }),
    slope: (run) => ({ ...run, slope: Math.abs(run.slope) + 0.005 }),
  };

  it.each(Object.entries(changes))(
    'changes with %s as the integrals do: to 10 % of the change on the ground, 30 % in the air',
    (_, change) => {
      fc.assert(
        fc.property(easyFigures, (figures) => {
          const kind = figures.kind === 'measured' ? 'disc' : figures.kind;
          const run = runOf({ ...figures, slope: Math.abs(figures.slope), kind });
          const [before, after] = [takeoff(run), takeoff(change(run))];
          fc.pre(before.outcome === 'reaches-screen' && after.outcome === 'reaches-screen');
          if (before.outcome !== 'reaches-screen' || after.outcome !== 'reaches-screen') return;
          fc.pre(before.leastClimbGradient > 0.08 && before.leastAccelerationRatio > 0.06);
          const [guess, guessAfter] = [takeoffEstimate(run), takeoffEstimate(change(run))];
          for (const [part, share, slack] of [
            ['groundRoll', 0.1, 3e-4],
            ['airDistance', 0.3, 3e-3],
          ] as const) {
            const wanted = Math.log(after[part] / before[part]);
            const found = Math.log(guessAfter[part] / guess[part]);
            expect(Math.abs(found - wanted), part).toBeLessThan(share * Math.abs(wanted) + slack);
          }
        }),
        { numRuns: 300 },
      );
    },
  );

  it('is Infinity, never NaN, where a mean is not positive', () => {
    const weak = { ...executiveJet, groundLiftCoefficient: 0, rollingFriction: 0.5 };
    expect(takeoffEstimate(weak).groundRoll).toBe(Number.POSITIVE_INFINITY);
    expect(takeoffEstimate({ ...weak, airDragCoefficient: 0.5 }).airDistance).toBe(Number.POSITIVE_INFINITY);
  });

  it('holds measured thrust at its ends, so that a small change never leads outside the data', () => {
    const figures = fc.sample(easyFigures, { numRuns: 1, seed: 5 })[0] as Figures;
    const run = runOf({ ...figures, kind: 'measured', headwindRatio: 0 });
    const airspeeds = [0, run.screenSpeed];
    const thrusts = airspeeds.map((airspeed) => run.thrust.at(airspeed));
    const thrust = measuredThrust(
      { airspeeds, thrusts, density: 1, densityExponent: 0, thrustFactor: 1 },
      1,
      standardAir(0),
    );
    const faster = { ...run, thrust, liftOffSpeed: run.liftOffSpeed * 1.5, screenSpeed: run.screenSpeed * 1.5 };
    expect(Number.isFinite(takeoffEstimate(faster).groundRoll)).toBe(true);
    expect(() => takeoffEstimate({ ...faster, headwind: -3 })).not.toThrow();
  });
});
