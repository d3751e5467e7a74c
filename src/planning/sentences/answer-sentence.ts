import type { Check } from '../answer.ts';
import type { AnswerContext } from '../cautions/answer-context.ts';
import { measureText } from './measure-text.ts';
import { thinSentence } from './thin-sentence.ts';

/**
 * The answer in one plain sentence or two, made from its numbers, in the asked units.
 *
 * @param notReached - why there are no distances, in words
 */
export function answerSentence(context: AnswerContext, notReached: () => string): string {
  const { outcome, phase } = context;
  const { units } = context.question;
  const metres = (si: number, direction: 'up' | 'down') => measureText(units, 'distance', si, direction);
  switch (outcome) {
    case 'enough':
      return `Enough: ${needs(context)}.`;
    case 'enough-but-thin':
      return `Enough but thin: ${needs(context)}. ${thinSentence(context)}`;
    case 'not-enough':
      return `Not enough: ${needs(context)}.`;
    case 'nothing-to-compare':
      return `Nothing to compare with in full: ${missing(context)}. ${distance(context)}${passing(context)}`.trim();
    case 'roll-longer-than-runway':
      return `The ground roll alone is longer than the ${phase === 'takeoff' ? 'run' : 'runway'}: ${metres(context.roll ?? 0, 'up')} without factors, ${metres(context.rollAvailable ?? 0, 'down')} of ${phase === 'takeoff' ? 'TORA' : 'LDA'} available.`;
    case 'rule-set-does-not-apply':
      return `The rules asked for do not apply (${context.ruleSet.title}): ${context.doesNotApply}. ${distance(context)}`.trim();
    case 'no-data-for-this-surface':
      return `No data for this surface (${context.surface}): ${context.noData ?? 'neither a factor of the rules asked for nor physics speaks of it'}.`;
    default:
      return notReached();
  }
}

/** 'needs 1 255 m of TORA under class B factors, 900 m available: short by 355 m' */
function needs({ governing, question: { units }, ruleSet }: AnswerContext): string {
  const { required = 0, available = 0, margin = 0 } = governing ?? {};
  const passes = governing?.result === 'passes';
  const spare = passes ? Math.max(0, margin) : margin;
  const kind = governing?.unit ?? 'distance';
  const difference = measureText(units, kind, passes ? spare : -spare, passes ? 'down' : 'up');
  const text = (si: number, direction: 'up' | 'down') => measureText(units, kind, si, direction);
  return `needs ${text(required, 'up')} of ${comparedName(governing)} ${ruleSet.phrase}, ${text(available, 'down')} available: ${passes ? 'spare' : 'short by'} ${difference}`;
}

/** What a check compares, as a sentence names it. */
function comparedName(check: Check | undefined): string {
  if (check?.of === 'climbGradient') return 'climb gradient';
  return check?.against?.toUpperCase() ?? 'clearance over obstacles';
}

function missing({ checks }: AnswerContext): string {
  const whys = checks.filter(({ result }) => result === 'not-assessed').map(({ why }) => why);
  return whys.length === 0 ? 'no length is declared' : [...new Set(whys)].join(', ');
}

function passing({ checks, question: { units } }: AnswerContext): string {
  const passed = checks.filter(({ result }) => result === 'passes');
  if (passed.length === 0) return '';
  const each = passed.map(
    (check) =>
      `${comparedName(check)} passes with ${measureText(units, check.unit, Math.max(0, check.margin ?? 0), 'down')} spare`,
  );
  return ` ${each.join(', ')}.`;
}

function distance({ phase, wholeDistance, question: { units } }: AnswerContext): string {
  return wholeDistance === undefined
    ? ''
    : `The ${phase} distance is ${measureText(units, 'distance', wholeDistance.value, 'up')} without factors.`;
}
