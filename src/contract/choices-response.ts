import { z } from 'zod';
import { aeroplaneUnderstood } from './aeroplane-choice.ts';
import { advisory, caution, digest, modelVersion, sources } from './answer-parts.ts';
import { answerBegin } from './answer-shape.ts';
import { landingChoicesRequest, takeoffChoicesRequest } from './choices-request.ts';
import { landingResponse } from './landing-response.ts';
import { rounding, units } from './question-frame.ts';
import { takeoffResponse } from './takeoff-response.ts';

const choiceBegin = {
  choice: z.number().meta({ description: 'Place of the choice in the question, from 0.' }),
  name: z.string().exactOptional(),
  designator: z.string().meta({ description: 'The runway end.' }),
  configuration: z.string(),
  outcome: answerBegin.outcome,
  sentence: z.string().meta({ description: 'The answer to this choice in one sentence.' }),
  cautions: z.array(caution),
  wind: answerBegin.wind,
};

const choiceBasis = z
  .strictObject({
    sources,
    modelVersion,
    digests: z.strictObject({ aeroplane: digest, rules: digest }),
  })
  .meta({ id: 'ChoicesBasis', description: 'What the answers rest on; ask a choice alone for its assumptions.' });

const takeoffChoiceAnswer = z
  .strictObject({
    ...choiceBegin,
    distances: takeoffResponse.shape.distances,
    assessment: takeoffResponse.shape.assessment,
    shortfall: takeoffResponse.shape.shortfall,
  })
  .meta({ id: 'TakeoffChoiceAnswer', description: 'The answer to one choice.' });

const landingChoiceAnswer = z
  .strictObject({
    ...choiceBegin,
    distances: landingResponse.shape.distances,
    assessment: landingResponse.shape.assessment,
    shortfall: landingResponse.shape.shortfall,
  })
  .meta({ id: 'LandingChoiceAnswer', description: 'The answer to one choice.' });

const ranked =
  'Best first: enough ones by the largest least margin in per cent, then the others by the least shortfall, last those without distances.';

export const takeoffChoicesResponse = z
  .strictObject({
    outcome: answerBegin.outcome,
    advisory,
    choices: z.array(takeoffChoiceAnswer).meta({ description: ranked }),
    basis: choiceBasis,
    question: z
      .strictObject({ ...takeoffChoicesRequest.shape, aeroplane: aeroplaneUnderstood, units, rounding })
      .meta({ id: 'TakeoffChoicesQuestion', description: 'The question as understood.' }),
  })
  .meta({ id: 'TakeoffChoicesResponse', description: 'The ways to take off, best first.' });

export const landingChoicesResponse = z
  .strictObject({
    outcome: answerBegin.outcome,
    advisory,
    choices: z.array(landingChoiceAnswer).meta({ description: ranked }),
    basis: choiceBasis,
    question: z
      .strictObject({ ...landingChoicesRequest.shape, aeroplane: aeroplaneUnderstood, units, rounding })
      .meta({ id: 'LandingChoicesQuestion', description: 'The question as understood.' }),
  })
  .meta({ id: 'LandingChoicesResponse', description: 'The ways to land, best first.' });

export type TakeoffChoicesResponse = z.infer<typeof takeoffChoicesResponse>;
export type LandingChoicesResponse = z.infer<typeof landingChoicesResponse>;
