import { z } from 'zod';
import { aeroplaneUnderstood } from './aeroplane-choice.ts';
import { percent, rateOfClimb, speed, speedSet } from './answer-parts.ts';
import { answerBegin, answerEnd } from './answer-shape.ts';
import { basisOf, landingContribution } from './basis.ts';
import { sensitivitiesOf } from './detail.ts';
import { bandedDistance, distancesShape, method, timesShape } from './distances.ts';
import { hourAnswer } from './hours.ts';
import { landingRequest } from './landing-request.ts';
import { rounding, units } from './question-frame.ts';
import { runway } from './runway.ts';

export const landingQuestion = z
  .strictObject({
    ...landingRequest.shape,
    aeroplane: aeroplaneUnderstood,
    runway,
    units,
    rounding,
  })
  .meta({
    id: 'LandingQuestion',
    description: 'The question as understood, with what was filled in. It can be sent again as it stands.',
  });

const balkedLanding = z
  .discriminatedUnion('outcome', [
    z.strictObject({
      outcome: z.literal('computed'),
      gradient: percent.meta({ description: 'Height over distance in still air; below 0 where the aeroplane sinks.' }),
      rate: rateOfClimb,
      method,
    }),
    z.strictObject({
      outcome: z.literal('outside-stated-data'),
      given: speed.meta({ description: 'True airspeed at which the thrust is asked for.' }),
      bound: speed.meta({ description: 'Where the stated thrust ends.' }),
    }),
  ])
  .meta({
    id: 'BalkedLanding',
    description:
      'The climb after a balked landing, for information: all engines at full power, in the landing configuration, at the landing reference speed, out of ground effect.',
  });

export const landingResponse = z
  .strictObject({
    ...answerBegin,
    speeds: z
      .strictObject({ stall: speedSet, landingReference: speedSet, touchdown: speedSet })
      .meta({ id: 'LandingSpeeds', description: 'Stall speed, then the speeds in the order of time.' }),
    distances: z
      .strictObject({ ...distancesShape, landingDistance: bandedDistance, ...timesShape })
      .meta({ id: 'LandingDistances', description: 'As stated, no factor, from the screen to a stop.' })
      .exactOptional(),
    balkedLanding,
    ...answerEnd,
    hours: z
      .array(hourAnswer)
      .meta({ description: 'The same question for each of the hours asked for.' })
      .exactOptional(),
    sensitivities: sensitivitiesOf('landingDistance', 'LandingSensitivity').exactOptional(),
    basis: basisOf(landingContribution, 'LandingBasis'),
    question: landingQuestion,
  })
  .meta({ id: 'LandingResponse', description: 'The answer to a landing.' });

export type LandingResponse = z.infer<typeof landingResponse>;
export type LandingQuestion = z.infer<typeof landingQuestion>;
