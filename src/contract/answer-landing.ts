import { landingDetail } from '../planning/detail/landing-detail.ts';
import { isRefused, type Refused } from '../planning/fault.ts';
import { planLanding } from '../planning/plan-landing.ts';
import { answerHours } from './answer-hours.ts';
import { presentationOf } from './assumed-presentation.ts';
import type { CatalogueLookup } from './catalogue-lookup.ts';
import type { LandingRequest } from './landing-request.ts';
import type { LandingResponse } from './landing-response.ts';
import type { Stamp } from './to-basis.ts';
import { isFaults, toHours } from './to-hours.ts';
import { toLandingQuestion } from './to-landing-question.ts';
import { toLandingResponse } from './to-landing-response.ts';
import { wholeRequest } from './whole-request.ts';

/** A landing from gate to gate: the request as a question, the plan, the answer as a response. */
export function answerLanding(
  request: LandingRequest,
  lookup: CatalogueLookup,
  stamp: Stamp,
): LandingResponse | Refused {
  const question = toLandingQuestion(request, lookup);
  if (isRefused(question)) return question;
  const answer = planLanding(question);
  if (isRefused(answer)) return answer;
  const { detail } = request;
  const whole = detail === undefined ? answer : { ...answer, detail: landingDetail(question, answer, detail) };
  const asked = wholeRequest(request, lookup.aerodromes, 'landing');
  const response = toLandingResponse(whole, asked, question, stamp);
  if (request.hours === undefined) return response;
  const hours = toHours(request.hours, asked.known.weather, asked.runway);
  if (isFaults(hours)) return { refused: hours };
  const answered = answerHours(presentationOf(request), question, hours, (one) => {
    const hourly = planLanding(one);
    return isRefused(hourly) ? hourly : { ...hourly, wholeDistance: hourly.distances?.landingDistance };
  });
  return isRefused(answered) ? answered : { ...response, hours: [...answered] };
}
