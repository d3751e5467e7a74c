import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { closedFormRoll } from '../../../src/performance/takeoff/closed-form-roll.ts';
import { groundRoll } from '../../../src/performance/takeoff/ground-roll.ts';
import { closedFormRolls } from '../../published/textbook-takeoffs.ts';
import { lightSingle, lightThrust } from '../../support/light-single.ts';
import { plainRun, quadraticThrust } from '../../support/plain-run.ts';

describe('closedFormRoll', () => {
  it.each(closedFormRolls.map((figure) => [figure.title, figure] as const))(
    '%s',
    (_, { inputs, expected, tolerance }) => {
      const run = lightSingle({ headwind: inputs.windShare * lightSingle().liftOffSpeed });
      const found = closedFormRoll(run, lightThrust);
      if (typeof found === 'string') throw new Error(found);
      expect(Math.abs(found.distance - expected)).toBeLessThan(tolerance);
    },
  );

  it('agrees with the quadrature to 1e-6 for any quadratic thrust, wind and slope', () => {
    const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
    fc.assert(
      fc.property(
        between(-12, 25),
        between(-0.03, 0.03),
        between(-0.4, 0.4),
        between(0, 0.08),
        between(0, 0.6),
        (headwind, slope, perSquare, rollingFriction, groundLiftCoefficient) => {
          const run = lightSingle({
            headwind,
            slope,
            rollingFriction,
            groundLiftCoefficient,
            thrust: quadraticThrust(2366, perSquare),
          });
          const closed = closedFormRoll(run, { atRest: 2366, perSquare });
          const found = groundRoll(run);
          if (typeof closed === 'string') {
            expect(found.outcome).toBe(closed);
            return;
          }
          if (found.outcome !== 'lifts-off') throw new Error(found.outcome);
          expect(Math.abs(found.distance / closed.distance - 1)).toBeLessThan(1e-6);
          expect(Math.abs(found.time / closed.time - 1)).toBeLessThan(1e-6);
        },
      ),
      { numRuns: 500 },
    );
  });

  it('adds a contaminant in still air, to 1e-6 of the quadrature, and has no form for it with a headwind', () => {
    for (const contaminantDrag of [0, 0.2, 1.5]) {
      const run = lightSingle({ contaminantDrag });
      const closed = closedFormRoll(run, lightThrust);
      const found = groundRoll(run);
      if (typeof closed === 'string' || found.outcome !== 'lifts-off') throw new Error('no roll');
      expect(Math.abs(found.distance / closed.distance - 1)).toBeLessThan(1e-6);
    }
    expect(closedFormRoll(lightSingle({ contaminantDrag: 3 }), lightThrust)).toBe('never-reaches-lift-off-speed');
    expect(() => closedFormRoll(lightSingle({ contaminantDrag: 1, headwind: 3 }), lightThrust)).toThrow(
      /contaminantDrag/,
    );
  });

  it('goes over to V^2/(2 a) where drag and friction balance, without losing digits', () => {
    for (const perSquare of [0, 1e-12, -1e-12, 1e-9, -1e-9, 2e-9]) {
      const found = closedFormRoll(plainRun({}), { atRest: 2, perSquare });
      if (typeof found === 'string') throw new Error(found);
      expect(found.distance / 225).toBeCloseTo(1, 6);
      expect(found.time / 15).toBeCloseTo(1, 6);
    }
  });
});
