import type { TakeoffAnswer } from './answer.ts';
import type { Refused } from './fault.ts';
import type { Question } from './question.ts';

/**
 * The takeoff, from a question in SI to an answer in SI: air, wind, speeds, distances, what the rules require, what is
 * declared, the outcome, the band and what should be said of it.
 */
export function planTakeoff(question: Question): TakeoffAnswer | Refused {
  return {
    refused: [{ pointer: '', code: 'implausible', message: `Nothing is planned yet for ${question.ruleSet}.` }],
  };
}
