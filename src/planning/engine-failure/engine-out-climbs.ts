import type { SpeedSet } from '../answer.ts';
import type { Climbed } from '../climb-checks.ts';
import type { PreparedTakeoff } from '../prepare-takeoff.ts';
import type { TakeoffQuestion } from '../question.ts';
import { continuousPower } from '../rules/engine-failure-defaults.ts';
import type { ClimbDemand, RuledAeroplane } from '../rules/rule-set.ts';
import type { EngineOutClimb } from './engine-failure-answer.ts';
import { engineOutClimb } from './engine-out-climb.ts';
import type { ResolvedEngineOut } from './resolve-engine-out.ts';

const ft = 0.3048;

/** Climbs with one engine out after takeoff. */
export interface EngineOutClimbs {
  /** those that could be computed, in the order of time */
  readonly shown: readonly EngineOutClimb[];
  /** the climb that a rule asks for, or why there is none */
  readonly of: (demand: ClimbDemand) => Climbed;
}

/**
 * The climbs on the engines that remain: at lift-off with gear and flap as they are, at 400 ft as the configuration then is, and at
 * 1 500 ft at continuous power.
 *
 * @param demands - of the rule set, for what each of them is compared with
 * @see references.Cfr25s121; references.EuAirOps340
 */
export function engineOutClimbs(
  question: TakeoffQuestion,
  { conditions, resolved, power, flown }: PreparedTakeoff,
  out: ResolvedEngineOut,
  demands: readonly ClimbDemand[] = [],
): EngineOutClimbs {
  const { aeroplane } = question;
  const { configuration, air } = conditions;
  const shared = {
    configuration,
    airDragIncrement: resolved.airDragIncrement,
    dragIncrementCoefficient: out.dragIncrementCoefficient,
    air,
    thrustFactor: power.thrustFactor,
  };
  const climb = (height: number, { eas }: SpeedSet, powerRatio: number) =>
    engineOutClimb(question, { ...shared, height, eas, powerRatio });
  const phases = [
    {
      phase: 'lift-off',
      height: 0,
      configuration: 'flap and gear as at lift-off, out of ground effect',
      speed: out.liftOff,
      climbed: climb(0, out.liftOff, flown.fullPowerRatio),
    },
    {
      phase: '400-ft',
      height: 400 * ft,
      configuration: 'flap and gear as they then are, takeoff power',
      speed: out.screen,
      climbed: climb(400 * ft, out.screen, flown.fullPowerRatio),
    },
    {
      phase: '1500-ft',
      height: 1500 * ft,
      configuration: 'flap and gear as they then are, continuous power',
      speed: out.screen,
      climbed: climb(1500 * ft, out.screen, continuousPower(aeroplane)),
    },
  ] as const;
  return {
    shown: phases.flatMap(({ climbed, ...phase }) =>
      'why' in climbed
        ? []
        : [
            {
              ...phase,
              gradient: climbed.gradient,
              rate: climbed.rate,
              required: requiredAt(demands, aeroplane, phase.height),
            },
          ],
    ),
    of: ({ atHeight = 0 }) =>
      phases.find(({ height }) => height === atHeight)?.climbed ?? { why: 'the climb at this height is not computed' },
  };
}

function requiredAt(demands: readonly ClimbDemand[], aeroplane: RuledAeroplane, height: number): number | undefined {
  return demands.find(
    ({ engines, atHeight = 0, appliesTo }) => engines === 'one-out' && atHeight === height && appliesTo(aeroplane),
  )?.gradient;
}
