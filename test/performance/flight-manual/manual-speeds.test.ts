import { describe, expect, it } from 'vitest';
import { manualSpeeds } from '../../../src/performance/flight-manual/manual-speeds.ts';
import { manualWith } from '../../support/manual-sheets.ts';

const manual = {
  ...manualWith([]),
  speedTables: [
    {
      id: 'speeds',
      page: '4-3',
      configurations: ['flap-10'],
      airspeed: 'cas',
      speeds: ['liftOff', 'screen'],
      masses: [800, 1000],
      cells: [
        [24, 28],
        [26, 31],
      ],
    },
  ],
} as const;

describe("the manual's speeds", () => {
  it('are linear between masses and met at each', () => {
    expect(manualSpeeds(manual, 'flap-10', 1000)).toMatchObject({ speeds: { liftOff: 26, screen: 31 }, edges: [] });
    expect(manualSpeeds(manual, 'flap-10', 850)).toEqual({
      outcome: 'speeds',
      speeds: { liftOff: 24.5, screen: 28.75 },
      sheet: { id: 'speeds', page: '4-3' },
      edges: [],
    });
  });

  it('are those of the lightest mass below it, named as an edge, and none above the heaviest', () => {
    const edge = { sheet: 'speeds', axis: 'mass', given: 700, bound: 800, side: 'below' };
    expect(manualSpeeds(manual, 'flap-10', 700)).toMatchObject({ speeds: { liftOff: 24 }, edges: [edge] });
    expect(manualSpeeds(manual, 'flap-10', 700, 'refuse')).toEqual({
      outcome: 'outside-flight-manual',
      bounds: [edge],
    });
    expect(manualSpeeds(manual, 'flap-10', 1001)).toMatchObject({
      outcome: 'outside-flight-manual',
      bounds: [{ bound: 1000, side: 'above' }],
    });
  });

  it('are none for a configuration without a table', () => {
    expect(manualSpeeds(manual, 'flap-20', 900)).toBeUndefined();
  });
});
