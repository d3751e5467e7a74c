import type { Configuration, ScheduledSpeed } from '../performance/aeroplane.ts';
import { aeroplanePointer } from './aeroplane-pointer.ts';
import type { Assumed, OtherEnd } from './assumed.ts';
import type { Question } from './question.ts';
import { type TakeoffDefault, takeoffDefaults } from './rules/takeoff-defaults.ts';
import { numberText } from './sentences/measure-text.ts';

/** A takeoff configuration with nothing left out, in SI. */
export interface ResolvedTakeoff {
  readonly rotation: ScheduledSpeed;
  readonly liftOff: ScheduledSpeed;
  readonly screen: ScheduledSpeed;
  readonly rotationTime: number;
  readonly pullUpLoadFactor: number;
  readonly groundLiftCoefficient: number;
  readonly groundDragIncrement: number;
  readonly airDragIncrement: number;
  readonly assumed: readonly Assumed[];
}

/**
 * Fills in what a configuration leaves out, each as an assumption with where it would be stated and what else it could be.
 *
 * @param question - for the pointers
 * @param configuration - of the aeroplane, for takeoff
 * @see references.Raymer for speeds and rotation; references.Judgement for the rest
 */
export function resolveTakeoff(
  { aeroplaneAt, configuration: id }: Pick<Question, 'aeroplaneAt' | 'configuration'>,
  configuration: Configuration,
): ResolvedTakeoff {
  const assumed: Assumed[] = [];
  const at = (member: string) => aeroplanePointer(aeroplaneAt, `/configurations/${escaped(id)}/${member}`);

  /** The stated figure, or the default, said. */
  function figure(
    member: string,
    name: string,
    stated: number | undefined,
    standing: TakeoffDefault,
    runMember: Extract<OtherEnd, { value: number }>['member'],
    increment = false,
  ): number {
    if (stated !== undefined) return stated;
    const time = member === 'rotationTime';
    assumed.push({
      name,
      assumption: {
        at: at(member),
        value: time ? { kind: 'time', value: standing.value } : standing.value,
        because: standing.because,
        source: standing.source,
      },
      otherEnd: {
        kind: increment ? 'run-increment' : 'run',
        member: runMember,
        value: standing.otherEnd,
        text: time ? `${numberText(standing.otherEnd)} s` : numberText(standing.otherEnd),
      },
    });
    return standing.value;
  }

  /** The stated speed, or a ratio to the stall speed, said. */
  function speed(
    member: 'liftOff' | 'screen',
    name: string,
    stated: ScheduledSpeed | undefined,
    standing: TakeoffDefault,
  ): ScheduledSpeed {
    if (stated !== undefined) return stated;
    assumed.push({
      name,
      assumption: {
        at: at(`speeds/${member}`),
        value: standing.value,
        because: standing.because,
        source: standing.source,
      },
      otherEnd: {
        kind: 'speed',
        member: member === 'liftOff' ? 'liftOffSpeed' : 'screenSpeed',
        factor: standing.otherEnd / standing.value,
        text: numberText(standing.otherEnd),
      },
    });
    return { kind: 'stall-ratio', ratio: standing.value };
  }

  const d = takeoffDefaults;
  const { speeds, flap } = configuration;
  const liftOff = speed('liftOff', 'the lift-off speed over the stall speed', speeds?.liftOff, d.liftOffStallRatio);
  const screen = speed('screen', 'the speed at the screen over the stall speed', speeds?.screen, d.screenStallRatio);
  if (speeds?.rotation === undefined) {
    assumed.push({
      name: 'the rotation speed',
      assumption: {
        at: at('speeds/rotation'),
        value: 'the lift-off speed',
        because: 'no rotation speed is stated',
        source: 'Judgement',
      },
    });
  }
  const groundLift = flap > 0 ? d.groundLiftFlap : d.groundLiftClean;
  const { rotationTime, pullUpLoadFactor, groundLiftCoefficient } = configuration;
  return {
    rotation: speeds?.rotation ?? liftOff,
    liftOff,
    screen,
    rotationTime: figure('rotationTime', 'the rotation time', rotationTime, d.rotationTime, 'rotationTime'),
    pullUpLoadFactor: figure(
      'pullUpLoadFactor',
      'the load factor of the pull-up',
      pullUpLoadFactor,
      d.pullUpLoadFactor,
      'pullUpLoadFactor',
    ),
    groundLiftCoefficient: figure(
      'groundLiftCoefficient',
      'the lift coefficient of the roll',
      groundLiftCoefficient,
      groundLift,
      'groundLiftCoefficient',
    ),
    groundDragIncrement: figure(
      'groundDragIncrementCoefficient',
      'the drag increment on the ground',
      configuration.groundDragIncrementCoefficient,
      d.groundDragIncrement,
      'groundDragCoefficient',
      true,
    ),
    airDragIncrement: figure(
      'airDragIncrementCoefficient',
      'the drag increment in the air',
      configuration.airDragIncrementCoefficient,
      d.airDragIncrement,
      'airDragCoefficient',
      true,
    ),
    assumed,
  };
}

/** A member's name as one step of an RFC 6901 pointer. */
function escaped(name: string): string {
  return name.replaceAll('~', '~0').replaceAll('/', '~1');
}
