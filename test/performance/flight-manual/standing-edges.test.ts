import { describe, expect, it } from 'vitest';
import type { ManualTable } from '../../../src/performance/flight-manual/flight-manual.ts';
import { standingEdges } from '../../../src/performance/flight-manual/standing-edges.ts';
import { takeoffTable } from '../../support/manual-sheets.ts';

const edges = (members: Partial<ManualTable>) => [...standingEdges(takeoffTable(members))];
const cells = takeoffTable().cells;

describe('edges that stand', () => {
  it('are those at which every figure of the face is no longer than further in', () => {
    expect(edges({})).toEqual(['pressureAltitude', 'temperature']);
  });

  it('count equal figures as longer', () => {
    expect(
      edges({
        cells: [
          [200, 400],
          [220, 440],
          [200, 400],
          [220, 440],
        ],
      }),
    ).toContain('pressureAltitude');
  });

  it.each([
    [
      'one roll',
      [
        [200, 400],
        [220, 440],
        [199, 500],
        [280, 560],
      ],
    ],
    [
      'one whole distance in another row',
      [
        [200, 400],
        [220, 440],
        [240, 430],
        [280, 439],
      ],
    ],
  ])('fall with %s that is longer at the edge, over the whole face', (_, other) => {
    expect(edges({ cells: other })).toEqual(['temperature']);
  });

  it('look at the next node inward alone', () => {
    const nodes = [[0], [500], [1000]];
    const three: Partial<ManualTable> = { axes: ['pressureAltitude'], nodes };
    expect(
      edges({
        ...three,
        cells: [
          [200, 400],
          [210, 420],
          [205, 410],
        ],
      }),
    ).toEqual(['pressureAltitude']);
    expect(
      edges({
        ...three,
        cells: [
          [200, 400],
          [190, 420],
          [250, 500],
        ],
      }),
    ).toEqual([]);
  });

  it('stand at the greatest headwind, and on a climb where it is the less steep', () => {
    const wind: Partial<ManualTable> = { axes: ['headwind'], nodes: [[0], [10]] };
    expect(
      edges({
        ...wind,
        cells: [
          [200, 400],
          [160, 330],
        ],
      }),
    ).toEqual(['headwind']);
    expect(
      edges({
        ...wind,
        cells: [
          [200, 400],
          [210, 330],
        ],
      }),
    ).toEqual([]);
    const climb: Partial<ManualTable> = { axes: ['mass'], nodes: [[800], [1000]], outputs: ['climbGradient'] };
    expect(edges({ ...climb, cells: [[0.12], [0.09]] })).toEqual(['mass']);
    expect(edges({ ...climb, cells: [[0.08], [0.09]] })).toEqual([]);
  });

  it('are decided where rows have nodes of their own, and not where nothing stands beside the face', () => {
    const nodes = [
      [0, 273],
      [0, 293],
      [1000, 263],
      [1000, 283],
    ];
    expect(edges({ nodes, cells })).toEqual(['pressureAltitude', 'temperature']);
    const apart = [
      [0, 273],
      [0, 283],
      [1000, 293],
      [1000, 303],
    ];
    expect(edges({ nodes: apart, cells })).toEqual(['temperature']);
  });
});
