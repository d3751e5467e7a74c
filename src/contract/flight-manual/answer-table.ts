import type { Fault, Refused } from '../../planning/fault.ts';
import { isRefused } from '../../planning/fault.ts';
import { checkFlightManual, checkManualSheets } from '../aeroplane-checks/check-flight-manual.ts';
import type { AeroplaneLookup, KnownAeroplane } from '../aeroplane-lookup.ts';
import { perhaps } from '../present.ts';
import { reader } from '../reading/reader.ts';
import { toCalibration } from '../to-aeroplane.ts';
import { toKnownAeroplane } from '../to-known-aeroplane.ts';
import type { FlightManualOnWire } from './flight-manual.ts';
import { type ManualTableOnWire, manualTable } from './manual-table.ts';
import { placeText, readTableCsv } from './read-table-csv.ts';
import { tableFindings } from './table-findings.ts';
import type { TableFinding, TableRequest, TableResponse } from './table-request.ts';
import { toManualTable } from './to-manual-table.ts';

const readTable = reader(manualTable);
const tableAt = '/flightManual/tables/0';

/** A table from CSV to a definition's form, from gate to gate. */
export function answerTable(request: TableRequest, lookup: AeroplaneLookup): TableResponse | Refused {
  const { reference: _, asOf: __, aeroplane, csv, ...members } = request;
  const known = aeroplane && toKnownAeroplane(aeroplane, lookup);
  const cells = readTableCsv(csv, '/csv');
  const slips = [...(Array.isArray(known) ? known : []), ...(Array.isArray(cells) ? cells : [])];
  if (Array.isArray(known) || Array.isArray(cells)) return { refused: slips };
  const read = readTable({ ...members, ...cells });
  if (isRefused(read)) return { refused: read.refused.map((fault) => inRequest(fault, '')) };
  const faults = checkTable(read.value, known).map((fault) => inRequest(fault, tableAt));
  if (faults.length > 0) return { refused: faults };
  const { airspeed: ___, ...asCalibrated } = read.value;
  return {
    outcome: 'in-order',
    table: read.value,
    findings: [...tableFindings(toManualTable(asCalibrated)), ...notChecked(read.value, known)],
  };
}

/** The table among the other sheets of its aeroplane, or by itself. */
function checkTable(table: ManualTableOnWire, known: KnownAeroplane | undefined): Fault[] {
  if (known === undefined) {
    const manual = { document: 'A table by itself', revision: '1', tables: [table] };
    return checkManualSheets(manual, table.airspeed === 'ias' ? 'at-fault' : undefined, '/flightManual', '');
  }
  const { definition } = known;
  const { flightManual } = definition;
  const others = (sheets: FlightManualOnWire['tables']) => sheets?.filter(({ id }) => id !== table.id) ?? [];
  const merged: FlightManualOnWire = {
    ...(flightManual ?? { document: 'A table by itself', revision: '1' }),
    tables: [table, ...others(flightManual?.tables)],
  };
  const calibration = perhaps(toCalibration, definition.airspeedCalibration);
  return checkFlightManual({ ...definition, flightManual: merged }, calibration, '');
}

function notChecked({ airspeed }: ManualTableOnWire, known: KnownAeroplane | undefined): TableFinding[] {
  if (known !== undefined) return [];
  const indicated = airspeed === 'ias' ? ', and neither the indicated speeds nor the worked examples' : '';
  const message = `Without an aeroplane its configurations are not checked${indicated}.`;
  return [{ code: 'not-checked', message }];
}

/** A fault of the table where it stands in the request: of columns and rows, in the lines of the text. */
function inRequest(fault: Fault, tableAt: string): Fault {
  if (!fault.pointer.startsWith(tableAt)) {
    return { ...fault, pointer: fault.pointer.endsWith('airspeedCalibration') ? '/airspeed' : '' };
  }
  const pointer = fault.pointer.slice(tableAt.length);
  const [, list, first, second] = pointer.split('/');
  if (list !== 'columns' && list !== 'rows') return { ...fault, pointer };
  const place =
    list === 'columns'
      ? placeText(1, first === undefined ? undefined : Number(first) + 1)
      : placeText(Number(first) + 2, second === undefined ? undefined : Number(second) + 1);
  return { ...fault, pointer: '/csv', message: `${place}: ${fault.message}` };
}
