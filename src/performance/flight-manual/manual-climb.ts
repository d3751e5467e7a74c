import { bestSheet, sheetsFor, together } from './best-sheet.ts';
import type { FlightManual } from './flight-manual.ts';
import type { ManualAsked, ManualClimb, OutsideManual } from './manual-figures.ts';

/**
 * The manual's own climb: gradient [ratio] and rate [m/s], its notes applied, never extrapolated.
 *
 * Wind, slope and surface have no part in it. Both come from one sheet where one gives both, else from two.
 *
 * @returns undefined where the manual has no climb sheet for this configuration
 */
export function manualClimb(
  manual: FlightManual,
  asked: Omit<ManualAsked, 'phase'>,
): ManualClimb | OutsideManual | undefined {
  const still: ManualAsked = { ...asked, phase: 'takeoff', headwind: 0, creditedHeadwind: 0, slope: 0 };
  const sheets = sheetsFor(manual, 'climb', asked.configuration);
  const gradient = bestSheet(sheets, 'climbGradient', still);
  const rate = bestSheet(sheets, 'climbRate', still);
  const used = together(gradient, rate);
  if (used === undefined || 'outcome' in used) return used;
  return {
    outcome: 'climb',
    gradient: gradient?.figures.outputs.climbGradient,
    rate: rate?.figures.outputs.climbRate,
    sheets: used.sheets,
    notes: used.notes,
    edges: used.edges,
  };
}
