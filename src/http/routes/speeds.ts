import type { FastifyInstance } from 'fastify';
import type { AeroplaneLookup } from '../../contract/aeroplane-lookup.ts';
import { answerSpeeds } from '../../contract/answer-speeds.ts';
import { speedsRequest, speedsResponse } from '../../contract/speeds.ts';
import type { Stamp } from '../../contract/to-basis.ts';
import { addOperation, type WarmUp } from '../operation.ts';
import { warmUpStates } from '../warm-up-states.ts';

const example = {
  aeroplane: { id: 'pellibrin-trainer' },
  mass: { value: 720, unit: 'kg' },
  configuration: 'takeoff-12',
  weather: {
    temperature: { value: 24, unit: 'degC' },
    dewPoint: { value: 13, unit: 'degC' },
    pressure: { pressureAltitude: { value: 450, unit: 'ft' } },
  },
  bank: { value: 30, unit: 'deg' },
};

export function speeds(app: FastifyInstance, lookup: AeroplaneLookup, stamp: Stamp): WarmUp {
  return addOperation(app, {
    url: '/v1/speeds',
    operationId: 'speeds',
    summary: 'What are the stall and reference speeds?',
    description: 'Stall speed, level and in a turn, and the speeds of the procedure, each as CAS, EAS and TAS.',
    tag: 'questions',
    request: speedsRequest,
    response: speedsResponse,
    example,
    warmUp: warmUpStates('takeoff').map((state) => ({ ...example, ...state })),
    answer: (request) => answerSpeeds(request, lookup, stamp),
  });
}
