import { z } from 'zod';
import { aeroplaneUnderstood } from './aeroplane-choice.ts';
import { percent, rateOfClimb, speedSet } from './answer-parts.ts';
import { answerBegin, answerEnd } from './answer-shape.ts';
import { basisOf, takeoffContribution } from './basis.ts';
import { sensitivitiesOf } from './detail.ts';
import { bandedDistance, distancesShape, method, timesShape } from './distances.ts';
import { decisionSpeed, engineOut } from './engine-out.ts';
import { hourAnswer } from './hours.ts';
import { obstaclePath } from './obstacle-path.ts';
import { rounding, units } from './question-frame.ts';
import { rejected } from './rejected.ts';
import { runway } from './runway.ts';
import { takeoffRequest } from './takeoff-request.ts';

/** The question as understood: it can be sent again as it stands. */
export const takeoffQuestion = z
  .strictObject({
    ...takeoffRequest.shape,
    aeroplane: aeroplaneUnderstood,
    runway,
    units,
    rounding,
  })
  .meta({
    id: 'TakeoffQuestion',
    description: 'The question as understood, with what was filled in. It can be sent again as it stands.',
  });

export const takeoffResponse = z
  .strictObject({
    ...answerBegin,
    speeds: z
      .strictObject({
        stall: speedSet,
        decision: decisionSpeed.exactOptional(),
        rotation: speedSet,
        liftOff: speedSet,
        screen: speedSet,
      })
      .meta({ id: 'TakeoffSpeeds', description: 'The speeds in the order of time.' }),
    distances: z
      .strictObject({ ...distancesShape, takeoffDistance: bandedDistance, ...timesShape })
      .meta({ id: 'TakeoffDistances', description: 'As stated, no factor, all engines.' })
      .exactOptional(),
    climb: z
      .strictObject({
        gradient: percent.meta({ description: 'Height over distance in still air.' }),
        rate: rateOfClimb,
        method,
      })
      .meta({
        id: 'TakeoffClimb',
        description:
          'All engines, flap and gear as at the screen, at the screen speed, out of ground effect; not a certified gradient.',
      })
      .exactOptional(),
    engineOut: engineOut.exactOptional(),
    obstaclePath: obstaclePath.exactOptional(),
    ...answerEnd,
    rejected: rejected.exactOptional(),
    hours: z
      .array(hourAnswer)
      .meta({ description: 'The same question for each of the hours asked for.' })
      .exactOptional(),
    sensitivities: sensitivitiesOf('takeoffDistance', 'TakeoffSensitivity').exactOptional(),
    basis: basisOf(takeoffContribution, 'Basis'),
    question: takeoffQuestion,
  })
  .meta({ id: 'TakeoffResponse', description: 'The answer to a takeoff.' });

export type TakeoffResponse = z.infer<typeof takeoffResponse>;
export type TakeoffQuestion = z.infer<typeof takeoffQuestion>;
