import type { Assumption } from './answer.ts';
import type { Question } from './question.ts';

/** What the gate filled in, as assumptions; nothing numeric hangs on units and rounding. */
export function defaulted({ defaulted, units }: Pick<Question, 'defaulted' | 'units'>): Assumption[] {
  return defaulted.map((at) => ({ at, value: filledIn(at, units), because: 'not given; the default of this version' }));
}

function filledIn(at: string, units: string): string {
  if (at === '/units') return units;
  if (at === '/rounding') return 'safe';
  return at.endsWith('/kind') ? 'one-g' : 'default';
}
