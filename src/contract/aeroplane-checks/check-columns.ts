import type { AirspeedCalibration } from '../../performance/aeroplane.ts';
import { calibratedFromIndicated } from '../../performance/airspeed-calibration.ts';
import type { Fault } from '../../planning/fault.ts';
import { fromSi, toSi } from '../../units/units.ts';
import { fittingUnit } from '../fitting-unit.ts';
import { columnKinds, type Heading } from '../flight-manual/manual-columns.ts';
import { isSpeed } from '../flight-manual/to-manual-table.ts';
import { figure } from '../written.ts';

/** Columns with their rows, as tables and speed tables have them. */
export interface Columns {
  readonly columns: readonly Heading[];
  readonly rows: readonly (readonly number[])[];
  readonly airspeed?: 'cas' | 'ias';
}

/** Columns named twice, rows of another length, and numbers beyond what a column of that name can hold. */
export function checkColumns({ columns, rows }: Columns, at: string): Fault[] {
  const faults: Fault[] = [];
  for (const [i, { name }] of columns.entries()) {
    if (columns.findIndex((other) => other.name === name) < i) {
      faults.push({
        pointer: `${at}/columns/${i}/name`,
        code: 'contradiction',
        message: `The column ${name} is there already.`,
        received: name,
        allowed: 'each column once',
      });
    }
  }
  for (const [i, row] of rows.entries()) {
    if (row.length !== columns.length) {
      faults.push({
        pointer: `${at}/rows/${i}`,
        code: 'contradiction',
        message: `The row has ${row.length} numbers for ${columns.length} columns.`,
        received: row.length,
        allowed: `${columns.length} numbers`,
        hint: 'A combination that the manual leaves blank has no row.',
      });
    }
  }
  if (faults.length > 0) return faults;
  return columns.flatMap((column, i) => checkRange(column, i, rows, at));
}

function checkRange({ name, unit }: Heading, index: number, rows: Columns['rows'], at: string): Fault[] {
  const { quantity, units, lowest, highest } = columnKinds[name];
  const fits = (value: number) => value >= lowest * (1 - 1e-9) - 1e-9 && value <= highest * (1 + 1e-9) + 1e-9;
  const row = rows.findIndex((cells) => !fits(toSi(quantity, cells[index] as number, unit as never)));
  if (row < 0) return [];
  const value = rows[row]?.[index] as number;
  const meant = fittingUnit(quantity, { value, unit }, units, fits);
  const bound = (limit: number) => figure(fromSi(quantity, limit, unit as never));
  return [
    {
      pointer: `${at}/rows/${row}/${index}`,
      code: 'out-of-range',
      message: `${name} is ${value} ${unit}.`,
      received: value,
      allowed: `${bound(lowest)} to ${bound(highest)} ${unit}`,
      ...(meant === undefined ? {} : { hint: `In ${meant} it would fit; check the unit of the column.` }),
    },
  ];
}

/**
 * The kind of the speeds of a table: stated, and with a calibration that reaches them where they are indicated.
 *
 * @param calibrationAt - pointer to where the airspeed calibration would be
 */
export function checkAirspeeds(
  { columns, rows, airspeed }: Columns,
  calibration: AirspeedCalibration | 'at-fault' | undefined,
  at: string,
  calibrationAt: string,
): Fault[] {
  const speeds = columns.flatMap((column, i) => (isSpeed(column) ? [{ ...column, i }] : []));
  const pointer = `${at}/airspeed`;
  if (speeds.length === 0) {
    const message = 'The table has no column of an airspeed.';
    return airspeed === undefined ? [] : [{ pointer, code: 'contradiction', message, received: airspeed }];
  }
  if (airspeed === undefined) {
    const message = `The kind of the speed ${speeds[0]?.name} is missing.`;
    return [{ pointer, code: 'missing', message, allowed: 'cas or ias' }];
  }
  if (airspeed === 'cas' || calibration === 'at-fault') return [];
  if (calibration === undefined) {
    return [
      {
        pointer: calibrationAt,
        code: 'missing',
        message: `The speeds of ${at} are indicated: they need an airspeed calibration.`,
        hint: 'Give airspeedCalibration, or the speeds as cas.',
      },
    ];
  }
  return speeds.flatMap(({ name, unit, i }) => {
    const reach = (cells: readonly number[]) =>
      calibratedFromIndicated(calibration, toSi('speed', cells[i] as number, unit as never));
    const row = rows.findIndex((cells) => reach(cells) === 'outside');
    if (row < 0) return [];
    const value = rows[row]?.[i] as number;
    return [
      {
        pointer: `${at}/rows/${row}/${i}`,
        code: 'contradiction' as const,
        message: `The airspeed calibration does not reach ${name} of ${value} ${unit} indicated.`,
        received: value,
      },
    ];
  });
}
