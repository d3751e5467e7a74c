import { describe, expect, it } from 'vitest';
import { steadyLeg } from '../../src/performance/speed-legs.ts';
import { pointAlong } from '../../src/performance/trajectory.ts';

/** 20 m/s for 3 s, 10 m/s for 2 s, in still air. */
const legs = [steadyLeg(20, 0, 3), steadyLeg(10, 0, 2)];

describe('pointAlong', () => {
  it('counts distance and time from the first leg on', () => {
    expect(pointAlong(legs, 30)).toMatchObject({ distance: 30, time: 1.5, groundSpeed: 20 });
    expect(pointAlong(legs, 75)).toMatchObject({ distance: 75, time: 4.5, groundSpeed: 10 });
  });

  it('gives the end between two legs to the later, and nothing from the end of all on', () => {
    expect(pointAlong(legs, 60)).toMatchObject({ distance: 60, time: 3, groundSpeed: 10 });
    expect(pointAlong(legs, 80)).toBeUndefined();
    expect(pointAlong([], 0)).toBeUndefined();
  });
});
