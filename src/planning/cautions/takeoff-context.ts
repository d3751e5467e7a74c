import type { Question } from '../question.ts';

/** What the cautions of a takeoff may look at. */
export interface TakeoffContext {
  readonly question: Question;
}
