/** What a contaminant is counted to help in a stop: perSquare Vg^2 below a ground speed, nothing at and above it. */
export interface StoppingDrag {
  /** [kg/m] */
  readonly perSquare: number;
  /** [m/s] */
  readonly below: number;
}

/** Share of the drag that is counted below hydroplaning. @see references.HouseContaminant */
const countedShare = 0.5;

/**
 * What of a contaminant's drag is counted to help in a stop: half of it below hydroplaning and none from there on, the longer way.
 *
 * @param perSquare - k of contaminantDrag [kg/m], 0 or more
 * @param hydroplaningSpeed - of the phase [m/s]
 * @see references.HouseContaminant
 */
export function stoppingDrag(perSquare: number, hydroplaningSpeed: number): StoppingDrag {
  if (!(perSquare >= 0)) throw new RangeError(`perSquare must be 0 or more: ${perSquare}`);
  if (!(hydroplaningSpeed > 0)) throw new RangeError(`hydroplaningSpeed must be above 0: ${hydroplaningSpeed}`);
  return { perSquare: countedShare * perSquare, below: hydroplaningSpeed };
}
