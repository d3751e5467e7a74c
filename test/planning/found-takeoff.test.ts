import { describe, expect, it } from 'vitest';
import type { Fit } from '../../src/performance/fit/fit.ts';
import type { ManualNote, ManualTable, SpeedTable } from '../../src/performance/flight-manual/flight-manual.ts';
import type { TakeoffQuestion } from '../../src/planning/question.ts';
import {
  byManual,
  fitUpTo,
  grassNote,
  headwindNote,
  manualOf,
  tailwindNote,
  takeoffTable,
} from '../support/flown-by-manual.ts';
import { expectRatio } from '../support/near.ts';
import { answered, type Changes, changed, plainQuestion } from '../support/takeoff-question.ts';

const ft = 0.3048;
const kt = 1852 / 3600;
const headwind = (knots: number): Changes => ({ weather: { wind: { kind: 'components', headwind: knots * kt } } });
const slope = (percent: number): Changes => ({ runway: { slope: percent / 100 } });
const dryGrass: Changes = { runway: { surface: { kind: 'grass', state: 'dry', grass: 'short', firmness: 'firm' } } };
const underClassB: Changes = { question: { ruleSet: 'eu-class-b' } };
const toraAlone: Changes = { runway: { declared: { tora: 2000 } } };

const distances = (question: TakeoffQuestion) => {
  const { distances: found } = answered(question);
  if (found === undefined) throw new Error('there must be distances');
  return found;
};
const physics = (question: TakeoffQuestion) => distances({ ...question, method: 'stated' });
const check = (question: TakeoffQuestion, code: string) => {
  const found = answered(question).assessment?.checks.find((one) => one.code === code);
  if (found === undefined) throw new Error(`there must be a check ${code}`);
  return found;
};

describe('a takeoff by its flight manual', () => {
  it('is the printed cell at a node, of both columns, by the method flight-manual', () => {
    const { groundRoll, takeoffDistance, airDistance } = distances(byManual());
    expectRatio(groundRoll.value, 1110 * ft, 1e-12);
    expectRatio(takeoffDistance.value, 2010 * ft, 1e-12);
    expectRatio(airDistance.value, 900 * ft, 1e-12);
    expect([groundRoll.method, airDistance.method, takeoffDistance.method]).toEqual(Array(3).fill('flight-manual'));
    expect(answered(byManual()).basis.method).toBe('flight-manual');
  });

  it('shows the physics of the same aeroplane beside it, with the ratio', () => {
    const { other } = answered(byManual()).basis;
    const { value } = physics(byManual()).takeoffDistance;
    expect(other?.method).toBe('stated');
    expectRatio(other?.distance ?? 0, value, 1e-12);
    expectRatio(other?.ratio ?? 0, value / (2010 * ft), 1e-12);
  });

  it('multiplies the printed figure by the overall factor alone on dry pavement [A.305(b): 1.25 on TORA alone, read]', () => {
    const required = check(byManual([], underClassB, toraAlone), 'takeoff-run');
    expect(required.startsFrom).toBe('flight-manual');
    expectRatio(required.required ?? 0, 1.25 * 2010 * ft, 1e-12);
  });

  it('takes the rules’ grass factor on the printed figure where its notes are silent [AMC1 A.305: 1.20, read], and says whose', () => {
    const question = byManual([], underClassB, toraAlone, dryGrass);
    const required = check(question, 'takeoff-run');
    expect(required.startsFrom).toBe('flight-manual');
    expectRatio(required.required ?? 0, 1.25 * 1.2 * 2010 * ft, 1e-12);
    expect(required.factors.map(({ code }) => code)).toContain('surface');
    expect(required.alternative?.startsFrom).toBe('credited');
  });

  it('takes its own grass note and no factor of the rules besides', () => {
    const question = byManual([grassNote], underClassB, toraAlone, dryGrass);
    const { groundRoll, takeoffDistance } = distances(question);
    expectRatio(groundRoll.value, 1.15 * 1110 * ft, 1e-12);
    expectRatio(takeoffDistance.value, (2010 + 0.15 * 1110) * ft, 1e-12);
    expect(takeoffDistance.method).toBe('flight-manual');
    const required = check(question, 'takeoff-run');
    expectRatio(required.required ?? 0, 1.25 * (2010 + 0.15 * 1110) * ft, 1e-12);
    expect(required.factors.map(({ code }) => code)).not.toContain('surface');
  });

  it('carries each part by its own ratio of physics where it is silent on a slope, and nothing at all on the level', () => {
    const uphill = byManual([], slope(1.5));
    const [sloping, level] = [physics(uphill), physics(byManual())];
    const found = distances(uphill);
    expectRatio(found.groundRoll.value, 1110 * ft * (sloping.groundRoll.value / level.groundRoll.value), 1e-12);
    expectRatio(found.airDistance.value, 900 * ft * (sloping.airDistance.value / level.airDistance.value), 1e-12);
    expect(found.takeoffDistance.method).toBe('stated');
    expectRatio(distances(byManual([], slope(1e-7))).takeoffDistance.value, 2010 * ft, 1e-6);
    const silent = answered(uphill).basis.flightManual;
    expect(silent?.silences).toEqual(['slope']);
  });

  it('carries a wind it has no note for, and keeps its figure in calm air', () => {
    const windy = byManual([], headwind(10));
    const ratio = physics(windy).groundRoll.value / physics(byManual()).groundRoll.value;
    expect(ratio).toBeLessThan(0.8);
    expectRatio(distances(windy).groundRoll.value, 1110 * ft * ratio, 1e-12);
  });

  it('enters a note that holds 50 and 150 per cent with the wind as given, and the credit of the rules comes no second time', () => {
    const notes = [headwindNote, tailwindNote];
    const into = byManual(notes, underClassB, toraAlone, headwind(9));
    expectRatio(distances(into).takeoffDistance.value, 0.9 * 2010 * ft, 1e-9);
    expectRatio(check(into, 'takeoff-run').required ?? 0, 1.25 * 0.9 * 2010 * ft, 1e-9);
    const before = byManual(notes, underClassB, toraAlone, headwind(-4));
    expectRatio(check(before, 'takeoff-run').required ?? 0, 1.25 * 1.2 * 2010 * ft, 1e-9);
  });

  it('credits half of a headwind through a note that holds no allowance [A.305(c): 50 %, read]', () => {
    const into = byManual(
      [{ ...headwindNote, windAllowance: false } as ManualNote],
      underClassB,
      toraAlone,
      headwind(9),
    );
    expectRatio(distances(into).takeoffDistance.value, 0.9 * 2010 * ft, 1e-9);
    expectRatio(check(into, 'takeoff-run').required ?? 0, 1.25 * 0.95 * 2010 * ft, 1e-9);
  });

  it('has no figure beyond its table and says where that ends; physics has one only by name, marked on every number', () => {
    const hot = byManual([], { weather: { temperature: 316.15 } });
    const outside = answered(hot);
    expect(outside.outcome).toBe('outside-flight-manual');
    expect(outside.distances).toBeUndefined();
    expect(outside.shortfall).toEqual([
      {
        at: '/weather/temperature',
        axis: 'temperature',
        table: 'takeoff-table',
        given: { kind: 'temperature', value: 316.15 },
        bound: { kind: 'temperature', value: 313.15 },
        side: 'above',
      },
    ]);
    expect(outside.sentence).toContain('takeoff-table ends at a temperature of 40 °C, and 43 °C is asked');
    const named = answered({ ...hot, method: 'stated' });
    expect(named.distances?.takeoffDistance.method).toBe('stated');
    expect(named.cautions.find(({ code }) => code === 'flight-manual-not-used')?.severity).toBe('strong');
  });

  it('says whose wind it is that leaves the manual: 8 kt on the tail lies in a note up to 10 kt, the 12 kt that class B counts do not', () => {
    const note = { ...tailwindNote, windAllowance: false } as ManualNote;
    const tail = { weather: { wind: { kind: 'components', headwind: -8 * kt } } } as const;
    expect(distances(byManual([note], tail)).takeoffDistance.method).toBe('flight-manual');
    const counted = answered(byManual([note], tail, underClassB, toraAlone));
    expect(counted.outcome).toBe('outside-flight-manual');
    expect(counted.sentence).toContain('takeoff-table ends at a tailwind of 10 kt, and the rule set counts 12 kt.');
    const asked = answered(byManual([note], { weather: { wind: { kind: 'components', headwind: -11 * kt } } }));
    expect(asked.sentence).toContain('takeoff-table ends at a tailwind of 10 kt, and 11 kt is asked.');
  });

  it('holds the edge on the side where the table shows it to be the longer, names it, and ends there when asked to', () => {
    const cold = byManual([], { weather: { temperature: 263.15 } });
    expectRatio(distances(cold).takeoffDistance.value, 1760 * ft, 1e-12);
    expect(distances(cold).takeoffDistance.edge).toBe('takeoff-table');
    expect(answered(cold).cautions.map(({ code }) => code)).toContain('flight-manual-edge');
    expect(answered({ ...cold, edges: 'refuse' }).outcome).toBe('outside-flight-manual');
  });

  it('scales the manual’s figure by the ratio of physics with and without changes to the aeroplane', () => {
    const base = byManual();
    const heavierDrag = changed(base, { aeroplane: { drag: { zeroLiftCoefficient: 0.05, oswaldFactor: 0.72 } } });
    const question: TakeoffQuestion = {
      ...heavierDrag,
      changes: { basedOn: 'stated-trainer', revision: '1', because: 'floats', changed: [], flewAs: base.aeroplane },
    };
    const [asChanged, onFile] = [physics(heavierDrag), physics(base)];
    const found = distances(question);
    expectRatio(found.groundRoll.value, 1110 * ft * (asChanged.groundRoll.value / onFile.groundRoll.value), 1e-12);
    expectRatio(found.airDistance.value, 900 * ft * (asChanged.airDistance.value / onFile.airDistance.value), 1e-12);
    expect(found.takeoffDistance.method).toBe('stated');
    expect(answered(question).basis.flightManual?.silences).toEqual(['changes']);
  });

  it('carries a friction stated as a number, which no manual speaks of', () => {
    const rough = byManual([grassNote], {
      runway: { surface: { kind: 'grass', state: 'dry', rollingFrictionCoefficient: 0.09 } },
    });
    expect(answered(rough).basis.flightManual?.silences).toEqual(['surface']);
    expect(distances(rough).groundRoll.value).toBeGreaterThan(1110 * ft);
  });

  it('gives no credit for a fall that neither rules nor manual credit', () => {
    const downhill = byManual([], underClassB, toraAlone, slope(-1.5));
    expect(distances(downhill).takeoffDistance.value).toBeLessThan(2010 * ft);
    expectRatio(check(downhill, 'takeoff-run').required ?? 0, 1.25 * 2010 * ft, 1e-12);
  });

  it('refuses a method by name that the aeroplane does not have', () => {
    const none = changed(byManual(), { aeroplane: { flightManual: manualOf({ configurations: ['another'] }) } });
    expect(() => answered({ ...none, method: 'flight-manual' })).toThrow(/method/);
    expect(() => answered({ ...byManual(), method: 'fitted' })).toThrow(/method/);
    expect(distances(none).takeoffDistance.method).toBe('stated');
  });
});

describe('what else the flight manual prints', () => {
  const climbTable: ManualTable = {
    ...takeoffTable,
    id: 'climb-table',
    phase: 'climb',
    outputs: ['climbGradient'],
    cells: takeoffTable.cells.map((_, i) => [0.12 - 0.01 * i]),
  };
  const speedTable: SpeedTable = {
    id: 'speeds',
    page: '5-10',
    configurations: ['takeoff'],
    airspeed: 'cas',
    speeds: ['liftOff', 'screen'],
    masses: [900, 1000, 1100],
    cells: [
      [48, 53],
      [50, 56],
      [52, 58],
    ].map((row) => row.map((knots) => knots * kt)),
  };

  it('is the climb it prints, its rate from the gradient at the speed of the screen [V sin gamma]', () => {
    const question = byManual();
    const flightManual = { ...manualOf(), tables: [...manualOf().tables, climbTable] };
    const { climb, speeds } = answered(changed(question, { aeroplane: { flightManual } }));
    expect(climb?.method).toBe('flight-manual');
    expectRatio(climb?.gradient ?? 0, 0.08, 1e-12);
    expectRatio(climb?.rate ?? 0, speeds.screen.tas * Math.sin(Math.atan(0.08)), 1e-12);
    expect(answered(question).climb?.method).toBe('stated');
  });

  it('is no climb of a changed aeroplane, and then nothing is said of where its table ends', () => {
    const lighter = { ...climbTable, conditions: { ...climbTable.conditions, mass: 900 } };
    const flightManual = { ...manualOf(), tables: [...manualOf().tables, lighter] };
    const onFile = changed(byManual(), { aeroplane: { flightManual } });
    const codes = (asked: TakeoffQuestion) => answered(asked).cautions.map(({ code }) => code);
    expect(codes(onFile)).toContain('flight-manual-beside');
    const changes = { basedOn: 'x', revision: '1', because: 'floats', changed: [], flewAs: onFile.aeroplane };
    expect(codes({ ...onFile, changes })).not.toContain('flight-manual-beside');
  });

  it('is the speed schedule at the mass asked, in place of the one stated', () => {
    const flightManual = { ...manualOf(), speedTables: [speedTable] };
    const { speeds } = answered(changed(byManual(), { aeroplane: { flightManual } }));
    expectRatio(speeds.liftOff.cas, 50.2 * kt, 1e-12);
    expectRatio(speeds.screen.cas, 56.2 * kt, 1e-12);
  });
});

describe('physics fitted to the flight manual', () => {
  const values = { thrustFactor: 0.9, airDragShift: 0.01, altitudeLapseCoefficient: 0.16, temperatureExponent: 0.8 };
  const fit: Fit = { takeoff: { takeoff: { ...fitUpTo(1010), values } } };
  const { propulsion } = plainQuestion.aeroplane;
  const asFitted: Changes = {
    aeroplane: {
      propulsion: {
        ...propulsion,
        thrustFactor: 0.9,
        altitudeLapseCoefficient: 0.16,
        temperatureExponent: 0.8,
        humidityFactor: 0,
      } as typeof propulsion,
    },
    configuration: { airDragIncrementCoefficient: 0.01, pullUpLoadFactor: 1.15 },
  };

  it('is the same as the fitted figures stated one by one [the pull-up of a fit is 1.15, read]', () => {
    const withFit = changed(plainQuestion, { aeroplane: { fit } });
    const byHand = physics(changed(plainQuestion, asFitted));
    const found = distances(withFit);
    expectRatio(found.takeoffDistance.value, byHand.takeoffDistance.value, 1e-12);
    expect(found.takeoffDistance.method).toBe('fitted');
    expect(distances({ ...withFit, method: 'stated' }).takeoffDistance.value).toBeLessThan(found.takeoffDistance.value);
  });

  it('carries the manual where it is silent, in place of stated figures, and is marked so', () => {
    const uphill = changed(byManual([], slope(1.5)), { aeroplane: { flightManual: manualOf(), fit } });
    const found = distances(uphill);
    const [sloping, level] = [uphill, changed(uphill, slope(0))].map((one) => distances({ ...one, method: 'fitted' }));
    expectRatio(
      found.groundRoll.value,
      1110 * ft * ((sloping?.groundRoll.value ?? 0) / (level?.groundRoll.value ?? 1)),
      1e-12,
    );
    expect(found.takeoffDistance.method).toBe('fitted');
    expect(answered(uphill).cautions.find(({ code }) => code === 'flight-manual-silent')?.severity).toBe('note');
  });
});

describe('how sure a figure of the flight manual is', () => {
  const form = (question: TakeoffQuestion) =>
    answered(question).basis.band?.find(({ of }) => of === 'model form')?.wholeDistance ?? Number.NaN;

  it('is 5 % as printed [published model form of a manual], and does not jump where physics begins to carry it', () => {
    expectRatio(form(byManual()), 0.05, 1e-9);
    expectRatio(form(byManual([], slope(1e-6))), 0.05, 1e-3);
  });

  it('grows with what physics carries: 15 % of ln of the ratio, as squares [published model form of stated figures]', () => {
    const question = byManual([], slope(2));
    const carried = Math.log(distances(question).takeoffDistance.value / (2010 * ft));
    expectRatio(form(question), Math.hypot(0.05, 0.15 * carried), 1e-9);
    expect(form(question)).toBeLessThan(0.15);
  });

  it('is of the part that is printed: without a ground roll in the table, roll and air distance are marked physics', () => {
    const cells = takeoffTable.cells.map(([, total]) => [total as number]);
    const alone = manualOf({ outputs: ['takeoffDistance'], cells });
    const { groundRoll, airDistance, takeoffDistance } = distances(
      changed(byManual(), { aeroplane: { flightManual: alone } }),
    );
    expectRatio(takeoffDistance.value, 2010 * ft, 1e-12);
    expect([groundRoll.method, airDistance.method, takeoffDistance.method]).toEqual([
      'stated',
      'stated',
      'flight-manual',
    ]);
  });
});

describe('notes of roll and whole distance that cross', () => {
  it('leave the roll to physics: no part of an answer is below nothing', () => {
    const crossing = { ...headwindNote, change: -0.5, multiplies: 'wholeDistance' } as ManualNote;
    const { groundRoll, airDistance, takeoffDistance } = distances(byManual([crossing], headwind(9)));
    expectRatio(takeoffDistance.value, 1005 * ft, 1e-9);
    expect(groundRoll.method).toBe('stated');
    expect(airDistance.value).toBeGreaterThan(0);
    expectRatio(groundRoll.value + airDistance.value, takeoffDistance.value, 1e-12);
  });
});
