import { brent } from '../../numerics/brent.ts';
import { accelerateGo } from './accelerate-go.ts';
import { accelerateStop } from './accelerate-stop.ts';
import type {
  AccelerateGo,
  AccelerateStop,
  DecisionBound,
  DecisionBounds,
  EngineFailureRun,
} from './engine-failure-run.ts';

/** Lengths that there are [m], less whatever is taken off them before brake release. */
export interface DecisionLengths {
  readonly accelerateStopDistanceAvailable: number;
  readonly takeoffDistanceAvailable: number;
}

/** The decision speeds that a runway allows, or the name of why there are none. */
export type V1Range =
  | { readonly outcome: 'decision-speeds'; readonly lowest: DecisionBound; readonly highest: DecisionBound }
  | {
      readonly outcome: 'no-decision-speed';
      /** from which the go fits, above the highest; absent where it fits from none within the bounds */
      readonly lowest?: DecisionBound;
      /** up to which the stop fits; absent where it fits from none within the bounds */
      readonly highest?: DecisionBound;
      /** the shortest of each within the bounds [m]: the go at the highest, the stop at the lowest; absent where the bounds cross */
      readonly shortest?: { readonly go: number; readonly stop: number };
    }
  | Exclude<AccelerateGo, { outcome: 'reaches-screen' }>
  | Exclude<AccelerateStop, { outcome: 'stops' }>;

/** On V1 [m/s]: a tenth of a millimetre of runway. */
const tolerance = 1e-6;
/** No runway is longer, and nothing that ends [m]. */
const longest = 1e9;
/** Stands for what a length is short of where there is no end to it [m]. */
const endless = 1e12;

/**
 * The decision speeds from which an aeroplane both stops and goes on in the lengths that there are.
 *
 * The lowest is the V1 from which the continued takeoff fits, the highest that up to which the rejected one does, each a bracketed
 * root within the bounds and named by what sets it.
 *
 * @param run - of the takeoff
 * @param bounds - of decisionBounds, or what was asked for
 * @param lengths - [m] from brake release
 * @see references.Cfr25s109a; references.Cfr25s113; references.Torenbeek1982
 */
export function v1Range(run: EngineFailureRun, bounds: DecisionBounds, lengths: DecisionLengths): V1Range {
  const { headwind } = run.allEngines;
  if (headwind >= run.liftOffSpeed) return { outcome: 'ground-speed-not-positive', headwind, speed: run.liftOffSpeed };
  const { lowest, highest } = bounds;
  if (!(highest.speed >= lowest.speed && highest.speed > headwind)) {
    return { outcome: 'no-decision-speed', ...bounds };
  }
  const go = accelerateGo(run, highest.speed);
  if (go.outcome !== 'reaches-screen') return go;
  const stop = accelerateStop(run, lowest.speed);
  if (stop.outcome !== 'stops') return stop;
  const toGo = Math.min(longest, lengths.takeoffDistanceAvailable);
  const toStop = Math.min(longest, lengths.accelerateStopDistanceAvailable);
  const spareToGo = (speed: number) => {
    const found = accelerateGo(run, speed);
    return found.outcome === 'reaches-screen' ? toGo - found.distance : -endless;
  };
  const spareToStop = (speed: number) => {
    const found = accelerateStop(run, speed);
    return found.outcome === 'stops' ? toStop - found.distance : -endless;
  };
  const from = within(spareToGo, lowest, { speed: highest.speed, because: 'takeoff-distance-available' });
  const upTo = within(spareToStop, highest, { speed: lowest.speed, because: 'accelerate-stop-distance-available' });
  if (from !== undefined && upTo !== undefined && from.speed <= upTo.speed) {
    return { outcome: 'decision-speeds', lowest: from, highest: upTo };
  }
  return {
    outcome: 'no-decision-speed',
    ...(from && { lowest: from }),
    ...(upTo && { highest: upTo }),
    shortest: { go: go.distance, stop: stop.distance },
  };
}

/** The speed nearest to a bound from which something is spared, on the way to another; undefined where nothing is there either. */
function within(
  spare: (speed: number) => number,
  bound: DecisionBound,
  { speed: other, because }: DecisionBound,
): DecisionBound | undefined {
  if (spare(bound.speed) >= 0) return bound;
  if (spare(other) < 0) return undefined;
  const found = brent(spare, bound.speed, other, tolerance);
  return found.outcome === 'root' ? { speed: found.root, because } : undefined;
}
