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
  /** work of the wheel brakes over the mass [m2/s2]; 0 where nothing brakes */
  brakeWork: number;
}

/** Adds the piece from one end to the other to a sum. */
export type AddPiece = (from: number, to: number, sum: PathIntegral) => void;

/** A sum of nothing. */
export function newPathIntegral(): PathIntegral {
  return {
    distance: 0,
    time: 0,
    least: Number.POSITIVE_INFINITY,
    leastAt: 0,
    most: Number.NEGATIVE_INFINITY,
    brakeWork: 0,
  };
}

/** Change on halving, as a share of the sum, at which a piece is taken: ten times the rounding of the least acceleration used. */
const agreement = 1e-9;
/** A change that is none: a nanometre, a nanosecond. A tailwind of 1e-300 m/s makes pieces of no length. */
const negligible = 1e-9;
/** Pieces a path may be cut into; a pole as near as 1e-6 of a piece needs some forty. */
const mostPieces = 500;

/**
 * Adds a piece by halving it until its halves agree with the whole: for integrands that nearly reach infinity.
 *
 * @param add - integrates one piece by a fixed rule
 * @param from - lower end
 * @param to - upper end
 * @param sum - receives the piece
 * @returns false where 500 pieces do not settle it, or what drives the path is not positive somewhere
 */
export function addSettled(add: AddPiece, from: number, to: number, sum: PathIntegral): boolean {
  const pending: [from: number, to: number, whole: PathIntegral][] = [[from, to, pieceOf(add, from, to)]];
  for (let pieces = 0; pieces < mostPieces; pieces++) {
    const next = pending.pop();
    if (next === undefined) return true;
    const [low, high, whole] = next;
    const middle = low + (high - low) / 2;
    const lower = pieceOf(add, low, middle);
    const upper = pieceOf(add, middle, high);
    if (!(whole.least > 0 && lower.least > 0 && upper.least > 0)) {
      gather(
        sum,
        whole.least < lower.least && whole.least < upper.least ? whole : lower.least < upper.least ? lower : upper,
      );
      return false;
    }
    if (
      agree(lower.distance + upper.distance, whole.distance, sum.distance) &&
      agree(lower.time + upper.time, whole.time, sum.time)
    ) {
      gather(sum, lower);
      gather(sum, upper);
    } else {
      pending.push([middle, high, upper], [low, middle, lower]);
    }
  }
  return pending.length === 0;
}

function pieceOf(add: AddPiece, from: number, to: number): PathIntegral {
  const piece = newPathIntegral();
  add(from, to, piece);
  return piece;
}

function agree(halves: number, whole: number, before: number): boolean {
  return Math.abs(halves - whole) <= agreement * (halves + before) + negligible;
}

/** Adds a part of a path to a sum. */
export function gather(sum: PathIntegral, part: PathIntegral): void {
  sum.distance += part.distance;
  sum.time += part.time;
  if (part.least < sum.least) {
    sum.least = part.least;
    sum.leastAt = part.leastAt;
  }
  sum.most = Math.max(sum.most, part.most);
  sum.brakeWork += part.brakeWork;
}
