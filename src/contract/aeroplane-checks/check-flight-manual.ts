import type { AirspeedCalibration } from '../../performance/aeroplane.ts';
import type { Fault } from '../../planning/fault.ts';
import type { AeroplaneDefinition } from '../aeroplane-definition.ts';
import { type FlightManualOnWire, mostSheets } from '../flight-manual/flight-manual.ts';
import { checkManualConfigurations } from './check-manual-configurations.ts';
import { checkManualGraph } from './check-manual-graph.ts';
import { checkManualNotes } from './check-manual-notes.ts';
import { checkManualTable } from './check-manual-table.ts';
import { checkScreenHeights } from './check-screen-heights.ts';
import { checkSpeedTable } from './check-speed-table.ts';
import { checkExampleForms, checkWorkedExamples } from './check-worked-examples.ts';
import { enteredSheets, examplesOf } from './entered-sheet.ts';

/**
 * The flight manual of a definition: its sheets, and the configurations of the aeroplane that they are for.
 *
 * @param calibration - 'at-fault' where it is at fault itself, so that nothing can be said of indicated speeds
 */
export function checkFlightManual(
  definition: AeroplaneDefinition,
  calibration: AirspeedCalibration | 'at-fault' | undefined,
  at: string,
): Fault[] {
  const { flightManual } = definition;
  if (flightManual === undefined) return [];
  const here = `${at}/flightManual`;
  return [
    ...checkManualConfigurations(definition, flightManual, here),
    ...checkScreenHeights(definition.certification, flightManual, here),
    ...checkManualSheets(flightManual, calibration, here, `${at}/airspeedCalibration`),
  ];
}

/**
 * The sheets of a flight manual: each against itself, and against the manual's own worked examples.
 *
 * @param calibrationAt - pointer to where the airspeed calibration would be
 */
export function checkManualSheets(
  manual: FlightManualOnWire,
  calibration: AirspeedCalibration | 'at-fault' | undefined,
  at: string,
  calibrationAt: string,
): Fault[] {
  const { tables = [], speedTables = [], graphs = [] } = manual;
  const entered = enteredSheets(manual, at);
  const examples = entered.flatMap(examplesOf);
  const faults = [
    ...checkSheets(manual, at),
    ...tables.flatMap((table, i) => checkManualTable(table, calibration, `${at}/tables/${i}`, calibrationAt)),
    ...graphs.flatMap((graph, i) => checkManualGraph(graph, `${at}/graphs/${i}`)),
    ...entered.flatMap((sheet) => checkManualNotes(sheet)),
    ...speedTables.flatMap((table, i) => checkSpeedTable(table, calibration, `${at}/speedTables/${i}`, calibrationAt)),
    ...checkExampleForms(examples),
  ];
  if (faults.length > 0 || calibration === 'at-fault') return faults;
  return checkWorkedExamples(manual, calibration, examples);
}

/** How many sheets there are, and that no two have one id. */
function checkSheets({ tables = [], speedTables = [], graphs = [] }: FlightManualOnWire, at: string): Fault[] {
  const sheets = Object.entries({ tables, speedTables, graphs }).flatMap(([kind, list]) =>
    list.map(({ id }, i) => ({ id, pointer: `${at}/${kind}/${i}/id` })),
  );
  if (sheets.length === 0 || sheets.length > mostSheets) {
    return [
      {
        pointer: at,
        code: sheets.length === 0 ? 'missing' : 'out-of-range',
        message: `The flight manual has ${sheets.length} tables and graphs.`,
        received: sheets.length,
        allowed: `1 to ${mostSheets}, of tables, speedTables and graphs together`,
      },
    ];
  }
  return sheets
    .filter(({ id }, i) => sheets.findIndex((other) => other.id === id) < i)
    .map(({ id, pointer }) => ({
      pointer,
      code: 'contradiction',
      message: `Another sheet has the id ${id} already.`,
      received: id,
    }));
}
