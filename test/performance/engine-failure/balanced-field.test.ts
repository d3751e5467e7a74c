import { describe, expect, it } from 'vitest';
import { brent } from '../../../src/numerics/brent.ts';
import { accelerateGo } from '../../../src/performance/engine-failure/accelerate-go.ts';
import { accelerateStop } from '../../../src/performance/engine-failure/accelerate-stop.ts';
import { balancedField } from '../../../src/performance/engine-failure/balanced-field.ts';
import type { DecisionBounds, EngineFailureRun } from '../../../src/performance/engine-failure/engine-failure-run.ts';
import { constantBraking } from '../../../src/physics/braking-friction.ts';
import { balancedFieldLength } from '../../published/balanced-field.ts';
import { balancedFieldRun, balancedFieldSpeeds, noDelay, withFailure } from '../../support/engine-failure-runs.ts';
import { expectNear, expectRatio } from '../../support/near.ts';
import { shortestFromRotation } from '../../support/optimised-rotation.ts';
import { plainRun, quadraticThrust } from '../../support/plain-run.ts';

const g = 9.80665;
const between = (lowest: number, highest: number): DecisionBounds => ({
  lowest: { speed: lowest, because: 'failure-at-standstill' },
  highest: { speed: highest, because: 'rotation-speed' },
});

/** 1 kg: 4 m/s2 with both engines, 2 with one, brakes 2 m/s2, lift-off at 30 m/s. */
const plain = withFailure(plainRun({ thrust: quadraticThrust(4) }));
const block: EngineFailureRun = { ...plain, stop: { ...plain.stop, braking: constantBraking(2 / g) } };

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
    const found = balancedField(block, between(0, 30));
    if (found.outcome !== 'balanced') throw new Error(found.outcome);
    const go = accelerateGo(block, 20);
    const air = go.outcome === 'reaches-screen' ? go.airDistance : Number.NaN;
    const speed = Math.sqrt((900 / 4 + air) / (1 / 4 + 1 / 4));
    expectNear(found.speed, speed, 2e-6);
    expectNear(found.length, speed ** 2 * (1 / 8 + 1 / 4), 1e-4);
  });

  it('takes an end of the bounds where stop and go do not cross between them', () => {
    const low = lengths(block, 15);
    expect(balancedField(block, between(10, 15))).toEqual({
      outcome: 'go-longer-throughout',
      speed: 15,
      length: low.go,
      ...low,
    });
    const high = lengths(block, 29.5);
    expect(balancedField(block, between(29.5, 30))).toEqual({
      outcome: 'stop-longer-throughout',
      speed: 29.5,
      length: high.stop,
      ...high,
    });
  });

  it('names what stands against it: no climb, no stop, no speed, wind', () => {
    const heavy = { ...block, dragIncrementCoefficient: 0.006 };
    expect(balancedField(heavy, between(0, 30))).toMatchObject({ outcome: 'single-engine-cannot-continue' });
    const loose = { ...block, stop: { ...block.stop, braking: constantBraking(0) } };
    expect(balancedField(loose, between(10, 30))).toMatchObject({ outcome: 'never-stops' });
    const bounds = between(31, 30);
    expect(balancedField(block, bounds)).toEqual({ outcome: 'no-decision-speed', bounds });
    const windy = { ...block, allEngines: { ...block.allEngines, headwind: 30 } };
    expect(balancedField(windy, between(30, 30))).toMatchObject({ outcome: 'ground-speed-not-positive' });
  });

  it('balances below a speed from which the brakes would not hold', () => {
    const braking = { at: (speed: number) => (speed < 29 ? 2 / g : 0), kinks: [29] };
    const found = balancedField({ ...block, stop: { ...block.stop, braking } }, between(0, 30));
    const free = balancedField(block, between(0, 30));
    expect(free).toMatchObject({ outcome: 'balanced' });
    expect((free as { speed: number }).speed).toBeLessThan(29);
    expectNear((found as { speed: number }).speed, (free as { speed: number }).speed, 1e-5);
  });

  it('balances above a speed below which one engine does not move it', () => {
    // thrust that the other engine only has from 5 m/s on
    const at = (airspeed: number) => (airspeed < 5 ? 0 : 2);
    const fill: typeof block.remainingThrust.fill = (airspeeds, n, out) => {
      for (let i = 0; i < n; i++) out[i] = at(airspeeds[i] as number);
    };
    const found = balancedField({ ...block, remainingThrust: { at, fill, kinks: [5] } }, between(0, 30));
    expectNear(
      (found as { speed: number }).speed,
      (balancedField(block, between(0, 30)) as { speed: number }).speed,
      1e-5,
    );
  });

  it('moves up with the time a failure takes to be seen, by hand: V_EF = V1 - a t', () => {
    const run = { ...block, timeline: { ...noDelay, recognitionTime: 1 } };
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
