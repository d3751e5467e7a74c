import { surfaceNotes } from './apply-notes.ts';
import { bestSheet, gives, type SheetFound, sheetsFor, together } from './best-sheet.ts';
import type { FlightManual, ManualOutput, Sheet } from './flight-manual.ts';
import type { ManualAsked, ManualFigures, OutsideManual } from './manual-figures.ts';
import { isPavedDry, speaksOfSurface } from './speaks-of-surface.ts';

/**
 * The manual's own ground roll and distance to or from the screen, its notes applied, never extrapolated.
 *
 * A sheet for the very surface comes first, then one with a note on it, then those for a dry paved runway, silent on the surface.
 * Both distances come from one sheet where one gives both, else from two; where these two are silent on different things the whole
 * distance alone is given, for one correction would not fit both; likewise where the roll, on its edge or by its notes, is not below it.
 *
 * @returns undefined where the manual has no sheet for this phase and configuration on this surface or a dry paved one
 */
export function manualDistances(manual: FlightManual, asked: ManualAsked): ManualFigures | OutsideManual | undefined {
  const whole = asked.phase === 'takeoff' ? 'takeoffDistance' : 'landingDistance';
  const sheets = sheetsFor(manual, asked.phase, asked.configuration);
  const distance = bestSheet(onSurface(sheets, whole, asked), whole, asked, sheets);
  const roll = besideIt(bestSheet(onSurface(sheets, 'groundRoll', asked), 'groundRoll', asked), distance, whole);
  const used = together(roll, distance);
  if (used === undefined || 'outcome' in used) return used;
  return {
    outcome: 'figures',
    groundRoll: roll?.figures.outputs.groundRoll,
    wholeDistance: distance?.figures.outputs[whole],
    speeds: { ...speedsOf(roll), ...speedsOf(distance) },
    ...used,
  };
}

/** The sheets that give an output and come nearest to the asked surface. */
function onSurface(sheets: readonly Sheet[], output: ManualOutput, asked: ManualAsked): readonly Sheet[] {
  const giving = sheets.filter((sheet) => gives(sheet, output));
  return (
    some(giving.filter(({ conditions }) => speaksOfSurface(conditions.surface, asked.surface))) ??
    some(giving.filter((sheet) => surfaceNotes(sheet, asked).length > 0)) ??
    giving.filter(({ conditions }) => isPavedDry(conditions.surface))
  );
}

function some<T>(list: readonly T[]): readonly T[] | undefined {
  return list.length > 0 ? list : undefined;
}

/** The ground roll, unless it is not below the whole distance, as notes of each may bring about, or silent on other things than it. */
function besideIt(
  roll: SheetFound | undefined,
  distance: SheetFound | undefined,
  whole: ManualOutput,
): SheetFound | undefined {
  if (roll === undefined || distance === undefined) return roll;
  if (roll.figures.outside.length > 0 || distance.figures.outside.length > 0) return roll;
  const isSilentAlike = roll.figures.silent.join() === distance.figures.silent.join();
  const isBelow = (roll.figures.outputs.groundRoll as number) < (distance.figures.outputs[whole] as number);
  return isSilentAlike && isBelow ? roll : undefined;
}

function speedsOf(found: SheetFound | undefined): ManualFigures['speeds'] {
  const { liftOff, screen, landingReference } = found?.figures.outputs ?? {};
  return {
    ...(liftOff === undefined ? {} : { liftOff }),
    ...(screen === undefined ? {} : { screen }),
    ...(landingReference === undefined ? {} : { landingReference }),
  };
}
