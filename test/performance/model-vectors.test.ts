import { describe, expect, it } from 'vitest';
import { takeoff } from '../../src/performance/takeoff/takeoff.ts';
import { independentProgram, takeoffVectors } from '../published/takeoff-vectors.ts';
import { vectorRun } from '../support/vector-run.ts';

const { source, status, tolerance } = independentProgram;

describe('takeoff', () => {
  it.each(takeoffVectors.map((vector) => [vector.id, vector] as const))(
    `%s: roll, air path, times and speeds to ${tolerance} relative [${source}; ${status}]`,
    (_, vector) => {
      const run = vectorRun(vector);
      const result = takeoff(run);
      if (result.outcome !== 'reaches-screen') throw new Error(result.outcome);
      const { expected } = vector;
      const pairs = {
        roll: [result.groundRoll, expected.roll],
        rollTime: [result.groundRollTime, expected.rollTime],
        air: [result.airDistance, expected.air],
        airTime: [result.airTime, expected.airTime],
        stallSpeed: [run.stallSpeed, expected.stallSpeed],
        liftOffSpeed: [run.liftOffSpeed, expected.liftOffSpeed],
        screenSpeed: [run.screenSpeed, expected.screenSpeed],
      } as const;
      for (const [name, [found, wanted]] of Object.entries(pairs)) {
        expect(Math.abs(found / wanted - 1), name).toBeLessThan(tolerance);
      }
      expect(result.takeoffDistance).toBe(result.groundRoll + result.airDistance);
    },
  );
});
