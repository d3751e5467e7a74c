import type { Fault } from '../../planning/fault.ts';
import type { AeroplaneDefinition } from '../aeroplane-definition.ts';
import { toCalibration } from '../to-aeroplane.ts';

/** Indicated over calibrated airspeed outside this band is another unit or another column; our choice. */
const positionErrors = { lowest: 0.7, highest: 1.4 };

/** The tables' own order: measured thrust and airspeed calibration. */
export function checkTables({ propulsion, airspeedCalibration }: AeroplaneDefinition, at: string): Fault[] {
  const faults: Fault[] = [];
  if (propulsion.kind === 'measured') {
    faults.push(...rising(propulsion.rows, 0, 'trueAirspeed', `${at}/propulsion/rows`));
  }
  if (airspeedCalibration !== undefined) {
    const rows = `${at}/airspeedCalibration/rows`;
    const disorder = [
      ...rising(airspeedCalibration.rows, 0, 'indicated', rows),
      ...rising(airspeedCalibration.rows, 1, 'calibrated', rows),
    ];
    if (disorder.length > 0) return [...faults, ...disorder];
    const { indicated, calibrated } = toCalibration(airspeedCalibration);
    const odd = indicated.findIndex((ias, i) => {
      const ratio = (calibrated[i] as number) / ias;
      return ratio < positionErrors.lowest || ratio > positionErrors.highest;
    });
    if (odd >= 0) {
      faults.push({
        pointer: `${rows}/${odd}`,
        code: 'implausible',
        message: `Calibrated over indicated airspeed is ${((calibrated[odd] as number) / (indicated[odd] as number)).toFixed(2)} in row ${odd}.`,
        allowed: `${positionErrors.lowest} to ${positionErrors.highest}`,
        hint: 'Check the units of the two columns and their order.',
      });
    }
  }
  return faults;
}

/** The first row, if any, that does not rise above the one before it. */
function rising(rows: readonly (readonly number[])[], column: number, name: string, at: string): Fault[] {
  const row = rows.findIndex((cells, i) => i > 0 && (cells[column] as number) <= (rows[i - 1]?.[column] as number));
  if (row < 0) return [];
  return [
    {
      pointer: `${at}/${row}/${column}`,
      code: 'contradiction',
      message: `${name} must rise from row to row: ${rows[row]?.[column]} follows ${rows[row - 1]?.[column]}.`,
      received: rows[row]?.[column] as number,
      allowed: `above ${rows[row - 1]?.[column]}`,
    },
  ];
}
