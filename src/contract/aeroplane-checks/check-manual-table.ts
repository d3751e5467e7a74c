import type { AirspeedCalibration } from '../../performance/aeroplane.ts';
import type { Fault } from '../../planning/fault.ts';
import type { ManualTableOnWire } from '../flight-manual/manual-table.ts';
import { isAxis, isOutput } from '../flight-manual/to-manual-table.ts';
import { checkGround } from '../question-checks/check-surface.ts';
import { checkAirspeeds, checkColumns } from './check-columns.ts';
import { checkEntries, checkOutputs } from './check-manual-entries.ts';
import { checkManualRows } from './check-manual-rows.ts';

/**
 * One table of the manual: its columns, then its rows, then its figures against each other.
 *
 * @param calibrationAt - pointer to where the airspeed calibration would be
 */
export function checkManualTable(
  table: ManualTableOnWire,
  calibration: AirspeedCalibration | 'at-fault' | undefined,
  at: string,
  calibrationAt: string,
): Fault[] {
  const { columns, conditions } = table;
  const names = columns.map(({ name }) => name);
  const faults = [
    ...checkGround(conditions.surface, `${at}/conditions/surface`),
    ...checkColumns(table, at),
    ...checkEntries(names.filter(isAxis), conditions, `${at}/columns`, `${at}/conditions`),
    ...checkOutputs(names.filter(isOutput), table.for, `${at}/columns`),
  ];
  if (faults.length > 0) return faults;
  return [...checkAirspeeds(table, calibration, at, calibrationAt), ...checkManualRows(table, at)];
}
