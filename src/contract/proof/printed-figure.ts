import type { AirspeedCalibration } from '../../performance/aeroplane.ts';
import { indicatedFromCalibrated } from '../../performance/airspeed-calibration.ts';
import { roundTo } from '../../units/presentation.ts';
import { fromSi } from '../../units/units.ts';
import { columnKinds, type Heading } from '../flight-manual/manual-columns.ts';
import { isSpeed } from '../flight-manual/to-manual-table.ts';

/** Finest step to which manuals print, and far above what a change of unit leaves behind. */
const finest = 1e-6;

/** Steps to which physics is shown beside printed figures, by unit; other units to a tenth. */
const steps: Readonly<Record<string, number>> = { m: 1, ft: 5, 'ft/min': 1, percent: 0.01 };

/**
 * A figure in SI as a column would print it: in the column's unit, and indicated where the column's speeds are.
 *
 * @param calibration - where the column's speeds are indicated
 * @param of - a printed figure, whole as it was typed in, or one of physics, rounded to what is sensible
 * @returns undefined where the calibration does not reach
 */
export function printedFigure(
  column: Heading,
  si: number,
  calibration: AirspeedCalibration | undefined,
  of: 'print' | 'physics',
): number | undefined {
  const own = calibration !== undefined && isSpeed(column) ? indicatedFromCalibrated(calibration, si) : si;
  if (own === 'outside') return undefined;
  const value = fromSi(columnKinds[column.name].quantity, own, column.unit as never);
  return roundTo(value, of === 'print' ? finest : (steps[column.unit] ?? 0.1), 'nearest');
}
