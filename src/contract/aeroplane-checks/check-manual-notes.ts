import type { ManualAxis, ManualNote } from '../../performance/flight-manual/flight-manual.ts';
import type { Fault } from '../../planning/fault.ts';
import type { ManualNoteOnWire } from '../flight-manual/manual-note.ts';
import { checkGround } from '../question-checks/check-surface.ts';
import { checkNoteChange, lengthens, type StepsOnWire, shortens } from './check-note-change.ts';
import type { EnteredSheet } from './entered-sheet.ts';

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
      ...checkOther(entered, note, `${here}/multiplies`),
      ...(note.about === 'surface'
        ? checkGround(note.surface, `${here}/surface`)
        : [...checkPlace(entered, note, `${here}/about`), ...checkNoteChange(sheet, note, here)]),
    ];
  });
}

function isSame(one: ManualNoteOnWire, other: ManualNoteOnWire): boolean {
  return isOfSame(one.multiplies, other.multiplies) && isAboutSame(one, other);
}

/** Roll and whole distance may have a note each; what is of both, or adds to both, leaves nothing for another note. */
function isOfSame(one: ManualNoteOnWire['multiplies'], other: ManualNoteOnWire['multiplies']): boolean {
  const ofBoth = ['both', 'groundRollAddedToBoth'];
  return one === other || ofBoth.includes(one) || ofBoth.includes(other);
}

function isAboutSame(one: ManualNoteOnWire, other: ManualNoteOnWire): boolean {
  if (one.about !== other.about) return false;
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

/**
 * What lengthens one of two distances lengthens the other: a note on one alone leaves the other too short. What shortens the whole
 * distance alone leaves it too short beside the ground roll.
 */
function checkOther({ sheet, outputs }: EnteredSheet, note: ManualNoteOnWire, pointer: string): Fault[] {
  const { multiplies } = note;
  if (multiplies !== 'groundRoll' && multiplies !== 'wholeDistance') return [];
  const isLonger = lengthens(sheet, note);
  if (!isLonger && (multiplies === 'groundRoll' || !shortens(note))) return [];
  const other = multiplies === 'groundRoll' ? 'wholeDistance' : 'groundRoll';
  const isGiven =
    outputs.includes('groundRoll') && (outputs.includes('takeoffDistance') || outputs.includes('landingDistance'));
  const isOnOther = (sheet.notes ?? []).some((one) => one.multiplies !== multiplies && isAboutSame(one, note));
  if (!isGiven || isOnOther) return [];
  return [
    {
      pointer,
      code: 'implausible',
      message: `${note.about} ${isLonger ? 'lengthens' : 'shortens'} the ${multiplies} alone: no note says what it makes of the ${other}.`,
      received: multiplies,
      allowed: `both, groundRollAddedToBoth, or a note on the ${other} too`,
    },
  ];
}

const places: Readonly<Partial<Record<ManualNote['about'], readonly ManualAxis[]>>> = {
  aboveStandard: ['temperature', 'temperatureDeviation'],
  belowStandard: ['temperature', 'temperatureDeviation'],
  aboveMass: ['mass'],
  belowMass: ['mass'],
};

/** Nothing is both an axis and a note. */
function checkPlace({ axes, winds }: EnteredSheet, { about }: StepsOnWire, pointer: string): Fault[] {
  const axis =
    about === 'headwind' || about === 'tailwind'
      ? winds.some((wind) => (about === 'headwind' ? wind > 0 : wind < 0)) && 'headwind'
      : places[about]?.find((one) => axes.includes(one));
  if (axis === undefined || axis === false) return [];
  return [
    { ...contradiction(pointer, `The sheet is entered with ${axis}, and a note is about ${about}.`), received: about },
  ];
}

function contradiction(pointer: string, message: string): Fault {
  return { pointer, code: 'contradiction', message };
}
