import { surfaceNotes } from './apply-notes.ts';
import { bestSheet, sheetsFor, together } from './best-sheet.ts';
import type { FlightManual } from './flight-manual.ts';
import type { ManualAsked, ManualFigures, OutsideManual } from './manual-figures.ts';
import { isPavedDry, speaksOfSurface } from './speaks-of-surface.ts';

/**
 * The manual's own ground roll and distance to or from the screen, its notes applied, never extrapolated.
 *
 * A sheet for the very surface comes first, then one with a note on it, then those for a dry paved runway, silent on the surface.
 * Both distances come from one sheet where one gives both, else from two.
 *
 * @returns undefined where the manual has no sheet for this phase and configuration on this surface or a dry paved one
 */
export function manualDistances(manual: FlightManual, asked: ManualAsked): ManualFigures | OutsideManual | undefined {
  const whole = asked.phase === 'takeoff' ? 'takeoffDistance' : 'landingDistance';
  const sheets = sheetsFor(manual, asked.phase, asked.configuration);
  const usable =
    some(sheets.filter(({ conditions }) => speaksOfSurface(conditions.surface, asked.surface))) ??
    some(sheets.filter((sheet) => surfaceNotes(sheet, asked).length > 0)) ??
    sheets.filter(({ conditions }) => isPavedDry(conditions.surface));
  const roll = bestSheet(usable, 'groundRoll', asked);
  const distance = bestSheet(usable, whole, asked, roll?.sheet);
  const used = together(roll, distance);
  if (used === undefined || 'outcome' in used) return used;
  return {
    outcome: 'figures',
    groundRoll: roll?.figures.outputs.groundRoll,
    wholeDistance: distance?.figures.outputs[whole],
    ...used,
  };
}

function some<T>(list: readonly T[]): readonly T[] | undefined {
  return list.length > 0 ? list : undefined;
}
