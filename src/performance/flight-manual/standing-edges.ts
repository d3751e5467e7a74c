import type { ManualAxis, ManualOutput, ManualTable } from './flight-manual.ts';
import { edgeSides, type ManualPoint, readLevel } from './read-level.ts';
import { type AxisLevel, isRow, type Level, tableIndex } from './table-index.ts';

const known = new WeakMap<ManualTable, ReadonlySet<ManualAxis>>();
const noEdges: ReadonlySet<ManualAxis> = new Set();

/**
 * The axes on whose edge a table shows itself to be no shorter than what lies beyond: lighter, lower, colder, more headwind.
 *
 * An edge stands where every output of every row along the whole printed face is no longer there than at the next node inward
 * (of a climb: no less steep), so that what lies beyond is shorter still; equal counts as shorter beyond.
 */
export function standingEdges(table: ManualTable): ReadonlySet<ManualAxis> {
  const found = known.get(table);
  if (found !== undefined) return found;
  const axes = new Set(table.axes.filter((axis) => edgeSides[axis] !== undefined && stands(table, axis)));
  known.set(table, axes);
  return axes;
}

function stands(table: ManualTable, axis: ManualAxis): boolean {
  let compared = false;
  const isShorter = levelsOf(tableIndex(table), axis).every(({ nodes, below }) => {
    if (nodes.length < 2) return true;
    const edge = edgeSides[axis] === 'below' ? 0 : nodes.length - 1;
    const inward = below[edge === 0 ? 1 : edge - 1] as Level;
    return everyRow(below[edge] as Level, {}, (figures, point) => {
      const trail = { edges: noEdges, held: [], outside: [] };
      const next = readLevel(inward, point as ManualPoint, trail);
      if (trail.outside.length > 0) return true;
      compared = true;
      return table.outputs.every((output, i) => isNoLonger(output, figures[i] as number, next[i] as number));
    });
  });
  return compared && isShorter;
}

/** Every place in the index where the rows are sorted by this axis. */
function levelsOf(level: Level, axis: ManualAxis): AxisLevel[] {
  if (isRow(level)) return [];
  return level.axis === axis ? [level] : level.below.flatMap((inner) => levelsOf(inner, axis));
}

/** Whether something holds for every row below a level, told with the axes below it alone. */
function everyRow(
  level: Level,
  point: Partial<Record<ManualAxis, number>>,
  holds: (figures: readonly number[], point: Partial<Record<ManualAxis, number>>) => boolean,
): boolean {
  if (isRow(level)) return holds(level, point);
  return level.below.every((inner, i) => everyRow(inner, { ...point, [level.axis]: level.nodes[i] as number }, holds));
}

function isNoLonger(output: ManualOutput, edge: number, inward: number): boolean {
  return output === 'climbGradient' || output === 'climbRate' ? edge >= inward : edge <= inward;
}
