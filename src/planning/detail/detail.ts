import type { TrajectoryPoint } from '../../performance/trajectory.ts';
import type { Measure } from '../answer.ts';
import type { Rejected } from '../engine-failure/rejected-takeoff.ts';
import type { WorkingLine } from '../working/working-line.ts';

/** What an answer can hold beyond what it always holds. */
export const details = ['working', 'trajectory', 'sensitivities', 'rejected'] as const;
/** Those that an answer to a landing can hold. */
export const landingDetails = ['working', 'trajectory', 'sensitivities'] as const satisfies readonly DetailName[];
export type DetailName = (typeof details)[number];

/** By how much each distance changes when one input is so much more. */
export interface Sensitivity {
  /** stable name of the input */
  readonly of: string;
  /** pointer to it in the request */
  readonly at: string;
  readonly per: Measure | number;
  /** [m], longer positive; absent where neither a little less nor a little more of it has distances */
  readonly change?: Changes;
}

/** Of ground roll, air distance, and takeoff or landing distance [m]. */
export interface Changes {
  readonly groundRoll: number;
  readonly airDistance: number;
  readonly wholeDistance: number;
}

/** The parts that were asked for; one is absent where it was not, or where the answer has no distances. */
export interface Detail {
  readonly working?: readonly WorkingLine[];
  /** at even steps of distance */
  readonly trajectory?: readonly TrajectoryPoint[];
  readonly sensitivities?: readonly Sensitivity[];
  /** of a takeoff alone, with and without distances */
  readonly rejected?: Rejected;
}
