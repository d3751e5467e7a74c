import { takeoffDetail } from '../planning/detail/takeoff-detail.ts';
import { isRefused, type Refused } from '../planning/fault.ts';
import { planTakeoff } from '../planning/plan-takeoff.ts';
import type { CatalogueLookup } from './catalogue-lookup.ts';
import type { TakeoffRequest } from './takeoff-request.ts';
import type { TakeoffResponse } from './takeoff-response.ts';
import type { Stamp } from './to-basis.ts';
import { toQuestion } from './to-question.ts';
import { toResponse } from './to-response.ts';
import { wholeRequest } from './whole-request.ts';

/** A takeoff from gate to gate: the request as a question, the plan, the answer as a response. */
export function answerTakeoff(
  request: TakeoffRequest,
  lookup: CatalogueLookup,
  stamp: Stamp,
): TakeoffResponse | Refused {
  const question = toQuestion(request, lookup);
  if (isRefused(question)) return question;
  const answer = planTakeoff(question);
  if (isRefused(answer)) return answer;
  const { detail } = request;
  const whole = detail === undefined ? answer : { ...answer, detail: takeoffDetail(question, answer, detail) };
  return toResponse(whole, wholeRequest(request, lookup.aerodromes, 'takeoff'), question, stamp);
}
