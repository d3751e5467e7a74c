import { takeoffDetail } from '../planning/detail/takeoff-detail.ts';
import { isRefused, type Refused } from '../planning/fault.ts';
import { planTakeoff } from '../planning/plan-takeoff.ts';
import { answerHours } from './answer-hours.ts';
import { presentationOf } from './assumed-presentation.ts';
import type { CatalogueLookup } from './catalogue-lookup.ts';
import type { TakeoffRequest } from './takeoff-request.ts';
import type { TakeoffResponse } from './takeoff-response.ts';
import type { Stamp } from './to-basis.ts';
import { isFaults, toHours } from './to-hours.ts';
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
  const asked = wholeRequest(request, lookup.aerodromes, 'takeoff');
  const response = toResponse(whole, asked, question, stamp);
  if (request.hours === undefined) return response;
  const hours = toHours(request.hours, asked.known.weather, asked.runway);
  if (isFaults(hours)) return { refused: hours };
  const answered = answerHours(presentationOf(request), question, hours, (one) => {
    const hourly = planTakeoff(one);
    return isRefused(hourly) ? hourly : { ...hourly, wholeDistance: hourly.distances?.takeoffDistance };
  });
  return isRefused(answered) ? answered : { ...response, hours: [...answered] };
}
