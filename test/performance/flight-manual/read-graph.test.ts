import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import type { GraphPanel } from '../../../src/performance/flight-manual/flight-manual.ts';
import type { ManualAsked } from '../../../src/performance/flight-manual/manual-figures.ts';
import { readSheet } from '../../../src/performance/flight-manual/read-sheet.ts';
import { takeoffAsked, takeoffGraph } from '../../support/manual-sheets.ts';

const read = (asked: Partial<ManualAsked>) => readSheet(takeoffGraph(), takeoffAsked(asked));
const within = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('a graph', () => {
  test.prop([within(0, 2000), within(273, 293), within(900, 1000), within(0, 10)])(
    'gives what its straight curves say one after the other, by hand, to 1e-9',
    (pressureAltitude, temperature, mass, headwind) => {
      const first = 200 + 0.1 * pressureAltitude + 2 * (temperature - 273);
      const expected = ((first * mass) / 1000) * (1 - 0.01 * headwind);
      const { outputs, outside } = read({ pressureAltitude, temperature, mass, headwind });
      const onGuides = (first * mass) / 1000;
      fc.pre(Math.abs(onGuides - 200) > 1e-3);
      if (onGuides < 200) {
        expect(outside).toMatchObject([{ axis: 'previous', side: 'below', bound: 200 }]);
        return;
      }
      expect(outside).toEqual([]);
      expect(Math.abs((outputs.takeoffDistance as number) / expected - 1)).toBeLessThanOrEqual(1e-9);
    },
  );

  it.each([
    ['pressureAltitude', { pressureAltitude: 2100 }, 2000, 'above'],
    ['pressureAltitude', { pressureAltitude: -1 }, 0, 'below'],
    ['temperature', { temperature: 294 }, 293, 'above'],
    ['mass', { mass: 1001 }, 1000, 'above'],
    ['mass', { mass: 790 }, 800, 'below'],
    ['headwind', { headwind: 11 }, 10, 'above'],
    ['headwind', { headwind: -1 }, 0, 'below'],
  ] as const)('ends at the drawn curves on the side of %s, edges or not: %o', (axis, asked, bound, side) => {
    expect(read(asked).outside).toEqual([{ sheet: 'graph', axis, given: Object.values(asked)[0], bound, side }]);
  });

  it('ends where what a panel gave is beyond the guide lines of the next', () => {
    const { outside } = read({ mass: 800, temperature: 275 });
    expect(outside).toEqual([
      { sheet: 'graph', axis: 'previous', given: expect.closeTo(163.2, 9), bound: 200, side: 'below' },
    ]);
  });

  it('reads a panel across what came before, on the curve of an axis', () => {
    const [first] = takeoffGraph().panels as [GraphPanel];
    const second: GraphPanel = {
      kind: 'curves',
      across: 'previous',
      parameter: 'mass',
      curves: [
        {
          parameter: 800,
          points: [
            [200, 100],
            [400, 300],
          ],
        },
        {
          parameter: 1000,
          points: [
            [200, 200],
            [400, 500],
          ],
        },
      ],
    };
    const graph = takeoffGraph({ panels: [first, second] });
    // 240 m; 140 and 260 m on the two curves
    const asked = takeoffAsked({ temperature: 293, mass: 900 });
    expect(readSheet(graph, asked).outputs.takeoffDistance).toBeCloseTo(200, 9);
  });

  it('finds flap among its curves and nowhere between', () => {
    const [first] = takeoffGraph().panels as [GraphPanel];
    const flaps: GraphPanel = {
      ...first,
      parameter: 'flap',
      curves: first.curves.map((curve, i) => ({ ...curve, parameter: 0.1 * i })),
    };
    const graph = takeoffGraph({ panels: [flaps] });
    expect(readSheet(graph, takeoffAsked({ flap: 0.1 })).outputs.takeoffDistance).toBe(300);
    expect(readSheet(graph, takeoffAsked({ flap: 0.16 })).outside).toMatchObject([
      { axis: 'flap', given: 0.16, bound: 0.2, side: 'below' },
    ]);
  });
});
