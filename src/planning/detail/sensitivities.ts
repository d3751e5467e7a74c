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

/**
 * What each distance changes by with one input, by central differences.
 *
 * Where the distances end on one side, as at the last climb gradient that still counts, the other side alone is taken.
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
  const more = beside(step);
  const less = beside(-step);
  if (more === undefined && less === undefined) return named;
  const between = more !== undefined && less !== undefined ? 2 * step : step;
  const scale = (typeof per === 'number' ? per : per.value) / between;
  const [high, low] = [more ?? base, less ?? base];
  return {
    ...named,
    change: {
      groundRoll: (high.groundRoll - low.groundRoll) * scale,
      airDistance: (high.airDistance - low.airDistance) * scale,
      wholeDistance: (high.wholeDistance - low.wholeDistance) * scale,
    },
  };
}
