import type { FastifyInstance } from 'fastify';
import * as z from 'zod';
import { answerTakeoff } from '../../contract/answer-takeoff.ts';
import type { CatalogueLookup } from '../../contract/catalogue-lookup.ts';
import { selected } from '../../contract/selection/selected.ts';
import { selectedAnswer } from '../../contract/selection/selected-answer.ts';
import { takeoffRequest } from '../../contract/takeoff-request.ts';
import { takeoffResponse } from '../../contract/takeoff-response.ts';
import type { Stamp } from '../../contract/to-basis.ts';
import { exampleTakeoff } from '../document/example-takeoff.ts';
import { addOperation, type WarmUp } from '../operation.ts';
import { warmUpStates } from '../warm-up-states.ts';

/** The takeoff; warmed up with each kind of propulsion. */
export function takeoff(app: FastifyInstance, lookup: CatalogueLookup, stamp: Stamp): WarmUp {
  return addOperation(app, {
    url: '/v1/takeoff',
    operationId: 'takeoff',
    summary: 'How much runway does this takeoff need?',
    description:
      'Takes an aeroplane, its mass and configuration, a runway, the weather and a rule set; gives the air, the wind, the speeds, the distances and the margins against the declared distances. Advisory only.',
    tag: 'questions',
    request: takeoffRequest,
    response: takeoffResponse,
    documented: z.union([takeoffResponse, selectedAnswer]),
    example: exampleTakeoff,
    warmUp: warmUpStates('takeoff').map((state) => ({ ...exampleTakeoff, ...state, ruleSet: 'unfactored' })),
    answer: (request) => answerTakeoff(request, lookup, stamp),
    shown: (answer, { select }) => (select === undefined ? answer : selected(answer, select)),
  });
}
