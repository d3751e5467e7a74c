import type { ThinMargin } from './rule-set.ts';

/** The margin below which an answer is thin, where a set of rules has no figure of its own. @see references.Judgement */
export const thinMargin: ThinMargin = {
  ratio: 0.1,
  because: 'a margin under 10 % of what is required is thin: a choice of this service',
  source: 'Judgement',
};
