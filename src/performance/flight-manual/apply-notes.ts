import type { ManualNote, ManualSheet, ProportionalNote, SurfaceNote } from './flight-manual.ts';
import type { AppliedNote, ManualAsked, ManualBound } from './manual-figures.ts';
import { noteAmount, noteReach } from './note-amount.ts';
import { closeness, speaksOfSurface } from './speaks-of-surface.ts';

/** Figures on their way through the notes; absent ones are not there. */
export interface CorrectedFigures {
  groundRoll: number | undefined;
  wholeDistance: number | undefined;
  /** what all notes make of a climb */
  climbFactor: number;
  readonly notes: AppliedNote[];
  /** where a note was held at its limit, on the side where that is the longer */
  readonly edges: ManualBound[];
  readonly outside: ManualBound[];
}

/**
 * The notes of a sheet on its figures, in the order of the manual.
 *
 * Within a note the change is proportional, 1 + change amount/per (whole steps only where it says so); several notes multiply;
 * a share of the ground roll is of the roll as corrected so far and is added to both distances. More headwind than a note speaks of
 * counts as the most it speaks of, less mass likewise; more of anything else is outside.
 *
 * @param figures - as printed [m]; changed in place
 * @param standardTemperature - as the sheet prints it, or of the standard atmosphere [K]
 */
export function applyNotes(
  sheet: ManualSheet,
  asked: ManualAsked,
  figures: CorrectedFigures,
  standardTemperature: number,
): void {
  const surfaces = surfaceNotes(sheet, asked);
  for (const note of sheet.notes) {
    if (note.about === 'surface') {
      if (surfaces.includes(note)) apply(sheet, note, { factor: 1 + note.change }, figures);
      continue;
    }
    const given = noteAmount(note, sheet, asked, standardTemperature);
    if (given === 0) continue;
    const factor =
      1 + (changeAt(note, asked.pressureAltitude) * reached(sheet, note, given, asked, figures)) / note.per;
    apply(sheet, note, { given, factor }, figures);
  }
}

/** The notes that speak of the asked surface most closely; none where the sheet itself is for it. */
export function surfaceNotes({ notes, conditions }: ManualSheet, { surface }: ManualAsked): readonly SurfaceNote[] {
  if (speaksOfSurface(conditions.surface, surface)) return [];
  const speaking = notes.filter(
    (note): note is SurfaceNote => note.about === 'surface' && speaksOfSurface(note.surface, surface),
  );
  const closest = Math.max(...speaking.map((note) => closeness(note.surface)));
  return speaking.filter((note) => closeness(note.surface) === closest);
}

/** The amount that counts: held at the limit, or noted as outside, beyond it; whole steps where the note says so. */
function reached(
  sheet: ManualSheet,
  note: ProportionalNote,
  given: number,
  { edges }: ManualAsked,
  figures: CorrectedFigures,
): number {
  const limit = noteReach(note);
  let amount = given;
  if (given > limit * (1 + 1e-9)) {
    const isHeld = edges === 'use' && (note.about === 'headwind' || note.about === 'belowMass');
    const bound: ManualBound = { sheet: sheet.id, axis: note.about, given, bound: limit, side: 'above' };
    (isHeld ? figures.edges : figures.outside).push(bound);
    amount = limit;
  }
  return note.wholeSteps ? note.per * Math.floor(amount / note.per + 1e-9) : amount;
}

function changeAt({ change }: ProportionalNote, pressureAltitude: number): number {
  if (typeof change === 'number') return change;
  const band = change.find(({ upTo }) => upTo === undefined || pressureAltitude <= upTo);
  if (band === undefined) throw new RangeError(`no band of a note reaches ${pressureAltitude} m`);
  return band.change;
}

function apply(
  { id }: ManualSheet,
  note: ManualNote,
  made: { readonly given?: number; readonly factor: number },
  figures: CorrectedFigures,
): void {
  const { factor } = made;
  const { multiplies } = note;
  if (multiplies === 'groundRollAddedToBoth' && figures.groundRoll === undefined) {
    throw new RangeError(`a share of the ground roll is added on ${id}, and there is none`);
  }
  const added = (figures.groundRoll ?? 0) * (factor - 1);
  if (multiplies === 'climb') figures.climbFactor *= factor;
  if (figures.groundRoll !== undefined) {
    if (multiplies === 'both' || multiplies === 'groundRoll') figures.groundRoll *= factor;
    else if (multiplies === 'groundRollAddedToBoth') figures.groundRoll += added;
  }
  if (figures.wholeDistance !== undefined) {
    if (multiplies === 'both' || multiplies === 'wholeDistance') figures.wholeDistance *= factor;
    else if (multiplies === 'groundRollAddedToBoth') figures.wholeDistance += added;
  }
  figures.notes.push({ sheet: id, note, ...made });
}
