import type { Fault } from '../../planning/fault.ts';
import { toSi } from '../../units/units.ts';
import type { AeroplaneDefinition } from '../aeroplane-definition.ts';
import type { FlightManualOnWire } from '../flight-manual/flight-manual.ts';
import type { ManualTableOnWire } from '../flight-manual/manual-table.ts';
import { si } from '../quantity.ts';
import { unknownId } from '../unknown-id.ts';
import { written } from '../written.ts';

/** Flap angles nearer to each other than this are one setting [rad]. */
const sameFlap = 1e-6;

/** The configurations that sheets are for: known, each once, of the sheet's phase, at a flap setting of the table. */
export function checkManualConfigurations(
  { configurations }: AeroplaneDefinition,
  { tables = [], speedTables = [], graphs = [] }: FlightManualOnWire,
  at: string,
): Fault[] {
  return [
    ...tables.flatMap((table, i) => [
      ...checkIds(table, `${at}/tables/${i}`),
      ...checkFlap(table, `${at}/tables/${i}`),
    ]),
    ...speedTables.flatMap((table, i) => checkIds(table, `${at}/speedTables/${i}`)),
    ...graphs.flatMap((graph, i) => checkIds(graph, `${at}/graphs/${i}`)),
  ];

  function checkIds(sheet: { readonly configurations: string[]; readonly for?: string }, sheetAt: string): Fault[] {
    const faults: Fault[] = [];
    for (const [i, id] of sheet.configurations.entries()) {
      const pointer = `${sheetAt}/configurations/${i}`;
      const known = Object.hasOwn(configurations, id) ? configurations[id] : undefined;
      if (known === undefined) {
        faults.push(unknownId(pointer, 'configuration', id, Object.keys(configurations)));
      } else if (sheet.configurations.indexOf(id) < i) {
        faults.push({ pointer, code: 'contradiction', message: `${id} is named twice.`, received: id });
      } else if ((sheet.for === 'takeoff' || sheet.for === 'landing') && !known.for.includes(sheet.for)) {
        faults.push({
          pointer,
          code: 'contradiction',
          message: `${id} is not a configuration for ${sheet.for}.`,
          received: id,
          allowed: `configurations whose for holds ${sheet.for}`,
        });
      }
    }
    return faults;
  }

  function checkFlap({ columns, rows, ...table }: ManualTableOnWire, tableAt: string): Fault[] {
    const column = columns.findIndex(({ name }) => name === 'flap');
    if (column < 0) return [];
    // a row of another length is told of its own
    const flaps = [...new Set(rows.flatMap((row) => row[column] ?? []))];
    return table.configurations.flatMap((id, i) => {
      const known = Object.hasOwn(configurations, id) ? configurations[id] : undefined;
      if (known === undefined) return [];
      const flap = si('angle', known.flap);
      if (flaps.some((printed) => Math.abs(toSi('angle', printed, 'deg') - flap) <= sameFlap)) return [];
      return [
        {
          pointer: `${tableAt}/configurations/${i}`,
          code: 'contradiction' as const,
          message: `${id} has a flap of ${written(known.flap)}, for which the table has no row.`,
          received: id,
          allowed: `configurations with a flap of ${flaps.slice(0, 12).join(', ')} deg`,
        },
      ];
    });
  }
}
