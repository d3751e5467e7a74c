import type { AirspeedCalibration } from '../../performance/aeroplane.ts';
import type { ProvedCell, TableProof } from '../../planning/proof/proof-of-table.ts';
import { roundTo } from '../../units/presentation.ts';
import type { Heading } from '../flight-manual/manual-columns.ts';
import type { ManualTableOnWire } from '../flight-manual/manual-table.ts';
import { isOutput } from '../flight-manual/to-manual-table.ts';
import { printedFigure } from './printed-figure.ts';

/** What is written where there is no figure. */
export const noData = 'no data';

export interface ProofGrid {
  readonly columns: { name: string; unit?: string }[];
  readonly rows: (number | string)[][];
  /** pointers into the definition */
  readonly differ: string[];
}

/**
 * A proof as columns and rows: what the table is entered with, and for each figure the printed one, the one looked up, whether
 * they agree, the one of physics, and printed over physics.
 *
 * @param at - pointer to the table in the definition
 */
export function proofGrid(
  given: ManualTableOnWire,
  proof: TableProof,
  calibration: AirspeedCalibration | undefined,
  at: string,
): ProofGrid {
  const entries = given.columns.filter(({ name }) => !isOutput(name));
  const outputs = given.columns.filter(({ name }) => isOutput(name)) as Heading[];
  const own = given.airspeed === 'ias' ? calibration : undefined;
  const differ: string[] = [];
  const rows = proof.rows.map(({ row, cells }) => {
    const typed = given.rows[row] as readonly number[];
    const figures = outputs.flatMap((column) => {
      const index = given.columns.findIndex(({ name }) => name === column.name);
      const cell = cells.find(({ output }) => output === column.name) as ProvedCell;
      if (!cell.agrees) differ.push(`${at}/rows/${row}/${index}`);
      return cellOf(column, typed[index] as number, cell, own);
    });
    const entered = entries.map((entry) => typed[given.columns.indexOf(entry)] as number);
    return [row, ...entered, ...figures];
  });
  return {
    columns: [
      { name: 'row' },
      ...entries.map(({ name, unit }) => ({ name, unit })),
      ...outputs.flatMap(({ name, unit }) => [
        { name, unit },
        { name: `${name}Read`, unit },
        { name: `${name}Agrees` },
        { name: `${name}Physics`, unit },
        { name: `${name}Ratio` },
      ]),
    ],
    rows,
    differ,
  };
}

function cellOf(
  column: Heading,
  typed: number,
  { printed, read, agrees, physics }: ProvedCell,
  calibration: AirspeedCalibration | undefined,
): (number | string)[] {
  const shown = (figure: number | undefined, of: 'print' | 'physics') =>
    (figure === undefined ? undefined : printedFigure(column, figure, calibration, of)) ?? noData;
  return [
    typed,
    agrees ? typed : shown(read, 'print'),
    agrees ? 'yes' : 'no',
    shown(physics, 'physics'),
    physics === undefined || physics === 0 ? noData : roundTo(printed / physics, 1e-4, 'nearest'),
  ];
}
