/** Where an aeroplane is at a moment of a takeoff or a landing. */
export interface TrajectoryPoint {
  /** along the runway [m] */
  readonly distance: number;
  /** [s] */
  readonly time: number;
  /** over the ground, and true airspeed [m/s] */
  readonly groundSpeed: number;
  readonly trueAirspeed: number;
  /** of the wheels above the runway [m] */
  readonly height: number;
}

/** A leg of a trajectory: how long it is, and where the aeroplane is after a distance on it, from the leg's own start. */
export interface Leg {
  /** [m] */
  readonly distance: number;
  /** [s] */
  readonly time: number;
  readonly at: (distance: number) => TrajectoryPoint;
}

/**
 * The point a distance along legs that follow one another; the end between two legs is the beginning of the later one.
 *
 * @param distance - [m], 0 or more
 * @returns undefined beyond the last leg
 */
export function pointAlong(legs: readonly Leg[], distance: number): TrajectoryPoint | undefined {
  let before = 0;
  let earlier = 0;
  for (const leg of legs) {
    if (distance < before + leg.distance) {
      const point = leg.at(distance - before);
      return { ...point, distance, time: earlier + point.time };
    }
    before += leg.distance;
    earlier += leg.time;
  }
  return undefined;
}

/**
 * Points at even steps of distance over legs that follow one another, both ends included.
 *
 * @param legs - in their order; one without length only takes its time
 * @param steps - how many, 1 or more
 */
export function evenSteps(legs: readonly Leg[], steps: number): TrajectoryPoint[] {
  if (!(Number.isInteger(steps) && steps >= 1)) throw new RangeError(`steps must be a whole number from 1: ${steps}`);
  const whole = legs.reduce((sum, leg) => sum + leg.distance, 0);
  const points: TrajectoryPoint[] = [];
  let before = 0;
  let earlier = 0;
  let i = 0;
  legs.forEach((leg, index) => {
    const last = index === legs.length - 1;
    for (; i <= steps; i++) {
      const distance = (whole * i) / steps;
      const within = i === steps ? leg.distance : distance - before;
      // the end of all belongs to the last leg, an end between two legs to the later one
      if (!last && (i === steps || within >= leg.distance)) break;
      const point = leg.at(Math.min(leg.distance, Math.max(0, within)));
      points.push({ ...point, distance, time: earlier + point.time });
    }
    before += leg.distance;
    earlier += leg.time;
  });
  return points;
}
