import type { Question } from '../question.ts';
import type { Changes, Sensitivity } from './detail.ts';
import type { Amount, MainInput } from './main-inputs.ts';

/** The distances with so much more of an input; undefined where there are none. */
export type Beside = (by: number) => Changes | undefined;

/**
 * What each distance changes by when one input of the question is so much more, the whole evaluation done again.
 *
 * @param distancesOf - of a question beside the one asked; undefined where it has none
 */
export function sensitivities<Q extends Question>(
  question: Q,
  inputs: readonly MainInput<Q>[],
  base: Changes,
  distancesOf: (question: Q) => Changes | undefined,
): readonly Sensitivity[] {
  return inputs.map((input) =>
    sensitivity(question, input, base, (by) => {
      const other = input.moved(question, by);
      return other && distancesOf(other);
    }),
  );
}

/** Slopes on the two sides of the question that differ by more than this share are those of a kink. */
const kink = 0.01;

/**
 * What each distance changes by with one input, by central differences.
 *
 * Where a kink lies between the sides, as on a level runway, from which a climb counts and a fall does not, it is the change with
 * more of the input. Where the distances end on one side, as at the last climb gradient that still counts, the other side alone is
 * taken.
 *
 * @param base - the distances of the question itself [m]
 */
export function sensitivity<Q extends Question>(
  question: Q,
  { of, at, per: perOf, step }: Amount<Q>,
  base: Changes,
  beside: Beside,
): Sensitivity {
  const per = perOf(question.units);
  const named = { of, at: at(question), per };
  const above = beside(step);
  const below = beside(-step);
  const more = above && between(base, above);
  const less = below && between(below, base);
  const slope = more === undefined || less === undefined || isKinked(more, less) ? (more ?? less) : mean(more, less);
  if (slope === undefined) return named;
  const scale = (typeof per === 'number' ? per : per.value) / step;
  return {
    ...named,
    change: {
      groundRoll: slope.groundRoll * scale,
      airDistance: slope.airDistance * scale,
      wholeDistance: slope.wholeDistance * scale,
    },
  };
}

function between(low: Changes, high: Changes): Changes {
  return {
    groundRoll: high.groundRoll - low.groundRoll,
    airDistance: high.airDistance - low.airDistance,
    wholeDistance: high.wholeDistance - low.wholeDistance,
  };
}

function mean(one: Changes, other: Changes): Changes {
  return {
    groundRoll: (one.groundRoll + other.groundRoll) / 2,
    airDistance: (one.airDistance + other.airDistance) / 2,
    wholeDistance: (one.wholeDistance + other.wholeDistance) / 2,
  };
}

function isKinked({ wholeDistance: one }: Changes, { wholeDistance: other }: Changes): boolean {
  return Math.abs(one - other) > kink * Math.max(Math.abs(one), Math.abs(other));
}
