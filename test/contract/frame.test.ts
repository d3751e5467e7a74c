import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { answerLanding } from '../../src/contract/answer-landing.ts';
import { answerTakeoff } from '../../src/contract/answer-takeoff.ts';
import type { LandingRequest } from '../../src/contract/landing-request.ts';
import type { TakeoffRequest } from '../../src/contract/takeoff-request.ts';
import { isRefused } from '../../src/planning/fault.ts';
import { unitFamilies } from '../../src/units/presentation.ts';
import { anyLanding, anyTakeoff, builtIn } from '../support/any-question.ts';

const stamp = { modelVersion: '1', rulesDigest: 'r' };
type Answer = Record<string, unknown>;

const phases: [name: string, any: fc.Arbitrary<unknown>, answer: (request: unknown) => Answer | undefined][] = [
  ['takeoff', anyTakeoff, (request) => unrefused(answerTakeoff(request as TakeoffRequest, builtIn, stamp))],
  ['landing', anyLanding, (request) => unrefused(answerLanding(request as LandingRequest, builtIn, stamp))],
];

function unrefused(answer: object): Answer | undefined {
  return isRefused(answer) ? undefined : (answer as Answer);
}

/** One of each unit in SI, by the definitions of the units; temperatures in K have an offset of their own. */
const inSi: Record<string, (value: number) => number> = {
  ft: (v) => v * 0.3048,
  kt: (v) => (v * 1852) / 3600,
  'ft/min': (v) => (v * 0.3048) / 60,
  lb: (v) => v * 0.45359237,
  degC: (v) => v + 273.15,
  hPa: (v) => v * 100,
  inHg: (v) => v * 3386.389,
  lbf: (v) => v * 0.45359237 * 9.80665,
  ft2: (v) => v * 0.3048 ** 2,
  kW: (v) => v * 1000,
  hp: (v) => v * 550 * 0.3048 * 0.45359237 * 9.80665,
};

/** Every number of an answer in SI with the path to it; the question as asked is left out. */
function numbersIn(node: unknown, path = ''): [path: string, value: number][] {
  if (typeof node === 'number') return [[path, node]];
  if (typeof node !== 'object' || node === null) return [];
  const { unit } = node as { unit?: string };
  const convert = (unit !== undefined && inSi[unit]) || ((value: number) => value);
  return Object.entries(node).flatMap(([name, child]) =>
    typeof child === 'number'
      ? [[`${path}/${name}`, convert(child)] as [string, number]]
      : numbersIn(child, `${path}/${name}`),
  );
}

describe.each(phases)('how a %s is asked and written', (_, any, answer) => {
  test.prop([any], { numRuns: 60 })('is the same before rounding in every family of units, to 1e-12', (request) => {
    const answers = unitFamilies.map((units) => answer({ ...(request as object), units, rounding: 'none' }));
    fc.pre(answers.every((one) => one !== undefined));
    const [first, ...others] = answers.map((one) => {
      const { air, wind, speeds, distances, assessment, climb, balkedLanding, obstaclePath } = one as Answer;
      return numbersIn({ air, wind, speeds, distances, assessment, climb, balkedLanding, obstaclePath });
    });
    const apart = others.flatMap((numbers) =>
      numbers.filter(([path, value], i) => {
        const [there, expected] = first?.[i] ?? ['', Number.NaN];
        // a temperature or a difference loses digits of its offset, a per cent those of the whole
        const scale = Math.max(Math.abs(expected), /temperature|dewPoint|Percent/i.test(path) ? 300 : 1e-3);
        return there !== path || !(Math.abs(value - expected) <= 1e-12 * scale);
      }),
    );
    expect(others.map((numbers) => numbers.length)).toEqual(others.map(() => first?.length));
    expect(apart).toEqual([]);
  });

  test.prop([any], { numRuns: 40 })(
    'shows numbers unrounded where rounding is none, and rounded by at most a step else',
    (request) => {
      const [bare, safe] = (['none', 'safe'] as const).map((rounding) =>
        answer({ ...(request as object), units: 'm-kt-kg', rounding }),
      );
      fc.pre(bare !== undefined && safe !== undefined && bare['distances'] !== undefined);
      type Shown = { distances: Record<string, { value: number; low?: number; high?: number }> };
      const [exact, rounded] = [bare as unknown as Shown, safe as unknown as Shown];
      for (const name of ['groundRoll', 'airDistance']) {
        const [from, to] = [exact.distances[name], rounded.distances[name]];
        expect(Number.isInteger(from?.value)).toBe(false);
        expect(Number.isInteger(to?.value)).toBe(true);
        expect((to?.value ?? 0) - (from?.value ?? 0)).toBeGreaterThanOrEqual(-1e-6);
        expect((to?.value ?? 0) - (from?.value ?? 0)).toBeLessThan(1);
        expect((from?.low ?? 0) - (to?.low ?? 0)).toBeGreaterThanOrEqual(-1e-6);
        expect((to?.high ?? 0) - (from?.high ?? 0)).toBeGreaterThanOrEqual(-1e-6);
      }
    },
  );

  it('echoes reference and time as they are, uses neither, and shows neither where not given', () => {
    const frame = { reference: 'Übung 7, „früh“', asOf: '2026-05-04T06:30:00.5+02:00' };
    const [request] = fc.sample(any, { numRuns: 1, seed: 11 });
    const [plain, framed] = [answer(request), answer({ ...(request as object), ...frame })];
    const { question: bare, ...rest } = plain as Answer & { question: object };
    const { question, ...same } = framed as Answer & { question: object };
    expect(same).toEqual(rest);
    expect(question).toEqual({ ...bare, ...frame });
    expect(Object.keys(question).slice(0, 2)).toEqual(['reference', 'asOf']);
    expect(bare).not.toHaveProperty('reference');
    expect(bare).not.toHaveProperty('asOf');
  });
});
