import type { AirspeedCalibration, Configuration, MaximumLift, ScheduledSpeed } from '../performance/aeroplane.ts';
import { calibratedFromIndicated } from '../performance/airspeed-calibration.ts';
import type { ConfigurationOnWire } from './configuration.ts';
import type { MaximumLiftOnWire, ScheduledSpeedOnWire } from './lift.ts';
import { perhaps, present } from './present.ts';
import { type Q, si } from './quantity.ts';

/** One setting of flap and gear, in SI; an indicated stall speed becomes calibrated by the aeroplane's own table. */
export function toConfiguration(given: ConfigurationOnWire, calibration?: AirspeedCalibration): Configuration {
  return present<Configuration>({
    for: given.for,
    flap: si('angle', given.flap),
    maximumLift: toMaximumLift(given.maximumLift, calibration),
    groundDragIncrementCoefficient: given.groundDragIncrementCoefficient,
    airDragIncrementCoefficient: given.airDragIncrementCoefficient,
    groundLiftCoefficient: given.groundLiftCoefficient,
    speeds: perhaps(toSpeeds, given.speeds),
    climbOut: given.climbOut?.map(({ from, airDragIncrementCoefficient }) => ({
      from: si('length', from),
      airDragIncrementCoefficient,
    })),
    rotationTime: perhaps(seconds, given.rotationTime),
    pullUpLoadFactor: given.pullUpLoadFactor,
    rollingStartAllowance: perhaps((length) => si('length', length), given.rollingStartAllowance),
    approachAngle: perhaps((angle) => si('angle', angle), given.approachAngle),
    flareLoadFactor: given.flareLoadFactor,
    // by a fit alone, never by a definition's configuration
    flareFitted: undefined,
    floatDecelerationRatio: given.floatDecelerationRatio,
    freeRollTime: perhaps(seconds, given.freeRollTime),
    idleThrust: perhaps((force) => si('force', force), given.idleThrust),
  });
}

function toSpeeds(given: NonNullable<ConfigurationOnWire['speeds']>): NonNullable<Configuration['speeds']> {
  return present<NonNullable<Configuration['speeds']>>({
    rotation: perhaps(toScheduledSpeed, given.rotation),
    liftOff: perhaps(toScheduledSpeed, given.liftOff),
    screen: perhaps(toScheduledSpeed, given.screen),
    engineOutLiftOff: perhaps(toScheduledSpeed, given.engineOutLiftOff),
    engineOutScreen: perhaps(toScheduledSpeed, given.engineOutScreen),
    landingReference: perhaps(toScheduledSpeed, given.landingReference),
    touchdown: perhaps(toScheduledSpeed, given.touchdown),
  });
}

/** A speed of the procedure, in SI. */
export function toScheduledSpeed(given: ScheduledSpeedOnWire): ScheduledSpeed {
  return 'stallRatio' in given
    ? { kind: 'stall-ratio', ratio: given.stallRatio }
    : { kind: 'cas', cas: si('speed', given.cas), mass: si('mass', given.mass) };
}

/**
 * The maximum lift, in SI.
 *
 * @throws RangeError where an indicated stall speed has no calibration that reaches it: a check refuses it before
 */
export function toMaximumLift(given: MaximumLiftOnWire, calibration?: AirspeedCalibration): MaximumLift {
  if ('coefficient' in given) return { kind: 'coefficient', coefficient: given.coefficient };
  const speed = si('speed', given.stallSpeed);
  const cas = given.type === 'cas' ? speed : calibration && calibratedFromIndicated(calibration, speed);
  if (typeof cas !== 'number') throw new RangeError(`no calibration of an indicated stall speed of ${speed} m/s`);
  return { kind: 'stall-speed', cas, mass: si('mass', given.mass), definition: given.kind ?? 'one-g' };
}

function seconds(given: Q<'s'>): number {
  return si('time', given);
}
