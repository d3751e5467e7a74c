import type { Parts } from '../band-parts.ts';

/** The parts of an answer over those of physics alone. */
export interface Shares {
  readonly groundRoll: number;
  readonly airDistance: number;
}

/**
 * What turns a distance of physics into one of the answer, so that a sentence never sets one beside the other.
 *
 * @returns undefined where the answer is that of physics, or one of them has no distances
 */
export function sharesOf(answer: Parts | undefined, physics: Parts | undefined): Shares | undefined {
  if (answer === undefined || physics === undefined) return undefined;
  const groundRoll = answer.groundRoll / physics.groundRoll;
  const airDistance = answer.airDistance / physics.airDistance;
  return groundRoll === 1 && airDistance === 1 ? undefined : { groundRoll, airDistance };
}
