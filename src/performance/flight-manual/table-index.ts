import type { ManualAxis, ManualTable } from './flight-manual.ts';

/** The rows of a table sorted by one axis: at each of its nodes the rows that are left, sorted by the next axis. */
export interface AxisLevel {
  readonly axis: ManualAxis;
  /** rising */
  readonly nodes: readonly number[];
  /** one a node: the next axis, or on the last one the printed figures */
  readonly below: readonly Level[];
}

/** An axis, or a row's figures: the outputs, and last the printed standard temperature where there is one. */
export type Level = AxisLevel | readonly number[];

export function isRow(level: Level): level is readonly number[] {
  return Array.isArray(level);
}

const indexes = new WeakMap<ManualTable, Level>();

/**
 * A table's rows, sorted once: axis within axis in the order of its columns, each with nodes of its own.
 *
 * Of rows with the same nodes the last stands; the gate refuses them.
 */
export function tableIndex(table: ManualTable): Level {
  const known = indexes.get(table);
  if (known !== undefined) return known;
  const figures = table.cells.map((cells, row) => {
    const standard = table.standardTemperatures?.[row];
    return standard === undefined ? cells : [...cells, standard];
  });
  const index = levelOf(
    table,
    figures,
    table.nodes.map((_, row) => row),
    0,
  );
  indexes.set(table, index);
  return index;
}

function levelOf(
  table: ManualTable,
  figures: readonly (readonly number[])[],
  rows: readonly number[],
  depth: number,
): Level {
  const axis = table.axes[depth];
  if (axis === undefined) return figures[rows.at(-1) as number] as readonly number[];
  const groups = new Map<number, number[]>();
  for (const row of rows) {
    const node = table.nodes[row]?.[depth] as number;
    const group = groups.get(node);
    if (group === undefined) groups.set(node, [row]);
    else group.push(row);
  }
  const nodes = [...groups.keys()].sort((a, b) => a - b);
  return {
    axis,
    nodes,
    below: nodes.map((node) => levelOf(table, figures, groups.get(node) as number[], depth + 1)),
  };
}
