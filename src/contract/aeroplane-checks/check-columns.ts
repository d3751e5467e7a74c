import type { AirspeedCalibration } from '../../performance/aeroplane.ts';
import { calibratedFromIndicated } from '../../performance/airspeed-calibration.ts';
import type { Fault } from '../../planning/fault.ts';
import { toSi } from '../../units/units.ts';
import type { Heading } from '../flight-manual/manual-columns.ts';
import { isSpeed } from '../flight-manual/to-manual-table.ts';
import { checkRange } from './check-range.ts';

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
  return columns.flatMap((column, c) =>
    checkRange(
      column,
      rows.map((row) => row[c] as number),
      (row) => `${at}/rows/${row}/${c}`,
    ),
  );
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
