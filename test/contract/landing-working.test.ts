import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { answerLanding } from '../../src/contract/answer-landing.ts';
import type { LandingRequest } from '../../src/contract/landing-request.ts';
import { type LandingResponse, landingResponse } from '../../src/contract/landing-response.ts';
import { isRefused } from '../../src/planning/fault.ts';
import { anyLanding, builtIn } from '../support/any-question.ts';
import { type Line, slipsIn, unsaidIn } from '../support/working-slips.ts';

const stamp = { modelVersion: '1', rulesDigest: 'r' };

function answered(request: LandingRequest): LandingResponse | undefined {
  const answer = answerLanding({ ...request, detail: ['working'] }, builtIn, stamp);
  return isRefused(answer) ? undefined : answer;
}
const linesOf = (answer: LandingResponse): Line[] => answer.working ?? [];

describe('the working of a landing', () => {
  test.prop([anyLanding], { numRuns: 150 })(
    'has each line from those it names: recomputed by hand, to 1e-9',
    (request) => {
      const answer = answered(request);
      fc.pre(answer !== undefined);
      expect(slipsIn(linesOf(answer as LandingResponse))).toEqual([]);
    },
  );

  test.prop([anyLanding], { numRuns: 50 })('is lawful, and says where each figure comes from', (request) => {
    const answer = answered(request);
    fc.pre(answer !== undefined);
    const whole = answer as LandingResponse;
    expect(landingResponse.safeParse(whole).error).toBeUndefined();
    expect(unsaidIn(linesOf(whole), whole.basis)).toEqual([]);
  });

  test.prop([anyLanding], { numRuns: 50 })('shows the numbers of the answer where it says so', (request) => {
    const answer = answered(request);
    fc.pre(answer !== undefined);
    const { air, speeds, distances, assessment, basis } = answer as LandingResponse;
    // beside a flight manual s_G and s_A are those of physics alone
    const asked = basis.flightManual === undefined ? '' : '_asked';
    const shown = new Map(linesOf(answer as LandingResponse).map((line) => [line.symbol, line.shown]));
    const increased = shown.has('V_APP_cas');
    const expected: Record<string, unknown> = {
      rho: air.density,
      V_S_cas: speeds.stall.cas,
      [increased ? 'V_APP_cas' : 'V_REF_cas']: speeds.landingReference.cas,
      [increased ? 'V_APP_tas' : 'V_REF_tas']: speeds.landingReference.tas,
      V_TD_eas: speeds.touchdown.eas,
      V_TD_tas: speeds.touchdown.tas,
      V_TD_cas: speeds.touchdown.cas,
    };
    const distance = (name: 'airDistance' | 'groundRoll' | 'landingDistance') =>
      distances && { value: distances[name].value, unit: distances[name].unit };
    if (distances !== undefined) {
      Object.assign(expected, {
        [`s_A${asked}`]: distance('airDistance'),
        [`s_G${asked}`]: distance('groundRoll'),
        s_L: distance('landingDistance'),
      });
    }
    for (const { code, distance: from, required, margin } of assessment?.checks ?? []) {
      const symbol = code.replaceAll('-', '_');
      Object.assign(expected, {
        [`s_${symbol}`]: from,
        [`required_${symbol}`]: required,
        [`margin_${symbol}`]: margin,
      });
    }
    for (const [symbol, number] of Object.entries(expected)) expect(shown.get(symbol), symbol).toEqual(number);
  });

  test.prop([anyLanding], { numRuns: 50 })(
    'estimates the roll within 5 % where friction, slope and thrust stay as they are',
    (request) => {
      const answer = answered({ ...request, method: 'stated' });
      const { slope, surface } = request.runway;
      const falls = surface.kind === 'paved' && surface.state === 'wet';
      fc.pre(answer?.distances !== undefined && !('profile' in slope) && !falls && request.procedure?.reverse !== true);
      const values = new Map(linesOf(answer as LandingResponse).map(({ symbol, value }) => [symbol, value]));
      expect(Math.abs((values.get('s_G_estimate') ?? 0) / (values.get('s_G') ?? 1) - 1)).toBeLessThan(0.05);
    },
  );

  it('covers every origin but the equation, and each way to a speed, between the questions tried', () => {
    const answers = fc.sample(anyLanding, { numRuns: 200, seed: 1 }).map(answered);
    const lines = answers.flatMap((answer) => (answer === undefined ? [] : linesOf(answer)));
    expect(answers.filter((answer) => answer?.distances !== undefined).length).toBeGreaterThan(150);
    expect(new Set(lines.map(({ origin }) => origin)).size).toBe(7);
    const symbols = new Set(lines.map(({ symbol }) => symbol));
    for (const symbol of [
      'k_REF',
      'V_REF_stated',
      'V_MC',
      'V_APP_tas',
      'T_idle',
      'T_rev',
      'LDA_available',
      'k_S',
      's_manual',
    ]) {
      expect(symbols).toContain(symbol);
    }
  });
});
