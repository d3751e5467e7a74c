import type { AirspeedCalibration } from '../../performance/aeroplane.ts';
import type { Fault } from '../../planning/fault.ts';
import type { SpeedTableOnWire } from '../flight-manual/manual-table.ts';
import { checkAirspeeds, checkColumns } from './check-columns.ts';

/** Speeds of one row that follow one another. */
const orders = [
  ['stall', 'rotation'],
  ['stall', 'liftOff'],
  ['stall', 'touchdown'],
  ['stall', 'landingReference'],
  ['rotation', 'liftOff'],
  ['rotation', 'screen'],
  ['liftOff', 'screen'],
  ['touchdown', 'landingReference'],
] as const;

/** One speed table: a mass column that rises, speeds that do not fall with it, and their order in each row. */
export function checkSpeedTable(
  table: SpeedTableOnWire,
  calibration: AirspeedCalibration | 'at-fault' | undefined,
  at: string,
  calibrationAt: string,
): Fault[] {
  const form = [...checkColumns(table, at), ...checkMass(table, at)];
  if (form.length > 0) return form;
  return [
    ...checkAirspeeds(table, calibration, at, calibrationAt),
    ...checkRising(table, at),
    ...checkOrder(table, at),
  ];
}

function checkMass({ columns }: SpeedTableOnWire, at: string): Fault[] {
  if (columns.some(({ name }) => name === 'mass')) return [];
  return [
    { pointer: `${at}/columns`, code: 'missing', message: 'There is no column mass.', allowed: 'mass and speeds' },
  ];
}

function checkRising({ columns, rows }: SpeedTableOnWire, at: string): Fault[] {
  return columns.flatMap(({ name, unit }, c) => {
    const row = rows.findIndex((cells, i) => {
      if (i === 0) return false;
      const rise = (cells[c] as number) - (rows[i - 1]?.[c] as number);
      return name === 'mass' ? rise <= 0 : rise < 0;
    });
    if (row < 0) return [];
    const [received, before] = [rows[row]?.[c] as number, rows[row - 1]?.[c]];
    return [
      {
        pointer: `${at}/rows/${row}/${c}`,
        code: 'contradiction' as const,
        message: `${name} ${name === 'mass' ? 'must rise' : 'does not fall'} from row to row: ${received} follows ${before}.`,
        received,
        allowed: `${name === 'mass' ? 'above' : 'at least'} ${before} ${unit}`,
      },
    ];
  });
}

function checkOrder({ columns, rows }: SpeedTableOnWire, at: string): Fault[] {
  return orders.flatMap(([lower, higher]) => {
    const low = columns.findIndex(({ name }) => name === lower);
    const high = columns.findIndex(({ name }) => name === higher);
    if (low < 0 || high < 0 || columns[low]?.unit !== columns[high]?.unit) return [];
    const row = rows.findIndex((cells) => (cells[high] as number) < (cells[low] as number));
    if (row < 0) return [];
    const cells = rows[row] as readonly number[];
    return [
      {
        pointer: `${at}/rows/${row}/${high}`,
        code: 'contradiction' as const,
        message: `${higher} at ${cells[high]} ${columns[high]?.unit} is below ${lower} at ${cells[low]} ${columns[low]?.unit}.`,
        received: cells[high] as number,
        allowed: `at least ${cells[low]} ${columns[low]?.unit}`,
      },
    ];
  });
}
