/** How a column of distances is printed [m]: one printed unit, and the step to which it is rounded. */
export interface Rounding {
  readonly unit: number;
  readonly step: number;
}

const foot = 0.3048;
const steps = [500, 200, 100, 50, 25, 20, 10, 5, 2, 1, 0.5, 0.2, 0.1, 0.05, 0.02, 0.01, 0.005, 0.002, 0.001];
/** A column is still in a step that this many in so many rows miss: a slip in one row does not hide it. */
const missesPerRow = 1 / 12;

/**
 * The greatest round step of which a column's figures are multiples, but for one row in twelve; in metres or in feet, whichever
 * has the longer step.
 *
 * @param distances - of one column [m]
 */
export function roundingStep(distances: readonly number[]): Rounding {
  const inMetres = stepIn(distances, 1);
  const inFeet = stepIn(distances, foot);
  return inFeet.step > inMetres.step ? inFeet : inMetres;
}

function stepIn(distances: readonly number[], unit: number): Rounding {
  const mayMiss = Math.floor(distances.length * missesPerRow);
  const step = steps.find(
    (size) => distances.filter((distance) => !isMultiple(distance / unit, size)).length <= mayMiss,
  );
  return { unit, step: (step ?? 0) * unit };
}

/** Whether a printed figure is a multiple of a step, to the rounding of a change of unit. */
export function isMultiple(printed: number, step: number): boolean {
  const ratio = printed / step;
  return Math.abs(ratio - Math.round(ratio)) <= 1e-9 * Math.abs(ratio) + 1e-9;
}
