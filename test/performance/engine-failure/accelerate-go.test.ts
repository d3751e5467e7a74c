import { describe, expect, it } from 'vitest';
import { accelerateGo } from '../../../src/performance/engine-failure/accelerate-go.ts';
import type { EngineFailureRun } from '../../../src/performance/engine-failure/engine-failure-run.ts';
import { airDistance } from '../../../src/performance/takeoff/air-distance.ts';
import { balancedFieldLegs } from '../../published/balanced-field.ts';
import { balancedFieldRun, balancedFieldSpeeds, noDelay, withFailure } from '../../support/engine-failure-runs.ts';
import { expectNear } from '../../support/near.ts';
import { plainRun, quadraticThrust } from '../../support/plain-run.ts';

function goOf(run: EngineFailureRun, decisionSpeed: number) {
  const result = accelerateGo(run, decisionSpeed);
  if (result.outcome !== 'reaches-screen') throw new Error(JSON.stringify(result));
  return result;
}

/** 1 kg that gains 4 m/s2 with both engines and 2 with one; it lifts off at 30 m/s. */
const block = withFailure(plainRun({ thrust: quadraticThrust(4), rotationTime: 1 }), {
  timeline: { ...noDelay, recognitionTime: 1 },
});

describe('accelerateGo', () => {
  const [both, , one] = balancedFieldLegs;
  it(`${both?.title}; ${one?.title}`, () => {
    const found = goOf(balancedFieldRun(balancedFieldSpeeds.rotation, 'own'), 70);
    expectNear(found.groundRoll, (both?.expected ?? 0) + (one?.expected ?? 0), 2e-5 * (both?.expected ?? 0));
  });

  it('adds up an even acceleration by hand, rotation on top', () => {
    // V1 20, V_EF 18: 18^2/8 with both, (30^2 - 18^2)/4 with one, 1 s at 30
    const found = goOf(block, 20);
    expectNear(found.failureSpeed, 18, 1e-8);
    expectNear(found.groundRoll, 40.5 + 144 + 30, 1e-7);
    expectNear(found.distance, found.groundRoll + found.airDistance, 1e-9);
  });

  it('flies the path of the all-engines takeoff with the thrust that remains and the added drag', () => {
    const run = { ...block, dragIncrementCoefficient: 0.0001 };
    const alone = airDistance({ ...run.allEngines, thrust: run.remainingThrust, airDragCoefficient: 0.0001 }, 0);
    if (alone.outcome !== 'reaches-screen') throw new Error(alone.outcome);
    const found = goOf(run, 20);
    expectNear(found.airDistance, alone.distance, 1e-9);
    expectNear(found.leastClimbGradient, alone.leastClimbGradient, 1e-12);
  });

  it('cannot continue where the roll stops gaining speed or the path does not climb, and says by how much', () => {
    const dragged = { ...block, dragIncrementCoefficient: 2 * 0.003 };
    // 2 - 0.003 V^2 at 30 m/s
    const roll = accelerateGo(dragged, 20);
    expect(roll).toMatchObject({ outcome: 'single-engine-cannot-continue', because: 'roll' });
    expectNear((roll as { least: number }).least, -0.7 / 9.80665, 1e-9);
    // no more at the lift-off speed itself, where nothing is left to roll
    expect(accelerateGo(dragged, 30)).toEqual(roll);
    const run = { ...block, allEngines: { ...block.allEngines, airDragCoefficient: 2 * 0.003 } };
    const climb = accelerateGo(run, 20);
    expect(climb).toMatchObject({ outcome: 'single-engine-cannot-continue', because: 'climb' });
    expectNear((climb as { least: number }).least, -0.7 / 9.80665, 1e-9);
    const none = { ...block, remainingThrust: quadraticThrust(0) };
    expect(accelerateGo(none, 20)).toMatchObject({ because: 'roll', least: 0 });
  });

  it('climbs at gradients that the all-engines takeoff is not given', () => {
    const run = { ...block, dragIncrementCoefficient: (2 * (2 - 0.008 * 9.80665)) / 900 };
    expectNear(goOf(run, 29.5).leastClimbGradient, 0.008, 1e-9);
  });

  it('names a headwind from the lift-off speed on and thrust that is not known; asks for V1 up to the lift-off speed', () => {
    const windy = { ...block, allEngines: { ...block.allEngines, headwind: 30 } };
    expect(accelerateGo(windy, 30)).toEqual({ outcome: 'ground-speed-not-positive', headwind: 30, speed: 30 });
    const known = { ...block, remainingThrust: { ...block.remainingThrust, domain: [0, 25] as const } };
    expect(accelerateGo(known, 20)).toEqual({ outcome: 'outside-stated-data', airspeed: 30, bound: 25 });
    expect(() => accelerateGo(block, 31)).toThrow(/decisionSpeed/);
  });
});
