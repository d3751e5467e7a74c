import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  type LastPoint,
  lastPointToStop,
  type RejectedTakeoff,
} from '../../../src/performance/engine-failure/last-point-to-stop.ts';
import { constantBraking } from '../../../src/physics/braking-friction.ts';
import { block, inWind } from '../../support/engine-failure-block.ts';
import { anyFailure } from '../../support/engine-failure-runs.ts';
import { expectNear, expectRatio } from '../../support/near.ts';

const g = 9.80665;
const { allEngines, stop } = block(5);
/** Gains 4 m/s2, rolls freely, brakes at 5 m/s2; 2 s until the pilot acts, 1 s until the brakes do. */
const rejected: RejectedTakeoff = { allEngines, stop, reactionTime: 2, transitionTime: 1 };

function pointOf(found: LastPoint) {
  if (found.outcome !== 'last-point' && found.outcome !== 'rotation-speed') throw new Error(found.outcome);
  return found;
}

describe('lastPointToStop', () => {
  it('is the root of the way by hand, with power lost and with power that holds', () => {
    // lost: V^2/8 + 2 V + V + V^2/10 = 150 at 20 m/s; held: V^2/8 + (2 V + 8) + (V + 8) + (V + 8)^2/10 = 204.4
    const lost = pointOf(lastPointToStop(rejected, 150).lossOfPower);
    expectNear(lost.airspeed, 20, 1e-5);
    expectNear(lost.distance, 50, 1e-4);
    expectNear(lost.stopDistance, 150, 1e-3);
    const holds = pointOf(lastPointToStop(rejected, 204.4).powerHolds);
    expectNear(holds.airspeed, 20, 1e-5);
    expectNear(holds.distance, 50, 1e-4);
    expect([lost.outcome, holds.outcome]).toEqual(['last-point', 'last-point']);
  });

  it('slows down on free wheels until the pilot acts where the power is lost', () => {
    const rolling = { ...rejected, allEngines: { ...allEngines, rollingFriction: 1 / g } };
    // 20^2/6 at 3 m/s2, 20 to 18 over 38, 18, 18^2/10
    const length = 400 / 6 + 38 + 18 + 32.4;
    expectNear(pointOf(lastPointToStop(rolling, length).lossOfPower).airspeed, 20, 1e-5);
  });

  it('counts the wind as every roll does', () => {
    const run = inWind(block(5), -6);
    const windy = { ...rejected, allEngines: run.allEngines, stop: run.stop };
    const lost = pointOf(lastPointToStop(windy, 150).lossOfPower);
    expectNear(lost.airspeed, 14, 1e-5);
    expectNear(lost.groundSpeed, 20, 1e-5);
  });

  it('is the rotation speed where it stops from there with length to spare', () => {
    const found = lastPointToStop(rejected, 400);
    expect(pointOf(found.lossOfPower)).toMatchObject({ outcome: 'rotation-speed', airspeed: 30 });
    // 900/8 + 90 + 90
    expectNear(pointOf(found.lossOfPower).stopDistance, 292.5, 1e-7);
    expectNear(pointOf(found.powerHolds).stopDistance, 900 / 8 + 68 + 38 + 38 ** 2 / 10, 1e-6);
  });

  it('is the speed below which the brakes hold, where they hold at no greater one and the length does not matter', () => {
    // 5 m/s2 up to a speed over the ground and nothing above: idle for 3 s at the cue's speed, that speed is the last
    for (const fades of [7.7, 11.3, 13.1, 17.9, 20, 23.3, 26.6, 28.9]) {
      const braking = { at: (speed: number) => (speed <= fades ? 5 / g : 0), kinks: [fades] };
      const fading = { ...rejected, stop: { ...stop, braking } };
      const lost = pointOf(lastPointToStop(fading, 50_000).lossOfPower);
      expect(lost.outcome).toBe('last-point');
      expectNear(lost.airspeed, fades, 1e-4);
      expectNear(lost.stopDistance, fades ** 2 / 8 + 3 * fades + fades ** 2 / 10, 1e-2);
    }
  });

  it('names a length that nothing fits, brakes that do not hold, wind, and thrust that is not known', () => {
    // at once at standstill: 2 s at 4 m/s2 to 8 m/s over 8 m, 8 m, 6.4 m
    const found = lastPointToStop(rejected, 20);
    expect(found.powerHolds.outcome).toBe('does-not-stop-within');
    expectNear((found.powerHolds as { shortest: number }).shortest, 22.4, 1e-6);
    expect(found.lossOfPower.outcome).toBe('last-point');
    const loose = { ...rejected, stop: { ...stop, braking: constantBraking(0) } };
    expect(lastPointToStop(loose, 500).powerHolds.outcome).toBe('never-stops');
    expect(lastPointToStop({ ...rejected, allEngines: inWind(block(5), 31).allEngines }, 500).powerHolds).toEqual({
      outcome: 'ground-speed-not-positive',
      headwind: 31,
      speed: 30,
    });
    const upTo = (highest: number) => ({ ...allEngines.thrust, domain: [0, highest] as const });
    const known = { ...rejected, allEngines: { ...allEngines, thrust: upTo(25) } };
    expect(lastPointToStop(known, 500).lossOfPower).toEqual({
      outcome: 'outside-stated-data',
      airspeed: 30,
      bound: 25,
    });
    // the thrust is known to the rotation speed but not 2 s later: only a length that asks for that is not answered
    const edge = { ...rejected, allEngines: { ...allEngines, thrust: upTo(31) } };
    expectNear(pointOf(lastPointToStop(edge, 204.4).powerHolds).airspeed, 20, 1e-5);
    expect(lastPointToStop(edge, 330).powerHolds.outcome).toBe('outside-stated-data');
    expect(lastPointToStop(edge, 330).lossOfPower.outcome).toBe('rotation-speed');
  });

  it('is below a speed from which the brakes would not hold', () => {
    const braking = { at: (speed: number) => (speed < 25 ? 5 / g : 0), kinks: [25] };
    const found = lastPointToStop({ ...rejected, stop: { ...stop, braking } }, 1000);
    expectNear(pointOf(found.lossOfPower).airspeed, 25, 1e-5);
    expectNear(pointOf(found.powerHolds).airspeed, 17, 1e-5);
    const endless = lastPointToStop({ ...rejected, stop: { ...stop, braking } }, Number.POSITIVE_INFINITY);
    expectNear(pointOf(endless.lossOfPower).airspeed, 25, 1e-5);
  });

  it('stops within the length from it and not from more; more length, more speed; power that holds asks for the lower speed', () => {
    let compared = 0;
    fc.assert(
      fc.property(anyFailure, fc.double({ min: 0.5, max: 0.8, noNaN: true }), ({ run }, share) => {
        const asked: RejectedTakeoff = {
          allEngines: { ...run.allEngines, profile: undefined },
          stop: { ...run.stop, profile: undefined },
          reactionTime: run.timeline.recognitionTime,
          transitionTime: run.timeline.transitionTime,
        };
        const whole = lastPointToStop(asked, Number.POSITIVE_INFINITY).lossOfPower;
        if (whole.outcome !== 'rotation-speed') return;
        const length = share * whole.stopDistance;
        const less = lastPointToStop(asked, length);
        const more = lastPointToStop(asked, 1.2 * length);
        for (const cue of ['lossOfPower', 'powerHolds'] as const) {
          if (less[cue].outcome !== 'last-point' || more[cue].outcome !== 'last-point') return;
          expect(pointOf(more[cue]).airspeed).toBeGreaterThan(pointOf(less[cue]).airspeed);
          expectRatio(pointOf(less[cue]).stopDistance, length, 1e-5);
        }
        compared++;
        expect(pointOf(less.powerHolds).airspeed).toBeLessThanOrEqual(pointOf(less.lossOfPower).airspeed + 1e-6);
      }),
      { numRuns: 500, seed: 64 },
    );
    expect(compared).toBeGreaterThan(40);
  });
});
