/** Nodes and weights of a Gauss-Legendre rule on [-1, 1], nodes rising. */
export interface GaussRule {
  readonly order: number;
  readonly nodes: Float64Array;
  readonly weights: Float64Array;
}

/**
 * The Gauss-Legendre rule of n nodes: exact for polynomials up to degree 2n - 1.
 *
 * The nodes are the roots of P_n, found by Newton from cos(pi (i - 1/4)/(n + 1/2)); w = 2/((1 - x^2) P_n'(x)^2). Meant to be
 * called once where a module loads, not in a computation.
 *
 * @param order - n, 1 to 64
 * @see references.AbramowitzStegun, 25.4.29 and 22.16.6
 */
export function gaussLegendre(order: number): GaussRule {
  if (!(Number.isInteger(order) && order >= 1 && order <= 64)) {
    throw new RangeError(`order must be a whole number from 1 to 64: ${order}`);
  }
  const nodes = new Float64Array(order);
  const weights = new Float64Array(order);
  for (let i = 0; i < (order + 1) >> 1; i++) {
    let x = Math.cos((Math.PI * (i + 0.75)) / (order + 0.5));
    let slope = 1;
    for (let step = 0; step < 10; step++) {
      let p = 1;
      let before = 0;
      for (let k = 1; k <= order; k++) {
        const next = ((2 * k - 1) * x * p - (k - 1) * before) / k;
        before = p;
        p = next;
      }
      slope = (order * (x * p - before)) / (x * x - 1);
      const change = p / slope;
      x -= change;
      if (Math.abs(change) < 1e-15) break;
    }
    const middle = 2 * i + 1 === order;
    nodes[i] = middle ? 0 : -x;
    nodes[order - 1 - i] = middle ? 0 : x;
    const weight = 2 / ((1 - x * x) * slope * slope);
    weights[i] = weight;
    weights[order - 1 - i] = weight;
  }
  return { order, nodes, weights };
}
