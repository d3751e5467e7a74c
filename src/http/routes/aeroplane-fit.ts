import type { FastifyInstance } from 'fastify';
import type * as z from 'zod';
import type { AeroplaneLookup } from '../../contract/aeroplane-lookup.ts';
import { answerFit } from '../../contract/fit/answer-fit.ts';
import { fitRequest } from '../../contract/fit/fit-request.ts';
import { fitResponse } from '../../contract/fit/fit-response.ts';
import type { Stamp } from '../../contract/to-basis.ts';
import { definitionBody } from '../body-limits.ts';
import { addLongOperation, type WarmUp } from '../operation.ts';

/** An invented table of a two-seat trainer. */
export const exampleFit: z.input<typeof fitRequest> = {
  reference: 'page 5-3',
  aeroplane: { id: 'pellibrin-trainer' },
  for: 'takeoff',
  configuration: 'takeoff-12',
  tables: [
    {
      source: 'invented page 5-3',
      conditions: { surface: { kind: 'paved', state: 'dry' }, mass: { value: 730, unit: 'kg' } },
      columns: [
        { name: 'pressureAltitude', unit: 'ft' },
        { name: 'temperature', unit: 'degC' },
        { name: 'groundRoll', unit: 'm' },
        { name: 'takeoffDistance', unit: 'm' },
      ],
      rows: [
        [0, 0, 230, 470],
        [0, 15, 265, 525],
        [0, 30, 295, 600],
        [2000, 0, 280, 575],
        [2000, 15, 320, 665],
        [2000, 30, 360, 745],
        [4000, 0, 345, 730],
        [4000, 15, 390, 840],
        [4000, 30, 440, 975],
        [6000, 0, 430, 950],
        [6000, 15, 490, 1150],
        [6000, 30, 555, 1425],
      ],
    },
  ],
};

export function aeroplaneFit(app: FastifyInstance, lookup: AeroplaneLookup, stamp: Stamp): WarmUp {
  return addLongOperation(app, {
    url: '/v1/aeroplanes/fit',
    operationId: 'fit',
    summary: 'Which thrust, drag and braking make physics agree with these distances?',
    description:
      "Takes an aeroplane and published tables or measured runs, else the tables of its flight manual; fits the physics of one configuration to them and says how far to trust it: residuals, uncertainty, what speaks against it, and where to measure next. The fit is a member for the aeroplane's definition. Advisory only.",
    tag: 'questions',
    request: fitRequest,
    response: fitResponse,
    example: exampleFit,
    limits: definitionBody,
    warmUp: [],
    work: (request) => answerFit(request, lookup, stamp),
  });
}
