import type { UnitFamily } from '../../units/presentation.ts';
import type { Check, Outcome } from '../answer.ts';
import type { ThinBecause } from '../outcome.ts';
import type { RuleSet } from '../rules/rule-set.ts';
import type { Reached, TakeoffRuns } from '../takeoff-runs.ts';
import { measureText } from './measure-text.ts';
import { notReachedSentence } from './not-reached-sentence.ts';
import { thinSentence } from './thin-sentence.ts';

/** What the sentence over a takeoff answer is made from. */
export interface SentenceGround {
  readonly outcome: Outcome;
  readonly units: UnitFamily;
  readonly ruleSet: RuleSet;
  readonly runs: TakeoffRuns;
  readonly stated: Reached | undefined;
  readonly checks: readonly Check[];
  readonly governing: Check | undefined;
  readonly rollAvailable: number | undefined;
  readonly doesNotApply: string | undefined;
  /** the surface in words */
  readonly surface: string;
  readonly thin: ThinBecause | undefined;
}

/** The answer in one plain sentence or two, made from its numbers, in the asked units. */
export function takeoffSentence(ground: SentenceGround): string {
  const { outcome, units } = ground;
  const metres = (si: number, direction: 'up' | 'down') => measureText(units, 'distance', si, direction);
  switch (outcome) {
    case 'enough':
      return `Enough: ${needs(ground)}.`;
    case 'enough-but-thin':
      return `Enough but thin: ${needs(ground)}. ${thinSentence(ground)}`;
    case 'not-enough':
      return `Not enough: ${needs(ground)}.`;
    case 'nothing-to-compare':
      return `Nothing to compare with in full: ${missing(ground)}. ${distance(ground)}${passing(ground)}`;
    case 'roll-longer-than-runway':
      return `The ground roll alone is longer than the run: ${metres(ground.stated?.groundRoll ?? 0, 'up')} without factors, ${metres(ground.rollAvailable ?? 0, 'down')} of TORA available.`;
    case 'rule-set-does-not-apply':
      return `The rules asked for do not apply (${ground.ruleSet.title}): ${ground.doesNotApply}. ${distance(ground)}`.trim();
    case 'no-data-for-this-surface':
      return `No data for this surface (${ground.surface}): neither a factor of the rules asked for nor physics speaks of it.`;
    default:
      return notReachedSentence(ground.runs, units);
  }
}

/** 'needs 1 255 m of TORA under class B factors, 900 m available: short by 355 m' */
function needs({ governing, units, ruleSet }: SentenceGround): string {
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

function missing({ checks }: SentenceGround): string {
  const whys = checks.filter(({ result }) => result === 'not-assessed').map(({ why }) => why);
  return whys.length === 0 ? 'no length is declared' : whys.join(', ');
}

function passing({ checks, units }: SentenceGround): string {
  const passed = checks.filter(({ result }) => result === 'passes');
  if (passed.length === 0) return '';
  const each = passed.map(
    (check) =>
      `${lengthName(check)} passes with ${measureText(units, 'distance', Math.max(0, check.margin ?? 0), 'down')} spare`,
  );
  return ` ${each.join(', ')}.`;
}

function distance({ stated, units }: SentenceGround): string {
  return stated === undefined
    ? ''
    : `The takeoff distance is ${measureText(units, 'distance', stated.takeoffDistance, 'up')} without factors.`;
}
