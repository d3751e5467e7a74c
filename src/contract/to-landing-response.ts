import type { BalkedLanding, LandingAnswer } from '../planning/answer.ts';
import type { Question } from '../planning/question.ts';
import { asUnderstood } from './as-understood.ts';
import type { LandingContribution } from './basis.ts';
import type { LandingRequest } from './landing-request.ts';
import type { LandingResponse } from './landing-response.ts';
import type { Draft } from './present.ts';
import { defaultRounding } from './question-frame.ts';
import { type Presentation, shownPercent, shownQuantity } from './shown-quantity.ts';
import { toAnswerBegin } from './to-answer-begin.ts';
import { toAssessment } from './to-assessment.ts';
import { toBandedDistance } from './to-banded-distance.ts';
import { type Stamp, toBasis, toContribution } from './to-basis.ts';
import { toSensitivities, toTrajectory, toWorking } from './to-detail.ts';
import { toShortfall } from './to-shortfall.ts';
import { toSpeedSet } from './to-speed-set.ts';
import type { Whole } from './whole-request.ts';

/**
 * The gate out: planning's answer to a landing in the units asked for, rounded the safe way, in the order of the contract.
 *
 * Distances go up, the lower end of a band down, what is available, spare and climbed down, all else to the nearest step.
 *
 * @param request - as read
 * @param question - what the gate in made of it
 */
export function toLandingResponse(
  answer: LandingAnswer,
  request: Whole<LandingRequest>,
  question: Question,
  stamp: Stamp,
): LandingResponse {
  const how = { units: question.units, rounding: request.rounding ?? defaultRounding };
  const response = toAnswerBegin(how, answer) as Draft<LandingResponse>;
  response.speeds = {
    stall: toSpeedSet(how, answer.speeds.stall),
    landingReference: toSpeedSet(how, answer.speeds.landingReference),
    touchdown: toSpeedSet(how, answer.speeds.touchdown),
  };
  if (answer.distances !== undefined) response.distances = toDistances(how, answer.distances);
  response.balkedLanding = toBalkedLanding(how, answer.balkedLanding);
  if (answer.assessment !== undefined) response.assessment = toAssessment(how, answer.assessment);
  if (answer.shortfall !== undefined) response.shortfall = answer.shortfall.map((one) => toShortfall(how, one));
  const { working, trajectory, sensitivities } = answer.detail ?? {};
  if (working !== undefined) response.working = toWorking(how, working);
  if (trajectory !== undefined) response.trajectory = toTrajectory(how, trajectory);
  if (sensitivities !== undefined) response.sensitivities = toSensitivities(how, sensitivities, 'landingDistance');
  response.basis = toBasis(how, answer, question.aeroplaneDigest, stamp, (one) => {
    const band = toContribution(how, one) as Draft<LandingContribution>;
    band.landingDistancePercent = shownPercent(how, one.wholeDistance, 'nearest');
    return band;
  });
  response.question = asUnderstood(request, question);
  return response;
}

function toDistances(how: Presentation, given: NonNullable<LandingAnswer['distances']>) {
  const distances: Draft<NonNullable<LandingResponse['distances']>> = {
    screenHeight: shownQuantity(how, 'altitude', given.screenHeight),
    airDistance: toBandedDistance(how, given.airDistance),
    groundRoll: toBandedDistance(how, given.groundRoll),
    landingDistance: toBandedDistance(how, given.landingDistance),
  };
  const { airTime, groundRollTime } = given;
  if (airTime !== undefined) distances.airTime = shownQuantity(how, 'time', airTime);
  if (groundRollTime !== undefined) distances.groundRollTime = shownQuantity(how, 'time', groundRollTime);
  return distances;
}

function toBalkedLanding(how: Presentation, given: BalkedLanding): LandingResponse['balkedLanding'] {
  return given.outcome === 'computed'
    ? {
        outcome: given.outcome,
        gradient: shownQuantity(how, 'gradient', given.gradient, 'down'),
        rate: shownQuantity(how, 'rateOfClimb', given.rate, 'down'),
        method: given.method,
      }
    : {
        outcome: given.outcome,
        given: shownQuantity(how, 'speed', given.airspeed),
        bound: shownQuantity(how, 'speed', given.bound),
      };
}
