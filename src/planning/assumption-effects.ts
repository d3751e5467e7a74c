import type { Assumed, NumberOtherEnd } from './assumed.ts';

/**
 * What each assumption is worth: the change of the whole distance when the other end of its plausible range is taken.
 *
 * @param assumed - in the order in which they were made
 * @param wholeWith - a cheap estimate of the distance [m] as stated, or with an other end in its place
 * @returns the same assumptions, with effectRatio where the estimate exists on both sides
 */
export function assumptionEffects<Other extends { readonly text: string }>(
  assumed: readonly Assumed<Other>[],
  wholeWith: (other?: Other) => number,
): readonly Assumed<Other>[] {
  const base = wholeWith();
  return assumed.map((one) => {
    if (one.otherEnd === undefined) return one;
    const effectRatio = wholeWith(one.otherEnd) / base - 1;
    return Number.isFinite(effectRatio) ? { ...one, assumption: { ...one.assumption, effectRatio } } : one;
  });
}

/** A run with the other end of a bare number in its place. */
export function withNumber<Run extends object>(run: Run, other: NumberOtherEnd<Run>): Run {
  const { member } = other;
  const own = run[member] as number;
  switch (other.kind) {
    case 'run':
      return { ...run, [member]: other.value };
    case 'run-increment':
      return { ...run, [member]: own + other.value };
    case 'speed':
      return { ...run, [member]: own * other.factor };
  }
}
