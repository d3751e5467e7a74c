import type { Work } from '../../numerics/work.ts';
import type { Aeroplane } from '../../performance/aeroplane.ts';
import type { ManualOutput, ManualTable } from '../../performance/flight-manual/flight-manual.ts';
import { sheetFigures } from '../../performance/flight-manual/sheet-figures.ts';
import { type PhysicsFigures, type TablePhysics, tablePhysics } from './physics-at-node.ts';
import { type TableNode, tableNode } from './table-node.ts';

/** One cell of a table as printed and as the service has it, in SI. */
export interface ProvedCell {
  readonly output: ManualOutput;
  readonly printed: number;
  /** what the look-up gives at the node, in the form of the printed figure; undefined where it gives nothing */
  readonly read: number | undefined;
  /** whether the two are one figure */
  readonly agrees: boolean;
  /** undefined where physics has no such figure there */
  readonly physics: number | undefined;
}

export interface ProvedRow {
  readonly row: number;
  readonly cells: readonly ProvedCell[];
}

/** Each cell of a table back as computed. */
export interface TableProof {
  readonly rows: readonly ProvedRow[];
  /** of each configuration whose flap the rows have; empty for a climb table */
  readonly physics: readonly { readonly configuration: string; readonly method: TablePhysics['method'] }[];
}

/** A flap setting of a row within this of a configuration's is that configuration's [rad]. */
const sameFlap = 1e-3;
/** Two statements of one figure, apart by no more than the change of unit makes. */
const sameFigure = 1e-9;

/**
 * Each cell of a table as the look-up gives it at its own node, and as physics gives it, in the order of the rows.
 *
 * Where several configurations share the table without a column for flap, physics is of the first.
 *
 * @returns work that yields between rows
 */
export function* proofOfTable(aeroplane: Aeroplane, table: ManualTable): Work<TableProof> {
  const configurations = table.configurations.flatMap((id) => {
    const physics = tablePhysics(aeroplane, table, id);
    const flap = aeroplane.configurations[id]?.flap;
    return physics === undefined || flap === undefined ? [] : [{ id, flap, physics }];
  });
  const used = table.axes.includes('flap') ? configurations : configurations.slice(0, 1);
  const rows: ProvedRow[] = [];
  for (let row = 0; row < table.nodes.length; row++) {
    const node = tableNode(table, row);
    const own = used.find(({ flap }) => node?.flap === undefined || Math.abs(node.flap - flap) <= sameFlap);
    const figures = node && own?.physics.at(node);
    rows.push({ row, cells: cellsOf(aeroplane, table, row, node, figures) });
    yield;
  }
  return { rows, physics: used.map(({ id, physics }) => ({ configuration: id, method: physics.method })) };
}

function cellsOf(
  aeroplane: Aeroplane,
  table: ManualTable,
  row: number,
  node: TableNode | undefined,
  figures: PhysicsFigures | undefined,
): ProvedCell[] {
  const read = node === undefined ? {} : readAt(aeroplane, table, node);
  return table.outputs.map((output, column) => {
    const printed = table.cells[row]?.[column] as number;
    const found = read[output];
    return {
      output,
      printed,
      read: found,
      agrees: found !== undefined && Math.abs(found - printed) <= sameFigure * Math.max(1, Math.abs(printed)),
      physics: figures?.[output],
    };
  });
}

/** What the look-up gives for the conditions of a row, with the factor that the printed figures hold. */
function readAt(
  aeroplane: Aeroplane,
  table: ManualTable,
  node: TableNode,
): Readonly<Partial<Record<ManualOutput, number>>> {
  const { configurations, conditions, contains, phase } = table;
  const configuration = configurations[0] as string;
  const { headwind } = node;
  const { outputs, outside } = sheetFigures(table, {
    phase: phase === 'landing' ? 'landing' : 'takeoff',
    configuration,
    flap: node.flap ?? aeroplane.configurations[configuration]?.flap ?? 0,
    mass: node.mass,
    pressureAltitude: node.pressureAltitude,
    temperature: node.temperature,
    standardTemperature: node.standardTemperature,
    headwind,
    creditedHeadwind: headwind,
    slope: 0,
    surface: conditions.surface,
    edges: 'refuse',
  });
  if (outside.length > 0) return {};
  return Object.fromEntries(
    Object.entries(outputs).map(([output, figure]) => [
      output,
      output.endsWith('Distance') || output === 'groundRoll' ? figure * contains.factor : figure,
    ]),
  );
}
