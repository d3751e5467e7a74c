/**
 * A runway's ground line from the start point on, as stretches of constant slope in the direction of movement.
 *
 * ends[i] [m] is where stretch i ends, rising; slopes[i] its slope, uphill positive. Beyond the last end the last slope holds:
 * whoever builds a profile sees to it that it covers the runway.
 */
export interface SlopeProfile {
  readonly ends: readonly number[];
  readonly slopes: readonly number[];
}

/**
 * The profile of a ground line surveyed at points.
 *
 * @param distances - of the points along the runway in the direction of movement [m], rising, at least two
 * @param heights - of the points [m]
 * @param start - distance of the start point on the same scale [m], at or after the first point and before the last
 * @returns stretches measured from the start point
 */
export function slopeProfile(distances: readonly number[], heights: readonly number[], start: number): SlopeProfile {
  const ends: number[] = [];
  const slopes: number[] = [];
  for (let i = 1; i < distances.length; i++) {
    const end = distances[i] as number;
    if (end <= start) continue;
    const begin = distances[i - 1] as number;
    ends.push(end - start);
    slopes.push(((heights[i] as number) - (heights[i - 1] as number)) / (end - begin));
  }
  return { ends, slopes };
}

/**
 * Slope of the line from the start point to a distance on the profile.
 *
 * @param length - [m], above 0; beyond the profile the last slope holds
 */
export function overallSlope({ ends, slopes }: SlopeProfile, length = ends[ends.length - 1] as number): number {
  let rise = 0;
  let from = 0;
  const last = ends.length - 1;
  for (let i = 0; i <= last && from < length; i++) {
    const end = i === last ? length : Math.min(length, ends[i] as number);
    rise += (slopes[i] as number) * (end - from);
    from = end;
  }
  return rise / length;
}

/** The greatest slope met from a distance on [m]; of the last stretch where the distance lies beyond it. */
export function steepestFrom({ ends, slopes }: SlopeProfile, distance: number): number {
  let steepest = slopes[slopes.length - 1] as number;
  for (let i = 0; i < ends.length; i++) {
    if ((ends[i] as number) > distance) steepest = Math.max(steepest, slopes[i] as number);
  }
  return steepest;
}
