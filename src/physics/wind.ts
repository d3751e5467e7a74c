/** A steady wind resolved on a direction of movement. */
export interface WindResolved {
  /** [m/s], on the nose positive */
  readonly headwind: number;
  /** size [m/s], 0 or more */
  readonly crosswind: number;
  /** the side it comes from, looking along the movement; absent where there is none */
  readonly crosswindFrom?: 'left' | 'right';
}

/**
 * Components of a wind along and across a direction of movement.
 *
 * headwind = V cos d, crosswind = V sin d, d = direction the wind comes from - direction of movement.
 *
 * @param from - direction the wind blows from [rad], clockwise from north
 * @param speed - [m/s], 0 or more
 * @param direction - of movement [rad], clockwise from the same north
 * @returns components [m/s]; what is below 1e-12 of the speed is 0, so that a wind from behind has no side
 * @see references.Phak, crosswind component chart
 */
export function windComponents(from: number, speed: number, direction: number): WindResolved {
  if (!(speed >= 0)) throw new RangeError(`speed must be 0 or more: ${speed}`);
  if (!Number.isFinite(from)) throw new RangeError(`from must be finite: ${from}`);
  if (!Number.isFinite(direction)) throw new RangeError(`direction must be finite: ${direction}`);
  const angle = from - direction;
  const headwind = settled(speed * Math.cos(angle), speed);
  const across = settled(speed * Math.sin(angle), speed);
  if (across === 0) return { headwind, crosswind: 0 };
  return { headwind, crosswind: Math.abs(across), crosswindFrom: across > 0 ? 'right' : 'left' };
}

function settled(component: number, speed: number): number {
  return Math.abs(component) <= 1e-12 * speed ? 0 : component;
}
