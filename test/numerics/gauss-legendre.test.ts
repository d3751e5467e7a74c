import { describe, expect, it } from 'vitest';
import { gaussLegendre } from '../../src/numerics/gauss-legendre.ts';

describe('gaussLegendre', () => {
  it.each([
    [2, [0.577350269189626], [1]],
    [5, [0.538469310105683, 0.906179845938664], [0.478628670499366, 0.236926885056189]],
    [8, [0.18343464249565, 0.960289856497536], [0.362683783378362, 0.101228536290376]],
  ])(
    'order %i has the printed nodes and weights to 15 digits [Abramowitz & Stegun, table 25.4; memory]',
    (order, nodes, weights) => {
      const rule = gaussLegendre(order);
      nodes.forEach((node, i) => {
        const place = [...rule.nodes].findIndex((x) => Math.abs(x - node) < 2e-15);
        expect(place).toBeGreaterThanOrEqual(0);
        expect(rule.weights[place]).toBeCloseTo(weights[i] as number, 14);
      });
    },
  );

  it.each([1, 2, 3, 6, 7, 14, 16, 24, 40])('order %i is exact for every power up to 2n - 1', (order) => {
    const { nodes, weights } = gaussLegendre(order);
    for (let power = 0; power < 2 * order; power++) {
      const sum = nodes.reduce((total, x, i) => total + (weights[i] as number) * x ** power, 0);
      expect(sum).toBeCloseTo(power % 2 === 0 ? 2 / (power + 1) : 0, 13);
    }
    expect([...nodes]).toEqual([...nodes].sort((a, b) => a - b));
  });

  it('names an order it cannot make', () => {
    for (const order of [0, 1.5, 65, Number.NaN]) expect(() => gaussLegendre(order)).toThrow(/order/);
  });
});
