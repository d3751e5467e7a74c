/** Least height over span for which the formula is used: a wing lies higher than this above its wheels. */
export const leastHeightRatio = 0.03;

/** Height of the wing over the span at which the ground's effect ends, 1/1.32. @see references.Wieselsberger1922 */
export const heightRatioWithoutEffect = 1 / 1.32;

/**
 * Factor on the induced drag near the ground.
 *
 * phi = 1 - (1 - 1.32 r)/(1.05 + 7.4 r), r = h/b: Wieselsberger's form, not above 1, which it reaches at r = 0.758.
 *
 * @param heightRatio - r, height of the wing's quarter chord above the runway over the span; below 0.03 it counts as 0.03
 * @returns phi, 0.25 to 1
 * @remarks Unswept wings without ground contact. The gain of lift in ground effect is not credited.
 * @see references.Wieselsberger1922
 */
export function groundEffect(heightRatio: number): number {
  if (heightRatio >= heightRatioWithoutEffect) return 1;
  const r = Math.max(heightRatio, leastHeightRatio);
  return 1 - (1 - 1.32 * r) / (1.05 + 7.4 * r);
}
