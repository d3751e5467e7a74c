/** A share of a cell, or a part of an axis, within which a point counts as being on the node; room for converted units. */
const slack = 1e-9;

/** Where a value lies among rising nodes. */
export interface NodeShare {
  /** the node at or below */
  readonly node: number;
  /** how far on to the next one, 0 up to but not including 1 */
  readonly share: number;
  /** where the nodes do not reach */
  readonly beyond?: 'below' | 'above';
}

/**
 * The place of a value among rising nodes, held at the first or last one and told so where it lies beyond them.
 *
 * share = (x - x_i) / (x_i+1 - x_i); a value within a billionth of a cell of a node is on it.
 *
 * @param nodes - strictly rising, at least one
 * @param x - in the nodes' unit
 */
export function nodeShare(nodes: readonly number[], x: number): NodeShare {
  const last = nodes.length - 1;
  const lowest = nodes[0] as number;
  const highest = nodes[last] as number;
  if (Number.isNaN(x) || last < 0) throw new RangeError(`x must be a number among nodes: ${x}`);
  const room = slack * Math.max(1, highest - lowest);
  if (x <= lowest) return x < lowest - room ? { node: 0, share: 0, beyond: 'below' } : { node: 0, share: 0 };
  if (x >= highest) return x > highest + room ? { node: last, share: 0, beyond: 'above' } : { node: last, share: 0 };
  let below = 0;
  let above = last;
  while (above - below > 1) {
    const middle = (below + above) >> 1;
    if ((nodes[middle] as number) <= x) below = middle;
    else above = middle;
  }
  const from = nodes[below] as number;
  const share = (x - from) / ((nodes[above] as number) - from);
  if (share <= slack) return { node: below, share: 0 };
  return share >= 1 - slack ? { node: above, share: 0 } : { node: below, share };
}

/** Between two values, never beyond either by rounding. */
export function between(from: number, to: number, share: number): number {
  const value = from + (to - from) * share;
  return from < to ? Math.min(Math.max(value, from), to) : Math.max(Math.min(value, from), to);
}
