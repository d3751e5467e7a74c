import type { TakeoffAnswer } from '../planning/answer.ts';
import type { Question } from '../planning/question.ts';
import { asUnderstood } from './as-understood.ts';
import type { TakeoffContribution } from './basis.ts';
import type { Draft } from './present.ts';
import { defaultRounding } from './question-frame.ts';
import { type Presentation, shownPercent, shownQuantity } from './shown-quantity.ts';
import type { TakeoffRequest } from './takeoff-request.ts';
import type { TakeoffResponse } from './takeoff-response.ts';
import { toAnswerBegin } from './to-answer-begin.ts';
import { toAssessment } from './to-assessment.ts';
import { toBandedDistance } from './to-banded-distance.ts';
import { type Stamp, toBasis, toContribution } from './to-basis.ts';
import { toSensitivities, toTrajectory, toWorking } from './to-detail.ts';
import { toDecisionSpeed, toEngineOut } from './to-engine-out.ts';
import { toObstaclePath } from './to-obstacle-path.ts';
import { toRejected } from './to-rejected.ts';
import { toShortfall } from './to-shortfall.ts';
import { toSpeedSet } from './to-speed-set.ts';
import type { Whole } from './whole-request.ts';

/**
 * The gate out: planning's answer to a takeoff in the units asked for, rounded the safe way, in the order of the contract.
 *
 * Distances go up, the lower end of a band down, what is available and spare down, all else to the nearest step.
 *
 * @param request - as read, its runway and its weather whole
 * @param question - what the gate in made of it
 */
export function toResponse(
  answer: TakeoffAnswer,
  request: Whole<TakeoffRequest>,
  question: Question,
  stamp: Stamp,
): TakeoffResponse {
  const how = { units: question.units, rounding: request.rounding ?? defaultRounding };
  const response = toAnswerBegin(how, answer) as Draft<TakeoffResponse>;
  response.speeds = toSpeeds(how, answer.speeds);
  if (answer.distances !== undefined) response.distances = toDistances(how, answer.distances);
  if (answer.climb !== undefined) {
    response.climb = {
      gradient: shownQuantity(how, 'gradient', answer.climb.gradient, 'down'),
      rate: shownQuantity(how, 'rateOfClimb', answer.climb.rate, 'down'),
      method: answer.climb.method,
    };
  }
  if (answer.engineOut !== undefined) response.engineOut = toEngineOut(how, answer.engineOut);
  if (answer.obstaclePath !== undefined) response.obstaclePath = toObstaclePath(how, answer.obstaclePath);
  if (answer.assessment !== undefined) response.assessment = toAssessment(how, answer.assessment);
  if (answer.shortfall !== undefined) response.shortfall = answer.shortfall.map((one) => toShortfall(how, one));
  const { working, trajectory, sensitivities, rejected } = answer.detail ?? {};
  if (working !== undefined) response.working = toWorking(how, working);
  if (trajectory !== undefined) response.trajectory = toTrajectory(how, trajectory);
  if (rejected !== undefined) response.rejected = toRejected(how, rejected);
  if (sensitivities !== undefined) response.sensitivities = toSensitivities(how, sensitivities, 'takeoffDistance');
  response.basis = toBasis(how, answer, question.aeroplaneDigest, stamp, (one) => {
    const band = toContribution(how, one) as Draft<TakeoffContribution>;
    band.takeoffDistancePercent = shownPercent(how, one.wholeDistance, 'nearest');
    return band;
  });
  response.question = asUnderstood(request, question);
  return response;
}

function toSpeeds(how: Presentation, { stall, decision, rotation, liftOff, screen }: TakeoffAnswer['speeds']) {
  return {
    stall: toSpeedSet(how, stall),
    ...(decision === undefined ? {} : { decision: toDecisionSpeed(how, decision) }),
    rotation: toSpeedSet(how, rotation),
    liftOff: toSpeedSet(how, liftOff),
    screen: toSpeedSet(how, screen),
  };
}

function toDistances(how: Presentation, given: NonNullable<TakeoffAnswer['distances']>) {
  const distances: Draft<NonNullable<TakeoffResponse['distances']>> = {
    screenHeight: shownQuantity(how, 'altitude', given.screenHeight),
    groundRoll: toBandedDistance(how, given.groundRoll),
    airDistance: toBandedDistance(how, given.airDistance),
    takeoffDistance: toBandedDistance(how, given.takeoffDistance),
  };
  const { groundRollTime, airTime } = given;
  if (groundRollTime !== undefined) distances.groundRollTime = shownQuantity(how, 'time', groundRollTime);
  if (airTime !== undefined) distances.airTime = shownQuantity(how, 'time', airTime);
  return distances;
}
