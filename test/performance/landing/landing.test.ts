import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { landing } from '../../../src/performance/landing/landing.ts';
import type { LandingResult, LandingRun } from '../../../src/performance/landing/landing-run.ts';
import { scaledBraking } from '../../../src/physics/braking-friction.ts';
import { landingProgram, landingVectors } from '../../published/landing-vectors.ts';
import { anyLanding, landingVectorRun } from '../../support/landing-runs.ts';
import { odex } from '../../support/odex.ts';

const { source, status, tolerance } = landingProgram;
type Stopped = Extract<LandingResult, { outcome: 'stops' }>;

function stopped(run: LandingRun): Stopped {
  const result = landing(run);
  fc.pre(result.outcome === 'stops');
  return result as Stopped;
}

describe('landing', () => {
  it.each(landingVectors.map((vector) => [vector.id, vector] as const))(
    `%s: air, free and braked roll and speeds to ${tolerance} relative [${source}; ${status}]`,
    (_, vector) => {
      const run = landingVectorRun(vector);
      const found = landing(run);
      if (found.outcome !== 'stops') throw new Error(found.outcome);
      const { expected } = vector;
      const pairs = {
        air: [found.airDistance, expected.air],
        freeRoll: [found.freeRoll, expected.freeRoll],
        brakedRoll: [found.brakedRoll, expected.brakedRoll],
        referenceSpeed: [run.referenceSpeed, expected.referenceSpeed],
        touchdownSpeed: [run.touchdownSpeed, expected.touchdownSpeed],
        stallSpeed: [run.stallSpeed, expected.stallSpeed],
      } as const;
      for (const [name, [value, wanted]] of Object.entries(pairs)) {
        expect(Math.abs(value / wanted - 1), name).toBeLessThan(tolerance);
      }
      expect(found.groundRoll).toBe(found.freeRoll + found.brakedRoll);
      expect(found.landingDistance).toBe(found.airDistance + found.groundRoll);
    },
  );

  it('agrees to 1e-6 with a general ODE library on the braked roll [odex 2.0.4, forces written out again; computed]', () => {
    let compared = 0;
    fc.assert(
      fc.property(anyLanding, (run) => {
        const found = landing(run);
        if (found.outcome !== 'stops') return;
        compared++;
        const deceleration = (airspeed: number) => {
          const pressure = 0.5 * run.density * run.wingArea * airspeed * Math.abs(airspeed);
          const r = run.wingHeight / run.span;
          const phi = Math.min(1, 1 - (1 - 0.66 * 2 * r) / (1.05 + 3.7 * 2 * r));
          const lift = run.groundLiftCoefficient;
          const drag = pressure * (run.groundDragCoefficient + phi * run.inducedDragFactor * lift * lift);
          const grip = run.braking.at(0) * Math.max(0, run.mass * 9.80665 - pressure * lift);
          return (grip + drag - run.idleThrust) / run.mass + 9.80665 * run.slope;
        };
        const weightless = Math.sqrt(
          (2 * run.mass * 9.80665) / (run.density * run.wingArea * run.groundLiftCoefficient),
        );
        const inside = [0, weightless].filter((v) => v > run.headwind && v < run.touchdownSpeed);
        const ends = [run.headwind, ...inside, run.touchdownSpeed].sort((a, b) => a - b);
        let distance = 0;
        for (let i = 1; i < ends.length; i++) {
          distance += odex(
            (v) => [(v - run.headwind) / deceleration(v), 1 / deceleration(v)],
            ends[i - 1] as number,
            ends[i] as number,
            1e-10,
          )[0];
        }
        expect(Math.abs(found.brakedRoll / distance - 1)).toBeLessThan(1e-6);
      }),
      { numRuns: 500 },
    );
    expect(compared).toBeGreaterThan(150);
  });

  it('is finite or a named outcome, whatever the figures', () => {
    const met = new Set<string>();
    fc.assert(
      fc.property(anyLanding, (run) => {
        const result = landing(run);
        met.add(result.outcome);
        for (const [name, value] of Object.entries(result)) {
          if (typeof value === 'number') expect(Number.isFinite(value), `${name} ${value}`).toBe(true);
        }
        if (result.outcome === 'stops') {
          for (const part of [result.airDistance + 1e3, result.freeRoll, result.brakedRoll])
            expect(part).toBeGreaterThanOrEqual(0);
          expect(result.leastDecelerationRatio).toBeGreaterThan(0);
        } else if (result.outcome === 'never-stops') {
          expect(result.leastDecelerationRatio).toBeLessThan(1e-5);
        } else {
          expect(run.headwind).toBeGreaterThanOrEqual(run.touchdownSpeed);
        }
      }),
      { numRuns: 2000 },
    );
    expect([...met].sort()).toEqual(['ground-speed-not-positive', 'never-stops', 'stops']);
  });

  const faster = (run: LandingRun, by: number) => ({
    ...run,
    referenceSpeed: run.referenceSpeed * (1 + by),
    touchdownSpeed: run.touchdownSpeed * (1 + by),
  });
  const longer: Record<string, (run: LandingRun, by: number) => LandingRun> = {
    'thinner air': (run, by) => ({ ...faster(run, (1 - by) ** -0.5 - 1), density: run.density * (1 - by) }),
    'more speed': faster,
    'less headwind': (run, by) => ({ ...run, headwind: run.headwind - 10 * by }),
    'a downhill slope': (run, by) => ({ ...run, slope: run.slope - by / 10 }),
    'less braking': (run, by) => ({ ...run, braking: scaledBraking(run.braking, 1 - by) }),
    'more idle thrust': (run, by) => ({ ...run, idleThrust: run.idleThrust + 0.1 * by * run.mass }),
    'a longer free roll': (run, by) => ({ ...run, freeRollTime: run.freeRollTime + by }),
  };

  it.each(Object.entries(longer))('%s makes the landing longer', (name, change) => {
    // with a tailwind a faster approach spends less time drifting: its air distance may shrink
    const least = name === 'more speed' || name === 'thinner air' ? 0 : Number.NEGATIVE_INFINITY;
    fc.assert(
      fc.property(anyLanding, fc.double({ min: 1e-3, max: 0.1, noNaN: true }), (figures, by) => {
        const run = {
          ...figures,
          headwind: Math.max(least, Math.min(figures.headwind, 0.6 * figures.touchdownSpeed)),
          groundLiftCoefficient: 0.3,
        };
        const before = stopped(run);
        const after = landing(change(run, by));
        if (after.outcome === 'stops')
          expect(after.landingDistance).toBeGreaterThan(before.landingDistance * (1 - 1e-9));
        else expect(after.outcome).toBe('never-stops');
      }),
      { numRuns: 300 },
    );
  });

  it('mass makes the landing longer, with the speeds that go with it', () => {
    fc.assert(
      fc.property(anyLanding, fc.double({ min: 1e-3, max: 0.1, noNaN: true }), (figures, by) => {
        // the arc of a flare grows with the square of the speed while the straight part shrinks: a light aeroplane's air distance
        // from a steep approach may not grow, so the roll is what is compared
        const run = {
          ...figures,
          headwind: Math.min(figures.headwind, 0.6 * figures.touchdownSpeed),
          groundLiftCoefficient: 0.3,
        };
        const before = stopped(run);
        const after = landing({
          ...faster(run, Math.sqrt(1 + by) - 1),
          mass: run.mass * (1 + by),
          idleThrust: run.idleThrust,
        });
        if (after.outcome === 'stops' && run.idleThrust <= 0) {
          expect(after.groundRoll).toBeGreaterThan(before.groundRoll * (1 - 1e-9));
        }
      }),
      { numRuns: 300 },
    );
  });

  it('begins braking, on the scale of the stretches, where the air distance and the free roll end', () => {
    const run = { ...landingVectorRun(landingVectors[0] as (typeof landingVectors)[number]), freeRollTime: 2 };
    const plain = landing(run);
    if (plain.outcome !== 'stops') throw new Error(plain.outcome);
    const touched = plain.airDistance + plain.freeRoll;
    const ice = { ...run, braking: scaledBraking(run.braking, 0.2) };
    const icedFrom = (end: number) => {
      const found = landing({
        ...run,
        stretches: [
          { ...run, end },
          { ...ice, end: 5000 },
        ],
      });
      if (found.outcome !== 'stops') throw new Error(found.outcome);
      expect(found.airDistance).toBe(plain.airDistance);
      return found.brakedRoll;
    };
    expect(icedFrom(touched + plain.brakedRoll + 0.01) / plain.brakedRoll).toBeCloseTo(1, 9);
    expect(icedFrom(touched + plain.brakedRoll - 1)).toBeGreaterThan(plain.brakedRoll + 0.5);
    const wholly = landing(ice);
    expect(icedFrom(touched) / (wholly as Stopped).brakedRoll).toBeCloseTo(1, 9);
  });

  it('has no jump where the wind turns from head to tail', () => {
    fc.assert(
      fc.property(anyLanding, (run) => {
        const [tail, head] = [-1e-7, 1e-7].map((headwind) => stopped({ ...run, headwind }));
        expect(Math.abs((tail as Stopped).landingDistance / (head as Stopped).landingDistance - 1)).toBeLessThan(1e-6);
      }),
      { numRuns: 200 },
    );
  });
});
