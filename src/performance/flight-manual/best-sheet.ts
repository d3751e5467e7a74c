import type { FlightManual, ManualOutput, ManualPhase, Sheet } from './flight-manual.ts';
import type { AppliedNote, ManualAsked, ManualBound, ManualSilence, OutsideManual } from './manual-figures.ts';
import { type SheetFigures, sheetFigures } from './sheet-figures.ts';

/** A sheet and what it makes of the question. */
export interface SheetFound {
  readonly sheet: Sheet;
  readonly figures: SheetFigures;
}

/** The sheets of a manual for one phase and configuration; those that give the most outputs first, then in its order. */
export function sheetsFor({ tables, graphs }: FlightManual, phase: ManualPhase, configuration: string): Sheet[] {
  return [...tables, ...graphs]
    .filter((sheet) => sheet.phase === phase && sheet.configurations.includes(configuration))
    .sort((a, b) => b.outputs.length - a.outputs.length);
}

export function gives(sheet: Sheet, output: ManualOutput): boolean {
  return sheet.outputs.some((given) => given === output);
}

/**
 * Of several sheets for an output the first that holds the point, else the one on the fewest edges and for the nearest mass.
 *
 * @param others - sheets of the manual from which a ground roll may come that a note adds a share of
 * @returns undefined where no sheet gives the output; with the bounds of every sheet where none reaches
 */
export function bestSheet(
  sheets: readonly Sheet[],
  output: ManualOutput,
  asked: ManualAsked,
  others: readonly Sheet[] = [],
): SheetFound | undefined {
  const giving = sheets.filter((sheet) => gives(sheet, output));
  const bounds: ManualBound[] = [];
  let best: SheetFound | undefined;
  for (const sheet of giving) {
    const figures = sheetFigures(sheet, asked, others);
    const found = { sheet, figures };
    if (figures.outside.length > 0) bounds.push(...figures.outside);
    else if (figures.edges.length === 0) return found;
    else if (best === undefined || isNearer(found, best)) best = found;
  }
  const [sheet] = giving;
  if (best !== undefined || sheet === undefined) return best;
  return { sheet, figures: { outputs: {}, notes: [], silent: [], edges: [], outside: bounds } };
}

function isNearer(one: SheetFound, other: SheetFound): boolean {
  const edges = one.figures.edges.length - other.figures.edges.length;
  return edges === 0 ? massOf(one) < massOf(other) : edges < 0;
}

function massOf({ sheet }: SheetFound): number {
  return sheet.conditions.mass ?? Number.POSITIVE_INFINITY;
}

/** What stands behind the figures of one sheet or two. */
export interface SheetsUsed {
  readonly sheets: readonly { readonly id: string; readonly page: string }[];
  readonly notes: readonly AppliedNote[];
  readonly silent: readonly ManualSilence[];
  readonly edges: readonly ManualBound[];
}

/** What the sheets found say together, each told once; undefined where none was found. */
export function together(
  one: SheetFound | undefined,
  other: SheetFound | undefined,
): SheetsUsed | OutsideManual | undefined {
  const found = [one, other].filter((sheet) => sheet !== undefined);
  if (found.length === 0) return undefined;
  const used = one?.sheet === other?.sheet ? found.slice(0, 1) : found;
  const outside = used.flatMap(({ figures }) => figures.outside);
  if (outside.length > 0) return { outcome: 'outside-flight-manual', bounds: once(outside) };
  return {
    sheets: used.map(({ sheet: { id, page } }) => ({ id, page })),
    notes: used.flatMap(({ figures }) => figures.notes),
    silent: [...new Set(used.flatMap(({ figures }) => figures.silent))],
    edges: once(used.flatMap(({ figures }) => figures.edges)),
  };
}

function once(bounds: readonly ManualBound[]): ManualBound[] {
  return bounds.filter(
    ({ sheet, axis, side }, i) =>
      bounds.findIndex((other) => other.sheet === sheet && other.axis === axis && other.side === side) === i,
  );
}
