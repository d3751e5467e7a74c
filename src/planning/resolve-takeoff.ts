import type { Configuration } from '../performance/aeroplane.ts';
import type { TakeoffFigures } from '../performance/takeoff/takeoff-figures.ts';
import type { TakeoffRun } from '../performance/takeoff/takeoff-run.ts';
import type { Assumed } from './assumed.ts';
import { ConfigurationFigures } from './configuration-figures.ts';
import { groundFigures } from './ground-figures.ts';
import type { Question } from './question.ts';
import { takeoffDefaults } from './rules/takeoff-defaults.ts';

/** A takeoff configuration with nothing left out, in SI. */
export interface ResolvedTakeoff extends TakeoffFigures {
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
  question: Pick<Question, 'aeroplaneAt' | 'configuration'>,
  configuration: Configuration,
): ResolvedTakeoff {
  const figures = new ConfigurationFigures<TakeoffRun>(question);
  const d = takeoffDefaults;
  const { speeds, flap } = configuration;
  const liftOff = figures.speed({
    member: 'liftOff',
    name: 'the lift-off speed over the stall speed',
    stated: speeds?.liftOff,
    standing: d.liftOffStallRatio,
    runMember: 'liftOffSpeed',
  });
  const screen = figures.speed({
    member: 'screen',
    name: 'the speed at the screen over the stall speed',
    stated: speeds?.screen,
    standing: d.screenStallRatio,
    runMember: 'screenSpeed',
  });
  if (speeds?.rotation === undefined) {
    figures.say('the rotation speed', {
      at: figures.at('speeds/rotation'),
      value: 'the lift-off speed',
      because: 'no rotation speed is stated',
      source: 'Judgement',
    });
  }
  return {
    rotation: speeds?.rotation ?? liftOff,
    liftOff,
    screen,
    rotationTime: figures.figure({
      member: 'rotationTime',
      name: 'the rotation time',
      stated: configuration.rotationTime,
      standing: d.rotationTime,
      runMember: 'rotationTime',
    }),
    pullUpLoadFactor: figures.figure({
      member: 'pullUpLoadFactor',
      name: 'the load factor of the pull-up',
      stated: configuration.pullUpLoadFactor,
      standing: d.pullUpLoadFactor,
      runMember: 'pullUpLoadFactor',
    }),
    ...groundFigures(figures, configuration, flap > 0 ? d.groundLiftFlap : d.groundLiftClean, d.groundDragIncrement),
    airDragIncrement: figures.figure({
      member: 'airDragIncrementCoefficient',
      name: 'the drag increment in the air',
      stated: configuration.airDragIncrementCoefficient,
      standing: d.airDragIncrement,
      runMember: 'airDragCoefficient',
      increment: true,
    }),
    assumed: figures.assumed,
  };
}
