import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import type { Check, TakeoffAnswer } from '../../src/planning/answer.ts';
import { isRefused } from '../../src/planning/fault.ts';
import { planTakeoff } from '../../src/planning/plan-takeoff.ts';
import type { Question } from '../../src/planning/question.ts';
import { unitFamilies } from '../../src/units/presentation.ts';
import { distancesBehind, readings } from '../published/four-readings.ts';
import { expectNear, expectRatio } from '../support/near.ts';
import { answered, type Changes, changed, fourReadings, plainQuestion } from '../support/takeoff-question.ts';

const kt = 1852 / 3600;
const onlyCheck = (answer: TakeoffAnswer) => answer.assessment?.checks[0] as Check;
const numbers = ({ air, wind, speeds, distances, assessment }: TakeoffAnswer) => ({
  air,
  wind,
  speeds,
  distances,
  assessment,
});

describe('one uphill takeoff on wet grass in a tailwind, under class B', () => {
  const answer = answered(fourReadings(900));
  const check = onlyCheck(answer);
  const distances: Record<string, number | undefined> = {
    stated: answer.distances?.takeoffDistance.value,
    credited: check.alternative?.distance,
    reference: check.distance,
  };
  it.each(distancesBehind)('$title', ({ id, expected, tolerance }) => {
    expectNear(distances[id], expected, tolerance);
  });

  const [stated, credited, ours, both] = readings;
  it(`takes the reading that is ours: ${ours?.title}`, () => {
    expectNear(check.required, 1254.8, 0.05);
    expect(check.startsFrom).toBe('reference');
    expect(check.factors.map(({ code, value }) => [code, value])).toEqual([
      ['surface', 1.3],
      ['slope', 1.04],
      ['overall', 1.25],
    ]);
  });
  it(`shows beside it: ${credited?.title}`, () => {
    expectNear(check.alternative?.required, 1186.9, 0.05);
    expect(check.alternative?.factors.map(({ code }) => code)).toEqual(['overall']);
  });
  it.each([stated, both])('and not, though its arithmetic can be had from the answer: $title', (reading) => {
    const by = reading?.id === 'stated alone' ? 1.25 : 1.25 * 1.3 * 1.04;
    const from = reading?.id === 'stated alone' ? distances['stated'] : distances['credited'];
    expectNear((from ?? 0) * by, reading?.expected ?? 0, 0.06);
    expect(Math.abs((check.required ?? 0) - (reading?.expected ?? 0))).toBeGreaterThan(50);
  });
  it('says so in one sentence, and is short by the difference of what is shown', () => {
    expect(answer.outcome).toBe('not-enough');
    expect(answer.sentence).toBe(
      'Not enough: needs 1 255 m of TORA under class B factors, 900 m available: short by 355 m.',
    );
    expect(answer.assessment?.governing).toBe('takeoff-run');
  });
  it('takes physics where it exceeds the factors, and shows the factors beside it', () => {
    const soft = changed(fourReadings(900), {
      runway: {
        surface: { kind: 'grass', state: 'wet', grass: 'short', firmness: 'firm', rollingFrictionCoefficient: 0.12 },
      },
    });
    const physics = onlyCheck(answered(soft));
    expect(physics.startsFrom).toBe('credited');
    expect(physics.factors.map(({ code }) => code)).toEqual(['overall']);
    expect(physics.alternative?.startsFrom).toBe('reference');
    expectNear(physics.alternative?.required, 1254.8, 0.05);
    expect(physics.required ?? 0).toBeGreaterThan(physics.alternative?.required ?? 0);
  });
});

describe('the outcome', () => {
  const long = { tora: 3000, toda: 3000, asda: 3000 };
  const cases: readonly [TakeoffAnswer['outcome'], Changes, RegExp][] = [
    ['enough', {}, /^Enough: needs \d+ m of TODA without factors, 1 500 m available: spare [\d ]+ m\.$/],
    [
      'enough-but-thin',
      { runway: { declared: { tora: 425, toda: 425, asda: 425 } } },
      /^Enough but thin: .* under 10 %\.$/,
    ],
    [
      'enough-but-thin',
      { runway: { declared: { tora: 560, toda: 560, asda: 560 } } },
      /high end of the 90 % band would not pass\.$/,
    ],
    ['not-enough', { runway: { declared: { tora: 400, toda: 400, asda: 400 } } }, /^Not enough: .* short by \d+ m\.$/],
    ['nothing-to-compare', { runway: { declared: { tora: 1500 } } }, /TODA is not declared.*TORA passes with/],
    ['nothing-to-compare', { runway: { declared: {} } }, /TORA is not declared, TODA is not declared/],
    ['roll-longer-than-runway', { runway: { declared: { tora: 200, toda: 300 } } }, /ground roll alone is longer/],
    ['never-reaches-lift-off-speed', { runway: { slope: 0.3, declared: long } }, /^Never reaches the lift-off speed/],
    [
      'never-reaches-screen-height',
      { question: { mass: 1600 }, weather: { temperature: 313 }, runway: { elevation: 2000, declared: long } },
      /^Never reaches the screen height: the least climb gradient is [\d.-]+ %, and 1\.5 % is needed/,
    ],
    [
      'ground-speed-not-positive',
      { weather: { wind: { kind: 'components', headwind: 40 } } },
      /^The headwind of 77\.8 kt is not below/,
    ],
    [
      'outside-stated-data',
      {
        aeroplane: {
          propulsion: {
            kind: 'measured',
            airspeeds: [0, 20],
            thrusts: [2300, 2200],
            density: 1.225,
            densityExponent: 1,
            thrustFactor: 1,
          },
        },
      },
      /^Outside the stated thrust/,
    ],
    [
      'no-data-for-this-surface',
      { runway: { surface: { kind: 'paved', state: 'flooded' } } },
      /^No data for this surface \(paved, flooded\)/,
    ],
    [
      'rule-set-does-not-apply',
      { question: { ruleSet: 'eu-class-b' }, aeroplane: { masses: { maximumTakeoff: 5701 } } },
      /class B ends at a maximum takeoff mass of 5 700 kg/,
    ],
  ];
  it.each(cases)('is %s with one change: %j', (outcome, changes, sentence) => {
    const answer = answered(changed(plainQuestion, changes));
    expect(answer.outcome).toBe(outcome);
    expect(answer.sentence).toMatch(sentence);
    const hasDistances = !/^(never|ground|outside|no-data)/.test(outcome);
    expect(answer.distances !== undefined).toBe(hasDistances);
    expect(answer.assessment !== undefined).toBe(hasDistances && outcome !== 'rule-set-does-not-apply');
    expect(answer.shortfall !== undefined).toBe(/^(never|ground|outside)/.test(outcome));
  });
  it('hides a failing check behind a roll that is longer than the run, and keeps the checks', () => {
    const answer = answered(changed(plainQuestion, { runway: { declared: { tora: 200, toda: 300 } } }));
    expect(answer.assessment?.checks.map(({ result }) => result)).toEqual(['fails', 'fails']);
  });
  it('of class B is at best nothing-to-compare where one of TODA and ASDA is missing', () => {
    const question = changed(plainQuestion, {
      question: { ruleSet: 'eu-class-b' },
      runway: { declared: { tora: 1500, toda: 1600 } },
    });
    const answer = answered(question);
    expect(answer.outcome).toBe('nothing-to-compare');
    expect(answer.assessment?.checks.map(({ code, result }) => [code, result])).toEqual([
      ['takeoff-run', 'passes'],
      ['takeoff-distance', 'passes'],
      ['accelerate-stop', 'not-assessed'],
    ]);
  });
  it('gives no distance on a surface of which neither factor nor physics speaks, under either rule set', () => {
    for (const ruleSet of ['unfactored', 'eu-class-b']) {
      const question = changed(plainQuestion, {
        question: { ruleSet },
        runway: { surface: { kind: 'snow', state: 'dry' } },
      });
      expect(answered(question).outcome).toBe('no-data-for-this-surface');
    }
  });
});

describe('a refused question', () => {
  const faults: readonly [string, string, Changes][] = [
    ['/ruleSet', 'unknown-id', { question: { ruleSet: 'eu-class-z' } }],
    ['/configuration', 'unknown-id', { question: { configuration: 'constructor' } }],
    ['/configuration', 'contradiction', { question: { configuration: 'landing' } }],
    ['/weather/dewPoint', 'contradiction', { weather: { dewPoint: 289 } }],
    ['/weather', 'out-of-range', { weather: { pressure: { kind: 'pressureAltitude', value: 40_000 } } }],
    [
      '/runway/magneticVariation',
      'missing',
      {
        runway: { directionReference: 'magnetic' },
        weather: { wind: { kind: 'from', from: 1, fromReference: 'true', speed: 5 } },
      },
    ],
    [
      '/aeroplane/definition/configurations/takeoff/speeds/liftOff',
      'contradiction',
      { configuration: { speeds: { liftOff: { kind: 'stall-ratio', ratio: 0.99 } } } },
    ],
    [
      '/aeroplane/definition/configurations/takeoff/speeds/rotation',
      'contradiction',
      { configuration: { speeds: { rotation: { kind: 'stall-ratio', ratio: 1.3 } } } },
    ],
  ];
  it.each(faults)('names %s as %s', (pointer, code, changes) => {
    const answer = planTakeoff(changed(plainQuestion, changes));
    expect(isRefused(answer) && answer.refused.map((fault) => [fault.pointer, fault.code])).toEqual([[pointer, code]]);
  });
});

describe('whatever the numbers', () => {
  const question = fc
    .record({
      ruleSet: fc.constantFrom('unfactored', 'eu-class-b'),
      mass: fc.double({ min: 700, max: 1300, noNaN: true }),
      headwind: fc.double({ min: -12, max: 20, noNaN: true }),
      slope: fc.double({ min: -0.03, max: 0.03, noNaN: true }),
      elevation: fc.double({ min: -100, max: 3000, noNaN: true }),
      temperature: fc.double({ min: 250, max: 318, noNaN: true }),
      surface: fc.constantFrom<Question['runway']['surface']>(
        { kind: 'paved', state: 'dry' },
        { kind: 'paved', state: 'wet' },
        { kind: 'grass', state: 'damp' },
        { kind: 'grass', state: 'dry', grass: 'short' },
        { kind: 'grass', state: 'wet', firmness: 'soft' },
        { kind: 'gravel', state: 'dry' },
        { kind: 'snow', state: 'dry' },
      ),
      tora: fc.double({ min: 200, max: 3000, noNaN: true }),
      beyond: fc.double({ min: 0, max: 3000, noNaN: true }),
    })
    .map(({ ruleSet, mass, headwind, slope, elevation, temperature, surface, tora, beyond }) =>
      changed(plainQuestion, {
        question: { ruleSet, mass },
        runway: { slope, elevation, surface, declared: { tora, toda: tora + beyond, asda: tora } },
        weather: {
          temperature,
          dewPoint: temperature - 5,
          wind: { kind: 'components', headwind },
        },
      }),
    );
  const runs = { numRuns: 120 };

  test.prop([question], runs)('a margin is negative exactly where the check fails', (asked) => {
    const answer = answered(asked);
    for (const { margin, result, required = 0, available } of answer.assessment?.checks ?? []) {
      if (available === undefined || margin === undefined) {
        expect(result).toBe('not-assessed');
      } else {
        expect(margin).toBe(available - required);
        expect(result).toBe(margin >= -1e-6 ? 'passes' : 'fails');
      }
    }
    const fails = answer.assessment?.checks.some(({ result }) => result === 'fails') ?? false;
    expect(fails && answer.outcome !== 'roll-longer-than-runway' ? answer.outcome : 'not-enough').toBe('not-enough');
    if (answer.outcome === 'enough' || answer.outcome === 'enough-but-thin') expect(fails).toBe(false);
  });
  test.prop([question], runs)('every number is finite and every word is written', (asked) => {
    const answer = answered(asked);
    const text = JSON.stringify(answer, (_, value) => {
      if (typeof value === 'number') expect(Number.isFinite(value)).toBe(true);
      return value;
    });
    expect(text).not.toMatch(/NaN|undefined|Infinity|\[object/);
  });
  test.prop([question], runs)('the same question has the same answer, and asking leaves it as it was', (asked) => {
    const before = JSON.stringify(asked);
    expect(JSON.stringify(planTakeoff(asked))).toBe(JSON.stringify(planTakeoff(asked)));
    expect(JSON.stringify(asked)).toBe(before);
  });
  test.prop([question], runs)('the unit family changes the words and no number', (asked) => {
    const [first, ...rest] = unitFamilies.map((units) => answered({ ...asked, units }));
    for (const other of rest) expect(numbers(other)).toEqual(numbers(first as TakeoffAnswer));
  });
  test.prop([question, fc.double({ min: 0.1, max: 8, noNaN: true })], runs)(
    'more tailwind never improves anything required',
    (asked, more) => {
      const wind = asked.weather.wind as { headwind: number };
      const base = answered(asked);
      const worse = answered(
        changed(asked, { weather: { wind: { kind: 'components', headwind: wind.headwind - more } } }),
      );
      if (base.outcome === 'ground-speed-not-positive') return;
      if (/^never/.test(base.outcome)) expect(worse.outcome).toMatch(/^never/);
      base.assessment?.checks.forEach((check, i) => {
        const other = worse.assessment?.checks[i];
        if (other?.required !== undefined) expect(other.required).toBeGreaterThan(check.required ?? 0);
      });
    },
  );
  test.prop([question, fc.double({ min: 0, max: 1, noNaN: true })], runs)(
    'a gust is never credited',
    (asked, share) => {
      const mean: Question['weather']['wind'] = {
        kind: 'from',
        from: asked.runway.direction,
        fromReference: 'true',
        speed: 8,
      };
      const steady = answered(changed(asked, { weather: { wind: mean } }));
      const gusty = answered(changed(asked, { weather: { wind: { ...mean, gust: 8 + 12 * share } } }));
      expect(numbers(gusty)).toEqual(numbers(steady));
    },
  );
  test.prop([question], runs)('downhill earns nothing under class B', (asked) => {
    const level = answered(changed(asked, { question: { ruleSet: 'eu-class-b' }, runway: { slope: 0 } }));
    const down = answered(changed(asked, { question: { ruleSet: 'eu-class-b' }, runway: { slope: -0.02 } }));
    const factored = ['paved', 'grass'].includes(asked.runway.surface.kind) && asked.runway.surface.firmness !== 'soft';
    if (!factored) return;
    level.assessment?.checks.forEach((check, i) => {
      const other = down.assessment?.checks[i];
      if (other?.required !== undefined && check.startsFrom === 'reference') {
        expectRatio(other.required, check.required ?? 0, 1e-12);
      }
    });
  });
});

describe('the wind', () => {
  it('is credited as the rules say, and not at all changed without rules', () => {
    const tail: Changes = { weather: { wind: { kind: 'components', headwind: -4 * kt } } };
    expect(answered(changed(plainQuestion, tail)).wind).toEqual({ headwind: -4 * kt, creditedHeadwind: -4 * kt });
    const classB = { ...plainQuestion, ruleSet: 'eu-class-b' };
    expectNear(answered(changed(classB, tail)).wind.creditedHeadwind, -6 * kt, 1e-12);
    const head: Changes = { weather: { wind: { kind: 'components', headwind: 10 * kt, crosswind: 3 * kt } } };
    expectNear(answered(changed(classB, head)).wind.creditedHeadwind, 5 * kt, 1e-12);
  });
});

describe('the basis', () => {
  it('says each default once, with what it is worth', () => {
    const bare = changed(plainQuestion, {
      aeroplane: {
        configurations: {
          takeoff: { for: ['takeoff'], flap: 0, maximumLift: { kind: 'coefficient', coefficient: 1.6 } },
        },
        propulsion: { kind: 'fixed-pitch', staticThrust: 2366, propellerDiameter: 1.9 },
      },
      runway: { surface: { kind: 'grass', state: 'dry' } },
      question: { aeroplaneAt: '/aeroplane', defaulted: ['/units', '/rounding'] },
    });
    const { assumed } = answered(bare).basis;
    const pointers = assumed.map(({ at }) => at);
    expect(new Set(pointers).size).toBe(pointers.length);
    expect(pointers).toEqual([
      '/aeroplane#/configurations/takeoff/speeds/liftOff',
      '/aeroplane#/configurations/takeoff/speeds/screen',
      '/aeroplane#/configurations/takeoff/speeds/rotation',
      '/aeroplane#/configurations/takeoff/rotationTime',
      '/aeroplane#/configurations/takeoff/pullUpLoadFactor',
      '/aeroplane#/configurations/takeoff/groundLiftCoefficient',
      '/aeroplane#/configurations/takeoff/groundDragIncrementCoefficient',
      '/aeroplane#/configurations/takeoff/airDragIncrementCoefficient',
      '/aeroplane#/propulsion/polarSlopeCoefficient',
      '/aeroplane#/propulsion/altitudeLapseCoefficient',
      '/aeroplane#/propulsion/temperatureExponent',
      '/aeroplane#/propulsion/humidityFactor',
      '/aeroplane#/propulsion/thrustFactor',
      '/runway/surface/rollingFrictionCoefficient',
      '/runway/surface/grass',
      '/runway/surface/firmness',
      '/units',
      '/rounding',
    ]);
    const at = (end: string) => assumed.find((one) => one.at.endsWith(end));
    expect(at('rotationTime')?.value).toEqual({ kind: 'time', value: 0 });
    const values = ['liftOff', 'screen', 'pullUpLoadFactor', 'groundLiftCoefficient', 'groundDragIncrementCoefficient'];
    expect(values.map((end) => at(end)?.value)).toEqual([1.15, 1.2, 1.1, 0.35, 0]);
    expect(at('pullUpLoadFactor')?.effectRatio ?? 0).toBeGreaterThan(0.05);
    expect(at('speeds/rotation')?.effectRatio).toBeUndefined();
  });
  it('lists what was not given', () => {
    const { dewPoint: _, ...dry } = plainQuestion.weather;
    const { limitations: __, ...unlimited } = plainQuestion.aeroplane;
    const question = { ...plainQuestion, weather: dry, aeroplane: unlimited };
    expect(answered(question).basis.notGiven).toEqual([
      '/aeroplane/definition/airspeedCalibration',
      '/aeroplane/definition/limitations/demonstratedCrosswind',
      '/aeroplane/definition/limitations/tailwind',
      '/aeroplane/definition/limitations/maximumTemperature',
      '/aeroplane/definition/limitations/maximumPressureAltitude',
      '/runway/lineUp',
      '/runway/obstacles',
      '/weather/dewPoint',
    ]);
  });
});
