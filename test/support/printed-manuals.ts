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

/** A manual with every kind of sheet that a definition of the sample tourer can have, in order; its graph is straight lines. */
export function fullManual() {
  const example = (given: object, reads: object, unit: 'ft' | 'percent') => ({
    given,
    reads,
    within: { value: 1, unit },
  });
  return {
    document: 'Flight manual of the Sample Tourer (invented)',
    revision: 'B',
    tables: [
      handbookTakeoff(),
      knowledgeTestLanding(),
      {
        id: 'climb',
        for: 'climb',
        configurations: ['takeoff-10'],
        page: '5-9',
        conditions: { surface: pavedDry },
        columns: [
          { name: 'flap', unit: 'deg' },
          { name: 'mass', unit: 'kg' },
          { name: 'pressureAltitude', unit: 'ft' },
          { name: 'climbGradient', unit: 'percent' },
        ],
        rows: [
          [10, 900, 0, 11],
          [10, 900, 4000, 8],
          [10, 1030, 0, 9],
          [10, 1030, 4000, 6.5],
        ],
        notes: [
          {
            about: 'aboveStandard',
            byPressureAltitude: [{ upTo: { value: 2000, unit: 'ft' }, changePercent: -5 }, { changePercent: -8 }],
            per: { value: 10, unit: 'deltaC' },
            multiplies: 'climb',
          },
        ],
        workedExamples: [
          example(
            {
              flap: { value: 10, unit: 'deg' },
              mass: { value: 965, unit: 'kg' },
              pressureAltitude: { value: 0, unit: 'ft' },
            },
            { climbGradient: { value: 10, unit: 'percent' } },
            'percent',
          ),
        ],
      },
    ],
    speedTables: [
      {
        id: 'takeoff-speeds',
        configurations: ['takeoff-10'],
        page: '4-3',
        airspeed: 'ias',
        columns: [
          { name: 'mass', unit: 'kg' },
          { name: 'liftOff', unit: 'kt' },
          { name: 'screen', unit: 'kt' },
        ],
        rows: [
          [900, 50, 56],
          [1030, 54, 60],
        ],
      },
    ],
    graphs: [
      {
        id: 'landing-graph',
        for: 'landing',
        configurations: ['landing-full'],
        page: '5-12',
        conditions: { surface: pavedDry },
        output: { name: 'landingDistance', unit: 'ft' },
        panels: [
          {
            kind: 'curves',
            across: { name: 'temperature', unit: 'degC' },
            parameter: { name: 'pressureAltitude', unit: 'ft' },
            curves: [
              {
                parameter: 0,
                points: [
                  [-10, 1000],
                  [40, 1200],
                ],
              },
              {
                parameter: 6000,
                points: [
                  [-10, 1300],
                  [40, 1500],
                ],
              },
            ],
          },
          {
            kind: 'guide',
            across: { name: 'mass', unit: 'kg' },
            reference: 1030,
            curves: [
              {
                parameter: 900,
                points: [
                  [800, 700],
                  [1030, 900],
                ],
              },
              {
                parameter: 1600,
                points: [
                  [800, 1300],
                  [1030, 1600],
                ],
              },
            ],
          },
        ],
        workedExamples: [
          example(
            {
              temperature: { value: 15, unit: 'degC' },
              pressureAltitude: { value: 3000, unit: 'ft' },
              mass: { value: 1030, unit: 'kg' },
            },
            { landingDistance: { value: 1250, unit: 'ft' } },
            'ft',
          ),
        ],
      },
    ],
  };
}
