import type { ManualSheet, ProportionalNote } from './flight-manual.ts';
import type { ManualAsked } from './manual-figures.ts';

/** A difference from calm, level or standard smaller than this is rounding [m/s, ratio, K, kg]. */
export const nothing = 1e-9;

/**
 * How far a note without a limit reaches: 20 kt of wind [m/s], 2 % of slope, 40 K of temperature; of mass it reaches nothing.
 *
 * @see references.Judgement
 */
const reach: Readonly<Record<ProportionalNote['about'], number>> = {
  headwind: (20 * 1852) / 3600,
  tailwind: (20 * 1852) / 3600,
  uphill: 0.02,
  downhill: 0.02,
  aboveStandard: 40,
  belowStandard: 40,
  aboveMass: 0,
  belowMass: 0,
};

/** The greatest amount that a note speaks of, in its own measure. */
export function noteReach({ about, limit }: ProportionalNote): number {
  return limit ?? reach[about];
}

/**
 * How much there is of what a note is about: m/s of wind, slope as a ratio, K off standard, kg off the sheet's mass; never below 0.
 *
 * @param standardTemperature - as the sheet prints it, or of the standard atmosphere [K]
 */
export function noteAmount(
  { about, windAllowance }: ProportionalNote,
  { conditions }: ManualSheet,
  asked: ManualAsked,
  standardTemperature: number,
): number {
  const off = differenceOf();
  return Math.abs(off) <= nothing ? 0 : Math.max(0, off);

  function differenceOf(): number {
    const wind = windAllowance ? asked.headwind : asked.creditedHeadwind;
    switch (about) {
      case 'headwind':
        return wind;
      case 'tailwind':
        return -wind;
      case 'uphill':
        return asked.slope;
      case 'downhill':
        return -asked.slope;
      case 'aboveStandard':
        return asked.temperature - standardTemperature;
      case 'belowStandard':
        return standardTemperature - asked.temperature;
      case 'aboveMass':
        return asked.mass - (conditions.mass ?? asked.mass);
      case 'belowMass':
        return (conditions.mass ?? asked.mass) - asked.mass;
    }
  }
}
