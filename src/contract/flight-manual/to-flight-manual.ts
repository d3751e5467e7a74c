import type { AirspeedCalibration } from '../../performance/aeroplane.ts';
import type { FlightManual } from '../../performance/flight-manual/flight-manual.ts';
import type { FlightManualOnWire } from './flight-manual.ts';
import { toManualGraph } from './to-manual-graph.ts';
import { toManualTable, toSpeedTable } from './to-manual-table.ts';

/**
 * The flight manual in SI; indicated speeds become calibrated by the aeroplane's own table.
 *
 * @param manual - read by its schema and without a fault of checkFlightManual
 */
export function toFlightManual(
  { document, revision, tables = [], speedTables = [], graphs = [] }: FlightManualOnWire,
  calibration?: AirspeedCalibration,
): FlightManual {
  return {
    document,
    revision,
    tables: tables.map((table) => toManualTable(table, calibration)),
    speedTables: speedTables.map((table) => toSpeedTable(table, calibration)),
    graphs: graphs.map(toManualGraph),
  };
}
