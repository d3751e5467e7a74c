import type { ManualAxis, ManualGraph, ManualOutput, ManualTable } from './flight-manual.ts';
import type { ManualAsked, ManualBound } from './manual-figures.ts';
import { speaks } from './off-conditions.ts';
import { readGraph } from './read-graph.ts';
import { type Crossing, type ManualPoint, type ReadingTrail, readLevel } from './read-level.ts';
import { standingEdges } from './standing-edges.ts';
import { tableIndex } from './table-index.ts';

/** What a sheet prints for a point, before its notes [SI]. */
export interface SheetReading {
  readonly outputs: Readonly<Partial<Record<ManualOutput, number>>>;
  /** as printed, or else of the standard atmosphere [K] */
  readonly standardTemperature: number;
  readonly edges: readonly ManualBound[];
  /** where the figures mean nothing, for the sheet does not reach */
  readonly outside: readonly ManualBound[];
}

const noEdges: ReadonlySet<ManualAxis> = new Set();
const graphAxes = new WeakMap<ManualGraph, readonly ManualAxis[]>();

/** What a sheet is entered with. */
export function axesOf(sheet: ManualTable | ManualGraph): readonly ManualAxis[] {
  if ('axes' in sheet) return sheet.axes;
  const known = graphAxes.get(sheet);
  if (known !== undefined) return known;
  const entries = sheet.panels.flatMap(({ across, parameter }) => [across, parameter]);
  const axes = [...new Set(entries)].filter((axis): axis is ManualAxis => axis !== 'previous');
  graphAxes.set(sheet, axes);
  return axes;
}

/**
 * What a table or a graph prints for what is asked, interpolated and never extrapolated.
 *
 * The headwind axis takes the wind as given where the sheet's figures hold an allowance for it, and the credited wind otherwise; a
 * tailwind of which a note speaks enters as calm.
 */
export function readSheet(sheet: ManualTable | ManualGraph, asked: ManualAsked): SheetReading {
  const wind = sheet.contains.windAllowance ? asked.headwind : asked.creditedHeadwind;
  const point: ManualPoint = {
    flap: asked.flap,
    mass: asked.mass,
    pressureAltitude: asked.pressureAltitude,
    temperature: asked.temperature,
    temperatureDeviation: asked.temperature - asked.standardTemperature,
    headwind: wind < 0 && speaks(sheet.notes, 'tailwind') ? 0 : wind,
  };
  return 'axes' in sheet ? readTable(sheet, asked, point) : readDrawn(sheet, asked, point);
}

function readTable(table: ManualTable, asked: ManualAsked, point: ManualPoint): SheetReading {
  const edges = asked.edges === 'use' ? standingEdges(table) : noEdges;
  const trail: ReadingTrail = { edges, held: [], outside: [] };
  const figures = readLevel(tableIndex(table), point, trail);
  const outputs: Partial<Record<ManualOutput, number>> = {};
  for (const [i, output] of table.outputs.entries()) outputs[output] = figures[i] as number;
  return {
    outputs,
    standardTemperature: figures[table.outputs.length] ?? asked.standardTemperature,
    edges: nearest(trail.held),
    outside: nearest(trail.outside),
  };

  /** One bound an axis and side: on a ragged grid the first that the point comes to. */
  function nearest(crossings: readonly Crossing[]): ManualBound[] {
    const bounds: ManualBound[] = [];
    for (const { axis, bound, side } of crossings) {
      const same = bounds.findIndex((other) => other.axis === axis && other.side === side);
      const found = { sheet: table.id, axis, given: point[axis], bound, side };
      if (same < 0) bounds.push(found);
      else if (side === 'above' ? bound < (bounds[same]?.bound as number) : bound > (bounds[same]?.bound as number)) {
        bounds[same] = found;
      }
    }
    return bounds;
  }
}

function readDrawn(graph: ManualGraph, asked: ManualAsked, point: ManualPoint): SheetReading {
  const { standardTemperature } = asked;
  const read = readGraph(graph, point);
  if (typeof read !== 'number') {
    return { outputs: {}, standardTemperature, edges: [], outside: [{ sheet: graph.id, ...read }] };
  }
  return { outputs: { [graph.outputs[0]]: read }, standardTemperature, edges: [], outside: [] };
}
