/** One line of a CSV text: its number from 1, and its cells without their quotation marks. */
export interface CsvRecord {
  readonly line: number;
  readonly cells: readonly string[];
}

/** Where a text first leaves the form of CSV, line and column from 1. */
export interface CsvSlip {
  readonly line: number;
  readonly column: number;
  readonly message: string;
}

/** A cell in quotation marks or without, of printable characters. */
const cell = /"((?:[^"\p{Cc}\p{Cs}]|"")*)"|([^",\p{Cc}\p{Cs}]*)/uy;

/**
 * Reads CSV: cells between commas, in quotation marks where they hold one, lines ended by CR LF or LF, the last perhaps by
 * nothing. A cell does not go over two lines here, and blanks around a comma belong to the cell.
 *
 * @see references.Rfc4180, sec. 2
 */
export function csvRecords(text: string): readonly CsvRecord[] | CsvSlip {
  const lines = text.replace(/\r?\n$/, '').split(/\r?\n/);
  const records: CsvRecord[] = [];
  for (const [i, line] of lines.entries()) {
    const cells: string[] = [];
    cell.lastIndex = 0;
    do {
      if (cells.length > 0) cell.lastIndex++;
      const found = cell.exec(line) as RegExpExecArray;
      cells.push(found[1]?.replaceAll('""', '"') ?? (found[2] as string));
    } while (line[cell.lastIndex] === ',');
    if (cell.lastIndex < line.length) {
      return { line: i + 1, column: cells.length, message: slipAt(line, cell.lastIndex) };
    }
    records.push({ line: i + 1, cells });
  }
  return records;
}

function slipAt(line: string, index: number): string {
  if (line[index] === '"') return 'A quotation mark is not closed on its line, or stands inside a cell without them.';
  return /\p{Cc}|\p{Cs}/u.test(line[index] as string)
    ? 'A control character or half of a surrogate pair stands in the text.'
    : 'Something follows a closing quotation mark.';
}
