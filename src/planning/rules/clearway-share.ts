/** The most that counts of a clearway, over the run available: half of it, in every set. @see references.EuAirOps205, (b)(2) */
export const clearwayShare = 0.5;
