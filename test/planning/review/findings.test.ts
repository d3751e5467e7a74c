import { describe, expect, it } from 'vitest';
import { completed } from '../../../src/numerics/work.ts';
import type { Configuration } from '../../../src/performance/aeroplane.ts';
import type { ManualNote, SpeedTable } from '../../../src/performance/flight-manual/flight-manual.ts';
import { findingTests } from '../../../src/planning/review/findings.ts';
import { review } from '../../../src/planning/review/review.ts';
import { references } from '../../../src/references.ts';
import { madeTables } from '../../published/made-tables.ts';
import { madeTable, manualTableOf, type Oddity, reviewedTrainer, soundTrainer } from '../../support/reviewed.ts';

const knot = 1852 / 3600;
const foot = 0.3048;
const degree = Math.PI / 180;
const found = (oddity: Oddity = {}) => completed(review(reviewedTrainer(oddity))).findings;
const raised = (code: string, oddity: Oddity) => found(oddity).filter((finding) => finding.code === code);

const own = soundTrainer.configurations.takeoff as Configuration;
const table = manualTableOf(madeTable('FIT-CLEAN-trainer'));
const fault = (id: string) => ({
  table: { cells: manualTableOf(madeTable(id)).cells, nodes: manualTableOf(madeTable(id)).nodes },
});
const stall = (cas: number): Oddity => ({
  configuration: { maximumLift: { kind: 'stall-speed', cas, mass: 1043, definition: 'one-g' } },
});
const speed = (name: string, ratio: number): Oddity => ({
  configuration: { speeds: { ...own.speeds, [name]: { kind: 'stall-ratio', ratio } } },
});
const masses = (changes: object): Oddity => ({ aeroplane: { masses: { ...soundTrainer.masses, ...changes } } });
const wing = (changes: object): Oddity => ({ aeroplane: { wing: { ...soundTrainer.wing, ...changes } } });
const second = (configuration: Partial<Configuration>, aeroplane: object = {}): Oddity => ({
  aeroplane: { configurations: { takeoff: own, second: { ...own, ...configuration } }, ...aeroplane },
});
const landing = (ratio: number): Oddity =>
  second({ for: ['landing'], flap: 0, speeds: { landingReference: { kind: 'stall-ratio', ratio } } });
const controlled = (vmc: number): Oddity => ({ aeroplane: { engineOut: { vmc: vmc * knot } } });
const certified = (basis: 'cs-23-amendment-4' | 'cs-25' | 'none', screenHeight: number): Oddity => ({
  aeroplane: { certification: { basis, screenHeight: screenHeight * foot } },
});
const cells = (factorOfRoll: number, factorOfWhole: number): Oddity => ({
  table: { cells: table.cells.map(([roll = 0, whole = 0]) => [roll * factorOfRoll, whole * factorOfWhole]) },
});
const warmer = (kelvin: (celsius: number) => number): Oddity => ({
  table: {
    nodes: table.nodes.map(([mass = 0, altitude = 0, temperature = 0]) => [
      mass,
      altitude,
      kelvin(temperature - 273.15),
    ]),
  },
});
const atMass = (mass: number): Oddity => ({
  table: {
    axes: ['pressureAltitude', 'temperature'],
    conditions: { surface: { kind: 'paved', state: 'dry' }, mass },
    nodes: table.nodes.map(([, altitude = 0, temperature = 0]) => [altitude, temperature]),
  },
});
const headwind = (limit?: number): Oddity => {
  const note: ManualNote = {
    about: 'headwind',
    change: -0.1,
    per: 9 * knot,
    wholeSteps: false,
    windAllowance: false,
    multiplies: 'both',
    ...(limit === undefined ? {} : { limit: limit * knot }),
  };
  return { table: { notes: [note] } };
};
const speedTable = (liftOff: number): Oddity => {
  const printed: SpeedTable = {
    id: 'speeds',
    page: '5-9',
    configurations: ['takeoff'],
    airspeed: 'cas',
    speeds: ['liftOff'],
    masses: [1043],
    cells: [[liftOff * knot]],
  };
  return { speedTable: printed };
};
const rowsUpTo = (altitude: number): Oddity => {
  const kept = table.nodes.flatMap(([, metres = 0], row) => (metres <= altitude * foot + 1 ? [row] : []));
  return {
    table: {
      nodes: kept.map((row) => table.nodes[row] as number[]),
      cells: kept.map((row) => table.cells[row] as number[]),
    },
  };
};

/** For each code a case that raises it and its neighbour that does not. */
const pairs: Readonly<Record<string, readonly [raised: Oddity, silent: Oddity]>> = {
  // 2 m g / (rho0 S V^2): 1.60 at 49.3 kt, 2.39 at 40.3 kt
  'maximum-lift-unusual': [stall(40.3 * knot), stall(49.3 * knot)],
  // 49.3 kt are 56.7 mph
  'stall-speed-in-other-unit': [stall(56.7 * knot), {}],
  'flap-without-lift': [
    second({ flap: 20 * degree, maximumLift: { kind: 'coefficient', coefficient: 1.5 } }),
    second({ flap: 20 * degree, maximumLift: { kind: 'coefficient', coefficient: 1.7 } }),
  ],
  'empty-mass-unusual': [masses({ empty: 400 }), masses({ empty: 430 })],
  'landing-mass-unusual': [masses({ maximumLanding: 880 }), masses({ maximumLanding: 890 })],
  'wing-loading-unusual': [wing({ area: 7 }), wing({ area: 8 })],
  'power-unusual': [
    { aeroplane: { propulsion: { ...soundTrainer.propulsion, staticThrust: 1800 } as typeof soundTrainer.propulsion } },
    { aeroplane: { propulsion: { ...soundTrainer.propulsion, staticThrust: 1900 } as typeof soundTrainer.propulsion } },
  ],
  'drag-unusual': [
    { aeroplane: { drag: { zeroLiftCoefficient: 0.07, oswaldFactor: 0.72 } } },
    { aeroplane: { drag: { zeroLiftCoefficient: 0.055, oswaldFactor: 0.62 } } },
  ],
  'aspect-ratio-unusual': [wing({ span: 8 }), wing({ span: 9 })],
  'speed-unusual': [speed('liftOff', 1.03), speed('liftOff', 1.08)],
  'screen-speed-low': [speed('screen', 1.18), speed('screen', 1.2)],
  'landing-reference-low': [landing(1.27), landing(1.3)],
  // 1.15 x 49.3 kt = 56.7 kt is 1.05 x 54 kt
  'control-speed-above': [controlled(56), controlled(53)],
  'certification-unusual': [certified('cs-25', 50), certified('cs-23-amendment-4', 50)],
  'screen-height-unusual': [certified('cs-23-amendment-4', 35), certified('cs-23-amendment-4', 50)],
  'calibration-not-given': [{ aeroplane: { airspeedCalibration: undefined as never } }, {}],
  'crosswind-not-stated': [{ aeroplane: { limitations: {} } }, { aeroplane: { limitations: { crosswind: 12 } } }],
  'columns-swapped': [fault('FAULT-COLUMNS-SWAPPED'), {}],
  'column-in-other-unit': [{ ...fault('FAULT-TOTAL-IN-FEET'), units: {} }, {}],
  'table-temperature-unusual': [warmer((celsius) => celsius * 1.8 + 32 + 273.15), {}],
  'table-mass-above-maximum': [atMass(1100), atMass(1043)],
  'roll-share-unusual': [cells(0.5, 1), cells(0.8, 1)],
  'cell-apart': [fault('FAULT-TYPO-ROLL'), {}],
  'fit-unusual': [cells(1.3, 1.3), {}],
  'table-and-physics-differ': [cells(1.6, 1.6), cells(1.1, 1.1)],
  'rows-not-compared': [
    {
      table: {
        nodes: Array.from({ length: 11 }, () => table.nodes).flat(),
        cells: Array.from({ length: 11 }, () => table.cells).flat(),
      },
    },
    {},
  ],
  'speed-table-differs': [speedTable(60), speedTable(57)],
  'configuration-without-table': [second({}), {}],
  'table-masses-not-reached': [atMass(1030), atMass(1040)],
  'table-conditions-not-reached': [rowsUpTo(0), rowsUpTo(3000)],
  'note-without-limit': [headwind(), headwind(20)],
  'table-without-worked-example': [{ table: { workedExamples: [] } }, {}],
};

describe('the findings of a review', () => {
  it('are each tried by a pair of cases, and named once', () => {
    const codes = findingTests.map(({ code }) => code);
    expect(new Set(codes).size).toBe(codes.length);
    expect([...codes].sort()).toEqual(Object.keys(pairs).sort());
    for (const { source } of findingTests) if (source !== undefined) expect(references).toHaveProperty(source);
  });

  it(`are none for an aeroplane with its own table [${madeTables.source}]`, () => {
    expect(found()).toEqual([]);
  });

  for (const [code, [odd, plain]] of Object.entries(pairs)) {
    it(`raise ${code}, and not for its neighbour`, () => {
      const [first] = raised(code, odd);
      expect(first).toBeDefined();
      expect(first?.at).toMatch(/^\//);
      expect(first?.message).toMatch(/^[A-Za-z0-9/-].*\.$/);
      expect(first?.message).not.toMatch(/NaN|undefined|Infinity/);
      expect(raised(code, plain)).toEqual([]);
    });
  }

  it('point at the cell that was typed wrongly', () => {
    const [typo] = raised('cell-apart', fault('FAULT-TYPO-ROLL'));
    // columns mass, pressureAltitude, temperature, groundRoll: row 5, column 3
    expect(typo?.at).toBe('/flightManual/tables/0/rows/5/3');
    expect(typo?.hint).toMatch(/two digits exchanged/);
  });

  it('name the unit that was meant', () => {
    const [unit] = raised('column-in-other-unit', fault('FAULT-TOTAL-IN-FEET'));
    expect(unit?.at).toBe('/flightManual/tables/0/columns/4/unit');
    expect(unit?.hint).toMatch(/^Perhaps ft/);
  });

  it('name the unit in which a stall speed would be usual: 49.3 kt are 91.3 km/h', () => {
    const [odd] = raised('maximum-lift-unusual', stall(91.3 * knot));
    expect(odd?.hint).toMatch(/^In km\/h it would be usual\./);
  });

  it('say that an aerodrome on file lies above a table', () => {
    const high = { aerodromes: [{ id: 'high-meadow', elevation: 2400 }] };
    const [above] = raised('table-conditions-not-reached', high);
    expect(above?.message).toMatch(/high-meadow lies at 7 874 ft/);
  });

  it('name degrees Fahrenheit under a heading of degrees Celsius', () => {
    const [odd] = raised(
      'table-temperature-unusual',
      warmer((celsius) => celsius * 1.8 + 32 + 273.15),
    );
    expect(odd?.hint).toBe('In degF they would be usual.');
  });
});
