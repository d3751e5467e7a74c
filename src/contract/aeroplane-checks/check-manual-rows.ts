import type { ManualTable } from '../../performance/flight-manual/flight-manual.ts';
import { standardTemperature } from '../../physics/atmosphere.ts';
import type { Fault } from '../../planning/fault.ts';
import { fromSi } from '../../units/units.ts';
import type { ManualTableOnWire } from '../flight-manual/manual-table.ts';
import { toManualTable } from '../flight-manual/to-manual-table.ts';
import { figure } from '../written.ts';
import { checkMonotone } from './check-monotone.ts';

/** A printed standard temperature is this near to that of the standard atmosphere [K]; whole degrees, with room; our choice. */
const nearStandard = 3;

/** The rows of a table whose columns are in order: each combination once, and figures that agree with each other. */
export function checkManualRows(given: ManualTableOnWire, at: string): Fault[] {
  // the kind of an airspeed plays no part here, so that none needs its calibration
  const { airspeed: _, ...asCalibrated } = given;
  const table = toManualTable(asCalibrated);
  const faults = [...checkDuplicates(given, table, at), ...checkConstant(given, table, at)];
  if (faults.length > 0) return faults;
  const figures = [...checkTotals(given, table, at), ...checkStandard(given, table, at)];
  return figures.length > 0 ? figures : checkMonotone(given, table, at);
}

/** Rows for one combination twice. */
function checkDuplicates({ columns, rows }: ManualTableOnWire, { axes, nodes }: ManualTable, at: string): Fault[] {
  const known = new Set<string>();
  return nodes.flatMap((node, row) => {
    const key = node.join();
    if (!known.has(key)) {
      known.add(key);
      return [];
    }
    const combination = columns.flatMap(({ name, unit }, column) =>
      axes.some((axis) => axis === name) ? [`${name} ${rows[row]?.[column]} ${unit}`] : [],
    );
    return [
      {
        pointer: `${at}/rows/${row}`,
        code: 'contradiction' as const,
        message: `A row before it is for ${combination.join(', ')} already.`,
        allowed: 'each combination once',
      },
    ];
  });
}

/** Axes along which there is nothing to interpolate. */
function checkConstant({ columns, rows }: ManualTableOnWire, { axes, nodes }: ManualTable, at: string): Fault[] {
  return axes.flatMap((axis, i) => {
    if (axis === 'flap' || nodes.some((node) => node[i] !== nodes[0]?.[i])) return [];
    const column = columns.findIndex(({ name }) => name === axis);
    const received = rows[0]?.[column] as number;
    return [
      {
        pointer: `${at}/columns/${column}`,
        code: 'contradiction' as const,
        message: `${axis} is ${received} ${columns[column]?.unit} in every row.`,
        received,
        allowed: 'two values or more',
        ...(axis === 'mass' ? { hint: 'Leave the column away and state the mass in conditions.' } : {}),
      },
    ];
  });
}

/** Whole distances that are not above the ground roll. */
function checkTotals({ columns, rows }: ManualTableOnWire, { outputs, cells }: ManualTable, at: string): Fault[] {
  const roll = outputs.indexOf('groundRoll');
  const whole = outputs.findIndex((output) => output === 'takeoffDistance' || output === 'landingDistance');
  if (roll < 0 || whole < 0) return [];
  const printed = (row: number, output: number) => {
    const column = columns.findIndex(({ name }) => name === outputs[output]);
    return { column, value: rows[row]?.[column] as number, unit: columns[column]?.unit as string };
  };
  return cells.flatMap((figures, row) => {
    const [part, total] = [figures[roll] as number, figures[whole] as number];
    if (total > part) return [];
    const [short, long] = [printed(row, roll), printed(row, whole)];
    return [
      {
        pointer: `${at}/rows/${row}/${long.column}`,
        code: 'contradiction' as const,
        message: `${outputs[whole]} of ${long.value} ${long.unit} is not above the ground roll of ${short.value} ${short.unit}.`,
        received: long.value,
        allowed: `above ${figure(fromSi('length', part, long.unit as 'm'))} ${long.unit}`,
        hint: 'Check the order of the columns and their units.',
      },
    ];
  });
}

/** Printed standard temperatures that no standard atmosphere has. */
function checkStandard(given: ManualTableOnWire, table: ManualTable, at: string): Fault[] {
  const { standardTemperatures, axes, nodes } = table;
  if (standardTemperatures === undefined) return [];
  const altitude = axes.indexOf('pressureAltitude');
  const row = standardTemperatures.findIndex(
    (printed, i) => Math.abs(printed - standardTemperature(nodes[i]?.[altitude] as number)) > nearStandard,
  );
  if (row < 0) return [];
  const column = given.columns.findIndex(({ name }) => name === 'standardTemperature');
  const standard = standardTemperature(nodes[row]?.[altitude] as number);
  return [
    {
      pointer: `${at}/rows/${row}/${column}`,
      code: 'implausible',
      message: `The standard temperature at that pressure altitude is ${figure(standard - 273.15)} degC.`,
      received: given.rows[row]?.[column] as number,
      allowed: `within ${nearStandard} degC of it`,
      hint: 'Check the units of both columns.',
    },
  ];
}
