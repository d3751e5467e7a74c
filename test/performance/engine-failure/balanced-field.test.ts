import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { brent } from '../../../src/numerics/brent.ts';
import { accelerateGo } from '../../../src/performance/engine-failure/accelerate-go.ts';
import { accelerateStop } from '../../../src/performance/engine-failure/accelerate-stop.ts';
import { balancedField } from '../../../src/performance/engine-failure/balanced-field.ts';
import { decisionBounds } from '../../../src/performance/engine-failure/decision-bounds.ts';
import type { DecisionBounds, EngineFailureRun } from '../../../src/performance/engine-failure/engine-failure-run.ts';
import { constantBraking, scaledBraking } from '../../../src/physics/braking-friction.ts';
import { balancedFieldLength } from '../../published/balanced-field.ts';
import { block, inWind } from '../../support/engine-failure-block.ts';
import {
  anyFailure,
  balancedFieldRun,
  balancedFieldSpeeds,
  type FailureAsked,
  noDelay,
  shareOfThrust,
} from '../../support/engine-failure-runs.ts';
import { expectNear, expectRatio } from '../../support/near.ts';
import { shortestFromRotation } from '../../support/optimised-rotation.ts';

const g = 9.80665;
const between = (lowest: number, highest: number): DecisionBounds => ({
  lowest: { speed: lowest, because: 'failure-at-standstill' },
  highest: { speed: highest, because: 'rotation-speed' },
});

const plain = block(2);

function lengths(run: EngineFailureRun, speed: number): { stop: number; go: number } {
  const stop = accelerateStop(run, speed);
  const go = accelerateGo(run, speed);
  if (stop.outcome !== 'stops' || go.outcome !== 'reaches-screen') throw new Error(`${stop.outcome}, ${go.outcome}`);
  return { stop: stop.distance, go: go.distance };
}

describe('balancedField', () => {
  const [published] = balancedFieldLength;
  it(`${published?.title}; by the energy path at load factor 1.10, lift-off at the published 87.25 m/s: within 5 %`, () => {
    const run = balancedFieldRun(87.25, 'ours');
    const found = balancedField(run, between(0, run.rotationSpeed));
    if (found.outcome !== 'balanced') throw new Error(found.outcome);
    expectRatio(found.length, published?.expected ?? 0, 0.05);
    expectNear(found.stop, found.go, 1e-3);
  });

  it(`${published?.title}; our stop and our roll to V_R, a rotation and a climb optimised here: within 1 %`, () => {
    const run = balancedFieldRun(balancedFieldSpeeds.rotation, 'own');
    const onward = shortestFromRotation();
    const difference = (speed: number) => {
      const stop = accelerateStop(run, speed);
      const go = accelerateGo(run, speed);
      if (stop.outcome !== 'stops' || go.outcome !== 'reaches-screen')
        throw new Error(`${stop.outcome}, ${go.outcome}`);
      return { stop: stop.distance, less: stop.distance - go.groundRoll - onward };
    };
    const found = brent((speed) => difference(speed).less, 60, run.rotationSpeed, 1e-6);
    if (found.outcome !== 'root') throw new Error(found.outcome);
    expectNear(difference(found.root).stop, published?.expected ?? 0, published?.tolerance ?? 0);
  });

  it('is the closed form where nothing delays: V1^2 (1/(2 a_2) + 1/(2 d)) = V1^2/(2 a_2) + (V_LOF^2 - V1^2)/(2 a_1) + air', () => {
    const found = balancedField(plain, between(0, 30));
    if (found.outcome !== 'balanced') throw new Error(found.outcome);
    const go = accelerateGo(plain, 20);
    const air = go.outcome === 'reaches-screen' ? go.airDistance : Number.NaN;
    const speed = Math.sqrt((900 / 4 + air) / (1 / 4 + 1 / 4));
    expectNear(found.speed, speed, 2e-6);
    expectNear(found.length, speed ** 2 * (1 / 8 + 1 / 4), 1e-4);
  });

  it('takes an end of the bounds where stop and go do not cross between them', () => {
    const low = lengths(plain, 15);
    expect(balancedField(plain, between(10, 15))).toEqual({
      outcome: 'go-longer-throughout',
      speed: 15,
      length: low.go,
      ...low,
    });
    const high = lengths(plain, 29.5);
    expect(balancedField(plain, between(29.5, 30))).toEqual({
      outcome: 'stop-longer-throughout',
      speed: 29.5,
      length: high.stop,
      ...high,
    });
  });

  it('names what stands against it: no climb, no stop, no speed, wind', () => {
    const heavy = { ...plain, dragIncrementCoefficient: 0.006 };
    expect(balancedField(heavy, between(0, 30))).toMatchObject({ outcome: 'single-engine-cannot-continue' });
    const loose = { ...plain, stop: { ...plain.stop, braking: constantBraking(0) } };
    expect(balancedField(loose, between(10, 30))).toMatchObject({ outcome: 'never-stops' });
    const bounds = between(31, 30);
    expect(balancedField(plain, bounds)).toEqual({ outcome: 'no-decision-speed', bounds });
    expect(balancedField(inWind(plain, 30), between(30, 30))).toMatchObject({ outcome: 'ground-speed-not-positive' });
  });

  it('balances below a speed from which the brakes would not hold', () => {
    const braking = { at: (speed: number) => (speed < 29 ? 2 / g : 0), kinks: [29] };
    const found = balancedField({ ...plain, stop: { ...plain.stop, braking } }, between(0, 30));
    const free = balancedField(plain, between(0, 30));
    expect(free).toMatchObject({ outcome: 'balanced' });
    expect((free as { speed: number }).speed).toBeLessThan(29);
    expectNear((found as { speed: number }).speed, (free as { speed: number }).speed, 1e-5);
  });

  it('balances above a speed below which one engine does not move it', () => {
    // thrust that the other engine only has from 5 m/s on
    const at = (airspeed: number) => (airspeed < 5 ? 0 : 2);
    const fill: typeof plain.remainingThrust.fill = (airspeeds, n, out) => {
      for (let i = 0; i < n; i++) out[i] = at(airspeeds[i] as number);
    };
    const found = balancedField({ ...plain, remainingThrust: { at, fill, kinks: [5] } }, between(0, 30));
    expectNear(
      (found as { speed: number }).speed,
      (balancedField(plain, between(0, 30)) as { speed: number }).speed,
      1e-5,
    );
  });

  it('moves up with the time a failure takes to be seen, by hand: V_EF = V1 - a t', () => {
    const run = { ...plain, timeline: { ...noDelay, recognitionTime: 1 } };
    const found = balancedField(run, between(2, 30));
    if (found.outcome !== 'balanced') throw new Error(found.outcome);
    const { speed } = found;
    const go = accelerateGo(run, speed);
    const air = go.outcome === 'reaches-screen' ? go.airDistance : Number.NaN;
    const failure = speed - 2;
    expectNear(found.stop, failure ** 2 / 8 + (speed ** 2 - failure ** 2) / 4 + speed ** 2 / 4, 1e-6);
    expectNear(found.go, failure ** 2 / 8 + (900 - failure ** 2) / 4 + air, 1e-6);
    expectNear(found.stop, found.go, 1e-4);
  });
});

describe('balancedField, whatever the figures', () => {
  /** With ground that is the same throughout: over humps the going may be the easier from a later failure's shorter climb. */
  function even({ run }: FailureAsked): EngineFailureRun {
    const { allEngines, stop } = run;
    return { ...run, allEngines: { ...allEngines, profile: undefined }, stop: { ...stop, profile: undefined } };
  }

  function boundsOf(run: EngineFailureRun): DecisionBounds {
    const bounds = decisionBounds(run, {});
    if ('outcome' in bounds) throw new Error(bounds.outcome);
    return bounds;
  }

  it('has a stop that grows and a go that shrinks with V1, which cross once, at the least of the greater', () => {
    const met = new Map<string, number>();
    fc.assert(
      fc.property(anyFailure, (asked) => {
        const run = even(asked);
        const bounds = boundsOf(run);
        const found = balancedField(run, bounds);
        met.set(found.outcome, (met.get(found.outcome) ?? 0) + 1);
        if (!('length' in found)) return;
        const { lowest, highest } = bounds;
        let before: { stop: number; go: number } | undefined;
        for (let i = 0; i <= 12; i++) {
          const speed = i === 12 ? highest.speed : lowest.speed + ((highest.speed - lowest.speed) * i) / 12;
          const stop = accelerateStop(run, speed);
          const go = accelerateGo(run, speed);
          if (stop.outcome !== 'stops' || go.outcome !== 'reaches-screen') continue;
          expect(Math.max(stop.distance, go.distance)).toBeGreaterThan(found.length - 1e-3);
          if (before !== undefined) {
            expect(stop.distance).toBeGreaterThan(before.stop - 1e-6);
            expect(go.distance).toBeLessThan(before.go + 1e-6);
          }
          before = { stop: stop.distance, go: go.distance };
        }
        if (found.outcome === 'balanced') expectRatio(found.stop, found.go, 1e-5);
        if (found.outcome === 'go-longer-throughout') expect(found.go).toBeGreaterThanOrEqual(found.stop);
        if (found.outcome === 'stop-longer-throughout') expect(found.stop).toBeGreaterThanOrEqual(found.go);
      }),
      { numRuns: 150, seed: 66 },
    );
    for (const outcome of ['balanced', 'single-engine-cannot-continue']) {
      expect(met.get(outcome) ?? 0, outcome).toBeGreaterThan(20);
    }
  });

  const longer: Record<string, (run: EngineFailureRun, by: number) => EngineFailureRun> = {
    mass: (run, by) => {
      const { allEngines, stop } = run;
      const mass = allEngines.mass * (1 + by);
      const speeds = (of: { rotationSpeed: number; liftOffSpeed: number; screenSpeed: number }) => ({
        rotationSpeed: of.rotationSpeed * Math.sqrt(1 + by),
        liftOffSpeed: of.liftOffSpeed * Math.sqrt(1 + by),
        screenSpeed: of.screenSpeed * Math.sqrt(1 + by),
      });
      return {
        ...run,
        ...speeds(run),
        allEngines: { ...allEngines, ...speeds(allEngines), mass },
        stop: { ...stop, mass },
      };
    },
    'thinner air at the same stall coefficient': (run, by) => {
      const { allEngines, stop } = run;
      const density = allEngines.density / (1 + by);
      const faster = Math.sqrt(1 + by);
      const speeds = (of: { rotationSpeed: number; liftOffSpeed: number; screenSpeed: number }) => ({
        rotationSpeed: of.rotationSpeed * faster,
        liftOffSpeed: of.liftOffSpeed * faster,
        screenSpeed: of.screenSpeed * faster,
      });
      const all = { ...allEngines, ...speeds(allEngines), density, thrust: shareOfThrust(allEngines.thrust, 1 - by) };
      const remainingThrust = shareOfThrust(run.remainingThrust, 1 - by);
      return { ...run, ...speeds(run), remainingThrust, allEngines: all, stop: { ...stop, density } };
    },
    'less headwind': (run, by) => inWind(run, run.allEngines.headwind - 10 * by),
    'poorer brakes': (run, by) => ({
      ...run,
      stop: { ...run.stop, braking: scaledBraking(run.stop.braking, 1 - by) },
    }),
    'less thrust on the engines that run': (run, by) => ({
      ...run,
      remainingThrust: shareOfThrust(run.remainingThrust, 1 - by),
    }),
    'a later recognition': (run, by) => ({
      ...run,
      timeline: { ...run.timeline, recognitionTime: run.timeline.recognitionTime + 10 * by },
    }),
  };

  it.each(Object.entries(longer))('is longer with %s', (_, change) => {
    let compared = 0;
    fc.assert(
      fc.property(anyFailure, fc.double({ min: 0.01, max: 0.05, noNaN: true }), (asked, by) => {
        const run = even(asked);
        const worse = change(run, by);
        if (worse.remainingThrust.domain !== undefined && worse.liftOffSpeed * 1.3 > worse.remainingThrust.domain[1])
          return;
        const [less, more] = [balancedField(run, boundsOf(run)), balancedField(worse, boundsOf(worse))];
        if (!('length' in less && 'length' in more)) return;
        compared++;
        expect(more.length).toBeGreaterThan(less.length * (1 - 1e-7));
      }),
      { numRuns: 120, seed: 67 },
    );
    expect(compared).toBeGreaterThan(30);
  });
});
