import { describe, expect, it } from 'vitest';
import { manualPoints } from '../../../src/performance/fit/manual-points.ts';
import type { ManualTable } from '../../../src/performance/flight-manual/flight-manual.ts';

const table: ManualTable = {
  id: 'tk-1',
  page: '5-3',
  phase: 'takeoff',
  configurations: ['short'],
  conditions: { surface: { kind: 'paved', state: 'dry' }, mass: 700 },
  contains: { factor: 1, windAllowance: false },
  notes: [],
  axes: ['pressureAltitude', 'temperature'],
  outputs: ['groundRoll', 'takeoffDistance'],
  nodes: [
    [0, 288.15],
    [1000, 298.15],
  ],
  cells: [
    [230, 470],
    [280, 575],
  ],
  workedExamples: [],
};
const runway = { flap: 0.2, rollingFriction: 0.03, screenHeight: 15.24 };

describe('manualPoints', () => {
  it('reads a row as a point, numbered on from the first', () => {
    const [, second] = manualPoints(table, runway, 10);
    expect(second).toMatchObject({
      row: 11,
      mass: 700,
      pressureAltitude: 1000,
      temperature: 298.15,
      headwind: 0,
      slope: 0,
      rollingFriction: 0.03,
    });
    expect(second?.observations).toMatchObject([
      { kind: 'groundRoll', distance: 280, printed: { unit: 1, step: 10 } },
      { kind: 'wholeDistance', distance: 575, printed: { unit: 1, step: 5 } },
    ]);
  });

  it('takes a factor and a wind allowance off: half of 10 m/s ahead, one and a half of 4 m/s behind, 460/1.15 m', () => {
    const windy: ManualTable = {
      ...table,
      axes: ['pressureAltitude', 'temperature', 'headwind'],
      contains: { factor: 1.15, windAllowance: true },
      nodes: [
        [0, 288.15, 10],
        [0, 288.15, -4],
      ],
      cells: [
        [230, 460],
        [345, 690],
      ],
    };
    const [ahead, behind] = manualPoints(windy, runway);
    expect([ahead?.headwind, behind?.headwind]).toEqual([5, -6]);
    expect(ahead?.observations[1]?.distance).toBeCloseTo(400, 9);
    const plain = manualPoints({ ...windy, contains: { factor: 1, windAllowance: false } }, runway);
    expect(plain.map(({ headwind }) => headwind)).toEqual([10, -4]);
  });

  it('leaves the rows of another flap out, and reads deviations and the standard day', () => {
    const flaps: ManualTable = {
      ...table,
      axes: ['flap', 'pressureAltitude', 'temperatureDeviation'],
      nodes: [
        [0.2, 0, 10],
        [0.5, 0, 10],
      ],
    };
    expect(manualPoints(flaps, runway).map(({ row, temperature }) => [row, temperature])).toEqual([[0, 298.15]]);
    const standard = manualPoints({ ...table, axes: ['pressureAltitude'], nodes: [[0], [1000]] }, runway);
    expect(standard.map(({ temperature }) => temperature)).toEqual([288.15, 281.65]);
  });

  it('reads the distance to a lower screen as one to a height', () => {
    const lower = { ...table, conditions: { ...table.conditions, screenHeight: 10.668 } };
    expect(manualPoints(lower, runway)[0]?.observations[1]).toMatchObject({
      kind: 'height',
      height: 10.668,
      distance: 470,
    });
  });
});
