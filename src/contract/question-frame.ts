import { z } from 'zod';
import { methodsAsked } from '../planning/question.ts';
import { unitFamilies } from '../units/presentation.ts';
import { shortText } from './text.ts';

/** Members that every question may have: what is echoed, and how the answer is written. */
export const reference = shortText.meta({ description: "The caller's own reference, echoed and not used." });
export const asOf = z.iso
  .datetime({ offset: true })
  .max(40)
  .meta({ description: 'The time the question is asked for, RFC 3339; echoed.' });
export const units = z.enum(unitFamilies).meta({
  description: 'Units of the answer: metres, knots, kilograms (altitudes in feet); feet, knots, pounds; or SI.',
});
export const method = z.enum(methodsAsked).meta({
  description:
    'Where the distances come from. best: the flight manual where it has a table for the configuration, else physics. A method by name is that one or a refusal; physics asked for by name is computed outside the tables too, and says so.',
});
export const edges = z.enum(['use', 'refuse']).meta({
  description:
    'Whether the edge of a table of the flight manual stands for what lies beyond it where the table shows its edge to be the longer distance (lighter, colder, lower, more headwind); refuse ends there.',
});
export const rounding = z
  .enum(['safe', 'none'])
  .meta({ description: 'safe rounds what is required up and what is available down; none shows numbers unrounded.' });

export const select = z.array(z.string().max(256)).max(64).meta({
  description:
    'JSON pointers (RFC 6901) into the answer: it then holds those members only, and outcome and advisory always. A pointer may name a member that this answer lacks; one that no answer to the question could have is refused. Lists, and numbers with their unit, are selected whole.',
});

/** What an answer is written in when the question does not say; frozen in v1. */
export const defaultUnits = 'm-kt-kg';
export const defaultRounding = 'safe';
