import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { answerLanding } from '../../src/contract/answer-landing.ts';
import { answerTakeoff } from '../../src/contract/answer-takeoff.ts';
import type { LandingRequest } from '../../src/contract/landing-request.ts';
import { type LandingResponse, landingResponse } from '../../src/contract/landing-response.ts';
import type { TakeoffRequest } from '../../src/contract/takeoff-request.ts';
import { type TakeoffResponse, takeoffResponse } from '../../src/contract/takeoff-response.ts';
import { isRefused } from '../../src/planning/fault.ts';
import { unitFamilies } from '../../src/units/presentation.ts';
import { anyLanding, anyTakeoff, builtIn } from '../support/any-question.ts';
import type { StatedRequest } from '../support/stated-request.ts';

const stamp = { modelVersion: '1', rulesDigest: 'r' };
const all = ['working', 'trajectory', 'sensitivities'] as const;
function answered(request: TakeoffRequest): TakeoffResponse | undefined {
  const answer = answerTakeoff(request, builtIn, stamp);
  return isRefused(answer) ? undefined : answer;
}

const plain: StatedRequest<TakeoffRequest> = {
  aeroplane: { id: 'pellibrin-trainer' },
  mass: { value: 700, unit: 'kg' },
  configuration: 'takeoff-12',
  runway: {
    designator: '25',
    direction: { value: 250, unit: 'deg' },
    directionReference: 'true',
    elevation: { value: 900, unit: 'ft' },
    slope: { value: 0.5, unit: 'percent' },
    surface: { kind: 'grass', state: 'dry', grass: 'short', firmness: 'firm' },
    start: 'threshold',
    declared: { tora: { value: 1000, unit: 'm' } },
  },
  weather: {
    temperature: { value: 22, unit: 'degC' },
    pressure: { qnh: { value: 1009, unit: 'hPa' } },
    wind: { headwind: { value: 6, unit: 'kt' } },
  },
  ruleSet: 'unfactored',
};
const asked = (change: Partial<TakeoffRequest>): TakeoffResponse => {
  const answer = answered({ ...plain, ...change });
  if (answer === undefined) throw new Error('refused');
  return answer;
};

describe('the trajectory of a takeoff', () => {
  test.prop([anyTakeoff], { numRuns: 60 })(
    'ends in the numbers of the answer, in the units of the answer',
    (request) => {
      const answer = answered({ ...request, detail: ['trajectory'] });
      fc.pre(answer?.distances !== undefined);
      const { trajectory, distances, speeds } = answer as TakeoffResponse;
      expect(takeoffResponse.safeParse(answer).error).toBeUndefined();
      const [first, last] = [trajectory?.rows[0], trajectory?.rows.at(-1)];
      expect(trajectory?.rows).toHaveLength(51);
      expect(trajectory?.columns.map(({ name }) => name)).toEqual([
        'distance',
        'time',
        'groundSpeed',
        'trueAirspeed',
        'height',
      ]);
      expect([first?.[0], first?.[1], first?.[2], first?.[4]]).toEqual([0, 0, 0, 0]);
      expect(last?.[0]).toBe(distances?.takeoffDistance.value);
      expect(trajectory?.columns[0]?.unit).toBe(distances?.takeoffDistance.unit);
      const seconds = (distances?.groundRollTime?.value ?? 0) + (distances?.airTime?.value ?? 0);
      expect(Math.abs((last?.[1] ?? 0) - seconds)).toBeLessThan(0.11);
      expect(last?.[4]).toBeCloseTo(distances?.screenHeight.value ?? 0, 9);
      expect(trajectory?.columns[4]?.unit).toBe(distances?.screenHeight.unit);
      if (speeds.screen.tas.value >= speeds.liftOff.tas.value) {
        expect(last?.[3]).toBeCloseTo(speeds.screen.tas.value, 6);
        expect(trajectory?.columns[3]?.unit).toBe(speeds.screen.tas.unit);
      }
    },
  );
});

describe('the sensitivities of a takeoff', () => {
  it('are those of asking again with a little more and a little less, to 1 %', () => {
    const { sensitivities = [] } = asked({ detail: ['sensitivities'], rounding: 'none' });
    const distanceWith = (change: Partial<TakeoffRequest>) =>
      asked({ rounding: 'none', ...change }).distances?.takeoffDistance.value as number;
    const { weather, runway } = plain;
    const air = (change: Partial<typeof weather>) => ({ weather: { ...weather, ...change } });
    const ground = (change: Partial<typeof runway>) => ({ runway: { ...runway, ...change } });
    const kelvin = (value: number) => ({ temperature: { value, unit: 'degC' as const } });
    const friction = (rollingFrictionCoefficient: number) =>
      ground({ surface: { ...runway.surface, rollingFrictionCoefficient } });
    const lift = (coefficient: number): Partial<TakeoffRequest> => ({
      aeroplane: {
        basedOn: 'pellibrin-trainer',
        because: 'to see',
        changes: { configurations: { 'takeoff-12': { maximumLift: { coefficient } } } },
      },
    });
    const given = builtIn.get('pellibrin-trainer')?.definition.configurations['takeoff-12']?.maximumLift;
    const greatest = given && 'coefficient' in given ? given.coefficient : Number.NaN;
    const mu = asked({}).basis.assumed.find(({ at }) => at.endsWith('/rollingFrictionCoefficient'))?.value as number;
    const pairs: Record<string, [Partial<TakeoffRequest>, Partial<TakeoffRequest>, per: number]> = {
      mass: [{ mass: { value: 705, unit: 'kg' } }, { mass: { value: 695, unit: 'kg' } }, 1],
      'maximum-lift-coefficient': [lift(greatest + 0.01), lift(greatest - 0.01), 5],
      slope: [
        ground({ slope: { value: 0.6, unit: 'percent' } }),
        ground({ slope: { value: 0.4, unit: 'percent' } }),
        5,
      ],
      temperature: [air(kelvin(22.5)), air(kelvin(21.5)), 1],
      pressure: [
        air({ pressure: { qnh: { value: 1009.5, unit: 'hPa' } } }),
        air({ pressure: { qnh: { value: 1008.5, unit: 'hPa' } } }),
        1,
      ],
      headwind: [
        air({ wind: { headwind: { value: 6.5, unit: 'kt' } } }),
        air({ wind: { headwind: { value: 5.5, unit: 'kt' } } }),
        1,
      ],
      'rolling-friction': [friction(mu + 0.002), friction(mu - 0.002), 2.5],
    };
    expect(sensitivities.map(({ of }) => of)).toEqual(Object.keys(pairs));
    for (const { of, change } of sensitivities) {
      const [more, less, per] = pairs[of] as (typeof pairs)[string];
      const expected = (distanceWith(more) - distanceWith(less)) * per;
      expect((change?.takeoffDistance.value ?? 0) / expected, of).toBeCloseTo(1, 2);
    }
  });

  test.prop([anyTakeoff], { numRuns: 40 })('have the signs they must have by physics, and add up', (request) => {
    const answer = answered({ ...request, method: 'stated', rounding: 'none', detail: ['sensitivities'] });
    fc.pre(answer?.distances !== undefined);
    const signs: Record<string, number> = { mass: 1, slope: 1, headwind: -1, 'rolling-friction': 1 };
    for (const { of, change } of (answer as TakeoffResponse).sensitivities ?? []) {
      if (change === undefined) continue;
      const { groundRoll, airDistance, takeoffDistance } = change;
      const sum = groundRoll.value + airDistance.value;
      expect(Math.abs(sum - takeoffDistance.value)).toBeLessThan(1e-4 * (1 + Math.abs(sum)));
      const sign = signs[of];
      if (sign !== undefined) expect(groundRoll.value * sign, of).toBeGreaterThan(0);
    }
  });

  test.prop([anyTakeoff], { numRuns: 40 })(
    'by a flight manual never have the other sign: they are 0 at an edge and of what its figure holds',
    (request) => {
      const answer = answered({ ...request, rounding: 'none', detail: ['sensitivities'] });
      fc.pre(answer?.basis.flightManual !== undefined && answer.distances !== undefined);
      const signs: Record<string, number> = { mass: 1, slope: 1, headwind: -1, 'rolling-friction': 1 };
      for (const { of, change } of (answer as TakeoffResponse).sensitivities ?? []) {
        const sign = signs[of];
        if (sign !== undefined && change !== undefined)
          expect(change.takeoffDistance.value * sign, of).toBeGreaterThan(-1e-6);
      }
    },
  );

  it.each(unitFamilies)('are told for amounts of the units of %s', (units) => {
    const { sensitivities = [] } = asked({ detail: ['sensitivities'], units });
    const pers = Object.fromEntries(sensitivities.map(({ of, per }) => [of, per]));
    expect(pers['mass']).toEqual({ value: 10, unit: units === 'ft-kt-lb' ? 'lb' : 'kg' });
    expect(pers['headwind']).toEqual({ value: 1, unit: units === 'si' ? 'm/s' : 'kt' });
    expect(pers['temperature']).toEqual({ value: 1, unit: 'deltaC' });
    expect(pers['slope']).toEqual({ value: 1, unit: 'percent' });
    expect(pers['pressure']).toEqual(
      {
        'm-kt-kg': { value: 1, unit: 'hPa' },
        'ft-kt-lb': { value: 0.1, unit: 'inHg' },
        si: { value: 100, unit: 'Pa' },
      }[units],
    );
  });

  it('are those of more where the sides differ: a level runway, on which uphill counts in the air and downhill does not', () => {
    const on = (percent: number) =>
      asked({
        runway: { ...plain.runway, slope: { value: percent, unit: 'percent' } },
        detail: ['sensitivities'],
        rounding: 'none',
      });
    const { sensitivities = [] } = on(0);
    const air = sensitivities.find(({ of }) => of === 'slope')?.change?.airDistance.value ?? 0;
    const more = on(0.1).distances?.airDistance.value ?? 0;
    const level = on(0).distances?.airDistance.value ?? 0;
    expect(on(-0.1).distances?.airDistance.value).toBe(level);
    expect(air / ((more - level) * 10)).toBeCloseTo(1, 1);
  });

  it('are taken from one side where the other has no distances, as at saturation', () => {
    const weather = { ...plain.weather, dewPoint: plain.weather.temperature };
    const { sensitivities = [] } = asked({ weather, detail: ['sensitivities'], rounding: 'none' });
    const beside = { ...weather, dewPoint: { value: 21.98, unit: 'degC' as const } };
    const near = asked({ weather: beside, detail: ['sensitivities'], rounding: 'none' }).sensitivities ?? [];
    const of = (list: typeof near) => list.find((one) => one.of === 'temperature')?.change?.takeoffDistance.value ?? 0;
    expect(of(sensitivities) / of(near)).toBeCloseTo(1, 2);
  });
});

describe('detail', () => {
  it('holds what is asked for and nothing else, and is echoed', () => {
    for (const name of all) {
      const answer = asked({ detail: [name] });
      expect(all.filter((one) => one in answer)).toEqual([name]);
      expect(answer.question.detail).toEqual([name]);
    }
    expect(all.filter((one) => one in asked({ detail: [] }))).toEqual([]);
    expect(asked({})).not.toHaveProperty('question.detail');
  });

  it('changes nothing else of the answer', () => {
    const { working: _w, trajectory: _t, sensitivities: _s, basis, question, ...rest } = asked({ detail: [...all] });
    const { basis: bare, question: _q, ...others } = asked({});
    expect(rest).toEqual(others);
    expect({ ...basis, sources: [] }).toEqual({ ...bare, sources: [] });
    expect(question.detail).toEqual(all);
  });

  it('leaves out what hangs on distances where there are none, and shows the working as far as it goes', () => {
    const steep = {
      ...plain.runway,
      slope: { value: 10, unit: 'percent' as const },
      elevation: { value: 9000, unit: 'ft' as const },
    };
    const answer = asked({ runway: steep, detail: [...all] });
    expect(answer.outcome).toMatch(/^never-/);
    expect(all.filter((one) => one in answer)).toEqual(['working']);
    expect(answer.working?.map(({ symbol }) => symbol)).toContain('a_2');
  });
});

describe('the detail of a landing', () => {
  const answeredLanding = (request: LandingRequest): LandingResponse | undefined => {
    const answer = answerLanding(request, builtIn, stamp);
    return isRefused(answer) ? undefined : answer;
  };

  test.prop([anyLanding], { numRuns: 60 })(
    'has a trajectory from the screen to a standstill, in the numbers of the answer',
    (request) => {
      const answer = answeredLanding({ ...request, detail: ['trajectory'] });
      fc.pre(answer?.distances !== undefined);
      const { trajectory, distances, speeds } = answer as LandingResponse;
      expect(landingResponse.safeParse(answer).error).toBeUndefined();
      const rows = trajectory?.rows ?? [];
      const [first, last] = [rows[0], rows.at(-1)];
      expect(rows).toHaveLength(51);
      expect([first?.[0], first?.[1]]).toEqual([0, 0]);
      expect(first?.[3]).toBeCloseTo(speeds.landingReference.tas.value, 6);
      expect(first?.[4]).toBeCloseTo(distances?.screenHeight.value ?? 0, 6);
      expect(last?.[0]).toBe(distances?.landingDistance.value);
      expect(last?.[2]).toBeCloseTo(0, 6);
      expect(last?.[4]).toBe(0);
      const seconds = (distances?.groundRollTime?.value ?? 0) + (distances?.airTime?.value ?? 0);
      expect(Math.abs((last?.[1] ?? 0) - seconds)).toBeLessThan(0.11);
    },
  );

  test.prop([anyLanding], { numRuns: 40 })(
    'has sensitivities with the signs they must have, that add up',
    (request) => {
      const answer = answeredLanding({ ...request, rounding: 'none', detail: ['sensitivities'] });
      fc.pre(answer?.distances !== undefined);
      const { sensitivities = [] } = answer as LandingResponse;
      expect(sensitivities.map(({ of }) => of)).toContain('braking-friction');
      const signs: Record<string, number> = { slope: -1, headwind: -1, 'braking-friction': -1 };
      for (const { of, change } of sensitivities) {
        if (change === undefined) continue;
        const { groundRoll, airDistance, landingDistance } = change;
        const sum = groundRoll.value + airDistance.value;
        expect(Math.abs(sum - landingDistance.value)).toBeLessThan(1e-4 * (1 + Math.abs(sum)));
        const sign = signs[of];
        if (sign !== undefined) expect(groundRoll.value * sign, of).toBeGreaterThan(0);
      }
    },
  );
});
