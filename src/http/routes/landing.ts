import type { FastifyInstance } from 'fastify';
import * as z from 'zod';
import { answerLanding } from '../../contract/answer-landing.ts';
import type { CatalogueLookup } from '../../contract/catalogue-lookup.ts';
import { landingRequest } from '../../contract/landing-request.ts';
import { landingResponse } from '../../contract/landing-response.ts';
import { selected } from '../../contract/selection/selected.ts';
import { selectedAnswer } from '../../contract/selection/selected-answer.ts';
import type { Stamp } from '../../contract/to-basis.ts';
import { exampleLanding } from '../document/example-landing.ts';
import { addOperation, type WarmUp } from '../operation.ts';
import { warmUpStates } from '../warm-up-states.ts';

/** The landing; warmed up with each kind of propulsion. */
export function landing(app: FastifyInstance, lookup: CatalogueLookup, stamp: Stamp): WarmUp {
  const { procedure: _, ...plain } = exampleLanding;
  return addOperation(app, {
    url: '/v1/landing',
    operationId: 'landing',
    summary: 'How much runway does this landing need?',
    description:
      'Takes an aeroplane, its mass and configuration, a runway, the weather and a rule set; gives the air, the wind, the speeds, the distances from 50 ft to a stop, the margin against the landing distance available, and the climb after a balked landing. Advisory only.',
    tag: 'questions',
    request: landingRequest,
    response: landingResponse,
    documented: z.union([landingResponse, selectedAnswer]),
    example: exampleLanding,
    warmUp: warmUpStates('landing').map((state) => ({ ...plain, ...state, ruleSet: 'unfactored' })),
    answer: (request) => answerLanding(request, lookup, stamp),
    shown: (answer, { select }) => (select === undefined ? answer : selected(answer, select)),
  });
}
