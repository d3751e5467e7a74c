import { describe, expect, it } from 'vitest';
import { landing } from '../../src/performance/landing/landing.ts';
import { isRefused } from '../../src/planning/fault.ts';
import { prepareLanding } from '../../src/planning/prepare-landing.ts';
import { prepareTakeoff } from '../../src/planning/prepare-takeoff.ts';
import type { LandingQuestion, Surface } from '../../src/planning/question.ts';
import { runwayCondition } from '../../src/planning/runway-condition.ts';
import { landed, plainLanding } from '../support/landing-question.ts';
import { expectRatio } from '../support/near.ts';
import { answered, changed, plainQuestion } from '../support/takeoff-question.ts';

const wheels = {
  arrangement: 'tricycle',
  tyrePressure: 30 * 6894.757,
  tyres: 3,
  maximumTyreWidth: 0.15,
  tyreDeflection: 0.03,
  sprayLength: 4,
} as const;
const slush = (depth?: number): Surface => ({
  kind: 'paved',
  state: 'contaminated',
  contaminant: depth === undefined ? { kind: 'slush' } : { kind: 'slush', depth },
});
const paved = (state: Surface['state'], runwayConditionCode: NonNullable<Surface['runwayConditionCode']>): Surface => ({
  kind: 'paved',
  state,
  runwayConditionCode,
});
const takeoffOn = (surface: Surface, shoes: object = wheels, more = {}) =>
  answered(changed(plainQuestion, { aeroplane: { wheels: shoes }, runway: { surface }, ...more }));
const landingOn = (surface: Surface, runway: Partial<LandingQuestion['runway']> = {}) =>
  landed(changed(plainLanding, { aeroplane: { wheels }, runway: { surface, ...runway } }));

describe('slush in a takeoff', () => {
  it('holds back by displacement and spray, by hand (AMC 25.1591, recalled)', () => {
    const question = changed(plainQuestion, { aeroplane: { wheels }, runway: { surface: slush(0.012) } });
    const prepared = prepareTakeoff(question);
    if (isRefused(prepared)) throw new Error('refused');
    const f = (0.03 + 0.012) / 0.15;
    const breadth = 2 * 0.15 * Math.sqrt(f - f * f);
    const byHand = 0.5 * 850 * (0.75 + 8 * 0.0025 * (4 / 0.3048)) * 3 * 0.012 * breadth;
    expectRatio(prepared.run.contaminantDrag, byHand, 1e-9);
  });
  it('is in the distance as stated and as credited, and lengthens with depth', () => {
    const roll = (depth: number) => takeoffOn(slush(depth)).distances?.groundRoll.value ?? Number.NaN;
    expect(roll(0.0031)).toBeGreaterThan(takeoffOn(paved('wet', 5)).distances?.groundRoll.value ?? Number.NaN);
    expect(roll(0.005)).toBeGreaterThan(roll(0.0031));
  });
  it('is never in the reference: a film reads as wet, whose factor starts there', () => {
    const film = takeoffOn(slush(0.003), wheels, { question: { ruleSet: 'eu-class-b' } });
    expect(film.assessment?.checks[0]?.factors.map(({ code }) => code)).toContain('surface');
    const deep = takeoffOn(slush(0.004), wheels, { question: { ruleSet: 'eu-class-b' } });
    expect(deep.assessment?.checks[0]?.startsFrom).toBe('credited');
  });
  it.each([
    ['tyres', /needs .*wheels\/tyres\./],
    ['maximumTyreWidth', /needs .*wheels\/maximumTyreWidth\./],
  ] as const)('has no data where the definition does not state %s, and names it', (member, says) => {
    const { [member]: _, ...rest } = wheels;
    const answer = takeoffOn(slush(0.01), rest);
    expect(answer.outcome).toBe('no-data-for-this-surface');
    expect(answer.sentence).toMatch(says);
    expect(answer.distances).toBeUndefined();
  });
  it('takes the longer way where deflection and spray are not stated, and says so', () => {
    const { tyreDeflection: _, sprayLength: __, ...rest } = wheels;
    const [full, sparse] = [takeoffOn(slush(0.004)), takeoffOn(slush(0.004), rest)];
    expect(sparse.distances?.groundRoll.value).toBeGreaterThan(full.distances?.groundRoll.value ?? Number.NaN);
    const said = sparse.basis.assumed.map(({ at }) => at);
    expect(said).toContain('/aeroplane/definition/wheels/tyreDeflection');
    expect(said).toContain('/aeroplane/definition/wheels/sprayLength');
  });
});

describe('what is refused', () => {
  const heavy = { category: 'twin-turboprop', engines: 2, masses: { maximumTakeoff: 5701 } } as const;
  const refusal = (surface: Surface, aeroplane: object = {}) => {
    const question = changed(plainQuestion, { aeroplane, runway: { surface } });
    return runwayCondition(question).refusal;
  };
  it('is slush or water deeper than 13 mm under a light aeroplane', () => {
    expect(refusal(slush(0.0131))?.reason).toBe(
      '13.1 mm of slush is more than the 13 mm up to which a light aeroplane is computed',
    );
    expect(refusal(slush(0.013))).toBeUndefined();
    expect(refusal({ ...slush(0.02), contaminant: { kind: 'water', depth: 0.02 } })).toBeDefined();
    expect(refusal({ ...slush(0.02), contaminant: { kind: 'wet-snow', depth: 0.02 } })).toBeUndefined();
  });
  it('is a matter of lightness: piston or electric, or no more than 5 700 kg', () => {
    expect(refusal(slush(0.02), heavy)).toBeUndefined();
    expect(refusal(slush(0.02), { ...heavy, masses: { maximumTakeoff: 5700 } })).toBeDefined();
    expect(refusal(slush(0.02), { ...heavy, category: 'twin-piston' })).toBeDefined();
    expect(refusal(slush(0.02), { ...heavy, category: 'twin-electric' })).toBeDefined();
  });
  it('is a light aeroplane where the depth is not known', () => {
    expect(refusal({ kind: 'paved', state: 'flooded' })?.reason).toMatch(/depth of the water is not given/);
    expect(refusal({ kind: 'paved', state: 'flooded' }, heavy)).toBeUndefined();
  });
  it('shows the depth and its bound, in takeoff and landing, and no distance under any rule set', () => {
    for (const ruleSet of ['unfactored', 'eu-class-b']) {
      const runway = { surface: slush(0.018) };
      for (const answer of [
        answered(changed(plainQuestion, { aeroplane: { wheels }, runway, question: { ruleSet } })),
        landed(changed(plainLanding, { aeroplane: { wheels }, runway, question: { ruleSet } })),
      ]) {
        expect(answer.outcome).toBe('no-data-for-this-surface');
        expect(answer.shortfall).toEqual([
          expect.objectContaining({ at: '/runway/surface/contaminant/depth', axis: 'contaminantDepth', side: 'above' }),
        ]);
        expect(answer.assessment).toBeUndefined();
      }
    }
  });
  it('is code 0 on any third, given or derived, even where a factor speaks of the surface', () => {
    for (const surface of [
      paved('wet', 0),
      paved('wet', [5, 5, 0]),
      { ...slush(), contaminant: { kind: 'wet-ice' } } as const,
    ]) {
      for (const ruleSet of ['unfactored', 'eu-class-b']) {
        const question = { ruleSet };
        expect(answered(changed(plainQuestion, { runway: { surface }, question })).outcome).toBe(
          'no-data-for-this-surface',
        );
        expect(landed(changed(plainLanding, { runway: { surface }, question })).outcome).toBe(
          'no-data-for-this-surface',
        );
      }
    }
    expect(landingOn(paved('wet', [5, 5, 1])).outcome).not.toBe('no-data-for-this-surface');
  });
});

describe('the stop that a factor stands for', () => {
  const asda = (surface: Surface, tora = 1500) =>
    takeoffOn(surface, wheels, {
      runway: { surface, declared: { tora, toda: tora + 1, asda: tora } },
      question: { ruleSet: 'eu-class-b' },
    });
  const stop = (surface: Surface, tora?: number) =>
    asda(surface, tora).assessment?.checks.find(({ code }) => code === 'accelerate-stop');
  const ice = { ...slush(), contaminant: { kind: 'ice' } } as const;
  it('is not assessed on a slippery runway, and keeps the answer from enough', () => {
    expect(stop(ice)?.result).toBe('not-assessed');
    expect(stop(ice)?.why).toMatch(/presumes a dry or wet runway/);
    expect(stop(ice)?.margin).toBeUndefined();
    expect(asda(ice).outcome).toBe('nothing-to-compare');
  });
  it('is the same where TORA alone is declared, whose 1.25 stands for the stop as well', () => {
    const alone = (surface: Surface, tora: number, more: object = {}) =>
      takeoffOn(surface, wheels, {
        runway: { surface, declared: { tora, ...more } },
        question: { ruleSet: 'eu-class-b' },
      });
    const [check, ...others] = alone(ice, 1500).assessment?.checks ?? [];
    expect([check?.code, check?.result, others]).toEqual(['takeoff-run', 'not-assessed', []]);
    expect(check?.why).toMatch(/presumes a dry or wet runway/);
    expect(alone(ice, 1500).outcome).toBe('nothing-to-compare');
    expect(alone(ice, 1500, { toda: 1500, asda: 1500 }).outcome).toBe('nothing-to-compare');
    expect(alone(ice, 300).outcome).toBe('not-enough');
    expect(alone({ kind: 'paved', state: 'wet' }, 1500).assessment?.checks[0]?.result).toBe('passes');
  });
  it('is assessed on a dry or wet one, and fails on ice where the factor alone fails', () => {
    expect(stop({ kind: 'paved', state: 'wet' })?.result).toBe('passes');
    expect(stop(ice, 300)?.result).toBe('fails');
    expect(asda(ice, 300).outcome).toBe('not-enough');
  });
});

describe('a takeoff by condition code', () => {
  const ofThirds = (runwayConditionCode: NonNullable<Surface['runwayConditionCode']>, ruleSet = 'unfactored') => {
    const { outcome, sentence, cautions, distances, assessment, basis } = takeoffOn(
      paved('wet', runwayConditionCode),
      wheels,
      {
        question: { ruleSet },
      },
    );
    return { outcome, sentence, cautions, distances, assessment, assumed: basis.assumed };
  };
  it('is the same for three like thirds as for the one code', () => {
    for (const ruleSet of ['unfactored', 'eu-class-b']) {
      for (const code of [6, 5, 4, 3, 2, 1, 0]) {
        expect(ofThirds([code, code, code], ruleSet)).toEqual(ofThirds(code, ruleSet));
      }
    }
  });
  it('takes the poorest third throughout, and says so', () => {
    for (const thirds of [
      [5, 5, 2],
      [5, 2, 5],
      [2, 5, 5],
    ] as const) {
      const found = ofThirds([...thirds]);
      const { assumed, ...rest } = ofThirds(2);
      expect(found).toMatchObject(rest);
      expect(found.assumed.filter((one) => !assumed.some(({ at }) => at === one.at))).toMatchObject([
        { at: '/runway/surface/runwayConditionCode', value: 2, because: expect.stringMatching(/the poorest counts/) },
      ]);
    }
  });
});

describe('a landing by condition code', () => {
  const roll = (surface: Surface, runway = {}) => landingOn(surface, runway).distances?.groundRoll.value ?? Number.NaN;
  it('is the same for three like thirds as for the one code', () => {
    for (const code of [5, 4, 3, 2, 1]) expect(roll(paved('wet', [code, code, code]))).toBe(roll(paved('wet', code)));
    const required = (runwayConditionCode: NonNullable<Surface['runwayConditionCode']>) =>
      landed(
        changed(plainLanding, {
          runway: { surface: paved('wet', runwayConditionCode) },
          question: { ruleSet: 'us-landing-by-condition-code' },
        }),
      ).assessment?.checks;
    for (const code of [5, 4, 3, 2, 1]) expect(required([code, code, code])).toEqual(required(code));
  });
  it('never gets shorter as a code gets worse', () => {
    const rolls = [6, 5, 4, 3, 2, 1].map((code) => roll(paved('wet', code)));
    for (let i = 1; i < rolls.length; i++) expect(rolls[i]).toBeGreaterThanOrEqual(rolls[i - 1] as number);
    expect(rolls[0]).toBe(roll({ kind: 'paved', state: 'wet' }));
  });
  it('lies between its best and its poorest third, and counts each where it lies', () => {
    const short = { declared: { lda: 900 } };
    const [good, poor] = [roll(paved('wet', 5), short), roll(paved('wet', 1), short)];
    const touchdownPoor = roll(paved('wet', [5, 1, 5]), short);
    expect(touchdownPoor).toBeGreaterThan(good);
    expect(touchdownPoor).toBeLessThan(poor);
    expect(roll(paved('wet', [1, 5, 5]), short)).toBe(good);
  });
  it('moves its thirds with a start offset', () => {
    const ends = (offset: number) => {
      const start = { kind: 'offset', offset } as const;
      const question = changed(plainLanding, { runway: { surface: paved('wet', [5, 4, 3]), start } });
      const prepared = prepareLanding(question);
      if (isRefused(prepared)) throw new Error('refused');
      expect(landing(prepared.run).outcome).toBe('stops');
      return prepared.run.stretches?.map(({ end }) => end);
    };
    expect(ends(0)).toEqual([500, 1000, 1500]);
    expect(ends(120)).toEqual([380, 880, 1380]);
  });
  it('takes the poorest throughout where no length is declared, and says so', () => {
    const answer = landingOn(paved('wet', [5, 5, 2]), { declared: {} });
    expect(answer.distances?.groundRoll.value).toBe(roll(paved('wet', 2), { declared: {} }));
    expect(answer.basis.assumed.map(({ at }) => at)).toContain('/runway/declared/lda');
  });
  it('takes the worse of a code and of what lies there', () => {
    const ice = { ...slush(), contaminant: { kind: 'ice' } } as const;
    expect(roll({ ...ice, runwayConditionCode: 4 })).toBe(roll(ice));
    expect(roll({ ...ice, runwayConditionCode: [4, 1, 6] })).toBe(roll(ice));
  });
  it('lets an effective coefficient stand, load and anti-skid not applied', () => {
    const question = changed(plainLanding, {
      runway: { surface: { ...slush(0.01), brakingFrictionCoefficient: 0.09 } },
    });
    const prepared = prepareLanding(question);
    if (isRefused(prepared)) throw new Error('refused');
    expect(prepared.run.braking.at(20)).toBe(0.09);
  });
  it('stops sooner in slush whose drag is known, by no more than half of it', () => {
    const { tyres: _, ...fewer } = wheels;
    const unknown = landed(changed(plainLanding, { aeroplane: { wheels: fewer }, runway: { surface: slush(0.01) } }));
    expect(roll(slush(0.01))).toBeLessThan(unknown.distances?.groundRoll.value ?? Number.NaN);
  });
});
