import { describe, expect, it } from 'vitest';
import { completed } from '../../../src/numerics/work.ts';
import type { ManualNote, ManualTable } from '../../../src/performance/flight-manual/flight-manual.ts';
import { proofOfTable } from '../../../src/planning/proof/proof-of-table.ts';
import { madeTables } from '../../published/made-tables.ts';
import { madeTable, manualTableOf, soundTrainer } from '../../support/reviewed.ts';

const knot = 1852 / 3600;
const made = madeTable('FIT-CLEAN-trainer');
const table = manualTableOf(made);
const proof = (changes: Partial<ManualTable> = {}) => completed(proofOfTable(soundTrainer, { ...table, ...changes }));
const tailwind: ManualNote = {
  about: 'tailwind',
  change: 0.1,
  per: 2 * knot,
  wholeSteps: false,
  windAllowance: false,
  multiplies: 'both',
};

describe('proofOfTable', () => {
  it('gives every printed figure of a table again, exactly', () => {
    const { rows, physics } = proof();
    expect(rows).toHaveLength(made.rows.length);
    rows.forEach(({ cells }, row) => {
      const [, , , roll, whole] = made.rows[row] as (typeof made.rows)[number];
      expect(cells.map(({ printed, read, agrees }) => [printed, read, agrees])).toEqual([
        [roll, roll, true],
        [whole, whole, true],
      ]);
    });
    expect(physics).toEqual([{ configuration: 'takeoff', method: 'stated' }]);
  });

  it(`puts physics beside them, within 30 % of a table that was made without ours [${madeTables.source}]`, () => {
    for (const { cells } of proof().rows) {
      for (const { printed, physics } of cells) {
        expect(Math.abs(Math.log(printed / (physics as number)))).toBeLessThan(0.3);
      }
    }
  });

  it('gives figures again that hold a factor, and puts physics with that factor beside them', () => {
    const plain = proof();
    const factored = proof({ contains: { factor: 1.25, windAllowance: false } });
    for (const { row, cells } of factored.rows) {
      for (const [i, { agrees, physics }] of cells.entries()) {
        expect(agrees).toBe(true);
        expect(physics).toBeCloseTo(1.25 * (plain.rows[row]?.cells[i]?.physics as number), 9);
      }
    }
  });

  it('shows the cells that a question never gets again: a tailwind column beside a note on tailwind', () => {
    const axes = ['pressureAltitude', 'headwind'] as const;
    const changes: Partial<ManualTable> = {
      axes,
      conditions: { surface: { kind: 'paved', state: 'dry' }, mass: 1000 },
      nodes: [
        [0, -5 * knot],
        [0, 0],
        [600, -5 * knot],
        [600, 0],
      ],
      cells: [
        [300, 560],
        [250, 470],
        [330, 640],
        [280, 550],
      ],
      notes: [tailwind],
    };
    expect(proof(changes).rows.map(({ cells }) => cells.map(({ agrees }) => agrees))).toEqual([
      [false, false],
      [true, true],
      [false, false],
      [true, true],
    ]);
  });

  it('has no physics for a climb, nor for a surface that physics does not speak of', () => {
    const climb = proof({ phase: 'climb', outputs: ['climbRate'], cells: table.cells.map(() => [3]) });
    expect(climb.physics).toEqual([]);
    expect(climb.rows.every(({ cells: [cell] }) => cell?.agrees === true && cell.physics === undefined)).toBe(true);
  });
});
