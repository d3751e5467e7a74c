/** Depth of water or slush up to which a light aeroplane is computed [m]: 13 mm. @see references.HouseContaminant */
export const deepestForLight = 0.013;

/** Greatest maximum takeoff mass of a light aeroplane [kg]; piston and electric ones count as light whatever their mass. @see references.HouseContaminant */
export const heaviestLight = 5700;

/** Tyre pressure for hydroplaning where none is stated [Pa]: 30 psi; a lower one hydroplanes at a lower speed. @see references.HouseContaminant */
export const assumedHydroplaningPressure = 30 * 6894.757293168361;

/**
 * Length of fuselage wetted by spray where none is stated, in a takeoff [m]: as much drag from spray as from displacement, the upper
 * end of what is published. In a stop none is counted.
 *
 * @see references.Amc25s1591; references.HouseContaminant
 */
export const assumedSprayLength = 11.43;
