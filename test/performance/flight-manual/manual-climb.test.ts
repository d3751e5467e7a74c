import { describe, expect, it } from 'vitest';
import type { ManualTable } from '../../../src/performance/flight-manual/flight-manual.ts';
import { manualClimb } from '../../../src/performance/flight-manual/manual-climb.ts';
import { manualWith, stepNote, takeoffAsked, takeoffTable } from '../../support/manual-sheets.ts';

const climb = (members: Partial<ManualTable>) =>
  takeoffTable({ phase: 'climb', outputs: ['climbGradient'], cells: [[0.1], [0.09], [0.08], [0.07]], ...members });

describe("the manual's climb", () => {
  it('is its gradient and its rate, from one sheet or two, whatever the wind, the slope and the surface', () => {
    const asked = takeoffAsked({
      pressureAltitude: 500,
      headwind: 5,
      slope: 0.01,
      surface: { kind: 'grass', state: 'wet' },
    });
    const rate = climb({ id: 'rate', outputs: ['climbRate'], cells: [[4], [3.6], [3.2], [2.8]] });
    expect(manualClimb(manualWith([climb({}), rate]), asked)).toMatchObject({
      outcome: 'climb',
      gradient: expect.closeTo(0.09, 12),
      rate: expect.closeTo(3.6, 12),
      sheets: [{ id: 'takeoff' }, { id: 'rate' }],
      edges: [],
    });
    expect(manualClimb(manualWith([takeoffTable()]), asked)).toBeUndefined();
  });

  it('takes its notes, and stands on the edge where it is the less steep', () => {
    const bare = climb({
      axes: ['pressureAltitude'],
      nodes: [[0], [1000]],
      cells: [[0.1], [0.08]],
      notes: [stepNote('aboveStandard', -0.1, 10, { multiplies: 'climb' })],
    });
    const warm = takeoffAsked({ temperature: 293.15 });
    expect(manualClimb(manualWith([bare]), warm)).toMatchObject({ gradient: expect.closeTo(0.095, 12) });
    const lower = manualClimb(manualWith([climb({})]), takeoffAsked({ pressureAltitude: -100 }));
    expect(lower).toMatchObject({ gradient: 0.1, edges: [{ axis: 'pressureAltitude', bound: 0 }] });
    const higher = manualClimb(manualWith([climb({})]), takeoffAsked({ pressureAltitude: 1100 }));
    expect(higher).toMatchObject({ outcome: 'outside-flight-manual', bounds: [{ side: 'above' }] });
  });
});
