import { landingDetail } from '../planning/detail/landing-detail.ts';
import { isRefused, type Refused } from '../planning/fault.ts';
import { planLanding } from '../planning/plan-landing.ts';
import type { CatalogueLookup } from './catalogue-lookup.ts';
import type { LandingRequest } from './landing-request.ts';
import type { LandingResponse } from './landing-response.ts';
import type { Stamp } from './to-basis.ts';
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
  return toLandingResponse(whole, wholeRequest(request, lookup.aerodromes, 'landing'), question, stamp);
}
