import { brent } from '../../numerics/brent.ts';
import { goAfter } from './accelerate-go.ts';
import { stopAfter } from './accelerate-stop.ts';
import type {
  AccelerateGo,
  AccelerateStop,
  BalancedField,
  DecisionBounds,
  EngineFailureRun,
} from './engine-failure-run.ts';
import { failureOf, failureRolls } from './failure-speed.ts';

/** On V1 [m/s]: micrometres of runway, a millimetre where the go hardly gains speed. */
const tolerance = 1e-8;
/** Stands for a distance that there is not [m]: longer than any that there is. */
const without = 1e12;

/**
 * The decision speed at which the rejected and the continued takeoff are as long as each other: the least of the greater of the two.
 *
 * With V1 the stop grows and the go shrinks, so they cross once at most: the bracketed root of stop - go. Where the go is the longer
 * up to the highest V1 that one is taken, where the stop is from the lowest on that one.
 *
 * @param run - of the takeoff
 * @param bounds - between which V1 is looked for
 * @returns V1, stop and go, the greater of which is the length; the named outcome of the go at the highest V1 or of the stop at the
 * lowest where there is none, and 'no-decision-speed' where the lowest lies above the highest
 * @see references.Torenbeek1982; references.Cfr25s109a; references.Cfr25s113
 */
export function balancedField(run: EngineFailureRun, bounds: DecisionBounds): BalancedField {
  const { headwind } = run.allEngines;
  const lowest = bounds.lowest.speed;
  const highest = bounds.highest.speed;
  if (headwind >= run.liftOffSpeed) return { outcome: 'ground-speed-not-positive', headwind, speed: run.liftOffSpeed };
  if (!(highest >= lowest && highest > headwind)) return { outcome: 'no-decision-speed', bounds };
  const rolls = failureRolls(run);
  const bothAt = (speed: number): Both => {
    const failure = failureOf(rolls, speed);
    return { speed, stop: stopAfter(rolls, failure, speed), go: goAfter(rolls, failure, speed) };
  };

  let latest = bothAt(highest);
  if (latest.go.outcome !== 'reaches-screen') return latest.go;
  const atHighest = stopLessGo(latest);
  if (atHighest <= 0) return fieldOf('go-longer-throughout', latest);
  latest = bothAt(lowest);
  if (latest.stop.outcome !== 'stops') return latest.stop;
  const atLowest = stopLessGo(latest);
  if (atLowest >= 0) return fieldOf('stop-longer-throughout', latest);
  const between = (speed: number) => {
    if (speed === lowest) return atLowest;
    if (speed === highest) return atHighest;
    latest = bothAt(speed);
    return stopLessGo(latest);
  };
  const found = brent(between, lowest, highest, tolerance);
  if (found.outcome !== 'root') throw new Error(`stop - go does not settle between ${lowest} and ${highest} m/s`);
  return fieldOf('balanced', latest.speed === found.root ? latest : bothAt(found.root));
}

interface Both {
  readonly speed: number;
  readonly stop: AccelerateStop;
  readonly go: AccelerateGo;
}

function fieldOf(
  outcome: 'balanced' | 'go-longer-throughout' | 'stop-longer-throughout',
  { speed, stop, go }: Both,
): BalancedField {
  if (go.outcome !== 'reaches-screen') return go;
  if (stop.outcome !== 'stops') return stop;
  return { outcome, speed, length: Math.max(stop.distance, go.distance), stop: stop.distance, go: go.distance };
}

function stopLessGo({ stop, go }: Both): number {
  return (
    (stop.outcome === 'stops' ? stop.distance : without) - (go.outcome === 'reaches-screen' ? go.distance : without)
  );
}
