import type { Aeroplane, Configuration } from '../performance/aeroplane.ts';
import type { Air } from '../performance/air.ts';
import { minimumToOneG } from '../performance/speeds/maximum-lift-coefficient.ts';
import { easFromCas } from '../physics/airspeed.ts';
import { aeroplanePointer } from './aeroplane-pointer.ts';
import type { SpeedSet, TakeoffAnswer } from './answer.ts';
import { isFault } from './chosen.ts';
import { ConfiguredSpeeds, ratioText } from './configured-speeds.ts';
import type { Fault } from './fault.ts';
import type { Question } from './question.ts';
import type { ResolvedTakeoff } from './resolve-takeoff.ts';
import { type LeastSpeed, takeoffSpeedRule } from './rules/certification/takeoff-speed-rule.ts';

/** A speed of the schedule below the least that the certification basis allows. */
export interface RaisedSpeed {
  readonly of: 'rotation' | 'screen';
  readonly from: SpeedSet;
  readonly to: SpeedSet;
  readonly by: 'stall' | 'control';
}

/** The speeds of a takeoff, and which of them were raised. */
export interface TakeoffSpeeds {
  readonly speeds: Pick<TakeoffAnswer['speeds'], 'stall' | 'rotation' | 'liftOff' | 'screen'>;
  /** as the configuration has them; the same object where none is raised */
  readonly scheduled: Pick<TakeoffAnswer['speeds'], 'stall' | 'rotation' | 'liftOff' | 'screen'>;
  readonly raised: readonly RaisedSpeed[];
}

/**
 * Stall, rotation, lift-off and screen speed at this mass in this air, each in its kinds [m/s].
 *
 * With more than one engine a rotation speed or a speed at the screen below the least of the certification basis is raised to it;
 * lift-off stays as far above rotation as the schedule has it. The speeds that a flight manual prints stand as they are.
 *
 * @param question - mass [kg], and where the speeds stand in the request
 * @param configuration - its greatest lift
 * @param resolved - the speed schedule, complete
 * @returns the speeds, or a fault where lift-off comes below the stall speed, before rotation, or at no subsonic speed
 * @see references.Cfr23s51; references.Cfr25s107
 */
export function takeoffSpeeds(
  question: Pick<Question, 'aeroplane' | 'aeroplaneAt' | 'configuration' | 'mass'>,
  configuration: Configuration,
  resolved: Pick<ResolvedTakeoff, 'rotation' | 'liftOff' | 'screen'>,
  air: Air,
): TakeoffSpeeds | Fault {
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
  const isPrinted = configuration !== question.aeroplane.configurations[question.configuration];
  const scheduled = { stall, rotation, liftOff, screen };
  return isPrinted
    ? { speeds: scheduled, scheduled, raised: [] }
    : raisedSpeeds(question, configuration, configured, scheduled, air);
}

function raisedSpeeds(
  { aeroplane, aeroplaneAt }: Pick<Question, 'aeroplane' | 'aeroplaneAt'>,
  { maximumLift }: Configuration,
  configured: ConfiguredSpeeds,
  scheduled: TakeoffSpeeds['scheduled'],
  { pressure }: Air,
): TakeoffSpeeds | Fault {
  const rule = takeoffSpeedRule(aeroplane);
  if (rule === undefined) return { speeds: scheduled, scheduled, raised: [] };
  const isMinimum = rule.ofMinimumSpeed && maximumLift.kind === 'stall-speed' && maximumLift.definition === 'minimum';
  const stallEas = configured.stallEas * (isMinimum ? minimumToOneG : 1);
  const rotation = leastSpeed(rule.rotation, stallEas, aeroplane, pressure);
  const screen = leastSpeed(rule.screen, stallEas, aeroplane, pressure);
  const controlAt = aeroplanePointer(aeroplaneAt, '/engineOut/vmc');
  const raised: RaisedSpeed[] = [];
  const atLeast = (of: RaisedSpeed['of'], from: SpeedSet, { eas, by }: Least): SpeedSet | Fault => {
    if (eas !== 'not-subsonic' && from.eas >= eas * (1 - 1e-9)) return from;
    const to = configured.inKinds(eas, by === 'control' ? controlAt : configured.at(`speeds/${of}`));
    if (!isFault(to)) raised.push({ of, from, to, by });
    return to;
  };
  const rotates = atLeast('rotation', scheduled.rotation, rotation);
  if (isFault(rotates)) return rotates;
  const liftsOff =
    rotates === scheduled.rotation
      ? scheduled.liftOff
      : configured.inKinds(
          rotates.eas + (scheduled.liftOff.eas - scheduled.rotation.eas),
          configured.at('speeds/liftOff'),
        );
  if (isFault(liftsOff)) return liftsOff;
  const passes = atLeast('screen', scheduled.screen, screen);
  if (isFault(passes)) return passes;
  if (raised.length === 0) return { speeds: scheduled, scheduled, raised };
  // no slower at the screen than at lift-off
  const atScreen = passes.eas >= liftsOff.eas ? passes : liftsOff;
  return {
    speeds: { stall: scheduled.stall, rotation: rotates, liftOff: liftsOff, screen: atScreen },
    scheduled,
    raised,
  };
}

interface Least {
  readonly eas: number | 'not-subsonic';
  readonly by: RaisedSpeed['by'];
}

function leastSpeed(
  { stallRatio = 0, controlRatio }: LeastSpeed,
  stallEas: number,
  { engineOut }: Pick<Aeroplane, 'engineOut'>,
  pressure: number,
): Least {
  const byStall = stallRatio * stallEas;
  if (engineOut?.vmc === undefined) return { eas: byStall, by: 'stall' };
  const byControl = easFromCas(controlRatio * engineOut.vmc, pressure);
  return byControl === 'not-subsonic' || byControl > byStall
    ? { eas: byControl, by: 'control' }
    : { eas: byStall, by: 'stall' };
}
