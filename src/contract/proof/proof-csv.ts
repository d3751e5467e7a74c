import { csvText } from './csv-text.ts';
import { advisoryLine } from './proof-page.ts';
import type { ProofResponse } from './proof-response.ts';

/** A proof as CSV: a header of names with units, one record a row, and in each what it is. */
export function proofCsv({ columns, rows }: ProofResponse): string {
  const header = columns.map(({ name, unit }) => (unit === undefined ? name : `${name} [${unit}]`));
  return csvText([[...header, 'advisory'], ...rows.map((row) => [...row, advisoryLine])]);
}
