import type { CsvTable } from './read-table-csv.ts';

/**
 * A table as CSV: headings `name [unit]`, then one line a row, each ended by CR LF.
 *
 * No heading and no number holds a comma, so that nothing is quoted.
 *
 * @see references.Rfc4180, sec. 2
 */
export function writeTableCsv({ columns, rows }: CsvTable): string {
  const headings = columns.map(({ name, unit }) => `${name} [${unit}]`);
  return [headings, ...rows].map((cells) => `${cells.join(',')}\r\n`).join('');
}
