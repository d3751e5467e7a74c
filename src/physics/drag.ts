/**
 * Induced drag factor of a wing out of ground effect.
 *
 * K = 1/(pi A e), A = b^2/S
 *
 * @param span - b [m], above 0
 * @param area - S [m2], above 0
 * @param oswaldFactor - e, above 0, about 0.7 to 0.85
 * @returns K, dimensionless
 * @see references.AndersonIntroduction, ch. 5 and 6
 */
export function inducedDragFactor(span: number, area: number, oswaldFactor: number): number {
  if (!(span > 0 && area > 0 && oswaldFactor > 0)) {
    throw new RangeError(`span, area and oswaldFactor must be above 0: ${span}, ${area}, ${oswaldFactor}`);
  }
  return area / (Math.PI * span * span * oswaldFactor);
}

/**
 * Drag coefficient of a parabolic polar near the ground.
 *
 * C_D = C_D0 + phi K C_L^2
 *
 * @param zeroLiftCoefficient - C_D0 with flap and gear as they are
 * @param inducedFactor - K, of inducedDragFactor
 * @param liftCoefficient - C_L
 * @param groundEffectFactor - phi, of groundEffect; 1 away from the ground
 * @returns C_D referred to the wing area
 * @remarks Attached flow below the onset of compressibility.
 * @see references.AndersonIntroduction, ch. 6
 */
export function dragCoefficient(
  zeroLiftCoefficient: number,
  inducedFactor: number,
  liftCoefficient: number,
  groundEffectFactor: number,
): number {
  return zeroLiftCoefficient + groundEffectFactor * inducedFactor * liftCoefficient * liftCoefficient;
}
