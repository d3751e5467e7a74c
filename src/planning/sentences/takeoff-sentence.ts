import type { Check } from '../answer.ts';
import type { TakeoffContext } from '../cautions/takeoff-context.ts';
import { measureText } from './measure-text.ts';
import { notReachedSentence } from './not-reached-sentence.ts';
import { thinSentence } from './thin-sentence.ts';

/** The answer in one plain sentence or two, made from its numbers, in the asked units. */
export function takeoffSentence(context: TakeoffContext): string {
  const { outcome } = context;
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
      return `Nothing to compare with in full: ${missing(context)}. ${distance(context)}${passing(context)}`;
    case 'roll-longer-than-runway':
      return `The ground roll alone is longer than the run: ${metres(context.stated?.groundRoll ?? 0, 'up')} without factors, ${metres(context.declared.credited.tora ?? 0, 'down')} of TORA available.`;
    case 'rule-set-does-not-apply':
      return `The rules asked for do not apply (${context.ruleSet.title}): ${context.doesNotApply}. ${distance(context)}`.trim();
    case 'no-data-for-this-surface':
      return `No data for this surface (${context.surface}): neither a factor of the rules asked for nor physics speaks of it.`;
    default:
      return notReachedSentence(context.runs, units);
  }
}

/** 'needs 1 255 m of TORA under class B factors, 900 m available: short by 355 m' */
function needs({ governing, question: { units }, ruleSet }: TakeoffContext): string {
  const { required = 0, available = 0, margin = 0 } = governing ?? {};
  const passes = governing?.result === 'passes';
  const spare = passes ? Math.max(0, margin) : margin;
  const difference = measureText(units, 'distance', passes ? spare : -spare, passes ? 'down' : 'up');
  const text = (si: number, direction: 'up' | 'down') => measureText(units, 'distance', si, direction);
  return `needs ${text(required, 'up')} of ${lengthName(governing)} ${ruleSet.phrase}, ${text(available, 'down')} available: ${passes ? 'spare' : 'short by'} ${difference}`;
}

function lengthName(check: Check | undefined): string {
  switch (check?.code) {
    case 'takeoff-distance':
      return 'TODA';
    case 'accelerate-stop':
      return 'ASDA';
    default:
      return 'TORA';
  }
}

function missing({ checks }: TakeoffContext): string {
  const whys = checks.filter(({ result }) => result === 'not-assessed').map(({ why }) => why);
  return whys.length === 0 ? 'no length is declared' : whys.join(', ');
}

function passing({ checks, question: { units } }: TakeoffContext): string {
  const passed = checks.filter(({ result }) => result === 'passes');
  if (passed.length === 0) return '';
  const each = passed.map(
    (check) =>
      `${lengthName(check)} passes with ${measureText(units, 'distance', Math.max(0, check.margin ?? 0), 'down')} spare`,
  );
  return ` ${each.join(', ')}.`;
}

function distance({ stated, question: { units } }: TakeoffContext): string {
  return stated === undefined
    ? ''
    : `The takeoff distance is ${measureText(units, 'distance', stated.takeoffDistance, 'up')} without factors.`;
}
