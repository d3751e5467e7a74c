/** How a figure was obtained: the text was seen; quoted elsewhere; recalled; computed from the named formula. */
export type FigureStatus = 'read' | 'secondary' | 'memory' | 'computed';

/** What a group of figures shares. */
export interface Provenance {
  readonly source: string;
  readonly section: string;
  readonly status: FigureStatus;
  readonly quantity: string;
  readonly unit: string;
  readonly note?: string;
}

export interface Row<Inputs> {
  readonly id: string;
  /** units in the names, as published */
  readonly inputs: Inputs;
  readonly expected: number;
  /** absolute, in the unit of the figure */
  readonly tolerance: number;
}

export interface Figure<Inputs> extends Row<Inputs>, Provenance {
  /** says what, where from and how close, for the test's title */
  readonly title: string;
}

/** Rows of one source with their provenance and a title each. */
export function figures<Inputs extends object>(
  provenance: Provenance,
  rows: readonly Row<Inputs>[],
): readonly Figure<Inputs>[] {
  return rows.map((row) => ({ ...provenance, ...row, title: titleOf(provenance, row) }));
}

function titleOf({ source, section, status, quantity, unit }: Provenance, row: Row<object>): string {
  const given = Object.entries(row.inputs).map(([name, value]) => `${name} ${value}`);
  return [
    `${row.id}: ${quantity}${given.length === 0 ? '' : ` at ${given.join(', ')}`}`,
    `= ${row.expected} ± ${row.tolerance} ${unit}`,
    `[${source}, ${section}; ${status}]`,
  ].join(' ');
}
