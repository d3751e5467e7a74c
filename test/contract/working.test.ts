import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { answerTakeoff } from '../../src/contract/answer-takeoff.ts';
import type { TakeoffRequest } from '../../src/contract/takeoff-request.ts';
import { type TakeoffResponse, takeoffResponse } from '../../src/contract/takeoff-response.ts';
import { isRefused } from '../../src/planning/fault.ts';
import { anyTakeoff, builtIn } from '../support/any-question.ts';
import { type Line, slipsIn, unsaidIn } from '../support/working-slips.ts';

const stamp = { modelVersion: '1', rulesDigest: 'r' };
function answered(request: TakeoffRequest): TakeoffResponse | undefined {
  const answer = answerTakeoff({ ...request, detail: ['working'] }, builtIn, stamp);
  return isRefused(answer) ? undefined : answer;
}
const linesOf = (answer: TakeoffResponse): Line[] => answer.working ?? [];
const valuesOf = (lines: readonly Line[]) => new Map(lines.map(({ symbol, value }) => [symbol, value]));

describe('the working of a takeoff', () => {
  test.prop([anyTakeoff], { numRuns: 150 })(
    'has each line from those it names: recomputed by hand, to 1e-9',
    (request) => {
      const answer = answered(request);
      fc.pre(answer !== undefined);
      expect(slipsIn(linesOf(answer as TakeoffResponse))).toEqual([]);
    },
  );

  test.prop([anyTakeoff], { numRuns: 50 })('is lawful, and says where each figure comes from', (request) => {
    const answer = answered(request);
    fc.pre(answer !== undefined);
    const whole = answer as TakeoffResponse;
    expect(takeoffResponse.safeParse(whole).error).toBeUndefined();
    expect(unsaidIn(linesOf(whole), whole.basis)).toEqual([]);
  });

  test.prop([anyTakeoff], { numRuns: 50 })('shows the numbers of the answer where it says so', (request) => {
    const answer = answered(request);
    fc.pre(answer !== undefined);
    const { air, wind, speeds, distances, assessment, basis } = answer as TakeoffResponse;
    // beside a flight manual s_G and s_A are those of physics alone
    const asked = basis.flightManual === undefined ? '' : '_asked';
    const shown = new Map(linesOf(answer as TakeoffResponse).map((line) => [line.symbol, line.shown]));
    const expected: Record<string, unknown> = {
      rho: air.density,
      DA: air.densityAltitude,
      w: request.weather.wind === 'calm' || 'headwind' in request.weather.wind ? undefined : wind.headwind,
      V_S_eas: speeds.stall.eas,
      V_S_tas: speeds.stall.tas,
      V_S_cas: speeds.stall.cas,
      V_S_ias: speeds.stall.ias,
      V_R_eas: speeds.rotation.eas,
      V_R_tas: speeds.rotation.tas,
      V_R_cas: speeds.rotation.cas,
      V_LOF_eas: speeds.liftOff.eas,
      V_LOF_tas: speeds.liftOff.tas,
      V_LOF_cas: speeds.liftOff.cas,
      V_LOF_ias: speeds.liftOff.ias,
      V_scr_eas: speeds.screen.eas,
      V_scr_tas: speeds.screen.tas,
      V_scr_cas: speeds.screen.cas,
      [`s_G${asked}`]: distances && { value: distances.groundRoll.value, unit: distances.groundRoll.unit },
      [`s_A${asked}`]: distances && { value: distances.airDistance.value, unit: distances.airDistance.unit },
      s_T: distances && { value: distances.takeoffDistance.value, unit: distances.takeoffDistance.unit },
    };
    for (const { code, distance, required, available, margin, startsFrom } of assessment?.checks ?? []) {
      const symbol = code.replaceAll('-', '_');
      if (startsFrom === undefined) expected[`available_${symbol}`] = available;
      Object.assign(expected, {
        [`s_${symbol}`]: distance,
        [`required_${symbol}`]: required,
        [`margin_${symbol}`]: margin,
      });
    }
    for (const [symbol, number] of Object.entries(expected)) expect(shown.get(symbol), symbol).toEqual(number);
  });

  test.prop([anyTakeoff], { numRuns: 50 })('estimates the roll within 3 % where it accelerates well', (request) => {
    const answer = answered({ ...request, method: 'stated' });
    fc.pre(answer?.distances !== undefined);
    const values = valuesOf(linesOf(answer as TakeoffResponse));
    const [slow, fast] = [values.get('a_1') ?? 0, values.get('a_2') ?? 0];
    // on one slope: a ground line with a profile has its hump where the estimate does not look
    fc.pre(!('profile' in request.runway.slope) && Math.min(slow, fast) > 0.1 * 9.80665);
    const roll = (values.get('s_standing') ?? values.get('s_G')) as number;
    expect(Math.abs((values.get('s_G_estimate') ?? 0) / roll - 1)).toBeLessThan(0.03);
    expect(Math.abs((values.get('s_A_estimate') ?? 0) / (values.get('s_A') ?? 1) - 1)).toBeLessThan(0.2);
  });

  it('covers every origin, every part and every kind of propulsion between the questions tried', () => {
    const requests = fc.sample(anyTakeoff, { numRuns: 200, seed: 1 });
    const answers = requests.flatMap((request) => [answered(request), answered({ ...request, method: 'stated' })]);
    const lines = answers.flatMap((answer) => (answer === undefined ? [] : linesOf(answer)));
    expect(answers.filter((answer) => answer?.distances !== undefined).length).toBeGreaterThan(240);
    expect(new Set(lines.map(({ origin }) => origin)).size).toBe(8);
    expect(new Set(lines.map(({ part }) => part)).size).toBe(9);
    const symbols = new Set(lines.map(({ symbol }) => symbol));
    for (const symbol of [
      'b_P',
      'v_1',
      'T_cap',
      'TR',
      'x_m',
      'dT_F',
      'h_m',
      'PA_c',
      'available_obstacle_all_engines',
      'f_P',
      's_rolling',
      's_G_manual',
      'k_G',
      'V_LOF_ias',
      'k_S',
      'variation',
    ]) {
      expect(symbols).toContain(symbol);
    }
  });

  it('is absent where it is not asked for', () => {
    const [request] = fc.sample(anyTakeoff, { numRuns: 1, seed: 3 });
    const answer = answerTakeoff(request as TakeoffRequest, builtIn, stamp);
    expect(answer).not.toHaveProperty('working');
  });
});
