import { flapNode, nearestFlap } from './flap-node.ts';
import type { GraphPanel, ManualGraph } from './flight-manual.ts';
import { between, nodeShare } from './node-share.ts';
import type { ManualPoint } from './read-level.ts';

/** Where a reading leaves the drawn curves; 'previous' is what the panel before gave, in the measure of the output. */
export interface GraphCrossing {
  readonly axis: GraphPanel['across'];
  readonly given: number;
  readonly bound: number;
  readonly side: 'below' | 'above';
}

/** The two curves around a parameter; the second is absent on a curve itself. */
interface Between {
  readonly from: Curve;
  readonly to?: Curve;
  readonly share: number;
}
type Curve = GraphPanel['curves'][number];

/**
 * What a graph gives at a point: panel by panel, what one gives enters the next, inside the drawn curves alone.
 *
 * A panel is read on the two curves around the parameter, each linear between its digitised points, and linear between the
 * two. On a guide panel the parameter is the height at the reference line, so that a point follows the guide lines around it.
 *
 * @returns the height of the last panel, or where the first panel at fault ends
 */
export function readGraph({ panels }: ManualGraph, point: ManualPoint): number | GraphCrossing {
  let previous = Number.NaN;
  for (const panel of panels) {
    const x = panel.across === 'previous' ? previous : point[panel.across];
    const parameter = panel.parameter === 'previous' ? previous : point[panel.parameter];
    const height = readPanel(panel, x, parameter);
    if (typeof height !== 'number') return height;
    previous = height;
  }
  return previous;
}

function readPanel(panel: GraphPanel, x: number, parameter: number): number | GraphCrossing {
  const around = curvesAround(panel, parameter);
  if (!('from' in around)) return around;
  const from = heightAt(panel, around.from, x);
  if (around.to === undefined || typeof from !== 'number') return from;
  const to = heightAt(panel, around.to, x);
  return typeof to === 'number' ? between(from, to, around.share) : to;
}

function curvesAround({ parameter: axis, curves }: GraphPanel, given: number): Between | GraphCrossing {
  const parameters = curves.map(({ parameter }) => parameter);
  if (axis === 'flap') {
    const met = flapNode(parameters, given);
    if (met !== undefined) return { from: curves[met] as Curve, share: 0 };
    const { bound, side } = nearestFlap(parameters, given);
    return { axis, given, bound, side };
  }
  const { node, share, beyond } = nodeShare(parameters, given);
  if (beyond !== undefined) return { axis, given, bound: parameters[node] as number, side: beyond };
  const from = curves[node] as Curve;
  return share === 0 ? { from, share } : { from, to: curves[node + 1] as Curve, share };
}

function heightAt({ across }: GraphPanel, { points }: Curve, x: number): number | GraphCrossing {
  const along = points.map(([place]) => place);
  const { node, share, beyond } = nodeShare(along, x);
  if (beyond !== undefined) return { axis: across, given: x, bound: along[node] as number, side: beyond };
  const [, height] = points[node] as readonly [number, number];
  return share === 0 ? height : between(height, (points[node + 1] as readonly [number, number])[1], share);
}
