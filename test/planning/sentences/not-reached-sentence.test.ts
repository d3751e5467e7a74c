import { describe, expect, it } from 'vitest';
import { notReachedSentence } from '../../../src/planning/sentences/not-reached-sentence.ts';
import { shortfalls } from '../../../src/planning/shortfalls.ts';
import type { NotReached } from '../../../src/planning/takeoff-runs.ts';

const said = (stated: NotReached) =>
  notReachedSentence(stated, { stated, credited: undefined, level: undefined, reference: undefined }, 'm-kt-kg');

describe('why there are no distances', () => {
  it('tells where the acceleration is gone, and the least one as met elsewhere', () => {
    expect(
      said({
        outcome: 'never-reaches-lift-off-speed',
        atAirspeed: (30 * 1852) / 3600,
        leastAccelerationRatio: -0.0147,
      }),
    ).toBe(
      'Never reaches the lift-off speed: at 30 kt true airspeed the aeroplane gains no more speed; the least acceleration is -1.47 % of that of gravity.',
    );
  });

  it('names the run that has none: in the wind credited, on a level runway, or where rules start from', () => {
    const none: NotReached = {
      outcome: 'never-reaches-lift-off-speed',
      atAirspeed: 15,
      leastAccelerationRatio: -0.01,
    };
    const [credited, level, reference] = [{ ...none }, { ...none }, { ...none }];
    const runs = { stated: undefined, credited: undefined, level: undefined, reference: undefined };
    const of = (one: NotReached, some: object) => notReachedSentence(one, { ...runs, ...some }, 'm-kt-kg');
    expect(of(credited, { credited })).toMatch(/^Never reaches the lift-off speed in the wind that the rules credit:/);
    expect(of(level, { level, reference })).toMatch(
      /speed on a level runway, since the rules give no credit for a slope/,
    );
    expect(of(reference, { reference })).toMatch(/speed on the paved, dry, level runway that the rules start from:/);
  });

  it('never shows a gradient that misses what is needed as if it reached it', () => {
    const result: NotReached = {
      outcome: 'never-reaches-screen-height',
      groundRoll: 900,
      groundRollTime: 30,
      leastClimbGradient: 0.014999,
      neededClimbGradient: 0.015,
    };
    expect(said(result)).toBe(
      'Never reaches the screen height: the least climb gradient is 1.49 %, and 1.5 % is needed.',
    );
    expect(shortfalls(result, '/aeroplane#/propulsion')[0]).toMatchObject({ given: { direction: 'down' } });
  });
});
