import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type SpeedChange, stretchedPath } from '../../src/performance/stretched-path.ts';
import { expectNear } from '../support/near.ts';

/** Constant acceleration [m/s2] from one speed to another, in still air. */
function steady(acceleration: number, from: number, to: number): SpeedChange {
  const distance = (to * to - from * from) / (2 * acceleration);
  const least = Math.sign(to - from) * acceleration;
  const time = (to - from) / acceleration;
  const sum = { distance, time, least, leastAt: Math.min(from, to), most: least, brakeWork: 0 };
  return { reaches: least > 0, sum };
}

describe('stretchedPath', () => {
  const anyPath = fc.record({
    accelerations: fc.array(fc.double({ min: 0.2, max: 4, noNaN: true }), { minLength: 1, maxLength: 5 }),
    length: fc.double({ min: 5, max: 200, noNaN: true }),
    begin: fc.double({ min: 0, max: 600, noNaN: true }),
  });

  it('keeps work and energy, speeding up and slowing down: the sum of a s is the change of V^2/2 [computed]', () => {
    fc.assert(
      fc.property(anyPath, fc.boolean(), ({ accelerations, length, begin }, slowing) => {
        const ends = accelerations.map((_, i) => length * (i + 1));
        const sign = slowing ? -1 : 1;
        const [from, to] = slowing ? [30, 0] : [0, 30];
        const path = stretchedPath(ends, begin, from, to, (i, low, high) =>
          steady(sign * (accelerations[i] as number), low, high),
        );
        expect(path.reaches).toBe(true);
        const stop = begin + path.sum.distance;
        const work = accelerations.reduce((sum, acceleration, i) => {
          const start = i === 0 ? 0 : (ends[i - 1] as number);
          const end = i === accelerations.length - 1 ? Number.POSITIVE_INFINITY : (ends[i] as number);
          return sum + acceleration * Math.max(0, Math.min(end, stop) - Math.max(start, begin));
        }, 0);
        expectNear(work, 450, 1e-4);
      }),
    );
  });

  it('says on which stretch it ends, and at what speed that was entered', () => {
    const slow = (i: number, from: number, to: number) => steady(i === 0 ? -1 : -4, from, to);
    const path = stretchedPath([100, 500], 0, 30, 0, slow);
    expect(path.stretch).toBe(1);
    expectNear(path.entered, Math.sqrt(900 - 200), 1e-6);
    expectNear(path.sum.time, 30 - Math.sqrt(700) + Math.sqrt(700) / 4, 1e-6);
  });

  it('does not reach where a stretch would not let it, whatever lies behind', () => {
    const push = (i: number, from: number, to: number) => steady(i === 1 ? 1 : -2, from, to);
    const path = stretchedPath([100, 200, 900], 0, 30, 0, push);
    expect(path).toMatchObject({ reaches: false, stretch: 1 });
    // and where it is held before it comes there
    expect(stretchedPath([100, 200, 900], 0, 15, 0, push)).toMatchObject({ reaches: true, stretch: 0 });
  });
});
