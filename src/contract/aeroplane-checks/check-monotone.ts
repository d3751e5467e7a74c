import type { ManualAxis, ManualOutput, ManualTable } from '../../performance/flight-manual/flight-manual.ts';
import type { Fault } from '../../planning/fault.ts';
import type { ManualTableOnWire } from '../flight-manual/manual-table.ts';
import { mostFaults } from '../reading/collect-faults.ts';

/** The way an output goes as an axis rises: up, down, or as it likes. */
type Way = 1 | -1 | 0;

/** Two neighbouring rows along an axis whose figures go the wrong way. */
interface Slip {
  readonly axis: ManualAxis;
  readonly output: number;
  readonly before: number;
  readonly after: number;
  readonly way: Way;
}

/**
 * Figures that fall where they must rise: distances with mass, pressure altitude and temperature, and with less headwind; a climb the
 * other way. Equal figures are in order.
 *
 * Of two cells out of order the one out of order with more of its neighbours is named.
 *
 * @param given - as typed in
 * @param table - the same in SI
 */
export function checkMonotone(given: ManualTableOnWire, table: ManualTable, at: string): Fault[] {
  const slips = table.axes.flatMap((axis, i) => (axis === 'flap' ? [] : slipsAlong(table, axis, i)));
  const counts = new Map<string, number>();
  for (const { output, before, after } of slips) {
    for (const row of [before, after]) counts.set(`${row},${output}`, (counts.get(`${row},${output}`) ?? 0) + 1);
  }
  const faults = new Map<string, Fault>();
  for (const slip of slips) {
    if (faults.size >= mostFaults) break;
    const { output, before, after } = slip;
    const [first, second] = [before, after].map((row) => counts.get(`${row},${output}`) as number) as [number, number];
    const row = first > second ? before : after;
    const column = given.columns.findIndex(({ name }) => name === table.outputs[output]);
    const pointer = `${at}/rows/${row}/${column}`;
    if (!faults.has(pointer)) faults.set(pointer, faultOf(given, slip, row, column, pointer));
  }
  return [...faults.values()];
}

function faultOf(given: ManualTableOnWire, slip: Slip, row: number, column: number, pointer: string): Fault {
  const { axis, before, after, way } = slip;
  const { name, unit } = given.columns[column] as { name: string; unit: string };
  const other = row === after ? before : after;
  const cells = (of: number) => given.rows[of] as readonly number[];
  const entry = given.columns.findIndex((heading) => heading.name === axis);
  const axisUnit = given.columns[entry]?.unit;
  const bound = (row === after) === (way === 1) ? 'at least' : 'at most';
  return {
    pointer,
    code: 'contradiction',
    message:
      `${name} is ${cells(row)[column]} ${unit} at ${axis} ${cells(row)[entry]} ${axisUnit}, ` +
      `and ${cells(other)[column]} ${unit} at ${cells(other)[entry]} ${axisUnit}: ` +
      `it does not ${way === 1 ? 'fall' : 'rise'} as ${axis} rises.`,
    received: cells(row)[column] as number,
    allowed: `${bound} ${cells(other)[column]} ${unit}`,
    hint: 'Check the cell against the manual.',
  };
}

function slipsAlong({ nodes, cells, outputs }: ManualTable, axis: ManualAxis, index: number): Slip[] {
  const lines = new Map<string, number[]>();
  for (const [row, node] of nodes.entries()) {
    const key = node.filter((_, i) => i !== index).join();
    const line = lines.get(key);
    if (line === undefined) lines.set(key, [row]);
    else line.push(row);
  }
  const slips: Slip[] = [];
  for (const rows of lines.values()) {
    rows.sort((a, b) => (nodes[a]?.[index] as number) - (nodes[b]?.[index] as number));
    for (let i = 1; i < rows.length; i++) {
      const [before, after] = [rows[i - 1] as number, rows[i] as number];
      for (const [output, name] of outputs.entries()) {
        const way = wayOf(name, axis);
        const rise = (cells[after]?.[output] as number) - (cells[before]?.[output] as number);
        if (rise * way < 0) slips.push({ axis, output, before, after, way });
      }
    }
  }
  return slips;
}

function wayOf(output: ManualOutput, axis: ManualAxis): Way {
  switch (output) {
    case 'groundRoll':
    case 'takeoffDistance':
    case 'landingDistance':
      return axis === 'headwind' ? -1 : 1;
    case 'climbGradient':
    case 'climbRate':
      return axis === 'headwind' ? 0 : -1;
    default:
      return axis === 'mass' ? 1 : 0;
  }
}
