import type { Basis } from './answer.ts';
import type { AnyAssumed } from './assumed.ts';
import type { Band } from './band.ts';
import { conditionCodeAssumed } from './condition-code-assumed.ts';
import type { Conditions } from './conditions.ts';
import { defaulted } from './defaulted.ts';
import type { Found } from './found.ts';
import { groundSlopeAssumed } from './ground-slope.ts';
import { notGiven } from './not-given.ts';
import type { Question } from './question.ts';

/**
 * What an answer rests on.
 *
 * @param assumed - by planning; what the gate filled in and what stands for a profile's slope come behind
 * @param band - of the distances, where there are any
 */
export function answerBasis(
  question: Question,
  phase: 'takeoff' | 'landing',
  { rules, rulesAssumed, condition }: Pick<Conditions, 'rules' | 'rulesAssumed' | 'condition'>,
  { method, other, flightManual }: Pick<Found<unknown>, 'method' | 'other' | 'flightManual'>,
  assumed: readonly AnyAssumed[],
  band: Band | undefined,
): Basis {
  return {
    method,
    other,
    flightManual,
    band: band?.contributions,
    assumed: [
      ...assumed.map(({ assumption }) => assumption),
      ...rulesAssumed,
      ...conditionCodeAssumed(condition, phase),
      ...groundSlopeAssumed(question.runway, phase),
      ...defaulted(question),
    ],
    notGiven: notGiven(question, phase),
    sources: [rules.source, rules.windCredit.source],
  };
}
