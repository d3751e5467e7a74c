import type { Asked, PhaseRules, Requirement } from './rule-set.ts';

/** The comparisons that the rules ask for in this case. */
export function requirements({ source, readings }: PhaseRules, asked: Asked): readonly Requirement[] {
  const found = readings.find(({ holds }) => holds(asked));
  if (found === undefined) throw new Error(`readings of ${source} must hold in every case`);
  return found.requirements;
}
