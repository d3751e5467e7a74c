import { isRefused, type Refused } from '../planning/fault.ts';
import { planLanding } from '../planning/plan-landing.ts';
import type { AeroplaneLookup } from './aeroplane-lookup.ts';
import type { LandingRequest } from './landing-request.ts';
import type { LandingResponse } from './landing-response.ts';
import type { Stamp } from './to-basis.ts';
import { toLandingQuestion } from './to-landing-question.ts';
import { toLandingResponse } from './to-landing-response.ts';

/** A landing from gate to gate: the request as a question, the plan, the answer as a response. */
export function answerLanding(
  request: LandingRequest,
  lookup: AeroplaneLookup,
  stamp: Stamp,
): LandingResponse | Refused {
  const question = toLandingQuestion(request, lookup);
  if (isRefused(question)) return question;
  const answer = planLanding(question);
  return isRefused(answer) ? answer : toLandingResponse(answer, request, question, stamp);
}
