import type { Question } from '../question.ts';
import type { Changes, Sensitivity } from './detail.ts';
import type { MainInput } from './main-inputs.ts';

/**
 * What each distance changes by when one input is so much more: central differences of the whole evaluation.
 *
 * Where the distances end on one side, as at the last climb gradient that still counts, the other side alone is taken.
 *
 * @param base - the distances of the question itself [m]
 * @param distancesOf - those of a question beside it; undefined where it has none
 */
export function sensitivities<Q extends Question>(
  question: Q,
  inputs: readonly MainInput<Q>[],
  base: Changes,
  distancesOf: (question: Q) => Changes | undefined,
): readonly Sensitivity[] {
  return inputs.map(({ of, at, per: perOf, step, moved }) => {
    const per = perOf(question.units);
    const beside = (by: number): Changes | undefined => {
      const other = moved(question, by);
      return other && distancesOf(other);
    };
    const more = beside(step);
    const less = beside(-step);
    const named = { of, at: at(question), per };
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
  });
}
