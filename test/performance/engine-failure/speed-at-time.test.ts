import { describe, expect, it } from 'vitest';
import { speedAtTime } from '../../../src/performance/engine-failure/speed-at-time.ts';
import { newPathIntegral } from '../../../src/performance/path-integral.ts';
import { expectNear } from '../../support/near.ts';

/** At 2 m/s2 either way from 20 m/s, and no further than a speed. */
function steady(airspeed: number, end = Number.POSITIVE_INFINITY) {
  const time = Math.abs(airspeed - 20) / 2;
  return { reaches: airspeed <= end, sum: { ...newPathIntegral(), time, distance: (time * (20 + airspeed)) / 2 } };
}

describe('speedAtTime', () => {
  it('finds the speed up and down, and its way', () => {
    const up = speedAtTime(steady, 20, 40, 3);
    expectNear(up.airspeed, 26, 1e-8);
    expectNear(up.change.sum.distance, 69, 1e-7);
    expectNear(speedAtTime(steady, 20, 0, 3).airspeed, 14, 1e-8);
    expect(speedAtTime(steady, 20, 0, 0).airspeed).toBe(20);
  });

  it('ends at the furthest speed where the time is not used up', () => {
    const { airspeed, change } = speedAtTime(steady, 20, 24, 3);
    expect(airspeed).toBe(24);
    expectNear(change.sum.time, 2, 1e-12);
  });

  it('ends at the last speed that the forces allow, on its near side', () => {
    for (const end of [20.3, 23, 25.9]) {
      const { airspeed, change } = speedAtTime((to) => steady(to, end), 20, 40, 3);
      expect(change.reaches).toBe(true);
      expectNear(airspeed, end, 5e-9);
    }
    expect(speedAtTime((to) => steady(to, 20), 20, 40, 3)).toMatchObject({
      airspeed: 20,
      change: { sum: { time: 0 } },
    });
  });

  it('asks for a time', () => {
    expect(() => speedAtTime(steady, 20, 40, -1)).toThrow(/seconds/);
  });
});
