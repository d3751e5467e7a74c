import type { AirspeedCalibration } from '../../performance/aeroplane.ts';
import { calibratedFromIndicated } from '../../performance/airspeed-calibration.ts';
import {
  type ManualAxis,
  type ManualOutput,
  type ManualSpeed,
  type ManualTable,
  manualAxes,
  manualOutputs,
  type SpeedTable,
} from '../../performance/flight-manual/flight-manual.ts';
import { toSi } from '../../units/units.ts';
import { perhaps, present } from '../present.ts';
import { columnKinds, type Heading } from './manual-columns.ts';
import type { ManualTableOnWire, SpeedTableOnWire } from './manual-table.ts';
import { toSheet, toWorkedExample } from './to-manual-sheet.ts';

/** A table in SI, its axes and outputs in the order of its columns. */
export function toManualTable(given: ManualTableOnWire, calibration?: AirspeedCalibration): ManualTable {
  const { columns, rows, workedExamples = [] } = given;
  const read = columnReader(given, calibration);
  const axes = columns.filter(({ name }) => isAxis(name));
  const outputs = columns.filter(({ name }) => isOutput(name));
  const standard = columns.find(({ name }) => name === 'standardTemperature');
  return present<ManualTable>({
    ...toSheet(given),
    axes: axes.map(({ name }) => name as ManualAxis),
    outputs: outputs.map(({ name }) => name as ManualOutput),
    nodes: rows.map((row) => axes.map((column) => read(row, column))),
    cells: rows.map((row) => outputs.map((column) => read(row, column))),
    standardTemperatures: perhaps((column) => rows.map((row) => read(row, column)), standard),
    workedExamples: workedExamples.map(toWorkedExample),
  });
}

/** A speed table in SI, its masses rising, its speeds calibrated. */
export function toSpeedTable(given: SpeedTableOnWire, calibration?: AirspeedCalibration): SpeedTable {
  const { id, page, configurations, airspeed, columns, rows } = given;
  const read = columnReader(given, calibration);
  const mass = columns.find(({ name }) => name === 'mass') as Heading;
  const speeds = columns.filter(({ name }) => name !== 'mass');
  return {
    id,
    page,
    configurations,
    airspeed,
    speeds: speeds.map(({ name }) => name as ManualSpeed),
    masses: rows.map((row) => read(row, mass)),
    cells: rows.map((row) => speeds.map((column) => read(row, column))),
  };
}

/**
 * Reads a number of a column in SI, an indicated speed as the calibrated one.
 *
 * @throws RangeError from what it returns, where an indicated speed has no calibration: a check refuses it before
 */
function columnReader(
  { columns, airspeed }: Pick<ManualTableOnWire | SpeedTableOnWire, 'columns' | 'airspeed'>,
  calibration?: AirspeedCalibration,
): (row: readonly number[], column: Heading) => number {
  return (row, column) => {
    const { quantity } = columnKinds[column.name];
    const value = toSi(quantity, row[columns.indexOf(column as never)] as number, column.unit as never) + 0;
    if (airspeed !== 'ias' || !isSpeed(column)) return value;
    const cas = calibration === undefined ? 'outside' : calibratedFromIndicated(calibration, value);
    if (cas === 'outside') throw new RangeError(`no calibration of an indicated ${column.name} of ${value} m/s`);
    return cas;
  };
}

/** Whether a column holds an airspeed, which is indicated or calibrated. */
export function isSpeed({ name }: Heading): boolean {
  return columnKinds[name] === columnKinds.liftOff;
}

export function isAxis(name: string): name is ManualAxis {
  return (manualAxes as readonly string[]).includes(name);
}

export function isOutput(name: string): name is ManualOutput {
  return (manualOutputs as readonly string[]).includes(name);
}
