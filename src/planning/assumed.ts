import type { Propulsion } from '../performance/aeroplane.ts';
import type { TakeoffRun } from '../performance/takeoff/takeoff-run.ts';
import type { Assumption } from './answer.ts';

type NumberMember = {
  [K in keyof TakeoffRun]: TakeoffRun[K] extends number ? K : never;
}[keyof TakeoffRun];

/** How to put the other end of an assumption's plausible range into a run. */
export type OtherEnd =
  | {
      /** 'run-increment': the value comes on top of the run's own */
      readonly kind: 'run' | 'run-increment';
      readonly member: NumberMember;
      readonly value: number;
      readonly text: string;
    }
  | {
      readonly kind: 'speed';
      readonly member: 'liftOffSpeed' | 'screenSpeed';
      readonly factor: number;
      readonly text: string;
    }
  | {
      readonly kind: 'propulsion';
      readonly propulsion: Propulsion;
      readonly thrustFactor: number;
      readonly text: string;
    };

/** Something taken without being told, and what else it could have been. */
export interface Assumed {
  readonly assumption: Assumption;
  /** what it is, for a sentence: 'pull-up load factor' */
  readonly name: string;
  /** absent where nothing numeric hangs on it */
  readonly otherEnd?: OtherEnd;
}
