import type { Propulsion } from '../performance/aeroplane.ts';
import type { TakeoffRun } from '../performance/takeoff/takeoff-run.ts';
import type { Assumption } from './answer.ts';

/** The members of a run that are bare numbers. */
export type NumberMember<Run> = {
  [K in keyof Run]-?: NonNullable<Run[K]> extends number ? K : never;
}[keyof Run];

/** How to put the other end of the plausible range of a bare number into a run. */
export type NumberOtherEnd<Run> =
  | {
      /** 'run-increment': the value comes on top of the run's own */
      readonly kind: 'run' | 'run-increment';
      readonly member: NumberMember<Run>;
      readonly value: number;
      readonly text: string;
    }
  | {
      readonly kind: 'speed';
      readonly member: NumberMember<Run>;
      readonly factor: number;
      readonly text: string;
    };

/** How to put the other end of an assumption of a takeoff into its run. */
export type OtherEnd =
  | NumberOtherEnd<TakeoffRun>
  | {
      readonly kind: 'propulsion';
      readonly propulsion: Propulsion;
      readonly thrustFactor: number;
      readonly text: string;
    };

/** Something taken without being told, and what else it could have been. */
export interface Assumed<Other extends { readonly text: string } = OtherEnd> {
  readonly assumption: Assumption;
  /** what it is, for a sentence: 'pull-up load factor' */
  readonly name: string;
  /** absent where nothing numeric hangs on it */
  readonly otherEnd?: Other;
}

/** An assumption as it is said, whatever it is about. */
export type AnyAssumed = Assumed<{ readonly text: string }>;
