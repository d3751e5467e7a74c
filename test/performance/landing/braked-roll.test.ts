import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { brakedRoll } from '../../../src/performance/landing/braked-roll.ts';
import type { BrakedRun } from '../../../src/performance/landing/landing-run.ts';
import { constantBraking, scaledBraking } from '../../../src/physics/braking-friction.ts';
import { codeBraking } from '../../../src/physics/code-braking.ts';
import type { RunwayConditionCode } from '../../../src/physics/runway-condition-code.ts';
import type { AntiSkidKind } from '../../../src/physics/wet-braking.ts';
import { andersonExample618, trainerStops } from '../../published/braking-and-landing.ts';

const g = 9.80665;
const trainer: BrakedRun = {
  mass: 1043,
  wingArea: 16.2,
  span: Math.sqrt(7.32 * 16.2),
  wingHeight: 0.2 * Math.sqrt(7.32 * 16.2),
  inducedDragFactor: 1 / (Math.PI * 7.32 * 0.72),
  groundDragCoefficient: 0.037,
  groundLiftCoefficient: 0.2,
  braking: constantBraking(0.3),
  idleThrust: 0,
  density: 1.225,
  headwind: 0,
  slope: 0,
};
const plain: BrakedRun = { ...trainer, groundDragCoefficient: 0, groundLiftCoefficient: 0 };

function stop(run: BrakedRun, airspeed: number) {
  const result = brakedRoll(run, airspeed);
  if (result.outcome !== 'stops') throw new Error(result.outcome);
  return result;
}

describe('brakedRoll', () => {
  it.each(trainerStops.map((figure) => [figure.title, figure] as const))('%s', (_, { inputs, expected, tolerance }) => {
    const found = stop({ ...trainer, braking: constantBraking(inputs.friction) }, 26).distance;
    expect(Math.abs(found - expected)).toBeLessThan(tolerance);
  });

  const [anderson] = andersonExample618;
  it(anderson?.title ?? '', () => {
    const run = {
      ...plain,
      mass: 54_966.4 / 9.8,
      wingArea: 29.54,
      groundDragCoefficient: 1.1 * 0.022,
      braking: constantBraking((0.4 * 9.8) / g),
    };
    expect(Math.abs(stop(run, 45.317).distance - 257.26)).toBeLessThan(anderson?.tolerance ?? 0);
  });

  it('is V^2/(2 g (mu + slope)) without air, and V/(g (mu + slope)) in time', () => {
    for (const slope of [-0.02, 0, 0.02]) {
      const found = stop({ ...plain, slope }, 30);
      expect(found.distance).toBeCloseTo(900 / (2 * g * (0.3 + slope)), 9);
      expect(found.time).toBeCloseTo(30 / (g * (0.3 + slope)), 9);
      expect(found.leastDecelerationRatio).toBeCloseTo(0.3 + slope, 12);
    }
  });

  it('counts the wind twice: in the speed to stop from and in the air that helps', () => {
    expect(stop({ ...plain, headwind: 10 }, 30).distance).toBeCloseTo(400 / (2 * g * 0.3), 9);
    // a tailwind pushes at the end: the last of the stop is from V = 0 to V = -5 of airspeed
    const tail = stop({ ...trainer, groundLiftCoefficient: 0, headwind: -5 }, 1e-9).distance;
    const k = (0.5 * 1.225 * 16.2 * 0.037) / 1043;
    const a = 0.3 * g;
    const expected = (5 / Math.sqrt(a * k)) * Math.atanh(5 * Math.sqrt(k / a)) + Math.log1p((-25 * k) / a) / (2 * k);
    expect(tail).toBeCloseTo(expected, 6);
  });

  it('takes idle thrust off and reverse thrust as help', () => {
    const thrust = 0.05 * 1043 * g;
    expect(stop({ ...plain, idleThrust: thrust }, 30).distance).toBeCloseTo(900 / (2 * g * 0.25), 9);
    expect(stop({ ...plain, idleThrust: -thrust }, 30).distance).toBeCloseTo(900 / (2 * g * 0.35), 9);
  });

  it('follows a friction that depends on ground speed, split at its kinks, to 1e-9', () => {
    const braking = { at: (speed: number) => (speed < 12 ? 0.2 : 0.1), kinks: [12] };
    const found = stop({ ...plain, braking, headwind: 4 }, 34).distance;
    expect(found).toBeCloseTo((900 - 144) / (2 * g * 0.1) + 144 / (2 * g * 0.2), 7);
  });

  it('never stops where thrust and slope outweigh the brakes, and says from which ground speed', () => {
    expect(brakedRoll({ ...plain, braking: constantBraking(0.05), slope: -0.05 }, 30)).toMatchObject({
      outcome: 'never-stops',
      atGroundSpeed: 30,
    });
    const k = (0.5 * 1.225 * 16.2 * 0.037) / 1043 / g;
    const result = brakedRoll(
      {
        ...trainer,
        groundLiftCoefficient: 0,
        headwind: 3,
        braking: constantBraking(0),
        idleThrust: 400 * k * 1043 * g,
      },
      30,
    );
    if (result.outcome !== 'never-stops') throw new Error(result.outcome);
    // drag balances idle thrust at an airspeed of 20
    expect(Math.abs(result.atGroundSpeed - 17)).toBeLessThan(0.03);
    expect(result.leastDecelerationRatio).toBeLessThan(0);
  });

  it('follows a deceleration that nearly vanishes', () => {
    for (const left of [1e-3, 1e-5]) {
      const k = (0.5 * 1.225 * 16.2 * 0.037) / 1043;
      const run = { ...trainer, groundLiftCoefficient: 0, braking: constantBraking(left) };
      expect(stop(run, 26).distance / (Math.log1p((k * 676) / (left * g)) / (2 * k))).toBeCloseTo(1, 7);
    }
  });

  it('heats the brakes by what the rest does not take, by hand', () => {
    // without air all of the motion; with idle thrust its work besides; uphill the slope takes its share
    expect(stop(plain, 30).brakeEnergy).toBeCloseTo((1043 * 900) / 2, 4);
    const thrust = 0.05 * 1043 * g;
    expect(stop({ ...plain, idleThrust: thrust }, 30).brakeEnergy / ((1043 * 450 * 0.3) / 0.25)).toBeCloseTo(1, 9);
    expect(stop({ ...plain, slope: 0.1 }, 30).brakeEnergy / (1043 * 450 * 0.75)).toBeCloseTo(1, 9);
    // with drag alone beside them: m a/(2 k) ln(1 + k V^2/a) of an even friction
    const k = (0.5 * 1.225 * 16.2 * 0.037) / 1043;
    const dragged = stop({ ...trainer, groundLiftCoefficient: 0 }, 30);
    expect(dragged.brakeEnergy / (((1043 * 0.3 * g) / (2 * k)) * Math.log1p((k * 900) / (0.3 * g)))).toBeCloseTo(1, 9);
    // over stretches as over one
    const braking = constantBraking(0.3);
    const stretches = [
      { end: 40, braking },
      { end: 80, braking },
    ];
    expect(stop({ ...trainer, stretches }, 30).brakeEnergy / stop(trainer, 30).brakeEnergy).toBeCloseTo(1, 9);
  });

  it('asks for a speed to stop from', () => {
    expect(() => brakedRoll({ ...plain, headwind: 30 }, 30)).toThrow(/airspeed/);
  });
});

describe('reverse thrust', () => {
  const reversed = { ...plain, reverseThrust: { thrust: 0.1 * plain.mass * g, cutOffSpeed: 15 } };
  it('slows above its cut-off speed and not below, by hand: v dv = a ds in two pieces', () => {
    const expected = (30 ** 2 - 15 ** 2) / (2 * 0.4 * g) + 15 ** 2 / (2 * 0.3 * g);
    expect(stop(reversed, 30).distance).toBeCloseTo(expected, 8);
    expect(stop(reversed, 15 - 1e-9).distance).toBeCloseTo(stop(plain, 15).distance, 6);
  });
  it('is of the ground speed, whatever the wind', () => {
    const windy = { ...reversed, headwind: 5, density: 1e-9 };
    expect(stop(windy, 35).distance).toBeCloseTo(stop({ ...reversed, density: 1e-9 }, 30).distance, 6);
  });

  it('is helped by a contaminant below its ground speed only: u^2 goes as exp(-2 k s) there [closed form; computed]', () => {
    const braking = constantBraking(0.1);
    const contaminantDrag = { perSquare: 1.5, below: 15 };
    for (const headwind of [-3, 0, 5]) {
      const found = stop({ ...plain, braking, contaminantDrag, headwind }, 30 + headwind);
      const k = 1.5 / 1043;
      const expected = (900 - 225) / (2 * g * 0.1) + Math.log1p((k * 225) / (0.1 * g)) / (2 * k);
      expect(found.distance).toBeCloseTo(expected, 7);
    }
  });
});

describe('brakedRoll over stretches of runway', () => {
  const third = (end: number, friction: number, slope = 0) => ({ end, braking: constantBraking(friction), slope });

  it('thirds of one code equal that code, wherever braking begins [the same integral cut; computed]', () => {
    const anywhere = fc.double({ min: 0, max: 1200, noNaN: true });
    const wind = fc.double({ min: -8, max: 12, noNaN: true });
    const slope = fc.double({ min: -0.02, max: 0.02, noNaN: true });
    const braking = { at: (speed: number) => 0.3 - 0.005 * Math.min(speed, 20), kinks: [20] };
    fc.assert(
      fc.property(anywhere, wind, slope, (begin, headwind, rise) => {
        const run = { ...trainer, braking, headwind, slope: rise, contaminantDrag: { perSquare: 0.4, below: 18 } };
        const stretches = [300, 600, 900].map((end) => ({ ...run, end }));
        const whole = stop(run, 32);
        const cut = brakedRoll({ ...run, stretches }, 32, begin);
        if (cut.outcome !== 'stops') throw new Error(cut.outcome);
        expect(cut.distance / whole.distance).toBeCloseTo(1, 8);
        expect(cut.time / whole.time).toBeCloseTo(1, 8);
        expect(cut.leastDecelerationRatio).toBeCloseTo(whole.leastDecelerationRatio, 6);
      }),
    );
  });

  it('loses mu g s of V^2/2 on each stretch, in the order in which they come [work and energy; computed]', () => {
    // braking begins 40 m before the end of the first: 450 = 0.1 g 40 + (0.05 + 0.01) g 300 + 0.3 g s
    const run = { ...plain, stretches: [third(300, 0.1), third(600, 0.05, 0.01), third(900, 0.3)] };
    const rest = (450 - g * (0.1 * 40 + 0.06 * 300)) / (0.3 * g);
    const result = brakedRoll(run, 30, 260);
    if (result.outcome !== 'stops') throw new Error(result.outcome);
    expect(result.distance).toBeCloseTo(340 + rest, 5);
    // a stop that begins on the last stretch, or beyond it, sees no other
    for (const begin of [600, 2000]) {
      expect(brakedRoll(run, 30, begin)).toMatchObject({ distance: expect.closeTo(450 / (0.3 * g), 7) });
    }
  });

  it('is between the poorest and the best of its stretches, and no shorter where one is poorer', () => {
    const friction = fc.double({ min: 0.05, max: 0.4, noNaN: true });
    fc.assert(
      fc.property(fc.tuple(friction, friction, friction), fc.nat(2), ([a, b, c], poorer) => {
        const of = (frictions: readonly number[]) => {
          const stretches = frictions.map((mu, i) => third(200 * (i + 1), mu));
          return stop({ ...trainer, stretches }, 32).distance;
        };
        const frictions = [a, b, c];
        const distance = of(frictions);
        const all = (mu: number) => stop({ ...trainer, braking: constantBraking(mu) }, 32).distance;
        expect(distance).toBeLessThanOrEqual(all(Math.min(a, b, c)) + 1e-6);
        expect(distance).toBeGreaterThanOrEqual(all(Math.max(a, b, c)) - 1e-6);
        const changed = frictions.map((mu, i) => (i === poorer ? 0.8 * mu : mu));
        expect(of(changed)).toBeGreaterThanOrEqual(distance - 1e-6);
      }),
    );
  });

  it('never stops where a stretch lets it gain speed, and says from which ground speed', () => {
    const run = { ...plain, slope: 0, stretches: [third(50, 0.2), third(600, 0.02, -0.05)] };
    const result = brakedRoll(run, 30);
    if (result.outcome !== 'never-stops') throw new Error(result.outcome);
    expect(result.leastDecelerationRatio).toBeCloseTo(-0.03, 12);
    expect(result.atGroundSpeed).toBeCloseTo(Math.sqrt(900 - 2 * g * 0.2 * 50), 6);
    // and stops where it is slow enough to be held before that
    expect(brakedRoll(run, 10)).toMatchObject({ outcome: 'stops' });
  });

  it('never stops where a friction that jumps holds it at a speed on a long stretch, whatever lies behind', () => {
    // 0.2 - 0.05 slows it from 15 to 12 m/s in 27.5 m; below 12, 0.02 - 0.05 would not
    const braking = { at: (speed: number) => (speed < 12 ? 0.02 : 0.2), kinks: [12] };
    const run = { ...plain, stretches: [{ end: 300, braking, slope: -0.05 }, third(900, 0.3)] };
    expect(brakedRoll(run, 15)).toMatchObject({ outcome: 'never-stops', atGroundSpeed: expect.closeTo(12, 1) });
    expect(brakedRoll(run, 15, 280)).toMatchObject({ outcome: 'stops' });
  });

  it('is never shorter for a worse code, on the whole runway or on any third of it', () => {
    const anyCode = fc.integer({ min: 1, max: 6 }) as fc.Arbitrary<RunwayConditionCode>;
    const brakes = fc.record({
      dry: fc.double({ min: 0.2, max: 0.5, noNaN: true }),
      antiSkid: fc.constantFrom<AntiSkidKind>('none', 'quasi-modulating', 'fully-modulating'),
      tyrePressure: fc.double({ min: 150_000, max: 1_500_000, noNaN: true }),
      hydroplaningSpeed: fc.option(fc.double({ min: 15, max: 60, noNaN: true }), { nil: undefined }),
    });
    const begin = fc.double({ min: 100, max: 700, noNaN: true });
    fc.assert(
      fc.property(fc.tuple(anyCode, anyCode, anyCode), fc.nat(2), brakes, begin, (codes, worse, own, from) => {
        const of = (thirds: readonly RunwayConditionCode[]) => {
          const stretches = thirds.map((code, i) => {
            const braking = codeBraking(code, own);
            if (braking === 'no-data') throw new Error(braking);
            return { end: 400 * (i + 1), braking: scaledBraking(braking, 0.85), slope: 0 };
          });
          const result = brakedRoll({ ...trainer, stretches }, 40, from);
          if (result.outcome !== 'stops') throw new Error(result.outcome);
          return result.distance;
        };
        fc.pre((codes[worse] as number) > 1);
        const poorer = codes.map((code, i) => (i === worse ? code - 1 : code)) as RunwayConditionCode[];
        expect(of(poorer)).toBeGreaterThanOrEqual(of(codes) * (1 - 1e-8));
      }),
      { numRuns: 300 },
    );
  });
});
