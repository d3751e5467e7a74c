import { describe, expect, it } from 'vitest';
import { accelerateStop } from '../../../src/performance/engine-failure/accelerate-stop.ts';
import type { EngineFailureRun } from '../../../src/performance/engine-failure/engine-failure-run.ts';
import { constantBraking } from '../../../src/physics/braking-friction.ts';
import { balancedFieldLegs } from '../../published/balanced-field.ts';
import { block, inWind } from '../../support/engine-failure-block.ts';
import { balancedFieldRun, noDelay } from '../../support/engine-failure-runs.ts';
import { expectNear, expectRatio } from '../../support/near.ts';
import { quadraticThrust } from '../../support/plain-run.ts';

function stopOf(run: EngineFailureRun, decisionSpeed: number) {
  const result = accelerateStop(run, decisionSpeed);
  if (result.outcome !== 'stops') throw new Error(result.outcome);
  return result;
}

describe('accelerateStop', () => {
  const [both, stop] = balancedFieldLegs;
  it(`${both?.title}; ${stop?.title}`, () => {
    const found = stopOf(balancedFieldRun(90, 'own'), 70);
    expectNear(found.distance, (both?.expected ?? 0) + (stop?.expected ?? 0), 2e-5 * (both?.expected ?? 0));
    expect(found.failureSpeed).toBe(70);
  });

  it('adds up the timeline of an even acceleration by hand', () => {
    // V1 20: 1 s at 2 m/s2 before it, so V_EF 18; 18^2/8 + 19 + 2 s at 20 + 1 s at 20 + 20^2/10
    const found = stopOf(block(5, { recognitionTime: 1, timeAtDecisionSpeed: 2, transitionTime: 1 }), 20);
    expectNear(found.failureSpeed, 18, 1e-8);
    expectNear(found.engineFailureDistance, 40.5 + 19 + 40 + 20 + 40, 1e-7);
    expectNear(found.allEnginesDistance, 50 + 40 + 20 + 40, 1e-7);
    expectNear(found.time, 4.5 + 1 + 2 + 1 + 4, 1e-8);
    expect(found).toMatchObject({ longer: 'engine-failure', distance: found.engineFailureDistance, brakingSpeed: 20 });
    expectNear(found.brakeEnergy, 200, 1e-9);
  });

  it('goes on accelerating for the seconds of the older rule, then holds the speed reached', () => {
    // with one engine 2 s at 2 m/s2: 20 to 24 over 44 m; with both at 4 m/s2: to 28 over 48 m
    const found = stopOf(block(5, { continuedAccelerationTime: 2, transitionTime: 1 }), 20);
    expectNear(found.engineFailureDistance, 50 + 44 + 24 + 57.6, 1e-6);
    expectNear(found.allEnginesDistance, 50 + 48 + 28 + 78.4, 1e-6);
    expect(found.longer).toBe('all-engines');
    expectNear(found.brakingSpeed, 28, 1e-8);
    expectNear(found.brakeEnergy, 28 ** 2 / 2, 1e-6);
    expectNear(found.time, 5 + 2 + 1 + 28 / 5, 1e-8);
  });

  it('counts the wind out of every leg: ground speed is what runs', () => {
    const run = block(5, { recognitionTime: 1, timeAtDecisionSpeed: 2, transitionTime: 1 });
    const windy = inWind(run, -6);
    expectNear(stopOf(windy, 14).distance, stopOf(run, 20).distance, 1e-7);
  });

  it('takes the idle thrust of the engines that run, and of all where none failed', () => {
    const run = block(5);
    const idle = { ...run, stop: { ...run.stop, idleThrust: 1 }, idleThrustAllEngines: 2 };
    const found = stopOf(idle, 20);
    expectNear(found.engineFailureDistance, 50 + 50, 1e-8);
    expectNear(found.allEnginesDistance, 50 + 400 / 6, 1e-8);
    // brakes take the motion and the work of the thrust: 5/3 of the motion
    expectNear(found.brakeEnergy, (200 * 5) / 3, 1e-8);
  });

  it('reverses all engines where none failed, and those that run where one did', () => {
    const run = block(5);
    const reversed = {
      ...run,
      stop: { ...run.stop, reverseThrust: { thrust: 1, cutOffSpeed: 0 } },
      reverseThrustAllEngines: 3,
    };
    const found = stopOf(reversed, 20);
    expectNear(found.engineFailureDistance, 50 + 400 / 12, 1e-8);
    expectNear(found.allEnginesDistance, 50 + 400 / 16, 1e-8);
  });

  it('lets the drag of the dead engine act from the failure to the stop, not on the all-engines stop', () => {
    const run = { ...block(5, { recognitionTime: 1 }), dragIncrementCoefficient: 0.004 };
    const found = stopOf(run, 20);
    // V' = 2 - k V^2 before V1 and -(5 + k V^2) after it, k = 0.5 rho S dC_D
    const k = 0.002;
    const root = Math.sqrt(2 / k);
    const failure = root * Math.tanh(Math.atanh(20 / root) - Math.sqrt(2 * k));
    const onward = Math.log((2 - k * failure ** 2) / (2 - k * 400)) / (2 * k);
    expectNear(found.failureSpeed, failure, 1e-8);
    expectRatio(found.engineFailureDistance, failure ** 2 / 8 + onward + Math.log1p((k * 400) / 5) / (2 * k), 1e-9);
    expectNear(found.allEnginesDistance, 90, 1e-8);
  });

  it('follows a rise of 1 m/s2 from where the wheels meet it, by hand', () => {
    const rising = (from: number, run: EngineFailureRun) => {
      const profile = { ends: [from, 1000], slopes: [0, 1 / 9.80665] };
      return { ...run, allEngines: { ...run.allEngines, profile }, stop: { ...run.stop, profile } };
    };
    // from 30 m on: V_EF 18.5, reached at 30 + (18.5^2 - 240)/6; on one engine at 1 m/s2 to 20; brakes and rise 6 m/s2
    const failed = stopOf(rising(30, block(5, { recognitionTime: 1.5 })), 20);
    expectNear(failed.engineFailureDistance, 30 + (18.5 ** 2 - 240) / 6 + (400 - 18.5 ** 2) / 2 + 400 / 12, 1e-5);
    // from 80 m on: V1 at 50 m, 40 m at V1, then 2 s at 1 m/s2 from 90 m on
    const later = stopOf(rising(80, block(5, { timeAtDecisionSpeed: 2, continuedAccelerationTime: 2 })), 20);
    expectNear(later.engineFailureDistance, 90 + 42 + 22 ** 2 / 12, 1e-5);
    expectNear(later.allEnginesDistance, 90 + 46 + 26 ** 2 / 12, 1e-5);
  });

  it('holds V1 through the recognition where the engines that remain do not accelerate', () => {
    const run = { ...block(5, { recognitionTime: 3 }), remainingThrust: quadraticThrust(0) };
    const found = stopOf(run, 20);
    expect(found.failureSpeed).toBe(20);
    expectNear(found.engineFailureDistance, 50 + 60 + 40, 1e-8);
    expectNear(found.time, 5 + 3 + 4, 1e-8);
  });

  it('names a speed that all engines do not reach, brakes that do not hold, and thrust that is not known', () => {
    const run = block(5);
    const dragged = { ...run, allEngines: { ...run.allEngines, groundDragCoefficient: 0.02 } };
    const named = accelerateStop(dragged, 25);
    // 4 = 0.01 V^2
    expect(named.outcome).toBe('never-reaches-decision-speed');
    expectNear((named as { atAirspeed: number }).atAirspeed, 20, 0.03);
    const loose = { ...run, stop: { ...run.stop, braking: constantBraking(0) } };
    expect(accelerateStop(loose, 20)).toMatchObject({ outcome: 'never-stops', atGroundSpeed: 20 });
    const known = { ...run, remainingThrust: { ...run.remainingThrust, domain: [0, 15] as const } };
    expect(accelerateStop(known, 20)).toEqual({ outcome: 'outside-stated-data', airspeed: 20, bound: 15 });
    const later = { ...run, timeline: { ...noDelay, continuedAccelerationTime: 2 } };
    const edge = { ...later, remainingThrust: { ...run.remainingThrust, domain: [0, 21] as const } };
    expect(accelerateStop(edge, 20)).toEqual({ outcome: 'outside-stated-data', airspeed: 21, bound: 21 });
  });

  it('stands where V1 is the headwind, and asks for no speed below it', () => {
    expect(stopOf(block(5), 0)).toMatchObject({ distance: 0, brakeEnergy: 0 });
    expect(() => accelerateStop(block(5), -1)).toThrow(/decisionSpeed/);
  });
});
