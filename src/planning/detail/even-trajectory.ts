import type { TrajectoryPoint } from '../../performance/trajectory.ts';
import type { Distances } from '../answer.ts';

/** Steps of distance of a trajectory. */
export const trajectorySteps = 50;

/**
 * A trajectory that ends where the answer does, to the last digit: the path is integrated in finer pieces than the answer, which
 * moves its end by some 1e-8 of the distance; where the answer is the flight manual's, that of physics is stretched to it.
 *
 * @param wholeDistance - of the answer [m]
 */
export function evenTrajectory(
  points: readonly TrajectoryPoint[],
  wholeDistance: number,
  { groundRollTime, airTime }: Pick<Distances, 'groundRollTime' | 'airTime'>,
): readonly TrajectoryPoint[] {
  const steps = points.length - 1;
  const last = points[steps]?.time ?? 0;
  const wholeTime = groundRollTime === undefined || airTime === undefined ? last : groundRollTime + airTime;
  return points.map((point, i) => ({
    ...point,
    distance: i === steps ? wholeDistance : (wholeDistance * i) / steps,
    time: i === steps ? wholeTime : (point.time * wholeTime) / last,
  }));
}
