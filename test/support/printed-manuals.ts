import type { FlightManualOnWire } from '../../src/contract/flight-manual/flight-manual.ts';
import type { ManualNoteOnWire } from '../../src/contract/flight-manual/manual-note.ts';
import type { ManualTableOnWire } from '../../src/contract/flight-manual/manual-table.ts';
import type { ManualAsked } from '../../src/performance/flight-manual/manual-figures.ts';
import { standardTemperature } from '../../src/physics/atmosphere.ts';
import {
  handbookTakeoffTable,
  knowledgeTestLandingTable,
  questionBankLandingTable,
} from '../published/printed-manual-tables.ts';

const kt = 1852 / 3600;
const pavedDry = { kind: 'paved', state: 'dry' } as const;
const dryGrass = { kind: 'grass', state: 'dry' } as const;

function windNotes([headwind, per]: readonly [number, number], tailwind?: readonly [number, number, number]) {
  const notes: ManualNoteOnWire[] = [
    { about: 'headwind', changePercent: headwind, per: { value: per, unit: 'kt' }, multiplies: 'both' },
  ];
  if (tailwind === undefined) return notes;
  const [changePercent, step, limit] = tailwind;
  notes.push({
    about: 'tailwind',
    changePercent,
    per: { value: step, unit: 'kt' },
    limit: { value: limit, unit: 'kt' },
    multiplies: 'both',
  });
  return notes;
}

/** The handbook's takeoff table as somebody types it in. */
export function handbookTakeoff(): ManualTableOnWire {
  const { mass_lb, rows, notes } = handbookTakeoffTable;
  return {
    id: 'short-field-takeoff',
    for: 'takeoff',
    configurations: ['takeoff-10'],
    page: 'Fig. 10-20',
    conditions: { surface: pavedDry, mass: { value: mass_lb, unit: 'lb' }, technique: 'short field' },
    columns: [
      { name: 'pressureAltitude', unit: 'ft' },
      { name: 'temperature', unit: 'degC' },
      { name: 'groundRoll', unit: 'ft' },
      { name: 'takeoffDistance', unit: 'ft' },
    ],
    rows: rows.map((row) => [...row]),
    notes: [
      ...windNotes(notes.headwind, notes.tailwind),
      { about: 'surface', surface: dryGrass, changePercent: notes.dryGrass, multiplies: 'groundRollAddedToBoth' },
    ],
    workedExamples: [
      {
        given: { pressureAltitude: { value: 2500, unit: 'ft' }, temperature: { value: 20, unit: 'degC' } },
        reads: { groundRoll: { value: 1173, unit: 'ft' } },
        within: { value: 1, unit: 'ft' },
      },
    ],
  };
}

export function knowledgeTestLanding(): ManualTableOnWire {
  const { mass_lb, rows, notes } = knowledgeTestLandingTable;
  const [changePercent, per] = notes.aboveStandard;
  return {
    id: 'knowledge-test-landing',
    for: 'landing',
    configurations: ['landing-full'],
    page: 'Fig. 38',
    conditions: { surface: pavedDry, mass: { value: mass_lb, unit: 'lb' } },
    columns: [
      { name: 'pressureAltitude', unit: 'ft' },
      { name: 'standardTemperature', unit: 'degF' },
      { name: 'groundRoll', unit: 'ft' },
      { name: 'landingDistance', unit: 'ft' },
    ],
    rows: rows.map((row) => [...row]),
    notes: [
      ...windNotes(notes.headwind),
      { about: 'aboveStandard', changePercent, per: { value: per, unit: 'deltaF' }, multiplies: 'both' },
    ],
  };
}

export function questionBankLanding(): ManualTableOnWire {
  const { mass_lb, rows, notes } = questionBankLandingTable;
  return {
    id: 'question-bank-landing',
    for: 'landing',
    configurations: ['landing-full'],
    page: 'FPP-16e',
    conditions: { surface: pavedDry, mass: { value: mass_lb, unit: 'lb' } },
    columns: [
      { name: 'pressureAltitude', unit: 'ft' },
      { name: 'temperature', unit: 'degC' },
      { name: 'groundRoll', unit: 'ft' },
      { name: 'landingDistance', unit: 'ft' },
    ],
    rows: rows.map((row) => [...row]),
    notes: [
      ...windNotes(notes.headwind, notes.tailwind),
      { about: 'surface', surface: dryGrass, changePercent: notes.dryGrass, multiplies: 'groundRollAddedToBoth' },
    ],
  };
}

/** A manual of these tables. */
export function manualOf(...tables: ManualTableOnWire[]): FlightManualOnWire {
  return { document: 'Printed tables', revision: '1', tables };
}

/** What a manual is asked: calm, level, dry and paved, edges in use, unless it says otherwise. */
export function askedOf(given: {
  phase: 'takeoff' | 'landing';
  mass: number;
  pressureAltitude_ft: number;
  temperature: number;
  headwind_kt?: number;
  rest?: Partial<ManualAsked>;
}): ManualAsked {
  const pressureAltitude = given.pressureAltitude_ft * 0.3048;
  const wind = (given.headwind_kt ?? 0) * kt;
  return {
    phase: given.phase,
    configuration: given.phase === 'takeoff' ? 'takeoff-10' : 'landing-full',
    flap: ((given.phase === 'takeoff' ? 10 : 30) * Math.PI) / 180,
    mass: given.mass,
    pressureAltitude,
    temperature: given.temperature,
    standardTemperature: standardTemperature(pressureAltitude),
    headwind: wind,
    creditedHeadwind: wind,
    slope: 0,
    surface: pavedDry,
    edges: 'use',
    ...given.rest,
  };
}
