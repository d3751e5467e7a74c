/** Distance and time gathered over pieces of a path, with the least and greatest of what drives it. */
export interface PathIntegral {
  /** [m] */
  distance: number;
  /** [s] */
  time: number;
  /** least and greatest of the acceleration or gradient met, and where the least was, in the piece's own variable */
  least: number;
  leastAt: number;
  most: number;
}

/** Adds the piece from one end to the other to a sum. */
export type AddPiece = (from: number, to: number, sum: PathIntegral) => void;

/** A sum of nothing. */
export function newPathIntegral(): PathIntegral {
  return { distance: 0, time: 0, least: Number.POSITIVE_INFINITY, leastAt: 0, most: Number.NEGATIVE_INFINITY };
}

/** Change on halving, as a share of the sum, at which a piece is taken. */
const agreement = 1e-10;

/**
 * Adds a piece by halving it until its halves agree with the whole: for integrands that nearly reach infinity.
 *
 * @param add - integrates one piece by a fixed rule
 * @param from - lower end
 * @param to - upper end
 * @param sum - receives the piece
 * @param halvings - how often a piece may be halved
 * @returns false where that does not settle it, or what drives the path is not positive somewhere
 */
export function addSettled(add: AddPiece, from: number, to: number, sum: PathIntegral, halvings = 40): boolean {
  const middle = from + (to - from) / 2;
  const whole = newPathIntegral();
  const halves = newPathIntegral();
  add(from, to, whole);
  add(from, middle, halves);
  add(middle, to, halves);
  if (!(whole.least > 0 && halves.least > 0)) {
    gather(sum, whole.least < halves.least ? whole : halves);
    return false;
  }
  const settled =
    Math.abs(halves.distance - whole.distance) <= agreement * (halves.distance + sum.distance) &&
    Math.abs(halves.time - whole.time) <= agreement * (halves.time + sum.time);
  if (settled || halvings === 0) {
    gather(sum, halves);
    return settled;
  }
  return addSettled(add, from, middle, sum, halvings - 1) && addSettled(add, middle, to, sum, halvings - 1);
}

function gather(sum: PathIntegral, part: PathIntegral): void {
  sum.distance += part.distance;
  sum.time += part.time;
  if (part.least < sum.least) {
    sum.least = part.least;
    sum.leastAt = part.leastAt;
  }
  sum.most = Math.max(sum.most, part.most);
}
