import type { Work } from '../../numerics/work.ts';
import { isRefused, type Refused } from '../../planning/fault.ts';
import { planFit } from '../../planning/fit/plan-fit.ts';
import type { AeroplaneLookup } from '../aeroplane-lookup.ts';
import type { Stamp } from '../to-basis.ts';
import type { FitRequest } from './fit-request.ts';
import type { FitResponse } from './fit-response.ts';
import { toFitQuestion } from './to-fit-question.ts';
import { toFitResponse } from './to-fit-response.ts';

/** A fit, from gate to gate: work that yields between its parts. */
export function* answerFit(request: FitRequest, lookup: AeroplaneLookup, stamp: Stamp): Work<FitResponse | Refused> {
  const asked = toFitQuestion(request, lookup);
  if (isRefused(asked)) return asked;
  const answer = yield* planFit(asked.question);
  return isRefused(answer) ? answer : toFitResponse(request, asked, answer, stamp);
}
