import { percentText } from '../sentences/measure-text.ts';
import type { AnswerContext } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** Change of the distance, as a ratio, above which an assumption is named. */
const matters = 0.01;
/** The change above which it may change the decision; below it is worth knowing. */
const mayDecide = 0.05;

/** Assumed values that move the distance; the largest is named, all are listed under the basis. */
export const assumptionMatters: CautionTest<AnswerContext> = {
  code: 'assumption-matters',
  severity: 'caution',
  meaning: 'A value that was assumed moves the takeoff or landing distance by more than 1 % over its plausible range.',
  threshold: matters,
  source: 'Judgement',
  test: ({ assumed, phase }) => {
    const heavy = assumed.filter(({ assumption }) => size(assumption.effectRatio) > matters);
    const [first, ...rest] = heavy;
    if (first === undefined) return undefined;
    const largest = rest.reduce(
      (most, one) => (size(one.assumption.effectRatio) > size(most.assumption.effectRatio) ? one : most),
      first,
    );
    const effect = largest.assumption.effectRatio ?? 0;
    const many =
      heavy.length === 1
        ? `One assumed value moves the ${phase} distance by more than 1 %`
        : `${heavy.length} assumed values each move the ${phase} distance by more than 1 %; the most`;
    return {
      message: `${many}: ${largest.name}, ${taken(largest.assumption.value)}. At ${largest.otherEnd?.text} the distance is ${percentText(size(effect))} ${effect > 0 ? 'longer' : 'shorter'}.`,
      at: largest.assumption.at,
      value: effect,
      severity: size(effect) > mayDecide ? 'caution' : 'note',
    };
  },
};

function size(ratio: number | undefined): number {
  return Math.abs(ratio ?? 0);
}

function taken(value: unknown): string {
  if (typeof value === 'number') return `taken as ${Math.round(value * 1000) / 1000}`;
  if (typeof value === 'string') return `taken as ${value}`;
  return 'taken as listed';
}
