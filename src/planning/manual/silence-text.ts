import type { Question } from '../question.ts';
import { measureText, percentText } from '../sentences/measure-text.ts';
import type { Silence } from './silence.ts';

/** What a silence needs to be told in words. */
export interface SilenceContext {
  readonly question: Pick<Question, 'units' | 'runway'>;
  readonly wind: { readonly headwind: number };
  /** in words: 'short wet grass' */
  readonly surface: string;
}

/** What the flight manual does not speak of, as a list in a sentence: 'a slope of 1.5 % uphill and short wet grass'. */
export function silenceText(silences: readonly Silence[], context: SilenceContext): string {
  const each = silences.map((silence) => textOf(silence, context));
  const last = each.pop() ?? 'nothing';
  return each.length === 0 ? last : `${each.join(', ')} and ${last}`;
}

function textOf(silence: Silence, { question: { units, runway }, wind, surface }: SilenceContext): string {
  switch (silence) {
    case 'wind':
      return `a ${wind.headwind < 0 ? 'tailwind' : 'headwind'} of ${measureText(units, 'speed', Math.abs(wind.headwind))}`;
    case 'slope':
      return `a slope of ${percentText(Math.abs(runway.slope), 2)} ${runway.slope < 0 ? 'downhill' : 'uphill'}`;
    case 'surface':
      return `this surface (${surface})`;
    case 'procedure':
      return 'the procedure asked for';
    case 'changes':
      return 'the changes to the aeroplane';
  }
}
