import type { AirspeedCalibration } from '../../performance/aeroplane.ts';
import { calibratedFromIndicated } from '../../performance/airspeed-calibration.ts';
import { maximumLiftCoefficient } from '../../performance/speeds/maximum-lift-coefficient.ts';
import type { Fault } from '../../planning/fault.ts';
import { fittingUnit } from '../fitting-unit.ts';
import type { MaximumLiftOnWire } from '../lift.ts';
import { si } from '../quantity.ts';
import { toMaximumLift } from '../to-configuration.ts';
import { figure, written } from '../written.ts';

/** Maximum lift coefficients of whole aeroplanes, flaps and slats included; our choice. */
const maximumLiftCoefficients = { lowest: 0.7, highest: 3.5 };
const speedUnits = ['kt', 'km/h', 'mph', 'm/s'] as const;

/** What a configuration says of its maximum lift: the coefficient behind it, or why there is none. */
export type LiftFinding = { readonly coefficient: number } | { readonly faults: Fault[] };

/**
 * The maximum lift of a configuration, checked.
 *
 * @param wingArea - [m2]
 * @param at - pointer to maximumLift
 * @param calibrationAt - pointer to where the airspeed calibration would be
 */
export function checkLift(
  given: MaximumLiftOnWire,
  wingArea: number,
  at: string,
  calibration: AirspeedCalibration | undefined,
  calibrationAt: string,
): LiftFinding {
  if ('stallSpeed' in given && given.type === 'ias') {
    if (calibration === undefined) {
      return {
        faults: [
          {
            pointer: calibrationAt,
            code: 'missing',
            message: `The stall speed ${written(given.stallSpeed)} is indicated: without an airspeed calibration it says nothing of lift.`,
            hint: 'Give airspeedCalibration, or the stall speed as cas.',
          },
        ],
      };
    }
    if (calibratedFromIndicated(calibration, si('speed', given.stallSpeed)) === 'outside') {
      return {
        faults: [
          {
            pointer: `${at}/stallSpeed`,
            code: 'contradiction',
            message: `The airspeed calibration does not reach an indicated airspeed of ${written(given.stallSpeed)}.`,
            received: given.stallSpeed.value,
          },
        ],
      };
    }
  }
  const coefficient = maximumLiftCoefficient(toMaximumLift(given, calibration), wingArea);
  if (plausible(coefficient)) return { coefficient };
  const allowed = `${maximumLiftCoefficients.lowest} to ${maximumLiftCoefficients.highest}`;
  if ('coefficient' in given) {
    return {
      faults: [
        {
          pointer: `${at}/coefficient`,
          code: 'implausible',
          message: `A maximum lift coefficient of ${given.coefficient} is outside what aeroplanes reach.`,
          received: given.coefficient,
          allowed,
        },
      ],
    };
  }
  const speed = si('speed', given.stallSpeed);
  const meant = fittingUnit('speed', given.stallSpeed, speedUnits, (other) =>
    plausible(coefficient * (speed / other) ** 2),
  );
  return {
    faults: [
      {
        pointer: `${at}/stallSpeed`,
        code: 'implausible',
        message: `A stall speed of ${written(given.stallSpeed)} at ${written(given.mass)} is a maximum lift coefficient of ${figure(coefficient)}.`,
        received: given.stallSpeed.value,
        allowed: `a coefficient of ${allowed}`,
        ...(meant === undefined ? {} : { hint: `In ${meant} it would fit.` }),
      },
    ],
  };
}

function plausible(coefficient: number): boolean {
  return coefficient >= maximumLiftCoefficients.lowest && coefficient <= maximumLiftCoefficients.highest;
}
