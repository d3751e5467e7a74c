import type { BrakedRun } from '../../performance/landing/landing-run.ts';
import type { TakeoffRun } from '../../performance/takeoff/takeoff-run.ts';
import type { BrakingFriction } from '../../physics/braking-friction.ts';
import type { StoppingDrag } from '../../physics/stopping-drag.ts';
import { aeroplanePointer, configurationPointer } from '../aeroplane-pointer.ts';
import type { AnyAssumed } from '../assumed.ts';
import { heldThrust } from '../held-thrust.ts';
import type { PreparedTakeoff } from '../prepare-takeoff.ts';
import type { TakeoffQuestion } from '../question.ts';
import { type ResolvedBraking, resolveBraking } from '../resolve-braking.ts';
import { type StopRule, stopRuleOf } from '../rules/certification/stop-rule.ts';
import { liftLeftBySpoilers } from '../rules/engine-failure-defaults.ts';
import { idleThrustShare } from '../rules/landing-defaults.ts';

/** What a rejected takeoff is made of, nothing left out. */
export interface ResolvedStop {
  readonly rule: StopRule;
  /** of the whole aeroplane [N] */
  readonly idleThrust: number;
  readonly braking: ResolvedBraking;
  /** of the aeroplane's own spoilers; undefined where it has none */
  readonly spoilerDrag: number | undefined;
  readonly assumed: readonly AnyAssumed[];
  /** pointers to what the definition leaves out and a distance of a certification rests on */
  readonly missing: readonly string[];
}

/** Brakes, spoilers and idle thrust of a rejected takeoff, each as stated or assumed and said. */
export function resolveStop(
  question: TakeoffQuestion,
  { conditions, run }: Pick<PreparedTakeoff, 'conditions' | 'run'>,
): ResolvedStop {
  const { aeroplane, aeroplaneAt, runway } = question;
  const asked = { aeroplane, aeroplaneAt };
  const braking = resolveBraking(asked, runway, conditions.condition, 'takeoff');
  const assumed: AnyAssumed[] = [...braking.assumed];
  const { idleThrust } = conditions.configuration;
  const share = idleThrustShare;
  const standing = share.value * heldThrust(run.thrust).at(Math.max(0, run.headwind));
  if (idleThrust === undefined) {
    assumed.push({
      name: 'the idle thrust',
      assumption: {
        at: configurationPointer(question, 'idleThrust'),
        value: { kind: 'force', value: standing },
        because: share.because,
        source: share.source,
      },
    });
  }
  const isBraked = aeroplane.brakes?.brakingFrictionCoefficient !== undefined;
  return {
    rule: stopRuleOf(aeroplane),
    idleThrust: idleThrust ?? standing,
    braking,
    spoilerDrag: aeroplane.spoilers?.dragIncrementCoefficient,
    assumed,
    missing: isBraked ? [] : [aeroplanePointer(aeroplaneAt, '/brakes/brakingFrictionCoefficient')],
  };
}

/**
 * The aeroplane braking in the attitude of the takeoff roll: flap as set, spoilers out where it has them.
 *
 * @param run - ground, wind and air
 * @param idleThrust - of the engines that still run [N]
 */
export function brakedRun(
  run: TakeoffRun,
  { spoilerDrag }: Pick<ResolvedStop, 'spoilerDrag'>,
  ground: { readonly braking: BrakingFriction; readonly contaminantDrag?: StoppingDrag | undefined },
  idleThrust: number,
): BrakedRun {
  return {
    mass: run.mass,
    wingArea: run.wingArea,
    span: run.span,
    wingHeight: run.wingHeight,
    inducedDragFactor: run.inducedDragFactor,
    groundDragCoefficient: run.groundDragCoefficient + (spoilerDrag ?? 0),
    groundLiftCoefficient: run.groundLiftCoefficient * (spoilerDrag === undefined ? 1 : liftLeftBySpoilers),
    braking: ground.braking,
    contaminantDrag: ground.contaminantDrag,
    idleThrust,
    density: run.density,
    headwind: run.headwind,
    slope: run.slope,
    profile: run.profile,
  };
}
