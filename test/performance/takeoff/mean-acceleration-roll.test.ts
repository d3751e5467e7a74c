import { describe, expect, it } from 'vitest';
import { meanAccelerationRoll } from '../../../src/performance/takeoff/mean-acceleration-roll.ts';
import { takeoffVectors } from '../../published/takeoff-vectors.ts';
import { andersonExample617 } from '../../published/textbook-takeoffs.ts';
import { executiveJet } from '../../support/executive-jet.ts';
import { vectorRun } from '../../support/vector-run.ts';

describe('meanAccelerationRoll', () => {
  const [mean] = andersonExample617;
  it(mean?.title ?? '', () => {
    expect(Math.abs(meanAccelerationRoll(executiveJet) - 1102.7)).toBeLessThan(mean?.tolerance ?? 0);
  });

  it.each(takeoffVectors.map((vector) => [vector.id, vector] as const))(
    '%s: within 2 %% of the roll [computed]',
    (_, vector) => {
      expect(Math.abs(meanAccelerationRoll(vectorRun(vector)) / vector.expected.roll - 1)).toBeLessThan(0.02);
    },
  );

  it('is Infinity where the mean acceleration is not positive', () => {
    expect(meanAccelerationRoll({ ...executiveJet, groundLiftCoefficient: 0, rollingFriction: 0.5 })).toBe(
      Number.POSITIVE_INFINITY,
    );
  });
});
