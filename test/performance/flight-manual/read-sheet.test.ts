import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import type { ManualAxis, ManualTable } from '../../../src/performance/flight-manual/flight-manual.ts';
import type { ManualAsked } from '../../../src/performance/flight-manual/manual-figures.ts';
import { readSheet } from '../../../src/performance/flight-manual/read-sheet.ts';
import { stepNote, takeoffAsked, takeoffTable } from '../../support/manual-sheets.ts';

const read = (table: ManualTable, asked: Partial<ManualAsked>) => readSheet(table, takeoffAsked(asked));

describe('a table', () => {
  it('is linear between its nodes, axis within axis: by hand', () => {
    const { outputs, edges, outside } = read(takeoffTable(), { pressureAltitude: 250, temperature: 283 });
    // at 0 m 210 and 420, at 1000 m 260 and 530; a quarter of the way up
    expect(outputs).toEqual({ groundRoll: 222.5, takeoffDistance: 447.5 });
    expect([edges, outside]).toEqual([[], []]);
  });

  it('names what it is outside of, on every axis at once', () => {
    const { outside } = read(takeoffTable(), { pressureAltitude: 1200, temperature: 300 });
    expect(outside).toEqual([
      { sheet: 'takeoff', axis: 'pressureAltitude', given: 1200, bound: 1000, side: 'above' },
      { sheet: 'takeoff', axis: 'temperature', given: 300, bound: 293, side: 'above' },
    ]);
  });

  it('takes its edge for what is lower and colder, where it is the longer there, and says so', () => {
    const { outputs, edges, outside } = read(takeoffTable(), { pressureAltitude: -100, temperature: 260 });
    expect(outputs).toEqual({ groundRoll: 200, takeoffDistance: 400 });
    expect(edges).toEqual([
      { sheet: 'takeoff', axis: 'pressureAltitude', given: -100, bound: 0, side: 'below' },
      { sheet: 'takeoff', axis: 'temperature', given: 260, bound: 273, side: 'below' },
    ]);
    expect(outside).toEqual([]);
  });

  it('takes no edge where that is refused', () => {
    const { edges, outside } = read(takeoffTable(), { pressureAltitude: -100, edges: 'refuse' });
    expect(edges).toEqual([]);
    expect(outside).toMatchObject([{ axis: 'pressureAltitude', bound: 0, side: 'below' }]);
  });

  it('finds flap among its settings and nowhere between', () => {
    const flaps = takeoffTable({
      axes: ['flap', 'pressureAltitude'],
      nodes: [
        [0, 0],
        [0, 1000],
        [0.35, 0],
        [0.35, 1000],
      ],
    });
    expect(read(flaps, { flap: 0.35, pressureAltitude: 500 }).outputs.groundRoll).toBe(260);
    expect(read(flaps, { flap: 0.3 }).outside).toEqual([
      { sheet: 'takeoff', axis: 'flap', given: 0.3, bound: 0.35, side: 'below' },
    ]);
  });

  it('is entered with the deviation from the standard day', () => {
    const deviations = takeoffTable({
      axes: ['pressureAltitude', 'temperatureDeviation'],
      nodes: [
        [0, 0],
        [0, 20],
        [1000, 0],
        [1000, 20],
      ],
    });
    // 288.15 - 0.0065 x 1000 + 10 K
    expect(read(deviations, { pressureAltitude: 1000, temperature: 291.65 }).outputs.groundRoll).toBeCloseTo(260, 9);
  });

  const winds: Partial<ManualTable> = {
    axes: ['pressureAltitude', 'headwind'],
    nodes: [
      [0, 0],
      [0, 10],
      [1000, 0],
      [1000, 10],
    ],
    cells: [
      [200, 400],
      [160, 330],
      [240, 500],
      [190, 400],
    ],
  };
  const wind = { headwind: 10, creditedHeadwind: 5 };

  it('is entered with the credited wind, or with the wind as given where it credits a part of it itself', () => {
    expect(read(takeoffTable(winds), wind).outputs.groundRoll).toBe(180);
    const allowing = takeoffTable({ ...winds, contains: { factor: 1, windAllowance: true } });
    expect(read(allowing, wind).outputs.groundRoll).toBe(160);
  });

  it('takes its last column for more headwind, and has nothing for a tailwind but its note', () => {
    expect(read(takeoffTable(winds), { headwind: 14 })).toMatchObject({
      outputs: { groundRoll: 160 },
      edges: [{ axis: 'headwind', given: 14, bound: 10, side: 'above' }],
    });
    expect(read(takeoffTable(winds), { headwind: -2 }).outside).toMatchObject([{ axis: 'headwind', side: 'below' }]);
    const noted = takeoffTable({ ...winds, notes: [stepNote('tailwind', 0.1, 1)] });
    expect(read(noted, { headwind: -2 })).toMatchObject({ outputs: { groundRoll: 200 }, outside: [] });
  });

  it('gives the printed standard temperature between its rows, else that of the standard atmosphere', () => {
    const printed = takeoffTable({
      axes: ['pressureAltitude'],
      nodes: [[0], [1000]],
      cells: [
        [200, 400],
        [240, 500],
      ],
      standardTemperatures: [288, 282],
    });
    expect(read(printed, { pressureAltitude: 500 }).standardTemperature).toBe(285);
    expect(read(takeoffTable(), { pressureAltitude: 500 }).standardTemperature).toBe(284.9);
  });
});

/** A table over three axes, each row of nodes with its own: `ragged` decides whether the inner ones differ. */
function randomTable(seed: { ragged: boolean; numbers: readonly number[] }): ManualTable {
  let place = 0;
  const next = () => seed.numbers[place++ % seed.numbers.length] as number;
  const nodesFrom = (first: number, step: number) =>
    Array.from({ length: 2 + Math.floor(3 * next()) }, (_, i) => first + step * (i + 0.6 * next()));
  const nodes: number[][] = [];
  const cells: number[][] = [];
  const regular = [nodesFrom(0, 500), nodesFrom(263, 12)] as const;
  for (const mass of nodesFrom(800, 100)) {
    for (const altitude of seed.ragged ? nodesFrom(0, 500) : regular[0]) {
      for (const temperature of seed.ragged ? nodesFrom(263, 12) : regular[1]) {
        nodes.push([mass, altitude, temperature]);
        cells.push([100 + 900 * next(), 1000 + 900 * next()]);
      }
    }
  }
  return takeoffTable({
    axes: ['mass', 'pressureAltitude', 'temperature'],
    nodes,
    cells,
    conditions: takeoffTable().conditions,
  });
}

const anyTable = fc
  .record({
    ragged: fc.boolean(),
    numbers: fc.array(fc.double({ min: 0, max: 0.999, noNaN: true }), { minLength: 23, maxLength: 61 }),
  })
  .map(randomTable);
const anyPlace = fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: 3, maxLength: 3 });

function at(table: ManualTable, [mass, pressureAltitude, temperature]: readonly number[]) {
  const asked = takeoffAsked({ mass, pressureAltitude, temperature, edges: 'refuse' } as Partial<ManualAsked>);
  return readSheet(table, asked);
}

/** A point of the table's box, at shares of its ranges. */
function pointIn(table: ManualTable, shares: readonly number[]): number[] {
  return shares.map((share, i) => {
    const values = table.nodes.map((node) => node[i] as number);
    const [lowest, highest] = [Math.min(...values), Math.max(...values)];
    return lowest + share * (highest - lowest);
  });
}

/** The rows around a point, found by plain search: of each axis the nodes next to it among the rows that are left. */
function cornersOf(table: ManualTable, point: readonly number[], rows: readonly number[], depth: number): number[] {
  if (depth === point.length) return [...rows];
  const values = [...new Set(rows.map((row) => table.nodes[row]?.[depth] as number))];
  const x = point[depth] as number;
  const around = [Math.max(...values.filter((v) => v <= x)), Math.min(...values.filter((v) => v >= x))];
  return [...new Set(around)].flatMap((node) =>
    cornersOf(
      table,
      point,
      rows.filter((row) => table.nodes[row]?.[depth] === node),
      depth + 1,
    ),
  );
}

describe('a table on a regular or a ragged grid', () => {
  test.prop([anyTable])('meets each of its cells exactly', (table) => {
    for (const [row, node] of table.nodes.entries()) {
      const { outputs, outside } = at(table, node);
      expect(outside).toEqual([]);
      expect([outputs.groundRoll, outputs.takeoffDistance]).toEqual(table.cells[row]);
    }
  });

  test.prop([anyTable, anyPlace])('stays within the corners of the cell', (table, shares) => {
    const point = pointIn(table, shares);
    const { outputs, outside } = at(table, point);
    if (outside.length > 0) return;
    const corners = cornersOf(
      table,
      point,
      table.nodes.map((_, row) => row),
      0,
    );
    for (const [i, output] of table.outputs.entries()) {
      const values = corners.map((row) => table.cells[row]?.[i] as number);
      expect(outputs[output]).toBeGreaterThanOrEqual(Math.min(...values));
      expect(outputs[output]).toBeLessThanOrEqual(Math.max(...values));
    }
  });

  test.prop([anyTable, anyPlace])(
    'is continuous to 1e-9 across its cells, whichever axis is crossed',
    (table, shares) => {
      const inside = pointIn(table, shares);
      for (const [axis] of table.axes.entries()) {
        for (const node of new Set(table.nodes.map((one) => one[axis] as number))) {
          const step = 1e-12 * Math.max(1, node);
          const sides = [node - step, node, node + step].map((x) =>
            at(
              table,
              inside.map((v, i) => (i === axis ? x : v)),
            ),
          );
          if (sides.some(({ outside }) => outside.length > 0)) continue;
          const [below, on, above] = sides.map(({ outputs }) => outputs.takeoffDistance as number) as [
            number,
            number,
            number,
          ];
          expect(Math.abs(below - on) / on).toBeLessThanOrEqual(1e-9);
          expect(Math.abs(above - on) / on).toBeLessThanOrEqual(1e-9);
        }
      }
    },
  );

  test.prop([fc.double({ min: 0, max: 1000, noNaN: true }), fc.double({ min: 273, max: 293, noNaN: true })])(
    'on a regular cell is the sum of its corners by opposite areas, to 1e-12',
    (altitude, temperature) => {
      const [u, v] = [altitude / 1000, (temperature - 273) / 20];
      const sum = 400 * (1 - u) * (1 - v) + 440 * (1 - u) * v + 500 * u * (1 - v) + 560 * u * v;
      const { outputs } = read(takeoffTable(), { pressureAltitude: altitude, temperature });
      expect(Math.abs((outputs.takeoffDistance as number) / sum - 1)).toBeLessThanOrEqual(1e-9);
    },
  );

  const axes: readonly ManualAxis[] = ['mass', 'pressureAltitude', 'temperature'];
  test.prop([anyTable, anyPlace])('says of every point either figures or an axis', (table, shares) => {
    const { outside, outputs } = at(table, pointIn(table, shares));
    if (outside.length === 0) expect(Object.values(outputs).every(Number.isFinite)).toBe(true);
    else expect(outside.every(({ axis }) => axes.includes(axis as ManualAxis))).toBe(true);
  });
});
