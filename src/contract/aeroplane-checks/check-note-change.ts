import type { ManualPhase, ProportionalNote } from '../../performance/flight-manual/flight-manual.ts';
import { noteReach } from '../../performance/flight-manual/note-amount.ts';
import type { Fault } from '../../planning/fault.ts';
import type { ManualNoteOnWire } from '../flight-manual/manual-note.ts';
import { type SheetOnWire, toNote } from '../flight-manual/to-manual-sheet.ts';

/** What is left of a figure at the limit of a note, at least, and what it becomes at most; our choice. */
const leastLeft = 0.1;
const greatestFactor = 6;

/** A note that is proportional to something. */
export type StepsOnWire = Exclude<ManualNoteOnWire, { about: 'surface' }>;

/** The change of a note: in one form, its bands rising, its sign and size what a manual can mean. */
export function checkNoteChange(sheet: SheetOnWire, note: StepsOnWire, at: string): Fault[] {
  const { changePercent, byPressureAltitude } = note;
  if ((changePercent === undefined) === (byPressureAltitude === undefined)) {
    const message =
      changePercent === undefined
        ? 'None of changePercent and byPressureAltitude is given.'
        : 'changePercent and byPressureAltitude do not go together.';
    const allowed = 'exactly one of changePercent or byPressureAltitude';
    return [{ pointer: at, code: 'exactly-one-of', message, allowed }];
  }
  const inSi = toNote(note) as ProportionalNote;
  if (typeof inSi.change === 'number') return checkSize(sheet, inSi, inSi.change, `${at}/changePercent`);
  const bandsAt = `${at}/byPressureAltitude`;
  const upTo = inSi.change.map((band) => band.upTo ?? Number.POSITIVE_INFINITY);
  const disorder = upTo.findIndex((bound, i) => bound <= (upTo[i - 1] ?? Number.NEGATIVE_INFINITY));
  const isOpen = upTo.at(-1) === Number.POSITIVE_INFINITY;
  if (disorder >= 0 || !isOpen) {
    return [
      {
        pointer: `${bandsAt}/${disorder < 0 ? upTo.length - 1 : disorder}`,
        code: 'contradiction',
        message: 'The bands do not rise up to one without an upper bound.',
        allowed: 'upTo rising from band to band, none in the last',
      },
    ];
  }
  return inSi.change.flatMap(({ change }, i) => checkSize(sheet, inSi, change, `${bandsAt}/${i}/changePercent`));
}

function checkSize(sheet: SheetOnWire, note: ProportionalNote, change: number, pointer: string): Fault[] {
  const way = wayOf(sheet.for, note.about);
  const received = Math.round(change * 1e8) / 1e6;
  if (change * way < 0) {
    return [
      {
        pointer,
        code: 'implausible',
        message: `${note.about} changes a ${sheet.for} by ${received} %.`,
        received,
        allowed: way > 0 ? '0 or more' : '0 or less',
        hint: 'What makes a figure smaller is negative.',
      },
    ];
  }
  const reach = noteReach(note);
  const factor = 1 + (change * reach) / note.per;
  if (factor >= leastLeft && factor <= greatestFactor) return [];
  return [
    {
      pointer,
      code: 'implausible',
      message: `At its limit the note makes ${Math.round(100 * factor)} % of the figure.`,
      received,
      allowed: `${100 * leastLeft} to ${100 * greatestFactor} % at the limit`,
      hint: 'Check the step that the change is for, and the limit.',
    },
  ];
}

/** The way in which something lengthens a distance, or makes a climb steeper: 1 more, -1 less. */
function wayOf(phase: ManualPhase, about: ProportionalNote['about']): 1 | -1 {
  const lengthens = about === 'tailwind' || about === 'aboveStandard' || about === 'aboveMass';
  const isSlope = about === 'uphill' || about === 'downhill';
  if (isSlope) return (about === 'uphill') === (phase === 'takeoff') ? 1 : -1;
  return lengthens === (phase !== 'climb') ? 1 : -1;
}

/** Whether a note makes distances longer. */
export function lengthens(sheet: SheetOnWire, note: ManualNoteOnWire): boolean {
  if (sheet.for === 'climb') return false;
  if (note.about === 'surface') return note.changePercent > 0;
  return wayOf(sheet.for, note.about) > 0 && changesOf(note).some((change) => change > 0);
}

/** Whether a note makes what it multiplies smaller. */
export function shortens(note: ManualNoteOnWire): boolean {
  return (note.about === 'surface' ? [note.changePercent] : changesOf(note)).some((change) => change < 0);
}

function changesOf({ changePercent = 0, byPressureAltitude = [] }: StepsOnWire): number[] {
  return [changePercent, ...byPressureAltitude.map((band) => band.changePercent)];
}
