import type {
  FlightManual,
  ManualGraph,
  ManualNote,
  ManualTable,
  ProportionalNote,
} from '../../src/performance/flight-manual/flight-manual.ts';
import type { ManualAsked } from '../../src/performance/flight-manual/manual-figures.ts';

const pavedDry = { kind: 'paved', state: 'dry' } as const;

/** A table of a takeoff, invented: 1000 kg, dry and paved, roll and distance by pressure altitude [m] and temperature [K]. */
export function takeoffTable(members: Partial<ManualTable> = {}): ManualTable {
  return {
    id: 'takeoff',
    page: '5-1',
    phase: 'takeoff',
    configurations: ['flap-10'],
    conditions: { surface: pavedDry, mass: 1000 },
    contains: { factor: 1, windAllowance: false },
    notes: [],
    axes: ['pressureAltitude', 'temperature'],
    outputs: ['groundRoll', 'takeoffDistance'],
    nodes: [
      [0, 273],
      [0, 293],
      [1000, 273],
      [1000, 293],
    ],
    cells: [
      [200, 400],
      [220, 440],
      [240, 500],
      [280, 560],
    ],
    workedExamples: [],
    ...members,
  };
}

export function manualWith(tables: ManualTable[], graphs: ManualGraph[] = []): FlightManual {
  return { document: 'Invented', revision: '1', tables, speedTables: [], graphs };
}

/** A takeoff at sea level and 273 K in still air on a level, dry paved runway at 1000 kg, unless it says otherwise. */
export function takeoffAsked(members: Partial<ManualAsked> = {}): ManualAsked {
  const headwind = members.headwind ?? 0;
  return {
    phase: 'takeoff',
    configuration: 'flap-10',
    flap: 0.1745,
    mass: 1000,
    pressureAltitude: 0,
    temperature: 273,
    standardTemperature: 288.15 - 0.0065 * (members.pressureAltitude ?? 0),
    headwind,
    creditedHeadwind: headwind,
    slope: 0,
    surface: pavedDry,
    edges: 'use',
    ...members,
  };
}

/** A proportional note on both distances. */
export function stepNote(
  about: ProportionalNote['about'],
  change: ProportionalNote['change'],
  per: number,
  members: Partial<ProportionalNote> = {},
): ManualNote {
  return { about, change, per, multiplies: 'both', wholeSteps: false, windAllowance: false, ...members };
}

/**
 * A graph whose curves are straight, so that it can be worked by hand: 200 m, 0.1 m more a metre of pressure altitude and 2 m a
 * kelvin above 273 K; then by mass over 1000 kg; then 1 % less for each m/s of headwind.
 */
export function takeoffGraph(members: Partial<ManualGraph> = {}): ManualGraph {
  const guide = (at: number, factor: number) =>
    [200, 400, 800].map((height) => ({
      parameter: height,
      points: [
        [0, height],
        [at, height * factor],
      ] as const,
    }));
  const { id: _, axes: __, outputs: ___, nodes: ____, cells: _____, ...sheet } = takeoffTable();
  return {
    ...sheet,
    id: 'graph',
    conditions: { surface: pavedDry },
    outputs: ['takeoffDistance'],
    panels: [
      {
        kind: 'curves',
        across: 'temperature',
        parameter: 'pressureAltitude',
        curves: [0, 1000, 2000].map((altitude) => ({
          parameter: altitude,
          points: [273, 283, 293].map((kelvin) => [kelvin, 200 + 0.1 * altitude + 2 * (kelvin - 273)] as const),
        })),
      },
      {
        kind: 'guide',
        across: 'mass',
        parameter: 'previous',
        reference: 1000,
        curves: [200, 400, 800].map((height) => ({
          parameter: height,
          points: [
            [800, 0.8 * height],
            [1000, height],
          ] as const,
        })),
      },
      { kind: 'guide', across: 'headwind', parameter: 'previous', reference: 0, curves: guide(10, 0.9) },
    ],
    ...members,
  };
}
