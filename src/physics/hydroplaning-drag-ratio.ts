/** Speed over hydroplaning at which the drag has fallen to its end, and that end. @see references.Amc25s1591 */
const fallenAt = 1.6;
const fallenTo = 0.3;

/**
 * Share of a contaminant's drag that is left above hydroplaning, as the tyre rides up: for comparison only, no distance is
 * computed with it.
 *
 * 1 up to V_P, linear to 0.3 at 1.6 V_P, 0.3 beyond.
 *
 * @param groundSpeed - [m/s]
 * @param hydroplaningSpeed - V_P [m/s], above 0
 * @see references.Amc25s1591
 */
export function hydroplaningDragRatio(groundSpeed: number, hydroplaningSpeed: number): number {
  if (!(hydroplaningSpeed > 0)) throw new RangeError(`hydroplaningSpeed must be above 0: ${hydroplaningSpeed}`);
  const beyond = (groundSpeed / hydroplaningSpeed - 1) / (fallenAt - 1);
  return 1 - (1 - fallenTo) * Math.min(1, Math.max(0, beyond));
}
