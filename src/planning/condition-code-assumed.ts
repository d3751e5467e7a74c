import type { Assumption } from './answer.ts';
import type { RunwayCondition } from './runway-condition.ts';

/** What is said of condition codes that differ by thirds where they are not counted third by third. */
export function conditionCodeAssumed(
  { given, codes }: Pick<RunwayCondition, 'given' | 'codes'>,
  phase: 'takeoff' | 'landing',
): readonly Assumption[] {
  if (phase === 'landing' || given === undefined || codes === undefined) return [];
  const [first, ...others] = given;
  if (others.every((code) => code === first)) return [];
  const [touchdown, middle, rollout] = given;
  return [
    {
      at: '/runway/surface/runwayConditionCode',
      value: Math.min(...codes),
      because: `${touchdown}, ${middle} and ${rollout} are given by thirds; in a takeoff the poorest counts throughout, and no code changes what the roll takes`,
      source: 'Judgement',
    },
  ];
}
