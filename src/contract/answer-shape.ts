import { z } from 'zod';
import { outcomes } from '../planning/answer.ts';
import { advisory, air } from './answer-parts.ts';
import { assessment } from './assessment.ts';
import { trajectory, working } from './detail.ts';
import { shortfall } from './shortfall.ts';
import { windComponents } from './wind-components.ts';

/** The blocks with which the answers to a takeoff and to a landing begin, before the speeds. */
export const answerBegin = {
  outcome: z.enum(outcomes).meta({ description: 'The answer, or the name of why there is none.' }),
  advisory,
  air,
  wind: windComponents,
};

/** The blocks between the distances and the basis. */
export const answerEnd = {
  assessment: assessment.exactOptional(),
  shortfall: z.array(shortfall).exactOptional(),
  working: working.exactOptional(),
  trajectory: trajectory.exactOptional(),
};
