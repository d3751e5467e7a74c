import type { Configuration } from '../performance/aeroplane.ts';
import type { Air } from '../performance/air.ts';
import type { TakeoffAnswer } from './answer.ts';
import { isFault } from './chosen.ts';
import { ConfiguredSpeeds, ratioText } from './configured-speeds.ts';
import type { Fault } from './fault.ts';
import type { Question } from './question.ts';
import type { ResolvedTakeoff } from './resolve-takeoff.ts';

/**
 * Stall, rotation, lift-off and screen speed at this mass in this air, each in its kinds [m/s].
 *
 * @param question - mass [kg], and where the speeds stand in the request
 * @param configuration - its greatest lift
 * @param resolved - the speed schedule, complete
 * @returns the speeds, or a fault where lift-off comes below the stall speed, before rotation, or at no subsonic speed
 */
export function takeoffSpeeds(
  question: Pick<Question, 'aeroplane' | 'aeroplaneAt' | 'configuration' | 'mass'>,
  configuration: Configuration,
  resolved: ResolvedTakeoff,
  air: Air,
): TakeoffAnswer['speeds'] | Fault {
  const configured = new ConfiguredSpeeds(question, configuration, air);
  const stall = configured.stall();
  if (isFault(stall)) return stall;
  const rotation = configured.scheduled(resolved.rotation, 'rotation');
  if (isFault(rotation)) return rotation;
  const liftOff = configured.scheduled(resolved.liftOff, 'liftOff');
  if (isFault(liftOff)) return liftOff;
  const screen = configured.scheduled(resolved.screen, 'screen');
  if (isFault(screen)) return screen;
  if (liftOff.stallRatio < 1) {
    return {
      pointer: configured.at('speeds/liftOff'),
      code: 'contradiction',
      message: `The lift-off speed is ${ratioText(liftOff.stallRatio)} of the stall speed: there is not enough lift to leave the ground.`,
      allowed: 'a lift-off speed at or above the stall speed',
    };
  }
  if (rotation.tas > liftOff.tas * (1 + 1e-9)) {
    return {
      pointer: configured.at('speeds/rotation'),
      code: 'contradiction',
      message: `The rotation speed is ${ratioText(rotation.tas / liftOff.tas)} of the lift-off speed: rotation comes first.`,
      allowed: 'a rotation speed at or below the lift-off speed',
    };
  }
  return { stall, rotation, liftOff, screen };
}
