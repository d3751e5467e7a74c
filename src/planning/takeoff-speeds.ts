import type { Aeroplane, Configuration, ScheduledSpeed } from '../performance/aeroplane.ts';
import type { Air } from '../performance/air.ts';
import { configuredStallSpeed } from '../performance/speeds/configured-stall-speed.ts';
import { scheduledSpeed } from '../performance/speeds/scheduled-speed.ts';
import { speedSet } from '../performance/speeds/speed-set.ts';
import { aeroplanePointer } from './aeroplane-pointer.ts';
import type { SpeedSet, TakeoffAnswer } from './answer.ts';
import type { Fault } from './fault.ts';
import type { Question } from './question.ts';
import type { ResolvedTakeoff } from './resolve-takeoff.ts';

type Speeds = TakeoffAnswer['speeds'];

/**
 * Stall, rotation, lift-off and screen speed at this mass in this air, each in its kinds [m/s].
 *
 * @param question - mass [kg], and where the speeds stand in the request
 * @param configuration - its greatest lift
 * @param resolved - the speed schedule, complete
 * @returns the speeds, or a fault where lift-off comes below the stall speed, before rotation, or at no subsonic speed
 */
export function takeoffSpeeds(
  {
    aeroplane,
    aeroplaneAt,
    configuration: id,
    mass,
  }: Pick<Question, 'aeroplane' | 'aeroplaneAt' | 'configuration' | 'mass'>,
  configuration: Configuration,
  resolved: ResolvedTakeoff,
  air: Air,
): Speeds | Fault {
  const at = (member: string) => aeroplanePointer(aeroplaneAt, `/configurations/${id}/${member}`);
  const stallEas = configuredStallSpeed(configuration.maximumLift, aeroplane.wing.area, mass);
  const stall = speedSet(stallEas, stallEas, air, aeroplane.airspeedCalibration);
  if (stall === 'not-subsonic') return notSubsonic(at('maximumLift'));
  const rotation = scheduled(resolved.rotation, mass, stallEas, air, aeroplane);
  if (rotation === 'not-subsonic') return notSubsonic(at('speeds/rotation'));
  const liftOff = scheduled(resolved.liftOff, mass, stallEas, air, aeroplane);
  if (liftOff === 'not-subsonic') return notSubsonic(at('speeds/liftOff'));
  const screen = scheduled(resolved.screen, mass, stallEas, air, aeroplane);
  if (screen === 'not-subsonic') return notSubsonic(at('speeds/screen'));
  if (liftOff.stallRatio < 1) {
    return {
      pointer: at('speeds/liftOff'),
      code: 'contradiction',
      message: `The lift-off speed is ${ratioText(liftOff.stallRatio)} of the stall speed: there is not enough lift to leave the ground.`,
      allowed: 'a lift-off speed at or above the stall speed',
    };
  }
  if (rotation.tas > liftOff.tas * (1 + 1e-9)) {
    return {
      pointer: at('speeds/rotation'),
      code: 'contradiction',
      message: `The rotation speed is ${ratioText(rotation.tas / liftOff.tas)} of the lift-off speed: rotation comes first.`,
      allowed: 'a rotation speed at or below the lift-off speed',
    };
  }
  return { stall, rotation, liftOff, screen };
}

function scheduled(
  schedule: ScheduledSpeed,
  mass: number,
  stallEas: number,
  air: Air,
  aeroplane: Aeroplane,
): SpeedSet | 'not-subsonic' {
  const eas = scheduledSpeed(schedule, mass, stallEas, air.pressure);
  return eas === 'not-subsonic' ? eas : speedSet(eas, stallEas, air, aeroplane.airspeedCalibration);
}

function notSubsonic(pointer: string): Fault {
  return { pointer, code: 'implausible', message: 'The speed that follows from this is not below that of sound.' };
}

function ratioText(ratio: number): string {
  return String(Math.round(ratio * 1000) / 1000);
}
