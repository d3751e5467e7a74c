import type { TakeoffAnswer } from '../answer.ts';
import type { EngineFailure } from '../engine-failure/engine-failure.ts';
import type { EngineOutClimb } from '../engine-failure/engine-failure-answer.ts';
import type { Reached } from '../takeoff-runs.ts';
import type { RaisedSpeed } from '../takeoff-speeds.ts';
import type { AnswerContext } from './answer-context.ts';

/** What the cautions of a takeoff may look at. */
export interface TakeoffContext extends AnswerContext {
  readonly speeds: TakeoffAnswer['speeds'];
  /** speeds of the schedule that the certification basis has raised */
  readonly raised: readonly RaisedSpeed[];
  /** what came of the run as stated, where physics speaks of the surface and the screen is reached */
  readonly stated: Reached | undefined;
  /** with more than one engine, what a failure comes to */
  readonly engineFailure: (EngineFailure & { readonly climb: readonly EngineOutClimb[] }) | undefined;
  /** of a loose contaminant over the square of the ground speed [kg/m] */
  readonly contaminantDrag: number | undefined;
  /** 1 at full power */
  readonly fullPowerRatio: number;
  /** the takeoff distance at full power [m] */
  readonly wholeAtFullPower: () => number | undefined;
  /** [m]; 0 from standing */
  readonly rollingStartAllowance: number;
}
