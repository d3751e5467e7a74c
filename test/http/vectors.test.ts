import type { FastifyInstance } from 'fastify';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { independentProgram, takeoffVectors } from '../published/takeoff-vectors.ts';
import { post, testHouse } from '../support/house.ts';
import { expectRatio } from '../support/near.ts';
import { vectorQuestion } from '../support/vector-question.ts';

const { source, status, tolerance } = independentProgram;

describe('POST /v1/takeoff', () => {
  let app: FastifyInstance;
  beforeAll(async () => {
    app = await testHouse();
  });
  afterAll(() => app.close());

  it.each(takeoffVectors.map((vector) => [vector.id, vector] as const))(
    `%s over HTTP to ${tolerance} relative [${source}; ${status}]`,
    async (_, vector) => {
      const response = await post(app, '/v1/takeoff', vectorQuestion(vector));
      expect(response.statusCode).toBe(200);
      const { distances, speeds } = response.json();
      const { expected } = vector;
      expectRatio(distances.groundRoll.value, expected.roll, tolerance);
      expectRatio(distances.groundRollTime.value, expected.rollTime, tolerance);
      expectRatio(distances.airDistance.value, expected.air, tolerance);
      expectRatio(distances.airTime.value, expected.airTime, tolerance);
      expectRatio(speeds.stall.tas.value, expected.stallSpeed, tolerance);
      expectRatio(speeds.liftOff.tas.value, expected.liftOffSpeed, tolerance);
      expectRatio(speeds.screen.tas.value, expected.screenSpeed, tolerance);
    },
  );
});
