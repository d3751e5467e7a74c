import { applyNotes, type CorrectedFigures, surfaceNotes } from './apply-notes.ts';
import type { ManualOutput, Sheet } from './flight-manual.ts';
import type { AppliedNote, ManualAsked, ManualBound, ManualSilence } from './manual-figures.ts';
import { offConditions, silentOn } from './off-conditions.ts';
import { axesOf, readSheet } from './read-sheet.ts';
import { rollBeside } from './roll-beside.ts';
import { speaksOfSurface } from './speaks-of-surface.ts';

/** What one sheet makes of a question, its notes applied [SI]. */
export interface SheetFigures {
  readonly outputs: Readonly<Partial<Record<ManualOutput, number>>>;
  readonly notes: readonly AppliedNote[];
  readonly silent: readonly ManualSilence[];
  readonly edges: readonly ManualBound[];
  /** not empty: the sheet does not reach, and the outputs mean nothing */
  readonly outside: readonly ManualBound[];
}

/**
 * The figures of one sheet: as printed, without the factor that they hold, corrected by its notes.
 *
 * @param others - sheets of the manual, one of which gives the ground roll where this one adds a share of it and does not
 */
export function sheetFigures(sheet: Sheet, asked: ManualAsked, others: readonly Sheet[] = []): SheetFigures {
  const read = readSheet(sheet, asked);
  const { standardTemperature, outputs } = read;
  const axes = axesOf(sheet);
  const off = offConditions(sheet, axes, asked, standardTemperature);
  const beside = needsRoll(sheet) ? rollBeside(sheet, asked, others) : undefined;
  const { factor } = sheet.contains;
  const figures: CorrectedFigures = {
    groundRoll: unfactored(outputs.groundRoll, factor) ?? beside?.groundRoll,
    wholeDistance: unfactored(outputs.takeoffDistance ?? outputs.landingDistance, factor),
    climbFactor: 1,
    notes: [],
    edges: [...read.edges, ...off.edges, ...(beside?.edges ?? [])],
    outside: [...read.outside, ...off.outside, ...(beside?.outside ?? [])],
  };
  applyNotes(sheet, asked, figures, standardTemperature);
  return {
    outputs: corrected(outputs, figures),
    notes: figures.notes,
    silent: [...silentOn(sheet, axes, asked), ...silentOnSurface(sheet, asked)],
    edges: figures.edges,
    outside: figures.outside,
  };
}

function needsRoll({ outputs, notes }: Sheet): boolean {
  return (
    !outputs.some((output) => output === 'groundRoll') &&
    notes.some(({ multiplies }) => multiplies === 'groundRollAddedToBoth')
  );
}

function unfactored(distance: number | undefined, factor: number): number | undefined {
  return distance === undefined ? undefined : distance / factor;
}

function corrected(outputs: SheetFigures['outputs'], { groundRoll, wholeDistance, climbFactor }: CorrectedFigures) {
  const made: Partial<Record<ManualOutput, number>> = {};
  for (const output of Object.keys(outputs) as ManualOutput[]) {
    const printed = outputs[output] as number;
    if (output === 'groundRoll') made[output] = groundRoll as number;
    else if (output === 'takeoffDistance' || output === 'landingDistance') made[output] = wholeDistance as number;
    else if (output === 'climbGradient' || output === 'climbRate') made[output] = printed * climbFactor;
    else made[output] = printed;
  }
  return made;
}

function silentOnSurface(sheet: Sheet, asked: ManualAsked): ManualSilence[] {
  const isSpokenOf = speaksOfSurface(sheet.conditions.surface, asked.surface) || surfaceNotes(sheet, asked).length > 0;
  return isSpokenOf ? [] : ['surface'];
}
