import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { takeoff } from '../../../src/performance/takeoff/takeoff.ts';
import type { TakeoffResult, TakeoffRun } from '../../../src/performance/takeoff/takeoff-run.ts';
import { odeAcceleration, odeAir, odeClimb, odeRoll } from '../../support/ode-takeoff.ts';
import { anyFigures, easyFigures, type Figures, runOf } from '../../support/takeoff-runs.ts';

type Reached = Extract<TakeoffResult, { outcome: 'reaches-screen' }>;

function reached(run: TakeoffRun): Reached {
  const result = takeoff(run);
  fc.pre(result.outcome === 'reaches-screen');
  return result as Reached;
}

const steps = 400;

describe('takeoff against a general ODE library (odex, tolerance 1e-10)', () => {
  it('agrees to 1e-6 relative on roll, air path and their times [odex 2.0.4, forces written out again; computed]', () => {
    let compared = 0;
    fc.assert(
      fc.property(anyFigures, (figures) => {
        const run = runOf(figures);
        const found = takeoff(run);
        if (found.outcome !== 'reaches-screen') return;
        compared++;
        const weightless = Math.sqrt(
          (2 * run.mass * 9.80665) / (run.density * run.wingArea * run.groundLiftCoefficient),
        );
        const rotation = (run.liftOffSpeed - run.headwind) * run.rotationTime;
        const [roll, rollTime] = odeRoll(run, 1e-10, [0, weightless, ...run.thrust.kinks]);
        const square = run.liftOffSpeed ** 2;
        const growth = Math.max(0, run.screenSpeed ** 2 - square) / run.screenHeight;
        const kinks = growth > 0 ? run.thrust.kinks.map((v) => (v * v - square) / growth) : [];
        const [air, airTime] = odeAir(run, 1e-10, [
          run.span / 1.32 - run.wingHeight,
          0.03 * run.span - run.wingHeight,
          ...kinks,
        ]);
        expect(Math.abs(found.groundRoll / (roll + rotation) - 1)).toBeLessThan(1e-6);
        expect(Math.abs(found.groundRollTime / (rollTime + run.rotationTime) - 1)).toBeLessThan(1e-6);
        expect(Math.abs(found.airDistance - air)).toBeLessThan(
          1e-6 * (Math.abs(air) + Math.abs(run.headwind) * airTime),
        );
        expect(Math.abs(found.airTime / airTime - 1)).toBeLessThan(1e-6);
      }),
      { numRuns: 600 },
    );
    expect(compared).toBeGreaterThan(60);
  });
});

describe('takeoff, whatever the figures', () => {
  it('is finite or a named outcome that its own forces bear out', () => {
    const met = new Map<string, number>();
    fc.assert(
      fc.property(anyFigures, (figures) => {
        const run = runOf(figures);
        const result = takeoff(run);
        met.set(result.outcome, (met.get(result.outcome) ?? 0) + 1);
        for (const [name, value] of Object.entries(result)) {
          if (typeof value === 'number') expect(Number.isFinite(value), `${name} ${value}`).toBe(true);
        }
        const speeds = Array.from(
          { length: steps + 1 },
          (_, i) => run.headwind + ((run.liftOffSpeed - run.headwind) * i) / steps,
        );
        const heights = Array.from({ length: steps + 1 }, (_, i) => (run.screenHeight * i) / steps);
        if (result.outcome === 'ground-speed-not-positive') {
          expect(run.headwind).toBeGreaterThanOrEqual('climbSpeed' in result ? result.climbSpeed : run.liftOffSpeed);
        } else if (result.outcome === 'never-reaches-lift-off-speed') {
          expect(odeAcceleration(run, result.atAirspeed)).toBeLessThan(2e-5);
        } else if (result.outcome === 'never-reaches-screen-height') {
          expect(Math.min(...heights.map((h) => odeClimb(run, h).gradient))).toBeLessThan(0.015 + 1e-9);
          expect(result.leastClimbGradient).toBeLessThanOrEqual(0.015);
        } else if (result.outcome === 'reaches-screen') {
          const least = Math.min(...speeds.map((v) => odeAcceleration(run, v))) / 9.80665;
          expect(least).toBeGreaterThan(0);
          expect(Math.abs(result.leastAccelerationRatio - least)).toBeLessThan(0.03 * Math.max(0.02, least));
          const gradient = Math.min(...heights.map((h) => odeClimb(run, h).gradient));
          expect(gradient).toBeGreaterThan(0.0149);
          expect(Math.abs(result.leastClimbGradient - gradient)).toBeLessThan(0.02 * gradient);
          expect(result.groundRoll).toBeGreaterThan(0);
        }
      }),
      { numRuns: 2000 },
    );
    for (const outcome of [
      'reaches-screen',
      'never-reaches-lift-off-speed',
      'never-reaches-screen-height',
      'ground-speed-not-positive',
    ]) {
      expect(met.get(outcome) ?? 0, outcome).toBeGreaterThan(40);
    }
  });

  const longer: Record<string, (run: TakeoffRun, by: number) => TakeoffRun> = {
    mass: (run, by) => {
      const heavier = run.mass * (1 + by);
      const faster = Math.sqrt(1 + by);
      return {
        ...run,
        mass: heavier,
        rotationSpeed: run.rotationSpeed * faster,
        liftOffSpeed: run.liftOffSpeed * faster,
        screenSpeed: run.screenSpeed * faster,
      };
    },
    friction: (run, by) => ({ ...run, rollingFriction: run.rollingFriction + 0.1 * by }),
    'an uphill slope': (run, by) => ({ ...run, slope: run.slope + 0.1 * by }),
    'less headwind': (run, by) => ({ ...run, headwind: run.headwind - 10 * by }),
    'drag on the ground': (run, by) => ({ ...run, groundDragCoefficient: run.groundDragCoefficient + 0.1 * by }),
    'drag in the air': (run, by) => ({ ...run, airDragCoefficient: run.airDragCoefficient + 0.1 * by }),
    'less thrust': (run, by) => ({
      ...run,
      thrust: {
        ...run.thrust,
        at: (airspeed) => run.thrust.at(airspeed) * (1 - by),
        fill: (airspeeds, n, out) => {
          run.thrust.fill(airspeeds, n, out);
          for (let i = 0; i < n; i++) out[i] = (out[i] as number) * (1 - by);
        },
      },
    }),
    'a gentler pull-up': (run, by) => ({ ...run, pullUpLoadFactor: 1 + (run.pullUpLoadFactor - 1) * (1 - by) }),
    'a higher screen': (run, by) => ({ ...run, screenHeight: run.screenHeight * (1 + by) }),
  };

  it.each(Object.entries(longer))('%s makes the takeoff longer', (name, change) => {
    fc.assert(
      fc.property(easyFigures, fc.double({ min: 0.001, max: 0.1, noNaN: true }), (figures, by) => {
        const run = runOf(figures);
        fc.pre(run.thrust.domain === undefined || name !== 'mass');
        const before = reached(run);
        const after = takeoff(change(run, by));
        if (after.outcome !== 'reaches-screen') {
          expect(after.outcome).toMatch(/never/);
          return;
        }
        expect(after.groundRoll).toBeGreaterThanOrEqual(before.groundRoll * (1 - 1e-9));
        // the schedule is fixed: a higher screen takes more height and the same speeds, so its climb alone may be shallower
        expect(after.takeoffDistance).toBeGreaterThan(before.takeoffDistance * (1 - 1e-9));
      }),
      { numRuns: 300 },
    );
  });

  it('thinner and hotter air makes the takeoff longer', () => {
    fc.assert(
      fc.property(easyFigures, fc.double({ min: 10, max: 500, noNaN: true }), fc.boolean(), (figures, by, hotter) => {
        const changed: Figures = hotter
          ? { ...figures, deviation: figures.deviation + by / 20 }
          : { ...figures, pressureAltitude: figures.pressureAltitude + by };
        const before = reached({ ...runOf(figures), headwind: 0 });
        const after = takeoff({ ...runOf(changed), headwind: 0 });
        if (after.outcome === 'reaches-screen') expect(after.takeoffDistance).toBeGreaterThan(before.takeoffDistance);
        else expect(after.outcome).toMatch(/never/);
      }),
      { numRuns: 300 },
    );
  });

  it('has no jump where the wind turns from head to tail', () => {
    fc.assert(
      fc.property(easyFigures, (figures) => {
        const run = runOf(figures);
        const [tail, head] = [-1e-7, 1e-7].map((headwind) => reached({ ...run, headwind }));
        expect(Math.abs((tail as Reached).groundRoll / (head as Reached).groundRoll - 1)).toBeLessThan(1e-6);
        expect(Math.abs((tail as Reached).airDistance / (head as Reached).airDistance - 1)).toBeLessThan(1e-6);
      }),
      { numRuns: 200 },
    );
  });

  it('asks for no airspeed outside measured thrust: outside-stated-data with the bound', () => {
    fc.assert(
      fc.property(easyFigures, fc.double({ min: 0.5, max: 1.5, noNaN: true }), (figures, share) => {
        const run = { ...runOf({ ...figures, kind: 'measured' }), headwind: 0 };
        const highest = share * run.screenSpeed;
        const bounded = { ...run, thrust: { ...run.thrust, domain: [0, highest] as const } };
        const result = takeoff(bounded);
        const asked = Math.max(run.liftOffSpeed, run.screenSpeed);
        if (asked > highest)
          expect(result).toEqual({ outcome: 'outside-stated-data', airspeed: asked, bound: highest });
        else expect(result.outcome).not.toBe('outside-stated-data');
      }),
    );
    const run = runOf({ ...(fc.sample(easyFigures, { numRuns: 1, seed: 1 })[0] as Figures), kind: 'measured' });
    const low = { ...run, headwind: 2, thrust: { ...run.thrust, domain: [5, 500] as const } };
    expect(takeoff(low)).toEqual({ outcome: 'outside-stated-data', airspeed: 2, bound: 5 });
  });
});
