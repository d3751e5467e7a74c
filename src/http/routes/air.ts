import type { FastifyInstance } from 'fastify';
import { airRequest, airResponse } from '../../contract/air.ts';
import { answerAir } from '../../contract/answer-air.ts';
import type { Stamp } from '../../contract/to-basis.ts';
import { addOperation, type WarmUp } from '../operation.ts';

const example = {
  elevation: { value: 5430, unit: 'ft' },
  weather: {
    temperature: { value: 31, unit: 'degC' },
    dewPoint: { value: 8, unit: 'degC' },
    pressure: { qnh: { value: 30.1, unit: 'inHg' } },
  },
};

export function air(app: FastifyInstance, stamp: Stamp): WarmUp {
  return addOperation(app, {
    url: '/v1/air',
    operationId: 'air',
    summary: 'What is the air like?',
    description: 'Pressure, density, pressure altitude and density altitude at an aerodrome.',
    tag: 'questions',
    request: airRequest,
    response: airResponse,
    example,
    warmUp: [example],
    answer: (request) => answerAir(request, stamp),
  });
}
