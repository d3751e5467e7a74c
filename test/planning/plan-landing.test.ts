import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import type { Check, LandingAnswer } from '../../src/planning/answer.ts';
import { conditionsOf, ruledRuns } from '../../src/planning/conditions.ts';
import { isRefused } from '../../src/planning/fault.ts';
import { planLanding } from '../../src/planning/plan-landing.ts';
import type { LandingQuestion, Surface } from '../../src/planning/question.ts';
import { unitFamilies } from '../../src/units/presentation.ts';
import {
  along,
  type LandingChanges,
  landed,
  plainLanding,
  wetGrass,
  wetPavement,
} from '../support/landing-question.ts';
import { expectNear, expectRatio } from '../support/near.ts';
import { changed } from '../support/takeoff-question.ts';

const classB = { ...plainLanding, ruleSet: 'eu-class-b' };
const check = (answer: LandingAnswer) => answer.assessment?.checks[0] as Check;
const numbers = ({ air, wind, speeds, distances, assessment, balkedLanding }: LandingAnswer) => ({
  air,
  wind,
  speeds,
  distances,
  assessment,
  balkedLanding,
});

describe('a landing by hand', () => {
  const answer = landed(changed(plainLanding, along(8)));
  const g = 9.80665;
  const stall = Math.sqrt((2 * 1010 * g) / (1.225 * 16.2 * 2));
  const density = answer.air.density;
  const over = Math.sqrt(1.225 / density);
  const [reference, touchdown, wind] = [1.3 * stall * over, 1.15 * stall * over, (8 * 1852) / 3600];

  it('has the speeds of the stall speed and its ratios, 14 CFR 23.73 [read]', () => {
    expectRatio(answer.speeds.stall.eas, stall, 1e-12);
    expectRatio(answer.speeds.landingReference.tas, reference, 1e-12);
    expectRatio(answer.speeds.touchdown.tas, touchdown, 1e-12);
  });
  it('comes down 3° and an arc of 1.2 g, then floats, Raymer ch. 17 [secondary] and arithmetic by hand', () => {
    const angle = Math.PI / 60;
    const mean = (reference + touchdown) / 2;
    const radius = mean ** 2 / (0.2 * g);
    const height = 15.24 - radius * (1 - Math.cos(angle));
    const time = height / (reference * Math.sin(angle)) + (radius * angle) / mean;
    const arc = height / Math.tan(angle) + radius * Math.sin(angle) - wind * time;
    const from = 0.96 * reference;
    const float = (from ** 2 - touchdown ** 2) / (2 * g * 0.12) - radius * Math.sin(angle);
    const floated = float * (1 - wind / ((from + touchdown) / 2));
    expect(arc).toBeGreaterThan(7 * (0.98 * reference - wind));
    expectRatio(answer.distances?.airDistance.value, arc + floated, 1e-9);
  });
  it('rolls a second, then brakes to within 2 % of the mean deceleration at 0.707 of the ground speed', () => {
    const ground = touchdown - wind;
    const mean = wind + Math.SQRT1_2 * ground;
    const q = 0.5 * density * mean ** 2 * 16.2;
    const polar = 0.08 + (0.71 * 0.5 ** 2) / (Math.PI * 7.32 * 0.72);
    const slowed = (0.35 * 0.85 * (1010 * g - q * 0.5) + q * polar - 100) / 1010;
    expectRatio(answer.distances?.groundRoll.value, ground + ground ** 2 / (2 * slowed), 0.02);
  });
  it('takes a second and the time of the mean deceleration on the ground, to 3 %', () => {
    const ground = touchdown - wind;
    const braked = (answer.distances?.groundRoll.value ?? 0) - ground;
    expectRatio(answer.distances?.groundRollTime, 1 + (2 * braked) / ground, 0.03);
  });
  it('adds up, and stands in the middle of its bands', () => {
    const { airDistance, groundRoll, landingDistance } = answer.distances ?? {};
    expectRatio(landingDistance?.value, (airDistance?.value ?? 0) + (groundRoll?.value ?? 0), 1e-12);
    for (const { value, low, high } of [airDistance, groundRoll, landingDistance].flatMap((one) => one ?? [])) {
      expectRatio(low * high, value * value, 1e-12);
    }
    expect(answer.distances?.screenHeight).toBe(15.24);
  });
});

describe('class B on a wet runway', () => {
  const dry = check(landed(classB));
  const readings = (surface: Surface) => {
    const found = check(landed(changed(classB, { runway: { surface } })));
    const both = [found, found.alternative].flatMap((one) => one ?? []);
    return { required: found.required, both, from: (start: string) => both.find((one) => one.startsFrom === start) };
  };

  it.each([wetPavement, wetGrass, { ...wetGrass, grass: 'short' as const }, { ...wetGrass, grass: 'long' as const }])(
    'puts no factor on physics of the wet runway, the factors on dry pavement beside it, and takes the longer: %j',
    (surface) => {
      const { required, both, from } = readings(surface);
      expect(both).toHaveLength(2);
      expect(from('credited')?.factors.map(({ code }) => code)).toEqual(['overall']);
      expectRatio(from('reference')?.distance, dry.distance ?? 0, 1e-12);
      expect(from('reference')?.factors.at(-1)?.code).toBe('overall');
      expect(required).toBe(Math.max(...both.map((one) => one.required ?? 0)));
    },
  );
  it('always shows the dry distance x 1.15 / 0.7 where the pavement is wet', () => {
    expectRatio(readings(wetPavement).from('reference')?.required, ((dry.distance ?? 0) * 1.15) / 0.7, 1e-12);
  });
  it('multiplies short wet grass by 1.60, and a fall of 2 % by 1.10', () => {
    const falls = changed(classB, { runway: { surface: { ...wetGrass, grass: 'short' }, slope: -0.02 } });
    const found = check(landed(falls));
    const factored = found.startsFrom === 'reference' ? found : found.alternative;
    expectRatio(factored?.required, ((dry.distance ?? 0) * 1.6 * 1.1) / 0.7, 1e-12);
  });
  it('credits half a headwind and half as much again of a tailwind', () => {
    const other = (knots: number) => check(landed(changed(classB, along(knots)))).distance;
    expectRatio(other(10), check(landed(changed(classB, along(5)))).alternative?.distance ?? other(10) ?? 0, 0.1);
    expectNear(landed(changed(classB, along(-6))).wind.creditedHeadwind, (-9 * 1852) / 3600, 1e-12);
    expectNear(landed(changed(classB, along(10))).wind.creditedHeadwind, (5 * 1852) / 3600, 1e-12);
  });
  it('is of EuAirOps330, 335 and their material, and names each source that it uses', () => {
    const { basis } = landed(changed(classB, { runway: { surface: wetPavement } }));
    expect(basis.sources).toContain('EuAirOps330');
  });
});

describe('the outcome', () => {
  const cases: readonly [LandingAnswer['outcome'], LandingChanges, RegExp][] = [
    ['enough', {}, /^Enough: needs \d+ m of LDA without factors, 1 500 m available: spare [\d ]+ m\.$/],
    ['enough-but-thin', { runway: { declared: { lda: 500 } } }, /^Enough but thin: .* under 10 %\.$/],
    ['enough-but-thin', { runway: { declared: { lda: 600 } } }, /high end of the 90 % band would not pass\.$/],
    ['not-enough', { runway: { declared: { lda: 430 } } }, /^Not enough: .* short by \d+ m\.$/],
    ['nothing-to-compare', { runway: { declared: { tora: 1500 } } }, /LDA is not declared.*landing distance is \d+ m/],
    [
      'roll-longer-than-runway',
      { runway: { declared: { lda: 120 } } },
      /^The ground roll alone .* of LDA available\.$/,
    ],
    [
      'never-stops',
      { runway: { surface: { kind: 'ice', state: 'dry' }, slope: -0.08 } },
      /^Never stops: at [\d.]+ kt over the ground nothing slows the aeroplane any more/,
    ],
    [
      'ground-speed-not-positive',
      along(90),
      /^The headwind of 90 kt is not below the touchdown speed of [\d.]+ kt true airspeed/,
    ],
    [
      'no-data-for-this-surface',
      { runway: { surface: { kind: 'paved', state: 'flooded' } } },
      /^No data for this surface \(paved, flooded\)/,
    ],
    [
      'rule-set-does-not-apply',
      { question: { ruleSet: 'eu-class-b' }, aeroplane: { masses: { maximumTakeoff: 5701 } } },
      /class B ends at a maximum takeoff mass of 5 700 kg.*landing distance/,
    ],
  ];
  it.each(cases)('is %s with one change: %j', (outcome, changes, sentence) => {
    const answer = landed(changed(plainLanding, changes));
    expect(answer.outcome).toBe(outcome);
    expect(answer.sentence).toMatch(sentence);
    const hasDistances = !/^(never|ground|no-data)/.test(outcome);
    expect(answer.distances !== undefined).toBe(hasDistances);
    expect(answer.assessment !== undefined).toBe(hasDistances && outcome !== 'rule-set-does-not-apply');
    expect(answer.shortfall !== undefined).toBe(/^(never|ground)/.test(outcome));
  });
  it('keeps the check of a roll that is longer than the runway', () => {
    const answer = landed(changed(plainLanding, { runway: { declared: { lda: 120 } } }));
    expect(check(answer).result).toBe('fails');
  });
  it('takes a surface that physics knows and class B does not by physics alone', () => {
    const gravel = landed(changed(classB, { runway: { surface: { kind: 'gravel', state: 'dry' } } }));
    expect(check(gravel).startsFrom).toBe('credited');
    expect(check(gravel).alternative).toBeUndefined();
  });
});

describe('the procedure', () => {
  it('rolls for a reaction time instead of the time of the definition, at the touchdown speed', () => {
    const slower = landed(changed(plainLanding, { question: { procedure: { reactionTime: 2.5 } } }));
    const { distances, speeds } = landed(plainLanding);
    const longer = (slower.distances?.groundRoll.value ?? 0) - (distances?.groundRoll.value ?? 0);
    expectRatio(longer, 1.5 * speeds.touchdown.tas, 1e-9);
  });
  it('comes down the angle that is asked for', () => {
    const angle = (3.5 * Math.PI) / 180;
    const asked = landed(changed(plainLanding, { question: { procedure: { approachAngle: angle } } }));
    const stated = landed(changed(plainLanding, { configuration: { approachAngle: angle } }));
    expect(asked.distances).toEqual(stated.distances);
  });
});

describe('why there are no distances', () => {
  const icy = { runway: { surface: { kind: 'ice', state: 'dry' }, slope: -0.08 } } as const;
  it('is in numbers: no deceleration, or a headwind at the touchdown speed', () => {
    const [never] = landed(changed(plainLanding, icy)).shortfall ?? [];
    expect(never).toMatchObject({ at: '/runway/surface', axis: 'decelerationRatio', bound: 0, side: 'below' });
    expect(never?.given as number).toBeLessThan(0);
    const windy = landed(changed(plainLanding, along(90)));
    expect(windy.shortfall?.[0]).toMatchObject({
      at: '/weather/wind',
      given: { kind: 'speed', value: expect.closeTo(46.3, 9) },
      bound: { kind: 'speed', value: windy.speeds.touchdown.tas },
    });
  });
  it('names the wind that the rules credit where only in that one it does not stop', () => {
    const gentle = { runway: { surface: { kind: 'ice', state: 'dry' }, slope: -0.009 } } as const;
    const tail = { ...gentle, weather: { wind: { kind: 'components', headwind: -5 } } } as const;
    expect(landed(changed(plainLanding, tail)).distances).toBeDefined();
    expect(landed(changed(classB, tail)).sentence).toMatch(/^Never stops in the wind that the rules credit: at /);
    const steeper = { ...tail, runway: { ...gentle.runway, slope: -0.08 } };
    expect(landed(changed(classB, steeper)).sentence).toMatch(/^Never stops: at /);
  });
});

describe('rules that do not apply', () => {
  it('take no part in the runs: the wind is as given', () => {
    const heavy = changed(plainLanding, {
      aeroplane: { masses: { maximumTakeoff: 5701 } },
      question: { ruleSet: 'eu-class-b' },
      weather: { wind: { kind: 'components', headwind: -landed(plainLanding).speeds.touchdown.tas } },
    });
    const conditions = conditionsOf(heavy, 'landing');
    if (isRefused(conditions)) throw new Error('refused');
    const ruled = ruledRuns(conditions);
    expect(ruled).toEqual({
      creditedHeadwind: conditions.wind.headwind,
      needsReference: false,
      slopeEarnsNothing: false,
    });
    const applies = conditionsOf(changed(heavy, { aeroplane: { masses: { maximumTakeoff: 1050 } } }), 'landing');
    if (isRefused(applies)) throw new Error('refused');
    expectRatio(ruledRuns(applies).creditedHeadwind, 1.5 * applies.wind.headwind, 1e-12);
  });
});

describe('reverse thrust', () => {
  const reversed = (reverse: boolean, ruleSet: string) =>
    landed(
      changed(plainLanding, {
        aeroplane: { reverseThrust: { thrust: 1500, cutOffSpeed: 10 } },
        question: { ruleSet, procedure: { reverse } },
      }),
    );
  it('shortens the roll, and not the distance that the factors of class B multiply', () => {
    const [without, used] = [reversed(false, 'eu-class-b'), reversed(true, 'eu-class-b')];
    expect(used.distances?.groundRoll.value ?? 0).toBeLessThan((without.distances?.groundRoll.value ?? 0) * 0.9);
    expect(check(used).startsFrom).toBe('reference');
    expectRatio(check(used).distance, check(without).distance ?? 0, 1e-12);
  });
  it('shortens what is required where there are no factors', () => {
    expect(check(reversed(true, 'unfactored')).required ?? 1).toBeLessThan(
      check(reversed(false, 'unfactored')).required ?? 0,
    );
  });
});

describe('a balked landing', () => {
  it('climbs as thrust less drag over weight at the landing reference speed, by hand', () => {
    const { balkedLanding, speeds, air } = landed(plainLanding);
    const speed = speeds.landingReference.tas;
    const weight = 1010 * 9.80665;
    const q = 0.5 * air.density * speed ** 2 * 16.2;
    const drag = q * (0.08 + (weight / q) ** 2 / (Math.PI * 7.32 * 0.72));
    const sigma = (1 - (0.0065 * air.pressureAltitude) / 288.15) ** 4.2558798;
    const lapse = ((sigma - 0.12) / 0.88) * Math.sqrt((288.15 - 0.0065 * air.pressureAltitude) / 288.15);
    const thrust = 2366 * lapse - 0.0564 * air.density * 1.905 ** 2 * speed ** 2;
    if (balkedLanding.outcome !== 'computed') throw new Error(balkedLanding.outcome);
    expectRatio(balkedLanding.rate, (speed * (thrust - drag)) / weight, 1e-6);
  });
});

describe('the runway', () => {
  it('is as long as LDA less a start offset, and not shortened from a named point', () => {
    const available = (start: LandingQuestion['runway']['start']) =>
      check(landed(changed(plainLanding, { runway: { start } }))).available;
    expect(available({ kind: 'threshold' })).toBe(1500);
    expect(available({ kind: 'offset', offset: 130 })).toBe(1370);
    expect(available({ kind: 'point', name: 'C' })).toBe(1500);
  });
  it('is not shortened by lining up', () => {
    const lined = changed(plainLanding, { runway: { lineUp: { tora: 20, asda: 25 } } });
    expect(check(landed(lined)).available).toBe(1500);
  });
});

describe('a screen', () => {
  it('stands at 50 ft whatever the takeoff was certified to', () => {
    const certification = { basis: 'cs-23-amendment-4', screenHeight: 35 * 0.3048 } as const;
    const answer = landed(changed(plainLanding, { aeroplane: { certification } }));
    expect(numbers(answer)).toEqual(numbers(landed(plainLanding)));
  });
});

describe('a question that cannot be answered', () => {
  const faults: readonly [string, string, LandingChanges][] = [
    ['/ruleSet', 'unknown-id', { question: { ruleSet: 'nobodys' } }],
    ['/configuration', 'contradiction', { question: { configuration: 'takeoff' } }],
    ['/weather/dewPoint', 'contradiction', { weather: { dewPoint: 300 } }],
    [
      '/aeroplane/definition/configurations/landing/speeds/touchdown',
      'contradiction',
      {
        configuration: {
          speeds: {
            landingReference: { kind: 'stall-ratio', ratio: 1.3 },
            touchdown: { kind: 'stall-ratio', ratio: 1.4 },
          },
        },
      },
    ],
    [
      '/aeroplane/definition/configurations/landing/speeds/touchdown',
      'contradiction',
      { configuration: { speeds: { touchdown: { kind: 'cas', cas: 20, mass: 1010 } } } },
    ],
    ['/procedure/reverse', 'missing', { question: { procedure: { reverse: true } } }],
  ];
  it.each(faults)('names %s as %s', (pointer, code, changes) => {
    const answer = planLanding(changed(plainLanding, changes));
    expect(isRefused(answer) && answer.refused.map((fault) => [fault.pointer, fault.code])).toEqual([[pointer, code]]);
  });
});

describe('whatever the numbers', () => {
  const question = fc
    .record({
      ruleSet: fc.constantFrom('unfactored', 'eu-class-b'),
      mass: fc.double({ min: 700, max: 1150, noNaN: true }),
      headwind: fc.double({ min: -10, max: 18, noNaN: true }),
      slope: fc.double({ min: -0.03, max: 0.03, noNaN: true }),
      elevation: fc.double({ min: -100, max: 3500, noNaN: true }),
      temperature: fc.double({ min: 250, max: 318, noNaN: true }),
      surface: fc.constantFrom<Surface>(
        { kind: 'paved', state: 'dry' },
        wetPavement,
        { kind: 'grass', state: 'damp' },
        { kind: 'grass', state: 'dry', grass: 'short' },
        { kind: 'grass', state: 'wet', firmness: 'soft' },
        { kind: 'gravel', state: 'dry' },
        { kind: 'snow', state: 'dry' },
        { kind: 'ice', state: 'dry' },
      ),
      lda: fc.double({ min: 150, max: 3000, noNaN: true }),
      approachSpeedIncrement: fc.double({ min: 0, max: 10, noNaN: true }),
    })
    .map(({ ruleSet, mass, headwind, slope, elevation, temperature, surface, lda, approachSpeedIncrement }) =>
      changed(plainLanding, {
        question: { ruleSet, mass, procedure: { approachSpeedIncrement } },
        runway: { slope, elevation, surface, declared: { lda } },
        weather: { temperature, dewPoint: temperature - 5, wind: { kind: 'components', headwind } },
      }),
    );
  const runs = { numRuns: 120 };
  const headwindOf = ({ weather }: LandingQuestion) => (weather.wind as { readonly headwind: number }).headwind;

  test.prop([question], runs)('a margin is negative exactly where the check fails', (asked) => {
    const answer = landed(asked);
    for (const { margin, result, required = 0, available = 0 } of answer.assessment?.checks ?? []) {
      expect(margin).toBe(available - required);
      expect(result).toBe((margin ?? 0) >= -1e-6 ? 'passes' : 'fails');
    }
  });
  test.prop([question], runs)('every number is finite and every word is written', (asked) => {
    const text = JSON.stringify(landed(asked), (_, value) => {
      if (typeof value === 'number') expect(Number.isFinite(value)).toBe(true);
      return value;
    });
    expect(text).not.toMatch(/NaN|undefined|Infinity|\[object/);
  });
  test.prop([question], runs)('the same question has the same answer, and asking leaves it as it was', (asked) => {
    const before = JSON.stringify(asked);
    expect(JSON.stringify(planLanding(asked))).toBe(JSON.stringify(planLanding(asked)));
    expect(JSON.stringify(asked)).toBe(before);
  });
  test.prop([question], runs)('the unit family changes the words and no number', (asked) => {
    const [first, ...rest] = unitFamilies.map((units) => landed({ ...asked, units }));
    for (const other of rest) expect(numbers(other)).toEqual(numbers(first as LandingAnswer));
  });

  const worse: readonly [string, fc.Arbitrary<number>, (asked: LandingQuestion, by: number) => LandingChanges][] = [
    // idle thrust does not grow with mass: on ice a heavier aeroplane may stop in less, so none is left here
    [
      'mass',
      fc.double({ min: 1, max: 300, noNaN: true }),
      (asked, by) => ({ question: { mass: asked.mass + by }, configuration: { idleThrust: 0 } }),
    ],
    [
      'tailwind',
      fc.double({ min: 0.1, max: 8, noNaN: true }),
      (asked, by) => ({ weather: { wind: { kind: 'components', headwind: headwindOf(asked) - by } } }),
    ],
    [
      'downslope',
      fc.double({ min: 0.001, max: 0.03, noNaN: true }),
      (asked, by) => ({ runway: { slope: asked.runway.slope - by } }),
    ],
    [
      'altitude',
      fc.double({ min: 10, max: 2000, noNaN: true }),
      (asked, by) => ({ runway: { elevation: asked.runway.elevation + by } }),
    ],
    [
      'approach speed',
      fc.double({ min: 0.1, max: 6, noNaN: true }),
      (asked, by) => ({
        question: {
          procedure: { approachSpeedIncrement: (asked.procedure?.approachSpeedIncrement ?? 0) + by },
        },
      }),
    ],
    [
      'a weaker brake',
      fc.double({ min: 0.05, max: 0.6, noNaN: true }),
      (asked, by) => ({ aeroplane: { brakes: { ...asked.aeroplane.brakes, loadFactor: 0.85 * (1 - by) } } }),
    ],
  ];
  it.each(worse)('is longer with %s', (_, by, change) => {
    fc.assert(
      fc.property(question, by, (asked, more) => {
        const base = landed(changed(asked, change(asked, 0)));
        const other = landed(changed(asked, change(asked, more)));
        if (/^never-stops/.test(base.outcome)) expect(other.outcome).toBe('never-stops');
        if (base.distances === undefined || other.distances === undefined) return;
        expect(other.distances.landingDistance.value).toBeGreaterThan(base.distances.landingDistance.value);
        const required = check(base)?.required;
        if (required !== undefined) expect(check(other)?.required ?? Infinity).toBeGreaterThanOrEqual(required);
      }),
      runs,
    );
  });
  test.prop([question, fc.double({ min: 0.05, max: 0.4, noNaN: true })], runs)(
    'is shorter with braking friction that the question states',
    (asked, friction) => {
      const given = (brakingFrictionCoefficient: number) =>
        landed(changed(asked, { runway: { surface: { ...asked.runway.surface, brakingFrictionCoefficient } } }));
      const [less, more] = [given(friction), given(friction + 0.1)];
      if (less.distances === undefined || more.distances === undefined) return;
      expect(more.distances.groundRoll.value).toBeLessThan(less.distances.groundRoll.value);
      expect(more.distances.airDistance.value).toBe(less.distances.airDistance.value);
    },
  );
  test.prop([question, fc.double({ min: 0, max: 1, noNaN: true })], runs)(
    'a gust is never credited',
    (asked, share) => {
      const mean = { kind: 'from', from: asked.runway.direction, fromReference: 'true', speed: 8 } as const;
      const steady = landed(changed(asked, { weather: { wind: mean } }));
      const gusty = landed(changed(asked, { weather: { wind: { ...mean, gust: 8 + 12 * share } } }));
      expect(numbers(gusty)).toEqual(numbers(steady));
    },
  );
});

describe('the basis', () => {
  const { idleThrust: _, ...bare } = { for: ['landing'], flap: 0.6, idleThrust: 0 } as const;
  const { brakes: __, wheels: ___, ...unbraked } = plainLanding.aeroplane;
  const silent = {
    ...plainLanding,
    aeroplane: {
      ...unbraked,
      configurations: { landing: { ...bare, maximumLift: { kind: 'coefficient', coefficient: 1.9 } } },
    },
    runway: { ...plainLanding.runway, surface: { kind: 'grass', state: 'wet' } },
  } as LandingQuestion;
  it('says each default once, with what it is worth', () => {
    const { basis } = landed(silent);
    const said = basis.assumed.map(({ at, effectRatio }) => [
      at.replace('/aeroplane/definition', '').replace('/configurations/landing', ''),
      effectRatio !== undefined,
    ]);
    expect(said).toEqual([
      ['/speeds/landingReference', true],
      ['/speeds/touchdown', true],
      ['/approachAngle', true],
      ['/flareLoadFactor', true],
      ['/floatDecelerationRatio', true],
      ['/freeRollTime', true],
      ['/groundLiftCoefficient', true],
      ['/groundDragIncrementCoefficient', true],
      ['/airDragIncrementCoefficient', false],
      ['/idleThrust', true],
      ['/runway/surface/grass', false],
      ['/runway/surface/firmness', false],
      ['/runway/surface/brakingFrictionCoefficient', true],
      ['/brakes/loadFactor', false],
      ['/brakes/antiSkid', false],
    ]);
  });
  it('takes the figures of the published ranges [Raymer, ch. 17: secondary; 14 CFR 23.73, 23.75: read; the rest judgement]', () => {
    const { basis } = landed(silent);
    const values = Object.fromEntries(basis.assumed.map(({ at, value }) => [at.split('/').at(-1), value]));
    expect(values).toMatchObject({
      landingReference: 1.3,
      touchdown: 1.15,
      approachAngle: { kind: 'angle', value: expect.closeTo(Math.PI / 60, 12) },
      flareLoadFactor: 1.2,
      floatDecelerationRatio: 0.12,
      freeRollTime: { kind: 'time', value: 2 },
      groundLiftCoefficient: 0.6,
      groundDragIncrementCoefficient: 0,
      airDragIncrementCoefficient: 0.065,
      brakingFrictionCoefficient: 0.12,
      loadFactor: 0.8,
      grass: 'long',
    });
    // 6 % of the static thrust of 2 366 N at 100 m and 15 °C, by the lapse of the definition
    expectNear((values['idleThrust'] as { value: number }).value, (0.06 * 2366 * (0.9904 - 0.12)) / 0.88, 1);
  });
  it('says nothing of what is stated', () => {
    expect(landed(plainLanding).basis.assumed).toEqual([]);
  });
  it('lists what could have been given for a landing, and nothing of a takeoff', () => {
    const { basis } = landed({ ...plainLanding, runway: { ...plainLanding.runway, declared: {} } });
    expect(basis.notGiven).toContain('/runway/declared/lda');
    expect(basis.notGiven.filter((at) => /tora|toda|asda|lineUp|obstacles/.test(at))).toEqual([]);
  });
});
