import { describe, expect, it } from 'vitest';
import type { Assumption } from '../../src/planning/answer.ts';
import { answered, type Changes, changed, plainQuestion } from '../support/takeoff-question.ts';

const {
  speeds: _,
  rotationTime: __,
  pullUpLoadFactor: ___,
  ...bare
} = plainQuestion.aeroplane.configurations['takeoff'] as NonNullable<
  (typeof plainQuestion.aeroplane.configurations)['takeoff']
>;
const unsaid: Changes = { aeroplane: { configurations: { takeoff: bare } } };
const worth = (changes: Changes): Record<string, Assumption['effectRatio']> =>
  Object.fromEntries(
    answered(changed(plainQuestion, changes)).basis.assumed.map(({ at, effectRatio }) => [
      at.split('/').at(-1) ?? '',
      effectRatio,
    ]),
  );
const distance = (changes: Changes) =>
  answered(changed(plainQuestion, changes)).distances?.takeoffDistance.value ?? Number.NaN;

describe('what an assumption is worth', () => {
  it.each([
    ['rotationTime', { rotationTime: 1 }],
    ['pullUpLoadFactor', { pullUpLoadFactor: 1.05 }],
    ['liftOff', { speeds: { liftOff: { kind: 'stall-ratio', ratio: 1.2 } } }],
    ['screen', { speeds: { screen: { kind: 'stall-ratio', ratio: 1.3 } } }],
  ] as const)(
    '%s: the estimate agrees with the whole computation at the other end within 2 %% of the distance',
    (name, other) => {
      const changes = { aeroplane: { configurations: { takeoff: { ...bare, ...other } } } };
      const computed = distance(changes) / distance(unsaid) - 1;
      expect(worth(unsaid)[name]).toBeDefined();
      expect(Math.abs((worth(unsaid)[name] ?? 0) - computed)).toBeLessThan(0.02);
      expect(computed).toBeGreaterThan(0);
    },
  );
  it('is there at the end of measured thrust too, which is held for it', () => {
    const { screen } = answered(plainQuestion).speeds;
    const propulsion = {
      kind: 'measured',
      airspeeds: [0, screen.tas * (1 + 1e-9)],
      thrusts: [2300, 2100],
      density: 1.225,
      densityExponent: 1,
    } as const;
    expect(worth({ aeroplane: { ...unsaid.aeroplane, propulsion } })['screen']).toBeDefined();
  });
  it('is not said where there is no distance', () => {
    const flooded = { ...unsaid, runway: { surface: { kind: 'paved', state: 'flooded' } as const } };
    expect(worth(flooded)['rotationTime']).toBeUndefined();
  });
});
