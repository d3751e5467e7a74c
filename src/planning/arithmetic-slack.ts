/** Below this a shortfall is the arithmetic's, not the runway's, in the unit of the check: 600 x 1.3 x 1.15 is 896.9999999999999. */
export const arithmeticSlack = 1e-6;
