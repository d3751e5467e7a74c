import type {
  ManualAxis,
  ManualNote,
  ManualSheet,
  ProportionalNote,
} from '../../performance/flight-manual/flight-manual.ts';
import { noteReach } from '../../performance/flight-manual/note-amount.ts';
import type { Fault } from '../../planning/fault.ts';
import type { ManualNoteOnWire } from '../flight-manual/manual-note.ts';
import { type SheetOnWire, toSheet } from '../flight-manual/to-manual-sheet.ts';
import { checkGround } from '../question-checks/check-surface.ts';
import type { EnteredSheet } from './entered-sheet.ts';

/** What is left of a figure at the limit of a note, at least, and what it becomes at most; our choice. */
const leastLeft = 0.1;
const greatestFactor = 6;

type Steps = Exclude<ManualNoteOnWire, { about: 'surface' }>;

/** The notes of one sheet: each against the sheet, and in its own size and sign. */
export function checkManualNotes(entered: EnteredSheet): Fault[] {
  const { sheet, pointer } = entered;
  const { notes = [] } = sheet;
  return notes.flatMap((note, i) => {
    const here = `${pointer}/notes/${i}`;
    const twice = notes.slice(0, i).some((other) => isSame(other, note));
    return [
      ...(twice ? [contradiction(here, `A note before it is about ${note.about} already, of the same.`)] : []),
      ...checkTarget(entered, note, `${here}/multiplies`),
      ...(note.about === 'surface'
        ? checkGround(note.surface, `${here}/surface`)
        : [...checkPlace(entered, note, `${here}/about`), ...checkChange(sheet, note, here)]),
    ];
  });
}

function isSame(one: ManualNoteOnWire, other: ManualNoteOnWire): boolean {
  if (one.about !== other.about || one.multiplies !== other.multiplies) return false;
  if (one.about !== 'surface' || other.about !== 'surface') return true;
  const { kind, state, grass, firmness } = one.surface;
  const { surface } = other;
  return kind === surface.kind && state === surface.state && grass === surface.grass && firmness === surface.firmness;
}

/** What a note multiplies is something that the sheet gives. */
function checkTarget({ sheet, outputs, hasRoll }: EnteredSheet, note: ManualNoteOnWire, pointer: string): Fault[] {
  const { multiplies } = note;
  const isClimb = sheet.for === 'climb';
  const gives = (names: readonly string[]) => names.some((name) => outputs.includes(name));
  const whole = ['takeoffDistance', 'landingDistance'];
  const fits = {
    climb: isClimb,
    both: !isClimb,
    groundRoll: gives(['groundRoll']),
    wholeDistance: gives(whole),
    groundRollAddedToBoth: hasRoll && !isClimb,
  }[multiplies];
  if (fits) return [];
  const message =
    multiplies === 'groundRollAddedToBoth' && !isClimb
      ? 'No sheet for these configurations gives the ground roll of which a share is added.'
      : `The sheet gives nothing that ${multiplies} could be of.`;
  return [{ ...contradiction(pointer, message), received: multiplies }];
}

const places: Readonly<Partial<Record<ManualNote['about'], readonly ManualAxis[]>>> = {
  aboveStandard: ['temperature', 'temperatureDeviation'],
  belowStandard: ['temperature', 'temperatureDeviation'],
  aboveMass: ['mass'],
  belowMass: ['mass'],
};

/** Nothing is both an axis and a note. */
function checkPlace({ axes, winds }: EnteredSheet, { about }: Steps, pointer: string): Fault[] {
  const axis =
    about === 'headwind' || about === 'tailwind'
      ? winds.some((wind) => (about === 'headwind' ? wind > 0 : wind < 0)) && 'headwind'
      : places[about]?.find((one) => axes.includes(one));
  if (axis === undefined || axis === false) return [];
  return [
    { ...contradiction(pointer, `The sheet is entered with ${axis}, and a note is about ${about}.`), received: about },
  ];
}

/** The change of a note: in one form, its bands rising, its sign and size what a manual can mean. */
function checkChange(sheet: SheetOnWire, note: Steps, at: string): Fault[] {
  const { changePercent, byPressureAltitude: bands } = note;
  if ((changePercent === undefined) === (bands === undefined)) {
    return [
      {
        pointer: at,
        code: 'exactly-one-of',
        message:
          bands === undefined
            ? 'None of changePercent and byPressureAltitude is given.'
            : 'changePercent and byPressureAltitude do not go together.',
        allowed: 'exactly one of changePercent or byPressureAltitude',
      },
    ];
  }
  const { notes } = toSheet({ ...sheet, notes: [note] });
  const inSi = notes[0] as ProportionalNote;
  if (typeof inSi.change === 'number') return checkSize(sheet, inSi, inSi.change, `${at}/changePercent`);
  const upTo = inSi.change.map((band) => band.upTo ?? Number.POSITIVE_INFINITY);
  const disorder = upTo.findIndex(
    (bound, i) =>
      (i > 0 && bound <= (upTo[i - 1] as number)) || (bound === Number.POSITIVE_INFINITY) !== (i === upTo.length - 1),
  );
  if (disorder >= 0) {
    return [
      {
        ...contradiction(
          `${at}/byPressureAltitude/${disorder}`,
          'The bands do not rise up to one without an upper bound.',
        ),
        allowed: 'upTo rising from band to band, none in the last',
      },
    ];
  }
  return inSi.change.flatMap(({ change }, i) =>
    checkSize(sheet, inSi, change, `${at}/byPressureAltitude/${i}/changePercent`),
  );
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
function wayOf(phase: ManualSheet['phase'], about: ProportionalNote['about']): 1 | -1 {
  const lengthens = about === 'tailwind' || about === 'aboveStandard' || about === 'aboveMass';
  const isSlope = about === 'uphill' || about === 'downhill';
  if (isSlope) return (about === 'uphill') === (phase === 'takeoff') ? 1 : -1;
  return lengthens === (phase !== 'climb') ? 1 : -1;
}

function contradiction(pointer: string, message: string): Fault {
  return { pointer, code: 'contradiction', message };
}
