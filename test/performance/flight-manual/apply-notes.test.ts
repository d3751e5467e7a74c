import { describe, expect, it } from 'vitest';
import { applyNotes, type CorrectedFigures } from '../../../src/performance/flight-manual/apply-notes.ts';
import type { ManualNote } from '../../../src/performance/flight-manual/flight-manual.ts';
import type { ManualAsked } from '../../../src/performance/flight-manual/manual-figures.ts';
import { stepNote, takeoffAsked, takeoffTable } from '../../support/manual-sheets.ts';

const kt = 1852 / 3600;

/** A roll of 200 m and a distance of 500 m through these notes. */
function corrected(notes: ManualNote[], asked: Partial<ManualAsked>, standardTemperature = 288.15): CorrectedFigures {
  const figures: CorrectedFigures = {
    groundRoll: 200,
    wholeDistance: 500,
    climbFactor: 1,
    notes: [],
    edges: [],
    outside: [],
  };
  applyNotes(takeoffTable({ notes }), takeoffAsked(asked), figures, standardTemperature);
  return figures;
}

const grass: ManualNote = {
  about: 'surface',
  surface: { kind: 'grass', state: 'dry' },
  change: 0.15,
  multiplies: 'groundRollAddedToBoth',
};
const onGrass = { surface: { kind: 'grass', state: 'dry', grass: 'short' } } as const;
const nearly = (value: number) => expect.closeTo(value, 9) as number;

describe('notes', () => {
  it('change in proportion, each what it says it multiplies: by hand', () => {
    const headwind = (multiplies: ManualNote['multiplies']) => [stepNote('headwind', -0.1, 9 * kt, { multiplies })];
    const asked = { headwind: 4.5 * kt };
    expect(corrected(headwind('both'), asked)).toMatchObject({ groundRoll: nearly(190), wholeDistance: nearly(475) });
    expect(corrected(headwind('groundRoll'), asked)).toMatchObject({ groundRoll: nearly(190), wholeDistance: 500 });
    expect(corrected(headwind('wholeDistance'), asked)).toMatchObject({ groundRoll: 200, wholeDistance: nearly(475) });
    expect(corrected(headwind('groundRollAddedToBoth'), asked)).toMatchObject({
      groundRoll: nearly(190),
      wholeDistance: nearly(490),
    });
    expect(corrected(headwind('climb'), asked)).toMatchObject({ groundRoll: 200, climbFactor: nearly(0.95) });
  });

  it('multiply one another, and a share of the roll is of the roll as corrected so far', () => {
    const wind = stepNote('headwind', -0.1, 9 * kt);
    const asked = { headwind: 18 * kt, ...onGrass };
    // 200 x .8 = 160, 15 % of it 24; 500 x .8 + 24
    expect(corrected([wind, grass], asked)).toMatchObject({ groundRoll: nearly(184), wholeDistance: nearly(424) });
    // the other way round: 30 on both, then x .8
    expect(corrected([grass, wind], asked)).toMatchObject({ groundRoll: nearly(184), wholeDistance: nearly(424) });
    const onRoll = stepNote('headwind', -0.1, 9 * kt, { multiplies: 'wholeDistance' });
    expect(corrected([onRoll, grass], asked).wholeDistance).toBeCloseTo(430, 9);
    expect(corrected([grass, onRoll], asked).wholeDistance).toBeCloseTo(424, 9);
  });

  it('count whole steps alone only where they say so', () => {
    const each = stepNote('tailwind', 0.1, 2 * kt, { wholeSteps: true });
    expect(corrected([each], { headwind: -5.9 * kt }).groundRoll).toBeCloseTo(240, 9);
    expect(corrected([each], { headwind: -6 * kt }).groundRoll).toBeCloseTo(260, 9);
    expect(corrected([stepNote('tailwind', 0.1, 2 * kt)], { headwind: -5 * kt }).groundRoll).toBeCloseTo(250, 9);
  });

  it('take the wind as given where they hold the allowance, else the credited one', () => {
    const asked = { headwind: 18 * kt, creditedHeadwind: 9 * kt };
    expect(corrected([stepNote('headwind', -0.1, 9 * kt)], asked).groundRoll).toBeCloseTo(180, 9);
    const holding = stepNote('headwind', -0.1, 9 * kt, { windAllowance: true });
    expect(corrected([holding], asked).groundRoll).toBeCloseTo(160, 9);
  });

  it('hold more headwind at their limit and name it, and refuse that where edges are refused', () => {
    const note = stepNote('headwind', -0.1, 9 * kt, { limit: 18 * kt });
    const held = corrected([note], { headwind: 27 * kt });
    expect(held.groundRoll).toBeCloseTo(160, 9);
    expect(held.edges).toEqual([{ sheet: 'takeoff', axis: 'headwind', given: 27 * kt, bound: 18 * kt, side: 'above' }]);
    expect(held.outside).toEqual([]);
    expect(corrected([note], { headwind: 27 * kt, edges: 'refuse' }).outside).toHaveLength(1);
    expect(corrected([note], { headwind: 18 * kt }).edges).toEqual([]);
  });

  it.each([
    ['tailwind', { headwind: -10.1 * kt }, 10 * kt],
    ['uphill', { slope: 0.011 }, 0.01],
    ['downhill', { slope: -0.011 }, 0.01],
    ['aboveStandard', { temperature: 309 }, 20],
    ['belowStandard', { temperature: 267 }, 20],
    ['aboveMass', { mass: 1051 }, 50],
  ] as const)('refuse more %s than their limit', (about, asked, limit) => {
    const { outside } = corrected([stepNote(about, 0.1, limit, { limit })], asked);
    expect(outside).toMatchObject([{ sheet: 'takeoff', axis: about, bound: limit, side: 'above' }]);
  });

  it.each([
    ['headwind', { headwind: 20 * kt }, { headwind: 20.1 * kt }],
    ['tailwind', { headwind: -20 * kt }, { headwind: -20.1 * kt }],
    ['uphill', { slope: 0.02 }, { slope: 0.0201 }],
    ['downhill', { slope: -0.02 }, { slope: -0.0201 }],
    ['aboveStandard', { temperature: 328.15 }, { temperature: 328.2 }],
    ['belowStandard', { temperature: 248.15 }, { temperature: 248.1 }],
  ] as const)('about %s without a limit reach as far as said and no further', (about, last, beyond) => {
    const note = stepNote(about, 0.01, 100);
    const bounds = (asked: Partial<ManualAsked>) => {
      const { edges, outside } = corrected([note], asked);
      return edges.length + outside.length;
    };
    expect([bounds(last), bounds(beyond)]).toEqual([0, 1]);
  });

  it('take the printed standard temperature', () => {
    const note = stepNote('aboveStandard', 0.1, 10);
    expect(corrected([note], { temperature: 293.15 }, 283.15).groundRoll).toBeCloseTo(220, 9);
  });

  it('take the change of the band of pressure altitude, each up to its bound', () => {
    const note = stepNote('uphill', [{ upTo: 1000, change: 0.05 }, { upTo: 2000, change: 0.1 }, { change: 0.2 }], 0.01);
    const roll = (pressureAltitude: number) => corrected([note], { slope: 0.01, pressureAltitude }).groundRoll;
    expect([roll(-50), roll(1000), roll(1001), roll(2000), roll(2500)]).toEqual(
      [210, 210, 220, 220, 240].map((value) => nearly(value)),
    );
  });

  it('lighten: less mass than a note speaks of counts as the least', () => {
    const note = stepNote('belowMass', -0.05, 50, { limit: 100 });
    const { groundRoll, edges } = corrected([note], { mass: 850 });
    expect(groundRoll).toBeCloseTo(180, 9);
    expect(edges).toMatchObject([{ axis: 'belowMass', given: 150, bound: 100, side: 'above' }]);
  });

  it('on a surface: the one that describes it most closely, and none where the sheet is for it', () => {
    const long: ManualNote = { ...grass, surface: { kind: 'grass', state: 'dry', grass: 'long' }, change: 0.3 };
    expect(corrected([grass, long], onGrass).groundRoll).toBeCloseTo(230, 9);
    expect(corrected([grass, long], { surface: long.surface }).groundRoll).toBeCloseTo(260, 9);
    expect(corrected([{ ...grass, surface: { kind: 'paved', state: 'dry' } }], {}).groundRoll).toBe(200);
  });

  it('are told as they were applied, and only those', () => {
    const wind = stepNote('headwind', -0.1, 9 * kt);
    const { notes } = corrected([stepNote('uphill', 0.1, 0.01), wind, grass], { headwind: 9 * kt, ...onGrass });
    expect(notes).toEqual([
      { sheet: 'takeoff', note: wind, given: 9 * kt, factor: nearly(0.9) },
      { sheet: 'takeoff', note: grass, factor: 1.15 },
    ]);
  });
});
