import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type CodeBrakes, codeAntiSkidScale, codeBraking } from '../../src/physics/code-braking.ts';
import { hydroplaningSpeed } from '../../src/physics/hydroplaning-speed.ts';
import type { RunwayConditionCode } from '../../src/physics/runway-condition-code.ts';
import {
  antiSkidScales,
  codeFour,
  codeOne,
  codeThree,
  codeTwoCap,
  codeTwoHydroplaning,
} from '../published/contaminated-runways.ts';
import { expectNear } from '../support/near.ts';

const psi = 6894.757293168361;
const knot = 1852 / 3600;
const codes = [1, 2, 3, 4, 5, 6] as const;
const tyrePressure = 100 * psi;
/** 90 kt; 85 % of it 76.5 kt. */
const hydroplaning = hydroplaningSpeed(tyrePressure, 'takeoff');
const transport: CodeBrakes = {
  dry: 0.4,
  antiSkid: 'fully-modulating',
  tyrePressure,
  hydroplaningSpeed: hydroplaning,
};

function at(code: RunwayConditionCode, knots: number, changes: Partial<CodeBrakes> = {}): number {
  const braking = codeBraking(code, { ...transport, ...changes });
  if (braking === 'no-data') throw new Error(braking);
  return braking.at(knots * knot);
}

describe('codeBraking', () => {
  const [four, three, sliding, cap, one] = [codeFour, codeThree, codeTwoHydroplaning, codeTwoCap, codeOne].map(
    ([figure]) => figure,
  );
  it(`${four?.title}`, () => expect(at(4, 60)).toBe(four?.expected));
  it(`${three?.title}`, () => expect(at(3, 60)).toBe(three?.expected));
  it(`${cap?.title}`, () => expect(at(2, 10)).toBe(cap?.expected));
  it(`${sliding?.title}`, () => {
    expect(at(2, 76.6)).toBe(sliding?.expected);
    expect(at(2, 76.4)).toBeGreaterThan(sliding?.expected ?? 1);
  });
  it(`${one?.title}; ours is 0.07, 0.01 lower: the European figure could not be read and may be that, and it stops longer`, () => {
    expect(at(1, 10)).toBe(0.07);
    expectNear((one?.expected ?? 0) - at(1, 10), 0.01, 1e-12);
  });

  it.each(antiSkidScales.map((figure) => [figure.title, figure] as const))('%s', (_, { inputs, expected }) => {
    expect(codeAntiSkidScale(inputs.antiSkid)).toBe(expected);
    expect(at(4, 40, inputs)).toBe(0.2 * expected);
    expect(at(2, 80, inputs)).toBe(0.05 * expected);
    expect(at(1, 10, inputs)).toBe(0.07 * expected);
  });

  it('counts no anti-skid as on-off: 0.30 over 0.80 [25.109(c)(2), low end for a pilot; judgement]', () => {
    expect(codeAntiSkidScale('none')).toBe(0.375);
    for (const code of codes) expect(at(code, 50, { antiSkid: 'none' })).toBe(at(code, 50, { antiSkid: 'on-off' }));
  });

  it('code 6 is the own dry figure, code 5 the wet curve times the efficiency and no better [25.109(c); read]', () => {
    expect(at(6, 100)).toBe(0.4);
    // 0.80 x (-0.0437 + 0.320 - 0.805 + 0.804) at 100 kt and 100 psi
    expectNear(at(5, 100), 0.8 * 0.2753, 1e-9);
    expect(at(5, 0)).toBe(0.4);
  });

  it('code 2 below 85 % of hydroplaning is half the wet figure, not above 0.16 [AC 25-31 table 2; secondary]', () => {
    // 70 kt: v = 0.7: -0.0437 x 0.343 + 0.320 x 0.49 - 0.805 x 0.7 + 0.804 = 0.38231; x 0.80 x 0.5 = 0.152924
    expectNear(at(2, 70), 0.152_924, 1e-6);
    expect(at(2, 60)).toBe(0.16);
  });

  it('code 2 of a tyre pressure that nobody stated is hydroplaning throughout', () => {
    for (const speed of [0, 30, 90]) expect(at(2, speed, { hydroplaningSpeed: undefined })).toBe(0.05);
  });

  it('code 0 has none', () => {
    expect(codeBraking(0, transport)).toBe('no-data');
  });

  it('on grooves is not above 70 % of dry in code 5, and the smooth curve in worse ones [25.109(d); read]', () => {
    const grooved = { texture: 'grooved' } as const;
    expect(at(5, 0, grooved)).toBeCloseTo(0.28, 12);
    expectNear(at(5, 130, grooved), at(5, 130, { ...grooved, dry: 2 }), 1e-12);
    expect(at(5, 130, grooved)).toBeGreaterThan(at(5, 130));
    expect(at(4, 130, grooved)).toBe(at(4, 130));
    expect(at(4, 10, { ...grooved, dry: 0.25 })).toBeCloseTo(0.7 * 0.25, 12);
  });

  it('never brakes better on a worse code, at any speed, pressure, system and own figure', () => {
    const brakes = fc.record({
      dry: fc.double({ min: 0.005, max: 0.6, noNaN: true }),
      antiSkid: fc.constantFrom('none', 'on-off', 'quasi-modulating', 'fully-modulating'),
      tyrePressure: fc.double({ min: 20 * psi, max: 350 * psi, noNaN: true }),
      hydroplaningSpeed: fc.option(fc.double({ min: 10, max: 90, noNaN: true }), { nil: undefined }),
      texture: fc.constantFrom('smooth', 'grooved', undefined),
    });
    fc.assert(
      fc.property(brakes, fc.double({ min: 0, max: 250, noNaN: true }), (own, knots) => {
        for (const code of codes.slice(0, -1)) {
          const better = (code + 1) as RunwayConditionCode;
          expect(at(code, knots, own as CodeBrakes)).toBeLessThanOrEqual(at(better, knots, own as CodeBrakes));
        }
      }),
      { numRuns: 1000 },
    );
  });

  it('names where its slope jumps: away from the kinks it bends by less than 0.001 in 1 m/s', () => {
    for (const code of codes) {
      const braking = codeBraking(code, transport);
      if (braking === 'no-data') throw new Error(braking);
      for (let speed = 0; speed < 100; speed++) {
        if (braking.kinks.some((kink) => kink >= speed && kink <= speed + 1)) continue;
        const jump = Math.abs(braking.at(speed + 1) - 2 * braking.at(speed + 0.5) + braking.at(speed));
        expect(jump, `code ${code} at ${speed} m/s`).toBeLessThan(1e-3);
      }
    }
  });
});
