import type { Aeroplane, Configuration } from '../../src/performance/aeroplane.ts';
import type { FlightManual, ManualTable, SpeedTable } from '../../src/performance/flight-manual/flight-manual.ts';
import type { Reviewed } from '../../src/planning/review/review-context.ts';
import { type MadeTable, madeTables } from '../published/made-tables.ts';

const foot = 0.3048;
const knot = 1852 / 3600;
const degree = Math.PI / 180;

export function madeTable(id: string): MadeTable {
  const found = madeTables.tables.find((table) => table.id === id);
  if (found === undefined) throw new Error(`no made table ${id}`);
  return found;
}

const trainer = madeTable('FIT-CLEAN-trainer');

/** A made table as a definition would have it: mass, pressure altitude and temperature entered, both distances given. */
export function manualTableOf({ rows, phase }: Pick<MadeTable, 'rows' | 'phase'>): ManualTable {
  return {
    id: 'short-field',
    page: '5-11',
    phase,
    configurations: [phase],
    conditions: { surface: { kind: 'paved', state: 'dry' } },
    contains: { factor: 1, windAllowance: false },
    notes: [],
    axes: ['mass', 'pressureAltitude', 'temperature'],
    outputs: ['groundRoll', phase === 'takeoff' ? 'takeoffDistance' : 'landingDistance'],
    nodes: rows.map(([mass, altitude, temperature]) => [mass, altitude * foot, temperature + 273.15]),
    cells: rows.map(([, , , roll, whole]) => [roll, whole]),
    workedExamples: [
      { given: { mass: 1043, pressureAltitude: 0, temperature: 273.15 }, reads: { groundRoll: 241 }, within: 1 },
    ],
  };
}

const { aeroplane: a } = trainer;
const span = Math.sqrt(a.aspectRatio * a.area);
const speeds: NonNullable<Configuration['speeds']> = {
  rotation: { kind: 'stall-ratio', ratio: 1.15 },
  liftOff: { kind: 'stall-ratio', ratio: 1.15 },
  screen: { kind: 'stall-ratio', ratio: 1.2 },
};

/** The trainer of the made tables, nothing odd about it, with its own takeoff table. */
export const soundTrainer: Aeroplane = {
  id: 'sound-trainer',
  revision: '1',
  name: 'Sound Trainer (invented)',
  category: 'single-piston',
  engines: 1,
  certification: { basis: 'cs-23-amendment-4', screenHeight: 50 * foot },
  masses: { empty: 640, maximumTakeoff: a.mass, maximumLanding: a.mass },
  wing: { area: a.area, span, heightAboveGround: a.heightOverSpan * span },
  drag: { zeroLiftCoefficient: a.groundDrag, oswaldFactor: a.oswaldFactor },
  configurations: {
    takeoff: {
      for: ['takeoff'],
      flap: 10 * degree,
      maximumLift: { kind: 'stall-speed', cas: 49.3 * knot, mass: a.mass, definition: 'one-g' },
      groundDragIncrementCoefficient: 0,
      airDragIncrementCoefficient: 0,
      groundLiftCoefficient: a.groundLift,
      speeds,
      rotationTime: 0,
      pullUpLoadFactor: 1.15,
    },
  },
  propulsion: {
    kind: 'fixed-pitch',
    staticThrust: a.power?.kind === 'fixed-pitch' ? a.power.staticThrust : 0,
    propellerDiameter: 1.905,
    polarSlopeCoefficient: 0.0564,
    thrustFactor: 0.93,
  },
  limitations: { demonstratedCrosswind: 15 * knot },
  airspeedCalibration: { indicated: [20, 60], calibrated: [22, 60] },
};

/** What a case changes of the sound trainer and its table. */
export interface Oddity {
  readonly aeroplane?: Partial<Aeroplane>;
  readonly configuration?: Partial<Configuration>;
  readonly table?: Partial<ManualTable>;
  readonly units?: Readonly<Record<string, string>>;
  readonly speedTable?: SpeedTable;
  readonly aerodromes?: Reviewed['aerodromes'];
  readonly stallSpeedUnit?: string;
  readonly without?: 'table';
}

/** The sound trainer as its review asks for it, changed. */
export function reviewedTrainer({
  aeroplane = {},
  configuration = {},
  table: changes = {},
  units = {},
  speedTable,
  aerodromes = [],
  stallSpeedUnit = 'kt',
  without,
}: Oddity = {}): Reviewed {
  const table = { ...manualTableOf(trainer), ...changes };
  const declared: Readonly<Record<string, string>> = {
    mass: 'kg',
    pressureAltitude: 'ft',
    temperature: 'degC',
    ...units,
  };
  const flightManual: FlightManual = {
    document: 'Sound Trainer flight manual (invented)',
    revision: '1',
    tables: without === 'table' ? [] : [table],
    speedTables: speedTable === undefined ? [] : [speedTable],
    graphs: [],
  };
  return {
    aeroplane: {
      ...soundTrainer,
      configurations: { takeoff: { ...(soundTrainer.configurations.takeoff as Configuration), ...configuration } },
      flightManual,
      ...aeroplane,
    },
    tables:
      without === 'table'
        ? []
        : [
            {
              table,
              at: '/flightManual/tables/0',
              columns: [...table.axes, ...table.outputs].map((name) => ({ name, unit: declared[name] ?? 'm' })),
              massUnit: table.conditions.mass === undefined ? undefined : 'kg',
            },
          ],
    speedTables: speedTable === undefined ? [] : [{ table: speedTable, at: '/flightManual/speedTables/0' }],
    graphs: [],
    stallSpeedUnits: { takeoff: stallSpeedUnit },
    aerodromes,
    units: 'm-kt-kg',
  };
}
