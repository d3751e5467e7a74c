import { describe, expect, it } from 'vitest';
import type { ManualNote, ManualTable } from '../../../src/performance/flight-manual/flight-manual.ts';
import { manualDistances } from '../../../src/performance/flight-manual/manual-distances.ts';
import type { ManualAsked } from '../../../src/performance/flight-manual/manual-figures.ts';
import { manualWith, stepNote, takeoffAsked, takeoffTable } from '../../support/manual-sheets.ts';

const ask = (tables: ManualTable[], asked: Partial<ManualAsked> = {}) =>
  manualDistances(manualWith(tables), takeoffAsked(asked));

describe("the manual's distances", () => {
  it('are those of its sheet for the configuration and the phase', () => {
    expect(ask([takeoffTable()])).toEqual({
      outcome: 'figures',
      groundRoll: 200,
      wholeDistance: 400,
      speeds: {},
      sheets: [{ id: 'takeoff', page: '5-1' }],
      notes: [],
      silent: [],
      edges: [],
    });
    expect(ask([takeoffTable()], { configuration: 'flap-20' })).toBeUndefined();
    expect(ask([takeoffTable()], { phase: 'landing' })).toBeUndefined();
  });

  it('are without the factor that the printed ones hold', () => {
    const factored = takeoffTable({ contains: { factor: 1.25, windAllowance: false } });
    expect(ask([factored])).toMatchObject({ groundRoll: 160, wholeDistance: 320 });
  });

  it('are the whole distance alone where the roll of another sheet, on its edge, comes out at or above it', () => {
    const rollOnly = takeoffTable({
      id: 'roll',
      outputs: ['groundRoll'],
      cells: takeoffTable().cells.map((cells) => cells.slice(0, 1)),
    });
    // a short distance for 900 kg: below the 200 m of roll at 1000 kg
    const light = takeoffTable({
      id: 'light',
      conditions: { ...takeoffTable().conditions, mass: 900 },
      outputs: ['takeoffDistance'],
      cells: takeoffTable().cells.map(([, distance]) => [0.5 * (distance as number)]),
    });
    const found = ask([rollOnly, light], { mass: 900 });
    expect(found).toMatchObject({ wholeDistance: 200, sheets: [{ id: 'light' }], edges: [] });
    expect(found).toHaveProperty('groundRoll', undefined);
  });

  it('name a single mass as an edge for a lighter aeroplane, and are outside for a heavier one', () => {
    expect(ask([takeoffTable()], { mass: 900 })).toMatchObject({
      groundRoll: 200,
      edges: [{ sheet: 'takeoff', axis: 'mass', given: 900, bound: 1000, side: 'below' }],
    });
    const beyond = [{ sheet: 'takeoff', axis: 'mass', given: 1001, bound: 1000, side: 'above' }];
    expect(ask([takeoffTable()], { mass: 1001 })).toEqual({ outcome: 'outside-flight-manual', bounds: beyond });
    expect(ask([takeoffTable()], { mass: 900, edges: 'refuse' })?.outcome).toBe('outside-flight-manual');
    expect(ask([takeoffTable()], { mass: 1000 * (1 + 1e-15) })).toMatchObject({ edges: [] });
  });

  it('come from the sheet for the nearest mass above, of several for one mass each', () => {
    const heavy = takeoffTable({ id: 'heavy', conditions: { ...takeoffTable().conditions, mass: 1200 } });
    const light = takeoffTable({ id: 'light' });
    for (const tables of [
      [heavy, light],
      [light, heavy],
    ]) {
      expect(ask(tables, { mass: 950 })).toMatchObject({ sheets: [{ id: 'light' }] });
      expect(ask(tables, { mass: 1000 })).toMatchObject({ sheets: [{ id: 'light' }], edges: [] });
      expect(ask(tables, { mass: 1100 })).toMatchObject({ sheets: [{ id: 'heavy' }] });
      expect(ask(tables, { mass: 1300 })).toMatchObject({ bounds: [{ bound: tables[0]?.conditions.mass }, {}] });
    }
  });

  it('come from the sheet that holds the point without an edge before one that stands on its edge', () => {
    const warm = takeoffTable({ id: 'warm' });
    const cold = takeoffTable({
      id: 'cold',
      nodes: [
        [0, 233],
        [0, 273],
        [1000, 233],
        [1000, 273],
      ],
    });
    expect(ask([warm, cold], { temperature: 250 })).toMatchObject({ sheets: [{ id: 'cold' }], edges: [] });
  });

  const grass = { kind: 'grass', state: 'dry' } as const;
  const noted: ManualNote = { about: 'surface', surface: grass, change: 0.15, multiplies: 'groundRollAddedToBoth' };

  it('come from a sheet for the very surface, else one with a note on it, else the paved one, silent on the surface', () => {
    const own = takeoffTable({ id: 'own', conditions: { surface: grass, mass: 1000 } });
    const paved = takeoffTable({ id: 'paved', notes: [noted] });
    const bare = takeoffTable({ id: 'bare' });
    expect(ask([bare, paved, own], { surface: grass })).toMatchObject({ sheets: [{ id: 'own' }], silent: [] });
    expect(ask([bare, paved], { surface: grass })).toMatchObject({
      sheets: [{ id: 'paved' }],
      groundRoll: expect.closeTo(230, 9),
      wholeDistance: expect.closeTo(430, 9),
      silent: [],
    });
    expect(ask([bare], { surface: grass })).toMatchObject({ groundRoll: 200, silent: ['surface'] });
    expect(ask([own])).toBeUndefined();
  });

  it('are never those of a dry sheet for a wet runway without saying so', () => {
    expect(ask([takeoffTable()], { surface: { kind: 'paved', state: 'wet' } })).toMatchObject({ silent: ['surface'] });
    const film = { kind: 'paved', state: 'contaminated', contaminant: { kind: 'water', depth: 0.001 } } as const;
    expect(ask([takeoffTable()], { surface: film })).toMatchObject({ silent: ['surface'] });
  });

  it('say on what neither an axis nor a note speaks: wind and slope, each on its own side', () => {
    const silent = (tables: ManualTable[], asked: Partial<ManualAsked>) => {
      const found = ask(tables, asked);
      return found?.outcome === 'figures' ? found.silent : found;
    };
    expect(silent([takeoffTable()], { headwind: 3, slope: 0.01 })).toEqual(['wind', 'slope']);
    expect(silent([takeoffTable()], { headwind: 1e-12, slope: -1e-12 })).toEqual([]);
    const spoken = takeoffTable({ notes: [stepNote('headwind', -0.1, 5), stepNote('uphill', 0.1, 0.01)] });
    expect(silent([spoken], { headwind: 3, slope: 0.01 })).toEqual([]);
    expect(silent([spoken], { headwind: -3, slope: -0.01 })).toEqual(['wind', 'slope']);
    expect(silent([takeoffTable()], { headwind: 5, creditedHeadwind: 0 })).toEqual([]);
  });

  const standardDays: Partial<ManualTable> = {
    axes: ['pressureAltitude'],
    nodes: [[0], [1000]],
    cells: [
      [200, 400],
      [240, 500],
    ],
    standardTemperatures: [288, 282],
  };

  it('without an axis of temperature are outside when it is warmer and stand when it is colder, unless a note speaks', () => {
    const bare = takeoffTable(standardDays);
    expect(ask([bare], { temperature: 288 })).toMatchObject({ groundRoll: 200, edges: [] });
    expect(ask([bare], { temperature: 290 })).toEqual({
      outcome: 'outside-flight-manual',
      bounds: [{ sheet: 'takeoff', axis: 'temperature', given: 290, bound: 288, side: 'above' }],
    });
    expect(ask([bare], { temperature: 270 })).toMatchObject({
      groundRoll: 200,
      edges: [{ axis: 'temperature', given: 270, bound: 288, side: 'below' }],
    });
    const noted = takeoffTable({
      ...standardDays,
      notes: [stepNote('aboveStandard', 0.1, 10), stepNote('belowStandard', -0.1, 20)],
    });
    expect(ask([noted], { temperature: 298 })).toMatchObject({ groundRoll: expect.closeTo(220, 9) });
    expect(ask([noted], { temperature: 278 })).toMatchObject({ groundRoll: expect.closeTo(190, 9), edges: [] });
    // printed 285 K between the rows, where the standard atmosphere has 284.9 K
    const between = { pressureAltitude: 500, temperature: 295 };
    expect(ask([noted], between)).toMatchObject({ groundRoll: expect.closeTo(242, 9) });
  });

  it('come from two sheets where none gives both, each with its own notes', () => {
    const { nodes, axes } = takeoffTable();
    const roll = takeoffTable({
      id: 'roll',
      outputs: ['groundRoll'],
      cells: [[200], [220], [240], [280]],
      notes: [stepNote('headwind', -0.2, 10, { multiplies: 'groundRoll' }), noted],
    });
    const whole = takeoffTable({
      id: 'whole',
      axes,
      nodes,
      outputs: ['takeoffDistance'],
      cells: [[400], [440], [500], [560]],
      notes: [stepNote('headwind', -0.1, 10, { multiplies: 'wholeDistance' }), noted],
    });
    expect(ask([whole, roll], { headwind: 10, surface: grass })).toMatchObject({
      // 200 x .8 x 1.15
      groundRoll: expect.closeTo(184, 9),
      // 400 x .9 and 15 % of the roll as this sheet's own notes leave it, 200
      wholeDistance: expect.closeTo(390, 9),
      sheets: [{ id: 'roll' }, { id: 'whole' }],
    });
    const silent = { ...roll, notes: roll.notes.slice(0, 1) };
    expect(ask([whole, silent], { headwind: 10, surface: grass })).toMatchObject({
      groundRoll: undefined,
      wholeDistance: expect.closeTo(390, 9),
      silent: [],
    });
    expect(() => ask([whole])).toThrow(/share of the ground roll/);
    expect(ask([{ ...whole, notes: [] }])).toMatchObject({ groundRoll: undefined, wholeDistance: 400 });
    expect(ask([roll])).toMatchObject({ groundRoll: 200, wholeDistance: undefined });
  });

  it('are outside when one of the two sheets is', () => {
    const roll = takeoffTable({ id: 'roll', outputs: ['groundRoll'], cells: [[200], [220], [240], [280]] });
    const whole = takeoffTable({
      id: 'whole',
      outputs: ['takeoffDistance'],
      nodes: [
        [0, 273],
        [0, 283],
        [1000, 273],
        [1000, 283],
      ],
      cells: [[400], [440], [500], [560]],
    });
    expect(ask([roll, whole], { temperature: 290 })).toEqual({
      outcome: 'outside-flight-manual',
      bounds: [{ sheet: 'whole', axis: 'temperature', given: 290, bound: 283, side: 'above' }],
    });
  });
});
