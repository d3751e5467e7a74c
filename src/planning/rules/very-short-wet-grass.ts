/** Code of the factor on very short wet grass; it stands for grass and wet together. */
export const veryShortWetGrass = 'very-short-wet-grass';
/** What landing on very short wet grass may need over landing on a paved, dry runway. @see references.EuAirOps335Gm1, (a) */
export const veryShortWetGrassFactor = 1.6;
