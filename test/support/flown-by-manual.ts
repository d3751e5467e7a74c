import type { FlightManual, ManualNote, ManualTable } from '../../src/performance/flight-manual/flight-manual.ts';
import { type Changes, changed, plainQuestion } from './takeoff-question.ts';

const ft = 0.3048;
const kt = 1852 / 3600;

/** An invented table: pressure altitude [ft], temperature [°C], ground roll [ft], distance to the screen [ft] at 1 010 kg. */
const printed = [
  [0, 0, 800, 1450],
  [0, 20, 920, 1650],
  [0, 40, 1050, 1880],
  [2000, 0, 960, 1760],
  [2000, 20, 1110, 2010],
  [2000, 40, 1270, 2310],
  [4000, 0, 1160, 2160],
  [4000, 20, 1350, 2500],
  [4000, 40, 1550, 2920],
] as const;

export const headwindNote: ManualNote = {
  about: 'headwind',
  change: -0.1,
  per: 9 * kt,
  wholeSteps: false,
  windAllowance: true,
  multiplies: 'both',
};
export const tailwindNote: ManualNote = {
  about: 'tailwind',
  change: 0.1,
  per: 2 * kt,
  limit: 10 * kt,
  wholeSteps: false,
  windAllowance: true,
  multiplies: 'both',
};
export const grassNote: ManualNote = {
  about: 'surface',
  surface: { kind: 'grass', state: 'dry' },
  change: 0.15,
  multiplies: 'groundRollAddedToBoth',
};

export const takeoffTable: ManualTable = {
  id: 'takeoff-table',
  page: '5-11',
  phase: 'takeoff',
  configurations: ['takeoff'],
  conditions: { surface: { kind: 'paved', state: 'dry' }, mass: 1010 },
  contains: { factor: 1, windAllowance: false },
  notes: [],
  axes: ['pressureAltitude', 'temperature'],
  outputs: ['groundRoll', 'takeoffDistance'],
  nodes: printed.map(([altitude, celsius]) => [altitude * ft, celsius + 273.15]),
  cells: printed.map(([, , roll, total]) => [roll * ft, total * ft]),
  workedExamples: [],
};

export const manualOf = (takeoff: Partial<ManualTable> = {}, landing: Partial<ManualTable> = {}): FlightManual => ({
  document: 'Stated Trainer Flight Manual (invented)',
  revision: '2',
  tables: [
    { ...takeoffTable, ...takeoff },
    { ...landingTable, ...landing },
  ],
  speedTables: [],
  graphs: [],
});

/** The same manual's landing table: a node at 2 000 ft and 20 °C of 620 ft roll and 1 390 ft from the screen. */
export const landingTable: ManualTable = {
  ...takeoffTable,
  id: 'landing-table',
  page: '5-20',
  phase: 'landing',
  configurations: ['landing'],
  outputs: ['groundRoll', 'landingDistance'],
  cells: [560, 590, 620, 590, 620, 650, 620, 650, 680].map((roll) => [roll * ft, (roll + 770) * ft]),
};

/** Changes that a takeoff and a landing can have alike. */
type OfAnyPhase = Pick<Changes, 'aeroplane' | 'runway' | 'weather'>;

/** 2 000 ft, dry pavement, calm; at 20 °C a node of both tables. */
export const atNode = (celsius = 20): OfAnyPhase => ({
  runway: {
    elevation: 2000 * ft,
    surface: { kind: 'paved', state: 'dry' },
    declared: { tora: 2000, toda: 2000, asda: 2000, lda: 2000 },
  },
  weather: { temperature: celsius + 273.15, dewPoint: 250, pressure: { kind: 'pressureAltitude', value: 2000 * ft } },
});

/** An aeroplane with that manual at that node. */
export const withManual = (manual = manualOf(), celsius = 20): OfAnyPhase => ({
  ...atNode(celsius),
  aeroplane: { flightManual: manual },
});

/** The takeoff at that node by a manual with these notes, changed further. */
export function byManual(notes: readonly ManualNote[] = [], ...changes: readonly Changes[]) {
  const base = changed(plainQuestion, withManual(manualOf({ notes })));
  return changes.reduce((question, change) => changed(question, change), base);
}

/** A fit to masses up to one [kg], wide in all else, that leaves every figure as stated. */
export const fitUpTo = (mass: number) =>
  ({
    fittedTo: '0'.repeat(64),
    modelVersion: '1.0.0',
    values: {},
    standardDeviations: {},
    correlation: [],
    rms: 0.01,
    greatest: 0.02,
    hull: { mass: [800, mass], pressureAltitude: [-500, 3000], temperature: [240, 320] },
  }) as const;

/** An aeroplane with that fit of both phases. */
export const fittedUpTo = (mass: number): OfAnyPhase => ({
  aeroplane: { fit: { takeoff: { takeoff: fitUpTo(mass) }, landing: { landing: fitUpTo(mass) } } },
});

/** That manual with a speed table from 900 kg to a mass, for a configuration, of speeds near those as stated. */
export const withSpeedsTo = (mass: number, configuration: 'takeoff' | 'landing'): FlightManual => ({
  ...manualOf(),
  speedTables: [
    {
      id: 'speed-table',
      page: '5-9',
      configurations: [configuration],
      airspeed: 'cas',
      speeds: configuration === 'takeoff' ? ['liftOff', 'screen'] : ['landingReference'],
      masses: [900, mass],
      cells:
        configuration === 'takeoff'
          ? [
              [27, 28.5],
              [28.5, 30],
            ]
          : [[30], [32]],
    },
  ],
});

/** That manual with its ground rolls so many times as long, and its whole distances as they are. */
export const withRollTimes = (times: number): FlightManual => {
  const shorter = (table: ManualTable) => ({
    cells: table.cells.map(([roll, whole]) => [(roll as number) * times, whole as number]),
  });
  return manualOf(shorter(takeoffTable), shorter(landingTable));
};
