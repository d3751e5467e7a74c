import type { Assumption } from './answer.ts';
import type { Question } from './question.ts';

/** What the gate filled in, as assumptions; what else it could have been has no figure here. */
export function defaulted({ defaulted, units }: Pick<Question, 'defaulted' | 'units'>): Assumption[] {
  return defaulted.map((at) => ({ at, value: filledIn(at, units), because: 'not given; the default of this version' }));
}

function filledIn(at: string, units: string): string {
  if (at === '/units') return units;
  if (at === '/rounding') return 'safe';
  if (at === '/method') return 'best';
  if (at === '/edges') return 'use';
  if (at === '/procedure/power') return 'full';
  if (at === '/procedure/start') return 'standing';
  if (at === '/procedure/approachSpeedIncrement') return 'none';
  if (at === '/procedure/reverse') return 'not used';
  if (at === '/procedure/antiSkid') return 'operative';
  return at.endsWith('/kind') ? 'one-g' : 'default';
}
