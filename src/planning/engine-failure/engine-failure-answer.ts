import type { BalancedField, DecisionBound } from '../../performance/engine-failure/engine-failure-run.ts';
import type { BandedDistance, Method, SpeedSet } from '../answer.ts';
import type { Delay, StopRule } from '../rules/certification/stop-rule.ts';

/** Why the decision speed is what it is. */
export type DecisionBecause =
  | 'asked-for'
  | 'balanced'
  | 'go-longer-throughout'
  | 'stop-longer-throughout'
  | 'takeoff-distance-available'
  | 'accelerate-stop-distance-available'
  | 'single-engine-cannot-continue';

/** Decision speeds at which the aeroplane both stops and goes on in the lengths that there are. */
export interface DecisionRange {
  readonly lowest: SpeedSet;
  readonly highest: SpeedSet;
  readonly lowestBecause: DecisionBound['because'];
  readonly highestBecause: DecisionBound['because'];
}

export interface DecisionSpeed extends SpeedSet {
  readonly because: DecisionBecause;
  /** absent where no speed both stops and goes on in time */
  readonly range?: DecisionRange | undefined;
}

/** The climb on the engines that remain at one place after lift-off. */
export interface EngineOutClimb {
  readonly phase: 'lift-off' | '400-ft' | '1500-ft';
  /** above the runway [m] */
  readonly height: number;
  readonly configuration: string;
  readonly speed: SpeedSet;
  readonly gradient: number;
  /** [m/s] */
  readonly rate: number;
  /** the least gradient that the rule set asks for there */
  readonly required?: number | undefined;
}

/** What comes of an engine failure, with the wind, surface and slope as given, without factors. */
export interface EngineOut {
  readonly outcome: BalancedField['outcome'] | 'no-data-for-this-surface';
  /** why there is no balanced field, where there is none */
  readonly why?: string | undefined;
  /** at the decision speed */
  readonly accelerateStopDistance?: BandedDistance | undefined;
  readonly accelerateGoDistance?: BandedDistance | undefined;
  /** the greater of the two at the decision speed that makes it least */
  readonly balancedFieldLength?: BandedDistance | undefined;
  /** [m] */
  readonly screenHeight: number;
  /** true airspeeds [m/s] */
  readonly failureSpeed?: number | undefined;
  /** heat of the brakes in the longer stop [J] */
  readonly brakeEnergy?: number | undefined;
  readonly liftOff: SpeedSet;
  readonly screen: SpeedSet;
  readonly climb: readonly EngineOutClimb[];
  readonly stopRule: StopRule['id'];
  readonly timeline: readonly Delay[];
  readonly method: Method;
}
