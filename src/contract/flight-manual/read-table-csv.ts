import { manualAxes, manualOutputs } from '../../performance/flight-manual/flight-manual.ts';
import type { Fault } from '../../planning/fault.ts';
import { mostFaults } from '../reading/collect-faults.ts';
import { nearestNames } from '../reading/nearest-name.ts';
import { shortened } from '../reading/scalar-faults.ts';
import { unitMeant } from '../reading/unit-meant.ts';
import { type CsvRecord, csvRecords } from './csv-records.ts';
import { columnKinds, type Heading } from './manual-columns.ts';
import { mostRows } from './manual-table.ts';

/** What a CSV text holds of a table. */
export interface CsvTable {
  readonly columns: readonly Heading[];
  readonly rows: readonly (readonly number[])[];
}

type Told = Omit<Fault, 'pointer' | 'message'>;
type ColumnName = (typeof names)[number];
const names = [...manualAxes, 'standardTemperature', ...manualOutputs] as const;
const heading = /^([^[\]]*?) \[([^[\]]*)\]$/;
const number = /^-?(?:0|[1-9]\d{0,9})(?:\.\d{1,9})?$/;
const mostColumns = 12;

/**
 * Reads a table from CSV: a first line of headings `name [unit]`, then one line of numbers for each combination printed.
 *
 * @param at - pointer to the text
 * @returns columns and rows as a definition has them, or every fault with its line and column
 * @see references.Rfc4180
 */
export function readTableCsv(text: string, at: string): CsvTable | Fault[] {
  if (text.startsWith('\ufeff')) {
    return [
      slip(at, 1, 1, 'The text begins with a byte order mark.', {
        code: 'unreadable',
        hint: 'Save it as UTF-8 without one.',
      }),
    ];
  }
  const records = csvRecords(text);
  if (!Array.isArray(records)) {
    const { line, column, message } = records as Exclude<typeof records, readonly CsvRecord[]>;
    return [slip(at, line, column, message, { code: 'unreadable' })];
  }
  const [first, ...lines] = records as [CsvRecord, ...CsvRecord[]];
  const faults = checkSize(first, lines, at);
  if (faults.length > 0) return faults;
  const columns = first.cells.map((cell, i) => readHeading(cell, i + 1, at));
  const rows = lines.map((record) => readRow(record, first.cells, at));
  const all = [...columns, ...rows].flatMap((one) => ('faults' in one ? one.faults : []));
  if (all.length > 0) return all.slice(0, mostFaults);
  return { columns: columns as Heading[], rows: rows.map((row) => (row as { numbers: number[] }).numbers) };
}

function checkSize({ cells }: CsvRecord, lines: readonly CsvRecord[], at: string): Fault[] {
  if (cells.length < 2 || cells.length > mostColumns) {
    const hint = cells[0]?.includes(';') || cells[0]?.includes('\t') ? { hint: 'Separate the cells by commas.' } : {};
    const allowed = `2 to ${mostColumns} columns`;
    return [
      slip(at, 1, 1, `There ${cells.length === 1 ? 'is 1 column' : `are ${cells.length} columns`}.`, {
        code: 'out-of-range',
        allowed,
        ...hint,
      }),
    ];
  }
  if (lines.length >= 2 && lines.length <= mostRows) return [];
  return [
    slip(at, 1, 1, `There are ${lines.length} lines of numbers.`, {
      code: 'out-of-range',
      allowed: `2 to ${mostRows}`,
    }),
  ];
}

function readHeading(cell: string, column: number, at: string): Heading | { faults: Fault[] } {
  const told = (message: string, rest: Told) => ({
    faults: [slip(at, 1, column, message, { received: shortened(cell), ...rest })],
  });
  const [, name, unit] = heading.exec(cell) ?? [];
  if (name === undefined || unit === undefined) {
    return told('The heading is not a name, a blank and a unit in brackets.', {
      code: 'wrong-type',
      allowed: 'name [unit], as in temperature [degC]',
    });
  }
  if (!isName(name)) {
    const [near] = nearestNames(name, names, 1);
    const hint = near === undefined ? {} : { hint: `Perhaps ${near}.` };
    return told(name === '' ? 'The heading has no name.' : `There is no column ${shortened(name)}.`, {
      code: 'unknown-id',
      allowed: names.join(', '),
      ...hint,
    });
  }
  const units: readonly string[] = columnKinds[name].units;
  if (units.includes(unit)) return { name, unit };
  const meant = unitMeant(unit, units);
  return told(`${shortened(unit)} is not a unit of ${name}.`, {
    code: 'unknown-unit',
    allowed: units.join(', '),
    ...(meant === undefined ? {} : { hint: `Perhaps ${meant}.` }),
  });
}

function readRow({ line, cells }: CsvRecord, headings: readonly string[], at: string) {
  if (cells.length !== headings.length) {
    const message = `The line has ${cells.length} ${cells.length === 1 ? 'cell' : 'cells'} for ${headings.length} headings.`;
    return { faults: [slip(at, line, Math.min(cells.length, headings.length), message, { code: 'contradiction' })] };
  }
  const faults = cells.flatMap((cell, i) => (number.test(cell) ? [] : [numberSlip(cell, line, i + 1, at)]));
  return faults.length > 0 ? { faults } : { numbers: cells.map((cell) => Number(cell) + 0) };
}

function numberSlip(cell: string, line: number, column: number, at: string): Fault {
  if (cell === '') {
    const hint = 'A combination that the manual leaves blank has no line.';
    return slip(at, line, column, 'The cell is blank.', { code: 'missing', allowed: 'a number', hint });
  }
  const hint = /^\d+,\d+$/.test(cell) ? { hint: 'Write the decimals behind a point, and thousands together.' } : {};
  const allowed = 'a number such as 1115 or -12.5';
  return slip(at, line, column, 'The cell is not a number.', {
    code: 'wrong-type',
    received: shortened(cell),
    allowed,
    ...hint,
  });
}

function isName(name: string): name is ColumnName {
  return (names as readonly string[]).includes(name);
}

function slip(at: string, line: number, column: number, message: string, rest: Told): Fault {
  return { pointer: at, message: `${placeText(line, column)}: ${message}`, ...rest };
}

/** Where something stands in a CSV text, for a sentence. */
export function placeText(line: number, column?: number): string {
  return column === undefined ? `Line ${line}` : `Line ${line}, column ${column}`;
}
