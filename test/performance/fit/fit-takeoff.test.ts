import { describe, expect, it } from 'vitest';
import { completed } from '../../../src/numerics/work.ts';
import { logRatios } from '../../../src/performance/fit/fit-distances.ts';
import type { FitFinding } from '../../../src/performance/fit/fit-finding.ts';
import { type FitPoint, type Observation, printedSd } from '../../../src/performance/fit/fit-point.ts';
import type { FittedResult } from '../../../src/performance/fit/fit-result.ts';
import { fitTakeoff, type TakeoffFitAsked } from '../../../src/performance/fit/fit-takeoff.ts';
import { takeoffModel } from '../../../src/performance/fit/takeoff-model.ts';
import type { TakeoffParameter } from '../../../src/performance/fit/takeoff-parameters.ts';
import { handbookTakeoffTable } from '../../published/handbook-takeoff-table.ts';
import { type MadeTable, madeTables } from '../../published/made-tables.ts';
import { dice } from '../../support/dice.ts';
import { pointsOf, takeoffAsked } from '../../support/fit-asked.ts';
import { odeTable, printed, type Row, type Truth } from '../../support/ode-table.ts';

const made = (id: string): MadeTable => {
  const found = madeTables.tables.find((table) => table.id === id);
  if (found === undefined) throw new Error(id);
  return found;
};
const trainer = made('FIT-CLEAN-trainer').aeroplane;
const tourer = made('FIT-NOISE12-1').aeroplane;

const resultOf = (asked: TakeoffFitAsked) => completed(fitTakeoff(asked));
const fitted = (asked: TakeoffFitAsked): FittedResult<TakeoffParameter> => {
  const result = resultOf(asked);
  if (result.outcome !== 'fitted') throw new Error(JSON.stringify(result.findings));
  return result;
};

/** The codes as the tables name them: with column and row where there are any. */
const named = (finding: FitFinding): string => {
  if (finding.code === 'unit-error')
    return `${finding.code}:${finding.column === 'wholeDistance' ? 'total' : finding.column}`;
  if (finding.code === 'outlier')
    return `${finding.code}:${finding.kind === 'wholeDistance' ? 'total' : finding.kind}@${finding.row}`;
  return finding.code;
};
const reported = (asked: TakeoffFitAsked) => resultOf(asked).findings.map(named);

const askedOf = (aeroplane: MadeTable['aeroplane'], rows: readonly Row[]): TakeoffFitAsked =>
  takeoffAsked({ id: '', phase: 'takeoff', aeroplane, rows, truth: [], mustReport: [] });

const grid = { masses: [860, 950, 1043], altitudes: [0, 2000, 4000, 6000], temperatures: [0, 15, 30] };
const truth: Truth = [0.94, 0.008, 0.18, 0.9];
const exact = odeTable(trainer, truth, grid);
const table = printed(exact, 0.01, 5, 7);

describe('fitTakeoff on tables of known parameters', () => {
  for (const { id, aeroplane, rows, truth, tolerance, mustReport } of madeTables.tables) {
    if (!id.startsWith('FIT')) continue;
    it(`recovers ${id} within ${tolerance?.join(', ')} and finds nothing wrong [${madeTables.source}]`, () => {
      // by the maximum lift behind the table: its stall speed is printed to 0.1 kt, which is worth 0.0004 of drag
      const result = fitted(askedOf(aeroplane, rows as readonly Row[]));
      result.parameters.forEach(({ value }, j) => {
        expect(Math.abs(value - (truth[j] as number))).toBeLessThan(tolerance?.[j] as number);
      });
      expect(result.findings).toEqual([]);
      expect(mustReport).toEqual([]);
      expect(result.accepted).toBe(true);
    });
  }

  for (const table of madeTables.tables.filter(({ id }) => id.startsWith('FAULT'))) {
    it(`names the fault of ${table.id}: ${table.mustReport} and nothing else [${madeTables.source}]`, () => {
      expect(reported(takeoffAsked(table))).toEqual(table.mustReport);
    });
  }

  it('recovers within 3 standard deviations at least 9 of 10 noisy tables made by an ODE library', () => {
    const { between } = dice(4);
    let within = 0;
    for (let seed = 0; seed < 10; seed++) {
      const [aeroplane, c, nT] = seed % 2 === 0 ? ([trainer, 0.18, 0.9] as const) : ([tourer, 0.12, 0.7] as const);
      const theirs: Truth = [
        between(0.84, 1.02),
        between(-0.008, 0.012),
        between(c - 0.02, c + 0.03),
        between(nT - 0.1, nT + 0.1),
      ];
      const rows = odeTable(aeroplane, theirs, {
        masses: [aeroplane.mass],
        altitudes: [0, 3000, 6000],
        temperatures: [0, 10, 20, 35],
      });
      const result = fitted(askedOf(aeroplane, printed(rows, 0.015, 5, 100 + seed)));
      if (result.parameters.every(({ value, sd }, j) => Math.abs(value - (theirs[j] as number)) <= 3 * sd)) within++;
      expect(result.findings, String(seed)).toEqual([]);
    }
    expect(within).toBeGreaterThanOrEqual(9);
  });

  for (const { id, aeroplane, rows, sdWithoutPriors } of madeTables.tables) {
    if (sdWithoutPriors === undefined) continue;
    it(`has the standard deviations of ${id}, ${sdWithoutPriors.join(', ')}, with the priors within 8 % [${madeTables.source}]`, () => {
      const { parameters, conditionNumber } = fitted(askedOf(aeroplane, rows as readonly Row[]));
      parameters.forEach(({ sd, prior }, j) => {
        const theirs = 1 / Math.hypot(1 / (sdWithoutPriors[j] as number), 1 / prior.sd);
        expect(Math.abs(sd / theirs - 1), String(j)).toBeLessThan(0.08);
      });
      expect(conditionNumber).toBeGreaterThan(3);
      expect(conditionNumber).toBeLessThan(5);
    });
  }

  it('states the scatter that refits to 80 noisy copies show, within a quarter', () => {
    const asked = askedOf(
      trainer,
      exact.filter(([mass]) => mass === 1043),
    );
    const { parameters } = fitted(asked);
    const { roll } = dice(11);
    const normal = () => Math.sqrt(-2 * Math.log(1 - roll())) * Math.cos(2 * Math.PI * roll());
    const estimates = Array.from({ length: 80 }, () => {
      const points = asked.points.map((point) => ({
        ...point,
        observations: point.observations.map((one) => ({
          ...one,
          distance: one.distance * Math.exp(0.015 * normal()),
        })),
      }));
      return fitted({ ...asked, points }).parameters.map(({ value }) => value);
    });
    parameters.forEach(({ sd }, j) => {
      const values = estimates.map((estimate) => estimate[j] as number);
      const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
      const seen = Math.sqrt(values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / (values.length - 1));
      expect(Math.abs(seen / sd - 1), String(j)).toBeLessThan(0.25);
    });
  });
});

describe('fitTakeoff on a published table', () => {
  const { wingArea, span, rows, source } = handbookTakeoffTable;
  const mass = handbookTakeoffTable.mass * 0.45359237;
  const cas = (knots: number) => ({ kind: 'cas', cas: (knots * 1852) / 3600, mass }) as const;
  const [liftOff, screen] = handbookTakeoffTable.speeds.map(cas) as [ReturnType<typeof cas>, ReturnType<typeof cas>];
  const base = askedOf(trainer, []);
  const points = pointsOf(
    rows.map(([altitude, celsius, roll, whole]) => [mass, altitude, celsius, roll * 0.3048, whole * 0.3048]),
    0.03,
  );
  const asked: TakeoffFitAsked = {
    ...base,
    // 160 hp and a fixed pitch: static thrust 2366 N, slope 0.0564, 1.905 m [memory]
    aeroplane: {
      ...base.aeroplane,
      masses: { maximumTakeoff: mass },
      wing: { area: wingArea, span, heightAboveGround: 0.2 * span },
    },
    configuration: { ...base.configuration, maximumLift: { kind: 'coefficient', coefficient: 1.6 } },
    figures: (mass) => ({ ...base.figures(mass), rotation: liftOff, liftOff, screen, groundLiftCoefficient: 0.5 }),
  };
  const isFittedTo = ({ pressureAltitude, temperature }: FitPoint) =>
    [0, 4000, 7000].some((feet) => Math.abs(pressureAltitude - feet * 0.3048) < 1) && temperature < 304;

  it(`predicts 30 of its cells from 12: median 1.5 %, 95 % within 4 %, both columns [${source}]`, () => {
    const result = fitted({ ...asked, points: points.filter(isFittedTo) });
    expect(result.residuals).toHaveLength(24);
    expect(result.findings).toEqual([]);
    const others = points.filter((point) => !isFittedTo(point));
    const model = takeoffModel(asked.aeroplane, asked.configuration.maximumLift, asked.figures, others);
    if (model === undefined) throw new Error('no model');
    const ratios = logRatios(
      model,
      Float64Array.from(result.parameters, ({ value }) => value),
    );
    for (const column of [0, 1]) {
      const errors = [...ratios]
        .filter((_, i) => i % 2 === column)
        .map(Math.abs)
        .sort((a, b) => a - b);
      expect(errors).toHaveLength(30);
      expect(errors[15]).toBeLessThan(0.015);
      expect(errors[Math.ceil(0.95 * 30) - 1]).toBeLessThan(0.04);
    }
  });

  it(`accepts the whole of it, and each altitude within 4 % of what the others say [${source}]`, () => {
    const result = fitted({ ...asked, points });
    expect(result.accepted).toBe(true);
    expect(result.findings).toEqual([]);
    expect(result.leaveOneAltitudeOut).toHaveLength(9);
    for (const { greatest } of result.leaveOneAltitudeOut) expect(greatest).toBeLessThan(0.04);
  });
});

describe('fitTakeoff on slips', () => {
  const foot = 0.3048;
  const map = (rows: readonly Row[], change: (row: Row) => Row) => askedOf(trainer, rows.map(change));

  it.each([
    [
      'unit-error:groundRoll',
      ([m, h, t, roll, whole]: Row): Row => [m, h, t, Math.round(roll / foot / 10) * 10, whole],
    ],
    ['unit-error:total', ([m, h, t, roll, whole]: Row): Row => [m, h, t, roll, Math.round(whole / foot / 10) * 10]],
    [
      'unit-error:distances',
      ([m, h, t, roll, whole]: Row): Row => [
        m,
        h,
        t,
        Math.round(roll / foot / 10) * 10,
        Math.round(whole / foot / 10) * 10,
      ],
    ],
    ['unit-error:mass', ([m, h, t, roll, whole]: Row): Row => [Math.round(m / 0.45359237), h, t, roll, whole]],
    ['unit-error:temperature', ([m, h, t, roll, whole]: Row): Row => [m, h, t * 1.8 + 32, roll, whole]],
    [
      'unit-error:pressureAltitude',
      ([m, h, t, roll, whole]: Row): Row => [m, Math.round(h * foot), t, roll, whole],
      'ft',
    ],
    ['unit-error:pressureAltitude', ([m, h, t, roll, whole]: Row): Row => [m, h / foot, t, roll, whole], 'm'],
    ['columns-swapped', ([m, h, t, roll, whole]: Row): Row => [m, h, t, whole, roll]],
  ] as const)('names %s', (code, slip, pressureAltitude?: string) => {
    for (const seed of [1, 2, 3]) {
      const asked = map(printed(exact, 0.012, 5, seed), slip);
      const declared = pressureAltitude === undefined ? asked.declared : { ...asked.declared, pressureAltitude };
      expect(reported({ ...asked, declared })[0]).toBe(code);
    }
  });

  it.each([
    ['stall-speed-indicated', 40.3],
    ['stall-speed-indicated', 43],
    // 49.3 kt is 56.7 mph, 91.3 km/h, 25.4 m/s
    ['stall-speed-unit', 56.7],
    ['stall-speed-unit', 91.3],
    ['stall-speed-unit', 25.4],
  ])('names %s of a stall speed of %f declared as kt', (code, stallSpeed) => {
    const asked = takeoffAsked({
      id: '',
      phase: 'takeoff',
      aeroplane: trainer,
      rows: table,
      stallSpeed,
      truth: [],
      mustReport: [],
    });
    expect(reported(asked)[0]).toBe(code);
  });

  it('names each figure with two digits exchanged, where that makes more than a tenth of difference', () => {
    const { pick } = dice(3);
    let tried = 0;
    for (let i = 0; i < 40; i++) {
      const row = Math.floor(i * 0.89);
      const column = pick([3, 4] as const);
      const figure = String((table[row] as Row)[column]);
      const other = Number(`${figure[1]}${figure[0]}${figure.slice(2)}`);
      if (other < 100 || Math.abs(Math.log(other / Number(figure))) < 0.1) continue;
      tried++;
      const rows = table.map((cells, k): Row => (k === row ? (cells.with(column, other) as unknown as Row) : cells));
      const finding = resultOf(askedOf(trainer, rows)).findings;
      expect(finding, `${row} ${column} ${figure}`).toMatchObject([
        { code: 'outlier', row, kind: column === 3 ? 'groundRoll' : 'wholeDistance', exchanged: Number(figure) },
      ]);
    }
    expect(tried).toBeGreaterThan(15);
  });

  it('names a figure that is 13 % off, whatever its digits', () => {
    for (const row of [0, 17, 35]) {
      const off = table.map((cells, k): Row => {
        const [m, h, t, roll, whole] = cells;
        return k === row ? [m, h, t, roll, Math.round((whole * 1.13) / 5) * 5] : cells;
      });
      expect(reported(askedOf(trainer, off))).toEqual([`outlier:total@${row}`]);
    }
  });

  it('finds nothing wrong with 30 tables of 1.5 % scatter', () => {
    for (let seed = 0; seed < 30; seed++) {
      expect(
        reported(askedOf(trainer, printed(exact, 0.015, seed % 2 === 0 ? 5 : 10, 500 + seed))),
        String(seed),
      ).toEqual([]);
    }
  });

  it('names rows above the maximum mass and hotter than tables are made for', () => {
    const asked = askedOf(trainer, table);
    const masses = { maximumTakeoff: 1000 };
    expect(resultOf({ ...asked, aeroplane: { ...asked.aeroplane, masses } }).findings).toMatchObject([
      { code: 'node-outside', column: 'mass', rows: 12, given: 1043 },
    ]);
    const hot = odeTable(trainer, truth, { ...grid, temperatures: [0, 20, 52] });
    expect(resultOf(askedOf(trainer, hot)).findings).toMatchObject([
      { code: 'node-outside', column: 'temperature', rows: 12 },
    ]);
  });

  it('calls a parameter at its bound and one that is implausible an error', () => {
    const weak = odeTable(trainer, [1.12, 0.01, 0.18, 0.9], grid);
    expect(resultOf(askedOf(trainer, weak)).findings).toMatchObject([
      { code: 'parameter-implausible', parameter: 'thrustFactor' },
    ]);
    const draggy = odeTable(trainer, [1.2, 0.09, 0.18, 0.9], { ...grid, altitudes: [0, 1000, 2000] });
    const result = fitted(askedOf(trainer, draggy));
    expect(result.findings.map(named)).toContain('parameter-at-bound');
    expect(result.accepted).toBe(false);
    expect(result.parameters[1]).toMatchObject({ value: 0.06, sd: 0, atBound: 'high' });
  });
});

describe('fitTakeoff', () => {
  it('holds what one altitude or one temperature cannot show, and says so', () => {
    const held = (rows: readonly Row[]) => fitted(askedOf(trainer, rows)).parameters.map(({ held }) => held);
    expect(held(table)).toEqual([undefined, undefined, undefined, undefined]);
    expect(held(table.filter(([, h]) => h === 2000))).toEqual([undefined, undefined, 'one-altitude', undefined]);
    expect(held(table.filter(([, , t]) => t === 15))).toEqual([undefined, undefined, undefined, 'one-temperature']);
    const standardDay = odeTable(trainer, truth, { ...grid, temperatures: [15] }).map(
      ([m, h, , ...distances]): Row => [m, h, 15 - 0.0019812 * h, ...distances],
    );
    expect(fitted(askedOf(trainer, standardDay)).parameters[3]).toMatchObject({
      held: 'one-temperature',
      value: 0.9,
      sd: 0,
    });
    const rolls = askedOf(trainer, table);
    const points = rolls.points.map((point) => ({ ...point, observations: point.observations.slice(0, 1) }));
    expect(fitted({ ...rolls, points }).parameters[1]).toMatchObject({ held: 'no-whole-distance', value: 0 });
    expect(fitted({ ...rolls, free: ['thrustFactor'] }).parameters.map(({ held }) => held)).toEqual([
      undefined,
      'not-asked',
      'not-asked',
      'not-asked',
    ]);
  });

  it('predicts an altitude left out as a fit without its rows does', () => {
    const rows = table.filter(([, h]) => h !== 4000);
    const without = fitted(askedOf(trainer, rows));
    const asked = askedOf(trainer, table);
    const points = asked.points.filter(({ pressureAltitude }) => Math.abs(pressureAltitude - 4000 * 0.3048) < 1);
    const model = takeoffModel(asked.aeroplane, asked.configuration.maximumLift, asked.figures, points);
    if (model === undefined) throw new Error('no model');
    const ratios = logRatios(
      model,
      Float64Array.from(without.parameters, ({ value }) => value),
    );
    const rms = Math.sqrt(ratios.reduce((sum, ratio) => sum + ratio * ratio, 0) / ratios.length);
    const left = fitted(asked).leaveOneAltitudeOut;
    expect(left).toHaveLength(4);
    expect(Math.abs((left[2]?.rms as number) / rms - 1)).toBeLessThan(0.01);
  });

  it('reads rolls, heights and marker speeds of runs as it reads a table', () => {
    const kT = 0.9;
    const asked = askedOf(trainer, []);
    const runs = [
      { altitude: 300, celsius: 5 },
      { altitude: 900, celsius: 22 },
      { altitude: 1500, celsius: 12 },
      { altitude: 200, celsius: 30 },
    ];
    const points = runs.map(
      ({ altitude, celsius }, row): FitPoint => ({
        row,
        mass: 950 + 20 * row,
        pressureAltitude: altitude,
        temperature: celsius + 273.15,
        headwind: row,
        slope: 0.002 * row,
        rollingFriction: 0.03,
        observations: [
          { kind: 'groundRoll', distance: 1, relativeSd: 0.02 },
          { kind: 'height', height: 6, distance: 1, relativeSd: 0.03 },
          { kind: 'marker', speed: 18, of: 'ground', distance: 1, relativeSd: 0.03 },
          { kind: 'marker', speed: 22, of: 'cas', distance: 1, relativeSd: 0.03 },
        ],
      }),
    );
    const model = takeoffModel(asked.aeroplane, asked.configuration.maximumLift, asked.figures, points);
    const compute = model?.at(Float64Array.of(kT, 0.01, 0.18, 0.9));
    const out = new Float64Array(4);
    const seen = points.map((point, i) => {
      expect(compute?.(i, out)).toBe(true);
      // a marker lies before lift-off, a height after it
      expect(out[2]).toBeLessThan(out[0] as number);
      expect(out[3]).toBeLessThan(out[0] as number);
      expect(out[1]).toBeGreaterThan(out[0] as number);
      return {
        ...point,
        observations: point.observations.map((one, k): Observation => ({ ...one, distance: out[k] as number })),
      };
    });
    const { parameters, rms } = fitted({ ...asked, points: seen });
    expect(parameters[0]?.value).toBeCloseTo(kT, 2);
    expect(rms).toBeLessThan(0.005);
  });

  it('frees thrust factor and drag alone where the power has no lapses', () => {
    const asked = askedOf(trainer, table);
    for (const propulsion of [
      { kind: 'turboprop', power: 130_000, propellerDiameter: 2.1 },
      { kind: 'electric', power: 105_000, propellerDiameter: 2 },
      { kind: 'jet', staticThrust: 3400 },
      {
        kind: 'measured',
        airspeeds: [0, 20, 40, 60],
        thrusts: [2400, 2200, 1900, 1500],
        density: 1.225,
        densityExponent: 0.8,
      },
    ] as const) {
      const aeroplane = { ...asked.aeroplane, propulsion };
      const model = takeoffModel(aeroplane, asked.configuration.maximumLift, asked.figures, asked.points);
      expect(model?.parameters.map(({ name }) => name)).toEqual(['thrustFactor', 'airDragShift']);
      const compute = model?.at(Float64Array.of(0.97, 0.006));
      const out = new Float64Array(2);
      const points = asked.points.map((point, i) => {
        expect(compute?.(i, out), propulsion.kind).toBe(true);
        return {
          ...point,
          observations: point.observations.map((one, k) => ({
            ...one,
            distance: out[k] as number,
            relativeSd: printedSd(out[k] as number, 0.001),
          })),
        };
      });
      const [factor, drag] = fitted({ ...asked, aeroplane, points }).parameters;
      expect(factor?.value, propulsion.kind).toBeCloseTo(0.97, 3);
      expect(drag?.value, propulsion.kind).toBeCloseTo(0.006, 3);
    }
  });

  it('suggests five conditions inside the table, each of which shrinks the band', () => {
    const { suggested, hull } = fitted(askedOf(trainer, table));
    expect(suggested?.measurements).toHaveLength(5);
    let before = suggested?.greatestSd as number;
    for (const { mass, pressureAltitude, temperature, greatestSdAfter } of suggested?.measurements ?? []) {
      expect(greatestSdAfter).toBeLessThanOrEqual(before);
      before = greatestSdAfter;
      for (const [value, [low, high]] of [
        [mass, hull.mass],
        [pressureAltitude, hull.pressureAltitude],
        [temperature, hull.temperature],
      ] as const) {
        expect(value).toBeGreaterThanOrEqual(low);
        expect(value).toBeLessThanOrEqual(high);
      }
    }
    expect(before).toBeLessThan(0.9 * (suggested?.greatestSd as number));
  });

  it('says which row nothing can fly from, and how few points there are', () => {
    const heavy = table.map(([m, h, t, ...d]): Row => [m, 5 * h, t, ...d]);
    expect(reported(askedOf(trainer, heavy)).at(-1)).toBe('not-computable');
    expect(reported(askedOf(trainer, table.slice(0, 0)))).toEqual(['too-few-points']);
  });

  it('yields between its parts', () => {
    let yields = 0;
    const work = fitTakeoff(askedOf(trainer, table));
    for (;;) {
      if (work.next().done === true) break;
      yields++;
    }
    expect(yields).toBeGreaterThan(10);
  });
});
