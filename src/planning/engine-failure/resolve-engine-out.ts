import type { Aeroplane } from '../../performance/aeroplane.ts';
import { easFromCas } from '../../physics/airspeed.ts';
import { aeroplanePointer, configurationPointer } from '../aeroplane-pointer.ts';
import type { SpeedSet } from '../answer.ts';
import type { AnyAssumed } from '../assumed.ts';
import { isFault } from '../chosen.ts';
import { ConfiguredSpeeds } from '../configured-speeds.ts';
import type { Fault } from '../fault.ts';
import type { PreparedTakeoff } from '../prepare-takeoff.ts';
import type { TakeoffQuestion } from '../question.ts';
import {
  deadEngine,
  engineOutDrag,
  engineOutScreen,
  liftOffBelowScreen,
  propellerTaken,
} from '../rules/engine-failure-defaults.ts';

/** What is different with one engine out, nothing left out. */
export interface ResolvedEngineOut {
  readonly dragIncrementCoefficient: number;
  /** of the continued takeoff */
  readonly liftOff: SpeedSet;
  readonly screen: SpeedSet;
  /** [m] */
  readonly screenHeight: number;
  /** minimum control speed on the ground; undefined where nothing is known of it */
  readonly minimumControl: SpeedSet | undefined;
  readonly assumed: readonly AnyAssumed[];
  /** pointers to what the definition leaves out and a distance of a certification rests on */
  readonly missing: readonly string[];
}

/**
 * Drag, speeds, screen and control with one engine out, each as stated or assumed and said.
 *
 * Lift-off of the continued takeoff is that of the definition, else 3 kt below its speed at the screen and not below the all-engines
 * lift-off. A minimum control speed on the ground that is not stated is taken to be that in the air.
 *
 * @returns the figures, or a fault where a speed is not below that of sound
 */
export function resolveEngineOut(
  question: TakeoffQuestion,
  { conditions, speeds }: Pick<PreparedTakeoff, 'conditions' | 'speeds'>,
): ResolvedEngineOut | Fault {
  const { aeroplane, aeroplaneAt } = question;
  const { air, configuration, asked } = conditions;
  const at = (member: string) => aeroplanePointer(aeroplaneAt, `/engineOut/${member}`);
  const assumed: AnyAssumed[] = [];
  const configured = new ConfiguredSpeeds(question, configuration, air);
  const fromCas = (cas: number, pointer: string) => configured.inKinds(easFromCas(cas, air.pressure), pointer);

  const scheduledScreen = configuration.speeds?.engineOutScreen;
  const ownScreen = scheduledScreen && configured.scheduled(scheduledScreen, 'engineOutScreen');
  if (ownScreen !== undefined && isFault(ownScreen)) return ownScreen;
  const screen = ownScreen ?? speeds.screen;
  const scheduledLiftOff = configuration.speeds?.engineOutLiftOff;
  const ownLiftOff = scheduledLiftOff && configured.scheduled(scheduledLiftOff, 'engineOutLiftOff');
  if (ownLiftOff !== undefined && isFault(ownLiftOff)) return ownLiftOff;
  const below = fromCas(screen.cas - liftOffBelowScreen, configured.at('speeds/screen'));
  if (isFault(below)) return below;
  const least = below.eas > speeds.liftOff.eas ? below : speeds.liftOff;
  const liftOff = ownLiftOff === undefined || ownLiftOff.eas < speeds.rotation.eas ? least : ownLiftOff;
  if (ownLiftOff === undefined) {
    assumed.push({
      name: 'the lift-off speed with one engine out',
      assumption: {
        at: configurationPointer(question, 'speeds/engineOutLiftOff'),
        value: { kind: 'speed', value: liftOff.cas },
        because: 'not stated; 3 kt below the speed at the screen, and not below lift-off with all engines',
        source: 'Judgement',
      },
    });
  }

  const control = controlSpeed(aeroplane);
  const minimumControl = control && fromCas(control.cas, at(control.member));
  if (minimumControl !== undefined && isFault(minimumControl)) return minimumControl;
  if (control?.member === 'vmc') {
    assumed.push({
      name: 'the minimum control speed on the ground',
      assumption: {
        at: at('vmcg'),
        value: { kind: 'speed', value: control.cas },
        because: 'not stated; the minimum control speed in the air, which is usually near it',
        source: 'Judgement',
      },
    });
  }
  const drag = engineOutDragOf(aeroplane, aeroplaneAt);
  assumed.push(...drag.assumed);
  return {
    dragIncrementCoefficient: drag.coefficient,
    liftOff,
    screen: screen.eas < liftOff.eas ? liftOff : screen,
    screenHeight: engineOutScreen(aeroplane, asked.surface),
    minimumControl,
    assumed,
    missing: control === undefined ? [at('vmcg')] : [],
  };
}

function controlSpeed({ engineOut }: Aeroplane): { readonly member: 'vmcg' | 'vmc'; readonly cas: number } | undefined {
  if (engineOut?.vmcg !== undefined) return { member: 'vmcg', cas: engineOut.vmcg };
  return engineOut?.vmc === undefined ? undefined : { member: 'vmc', cas: engineOut.vmc };
}

/** Drag coefficient of the dead engine and the rudder, as stated or assumed and said. */
export function engineOutDragOf(
  aeroplane: Aeroplane,
  aeroplaneAt: string,
): { readonly coefficient: number; readonly assumed: readonly AnyAssumed[] } {
  const { engineOut } = aeroplane;
  const at = (member: string) => aeroplanePointer(aeroplaneAt, `/engineOut/${member}`);
  const stated = engineOut?.dragIncrementCoefficient;
  if (stated !== undefined) return { coefficient: stated, assumed: [] };
  const dead = deadEngine(aeroplane);
  const { value, because, source } = engineOutDrag[dead];
  const assumed: AnyAssumed[] = [
    {
      name: 'the drag of the dead engine and the rudder',
      assumption: { at: at('dragIncrementCoefficient'), value, because, source },
    },
  ];
  if (dead !== 'jet' && engineOut?.propeller === undefined) {
    assumed.push({ name: "the dead engine's propeller", assumption: { at: at('propeller'), ...propellerTaken } });
  }
  return { coefficient: value, assumed };
}
