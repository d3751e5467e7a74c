import type { FastifyInstance } from 'fastify';
import { answerLandingChoices, answerTakeoffChoices } from '../../contract/answer-choices.ts';
import type { CatalogueLookup } from '../../contract/catalogue-lookup.ts';
import { landingChoicesRequest, takeoffChoicesRequest } from '../../contract/choices-request.ts';
import { landingChoicesResponse, takeoffChoicesResponse } from '../../contract/choices-response.ts';
import type { Stamp } from '../../contract/to-basis.ts';
import { exampleLanding } from '../document/example-landing.ts';
import { exampleTakeoff } from '../document/example-takeoff.ts';
import { addOperation, type WarmUp } from '../operation.ts';

/** The ways to take off: runway ends, starts and configurations under one weather and mass. */
export function takeoffChoices(app: FastifyInstance, lookup: CatalogueLookup, stamp: Stamp): WarmUp {
  const { runway, configuration, ...common } = exampleTakeoff;
  const example = { ...common, choices: [{ name: 'as filed', configuration, runway }] };
  return addOperation(app, {
    url: '/v1/takeoff/choices',
    operationId: 'takeoffChoices',
    summary: 'Which runway end, start and flap leave the largest margin for this takeoff?',
    description:
      'Takes one aeroplane, mass, weather and rule set, and 1 to 24 choices of runway and configuration; answers each as a takeoff and ranks them. Advisory only.',
    tag: 'questions',
    request: takeoffChoicesRequest,
    response: takeoffChoicesResponse,
    example,
    warmUp: [],
    answer: (request) => answerTakeoffChoices(request, lookup, stamp),
  });
}

/** The ways to land: runway ends, thresholds and configurations under one weather and mass. */
export function landingChoices(app: FastifyInstance, lookup: CatalogueLookup, stamp: Stamp): WarmUp {
  const { runway, configuration, ...common } = exampleLanding;
  const example = { ...common, choices: [{ name: 'as filed', configuration, runway }] };
  return addOperation(app, {
    url: '/v1/landing/choices',
    operationId: 'landingChoices',
    summary: 'Which runway end, threshold and flap leave the largest margin for this landing?',
    description:
      'Takes one aeroplane, mass, weather and rule set, and 1 to 24 choices of runway and configuration; answers each as a landing and ranks them. Advisory only.',
    tag: 'questions',
    request: landingChoicesRequest,
    response: landingChoicesResponse,
    example,
    warmUp: [],
    answer: (request) => answerLandingChoices(request, lookup, stamp),
  });
}
