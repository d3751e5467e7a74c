import type { ManualAxis } from '../../performance/flight-manual/flight-manual.ts';
import { speaksOfSurface } from '../../performance/flight-manual/speaks-of-surface.ts';
import type { FlightManualOnWire } from '../flight-manual/flight-manual.ts';
import type { ManualGraphOnWire } from '../flight-manual/manual-graph.ts';
import type { ManualTableOnWire } from '../flight-manual/manual-table.ts';
import type { SheetOnWire } from '../flight-manual/to-manual-sheet.ts';
import { isAxis, isOutput } from '../flight-manual/to-manual-table.ts';
import type { WorkedExampleOnWire } from '../flight-manual/worked-example.ts';
import { toSurface } from '../to-runway.ts';
import { entriesOf } from './check-manual-graph.ts';

/** A table or a graph with what it is entered with and gives: what its notes and examples are checked against. */
export interface EnteredSheet {
  readonly sheet: SheetOnWire & { readonly workedExamples?: readonly WorkedExampleOnWire[] };
  readonly pointer: string;
  readonly axes: readonly ManualAxis[];
  readonly outputs: readonly string[];
  /** values along the headwind axis, in its unit */
  readonly winds: readonly number[];
  /** whether this sheet or another one for its configurations gives the ground roll */
  readonly hasRoll: boolean;
}

/** An example with where it stands and what its sheet is entered with and gives. */
export interface PlacedExample {
  readonly sheet: string;
  readonly index: number;
  readonly example: WorkedExampleOnWire;
  readonly axes: readonly ManualAxis[];
  readonly outputs: readonly string[];
  readonly pointer: string;
}

/** Tables and graphs alike. */
export function enteredSheets({ tables = [], graphs = [] }: FlightManualOnWire, at: string): EnteredSheet[] {
  const sheets = [
    ...tables.map((table, i) => ({ sheet: table, pointer: `${at}/tables/${i}`, ...entryOfTable(table) })),
    ...graphs.map((graph, i) => ({ sheet: graph, pointer: `${at}/graphs/${i}`, ...entryOfGraph(graph) })),
  ];
  return sheets.map((one) => ({
    ...one,
    hasRoll: sheets.some(
      ({ sheet, outputs }) =>
        outputs.includes('groundRoll') &&
        sheet.for === one.sheet.for &&
        one.sheet.configurations.every((id) => sheet.configurations.includes(id)) &&
        speaksOfSurface(toSurface(sheet.conditions.surface), toSurface(one.sheet.conditions.surface)),
    ),
  }));
}

export function examplesOf({ sheet, axes, outputs, pointer }: EnteredSheet): PlacedExample[] {
  return (sheet.workedExamples ?? []).map((example, index) => ({
    sheet: sheet.id,
    index,
    example,
    axes,
    outputs,
    pointer: `${pointer}/workedExamples/${index}`,
  }));
}

function entryOfTable({ columns, rows }: ManualTableOnWire) {
  const names = columns.map(({ name }) => name);
  const wind = names.indexOf('headwind');
  return {
    axes: names.filter(isAxis),
    outputs: names.filter(isOutput),
    winds: wind < 0 ? [] : rows.map((row) => row[wind] ?? 0),
  };
}

function entryOfGraph({ panels, output }: ManualGraphOnWire) {
  const names = panels.flatMap(entriesOf).flatMap((entry) => (entry === 'previous' ? [] : [entry.name as string]));
  const winds = panels.flatMap((panel) => {
    const isWind = (entry: ReturnType<typeof entriesOf>[number] | undefined) =>
      entry !== undefined && entry !== 'previous' && entry.name === 'headwind';
    const [across, parameter] = entriesOf(panel);
    if (isWind(across)) return panel.curves.flatMap(({ points }) => points.map(([x]) => x));
    return isWind(parameter) ? panel.curves.map((curve) => curve.parameter) : [];
  });
  return { axes: names.filter(isAxis), outputs: [output.name as string], winds };
}
