import { maximumLiftRange } from '../../performance/fit/maximum-lift-range.ts';
import { maximumLiftCoefficient } from '../../performance/speeds/maximum-lift-coefficient.ts';
import { toSi, type Unit } from '../../units/units.ts';
import type { FindingTest } from './finding-test.ts';
import { configurationsOf, textIn } from './review-context.ts';

/** A stall speed is known to 3 %, and lift goes with its square. @see references.Judgement */
const room = 0.06;
const speedUnits = ['kt', 'mph', 'km/h', 'm/s'] as const;

/** A stall speed that goes with no usual wing: indicated, in another unit, or at another mass. */
export const maximumLiftUnusual: FindingTest = {
  code: 'maximum-lift-unusual',
  severity: 'caution',
  meaning:
    'The stall speed, mass and wing area of a configuration come to more or less lift than such aeroplanes have: an indicated speed, another unit, or another mass.',
  source: 'HouseFit',
  test: (context) =>
    configurationsOf(context).flatMap(({ configuration, at, id }) => {
      const { maximumLift, flap } = configuration;
      const { category, wing } = context.aeroplane;
      const coefficient = maximumLiftCoefficient(maximumLift, wing.area);
      const ranges = configuration.for.map((phase) => maximumLiftRange(category, phase, flap));
      const [low, high] = [Math.min(...ranges.map(([least]) => least)), Math.max(...ranges.map(([, most]) => most))];
      if (coefficient >= low * (1 - room) && coefficient <= high * (1 + room)) return [];
      const bound = coefficient < low ? low : high;
      const usual = `usual is ${figure(low)} to ${figure(high)}`;
      if (maximumLift.kind === 'coefficient') {
        return [
          {
            message: `The maximum lift coefficient of ${id} is ${figure(coefficient)}; ${usual}.`,
            at: `${at}/maximumLift/coefficient`,
            value: coefficient,
            threshold: bound,
          },
        ];
      }
      const { cas, mass } = maximumLift;
      const meant = otherUnits(context.stallSpeedUnits[id], (factor) => {
        const other = coefficient * factor ** 2;
        return other >= low && other <= high;
      });
      return [
        {
          message: `A stall speed of ${textIn(context, 'speed', cas)} at ${textIn(context, 'mass', mass)} in ${id} is a maximum lift coefficient of ${figure(coefficient)}; ${usual}.`,
          at: `${at}/maximumLift/stallSpeed`,
          value: coefficient,
          threshold: bound,
          hint: [
            meant.length > 0 ? `In ${meant.join(' or ')} it would be usual.` : '',
            coefficient > high
              ? 'An indicated stall speed is several knots below the calibrated one; check the kind of the speed and its mass.'
              : 'Check the unit of the speed, and that the mass is the one it was found at.',
          ]
            .filter((part) => part !== '')
            .join(' '),
        },
      ];
    }),
};

/** Other units in which the same number fits, by their factor to the one it was typed in with. */
function otherUnits(typed: string | undefined, fits: (factor: number) => boolean): Unit[] {
  if (typed === undefined) return [];
  const declared = toSi('speed', 1, typed as never);
  return speedUnits.filter((unit) => unit !== typed && fits(declared / toSi('speed', 1, unit)));
}

function figure(value: number): string {
  return value.toFixed(2);
}
