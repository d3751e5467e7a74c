import { deepestWet, type LooseContaminant } from './runway-surface.ts';

/** Density [kg/m3]. @see references.Amc25s1591 */
export const contaminantDensity: Readonly<Record<LooseContaminant, number>> = {
  water: 1000,
  slush: 850,
  'wet-snow': 400,
  'dry-snow': 200,
};

/** Drag coefficient of a tyre on the front it pushes aside, water and slush; taken for snow too. @see references.Amc25s1591 */
const displacementCoefficient = 0.75;
/** Drag coefficient of the spray by length of fuselage that it wets [1/m]: 8 x 0.0025 a foot. @see references.Amc25s1591 */
const sprayCoefficientPerLength = (8 * 0.0025) / 0.3048;

/** What of an aeroplane runs and is sprayed in a contaminant. */
export interface WettedGear {
  /** tyres that make a track of their own; two side by side count as two */
  readonly tyres: number;
  /** greatest width of a tyre [m] */
  readonly tyreWidth: number;
  /** how far the loaded tyre is flattened [m]; half the width or more gives the whole width */
  readonly tyreDeflection: number;
  /** length of fuselage behind the wheels that the spray wets [m] */
  readonly sprayLength: number;
}

/**
 * Drag of a loose contaminant over the square of the ground speed: displacement and spray.
 *
 * D = k Vg^2, k = rho_c/2 (C_D + C_Dspray) n d b; C_D = 0.75; C_Dspray = 0.0656 L; b = 2 W sqrt(f - f^2), f = (deflection + d)/W,
 * the chord of a circular tyre section at the surface of the contaminant, W from f = 0.5 on.
 *
 * @param kind - its density is taken as 1000 water, 850 slush, 400 wet snow, 200 dry snow [kg/m3]
 * @param depth - d [m], 0 or more; up to 3 mm nothing is displaced
 * @param gear - n tyres of width W, and L
 * @returns k [kg/m]
 * @remarks Tyres add up, so that two side by side have the 2.0 and a bogie of four the 4 of the source. The coefficient holds
 * before hydroplaning and is counted at every speed of a takeoff: the longer way.
 * @see references.Amc25s1591, displacement and spray impingement drag; references.HouseContaminant for the same C_D in snow
 */
export function contaminantDrag(kind: LooseContaminant, depth: number, gear: WettedGear): number {
  const { tyres, tyreWidth, tyreDeflection, sprayLength } = gear;
  if (!(depth >= 0)) throw new RangeError(`depth must be 0 or more: ${depth}`);
  if (!(tyreWidth > 0)) throw new RangeError(`tyreWidth must be above 0: ${tyreWidth}`);
  if (!(tyres >= 0 && tyreDeflection >= 0 && sprayLength >= 0)) {
    throw new RangeError(
      `tyres, tyreDeflection and sprayLength must be 0 or more: ${tyres}, ${tyreDeflection}, ${sprayLength}`,
    );
  }
  if (depth <= deepestWet) return 0;
  const f = (tyreDeflection + depth) / tyreWidth;
  const breadth = f >= 0.5 ? tyreWidth : 2 * tyreWidth * Math.sqrt(f - f * f);
  const coefficient = displacementCoefficient + sprayCoefficientPerLength * sprayLength;
  return 0.5 * contaminantDensity[kind] * coefficient * tyres * depth * breadth;
}
