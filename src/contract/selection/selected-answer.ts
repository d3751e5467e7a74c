import { z } from 'zod';
import { outcomes } from '../../planning/answer.ts';
import { advisory } from '../answer-parts.ts';

/** What an answer is when the question selects members of it: for the document, since the whole answer is what is checked. */
export const selectedAnswer = z.looseObject({ outcome: z.enum(outcomes), advisory }).meta({
  id: 'SelectedAnswer',
  description:
    'An answer to a question with select: outcome, advisory, and the members selected, each in its own form.',
});
