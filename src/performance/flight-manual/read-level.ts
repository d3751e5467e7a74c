import { flapNode, nearestFlap } from './flap-node.ts';
import type { ManualAxis } from './flight-manual.ts';
import { between, nodeShare } from './node-share.ts';
import { type AxisLevel, isRow, type Level } from './table-index.ts';

/** What a table is entered with, SI. */
export type ManualPoint = Readonly<Record<ManualAxis, number>>;

/** A place where a point leaves the printed nodes. */
export interface Crossing {
  readonly axis: ManualAxis;
  readonly bound: number;
  readonly side: 'below' | 'above';
}

/** What one reading gathers on its way. */
export interface ReadingTrail {
  /** axes whose edge stands for what lies beyond it on the side where it is the longer */
  readonly edges: ReadonlySet<ManualAxis>;
  /** edges that stood */
  readonly held: Crossing[];
  /** where there is nothing to stand */
  readonly outside: Crossing[];
}

/** The side of each axis beyond which an edge may stand: lighter, lower, colder, more headwind. */
export const edgeSides: Readonly<Partial<Record<ManualAxis, 'below' | 'above'>>> = {
  mass: 'below',
  pressureAltitude: 'below',
  temperature: 'below',
  temperatureDeviation: 'below',
  headwind: 'above',
};

/**
 * The figures of a point: linear between the nodes of each axis, axis within axis.
 *
 * The outer axis takes the two rows of nodes around the point, and each of these is read over its own inner nodes. So a grid
 * need not be regular, a row is met exactly, and the figures lie within those of the cell's corners. Flap is met or is not there.
 *
 * @returns the figures; they mean nothing where the trail has gone outside
 */
export function readLevel(level: Level, point: ManualPoint, trail: ReadingTrail): readonly number[] {
  if (isRow(level)) return level;
  if (level.axis === 'flap') return readLevel(flapRows(level, point.flap, trail), point, trail);
  const { axis, nodes, below } = level;
  const { node, share, beyond } = nodeShare(nodes, point[axis]);
  if (beyond !== undefined) {
    const crossing = { axis, bound: nodes[node] as number, side: beyond };
    const stands = trail.edges.has(axis) && edgeSides[axis] === beyond;
    (stands ? trail.held : trail.outside).push(crossing);
  }
  const from = readLevel(below[node] as Level, point, trail);
  if (share === 0) return from;
  const to = readLevel(below[node + 1] as Level, point, trail);
  return from.map((figure, i) => between(figure, to[i] as number, share));
}

function flapRows({ nodes, below }: AxisLevel, flap: number, { outside }: ReadingTrail): Level {
  const met = flapNode(nodes, flap);
  if (met !== undefined) return below[met] as Level;
  const { node, bound, side } = nearestFlap(nodes, flap);
  outside.push({ axis: 'flap', bound, side });
  return below[node] as Level;
}
