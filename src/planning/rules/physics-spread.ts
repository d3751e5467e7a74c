/**
 * Beyond these one of the two is suspected where a flight manual and physics give different distances, as a difference of ln: twice
 * the model form of the physics.
 *
 * @see references.HouseManual
 */
export const physicsSpread = { fitted: 0.1, stated: 0.3 } as const;
