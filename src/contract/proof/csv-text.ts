/**
 * Records as RFC 4180 writes them: fields apart by commas, each record ended by CR LF, a field in quotation marks where it holds
 * one of these or a quotation mark.
 *
 * @see references.Rfc4180
 */
export function csvText(records: readonly (readonly (string | number)[])[]): string {
  return records.map((fields) => `${fields.map(field).join(',')}\r\n`).join('');
}

function field(value: string | number): string {
  const text = String(value);
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}
