import type { FastifyInstance } from 'fastify';
import type { AeroplaneLookup } from '../../contract/aeroplane-lookup.ts';
import { airspeedRequest, airspeedResponse } from '../../contract/airspeed.ts';
import { answerAirspeed } from '../../contract/answer-airspeed.ts';
import type { Stamp } from '../../contract/to-basis.ts';
import { addOperation, type WarmUp } from '../operation.ts';

const example = {
  speed: { cas: { value: 104, unit: 'kt' } },
  weather: {
    temperature: { value: 2, unit: 'degC' },
    pressure: { pressureAltitude: { value: 7200, unit: 'ft' } },
  },
};

export function airspeed(app: FastifyInstance, lookup: AeroplaneLookup, stamp: Stamp): WarmUp {
  return addOperation(app, {
    url: '/v1/airspeed',
    operationId: 'airspeed',
    summary: 'What is this airspeed in its other kinds?',
    description: 'One speed given as CAS, EAS, TAS, IAS or Mach number, in all of them, in the air given.',
    tag: 'questions',
    request: airspeedRequest,
    response: airspeedResponse,
    example,
    warmUp: [example],
    answer: (request) => answerAirspeed(request, lookup, stamp),
  });
}
