import type { EngineFailureRun } from '../../performance/engine-failure/engine-failure-run.ts';
import { oneOutRun } from '../../performance/engine-failure/one-out-run.ts';
import { stopEstimate } from '../../performance/landing/landing-estimate.ts';
import { takeoffEstimate } from '../../performance/takeoff/takeoff-estimate.ts';
import type { TakeoffRun } from '../../performance/takeoff/takeoff-run.ts';
import type { Thrust } from '../../physics/thrust/thrust.ts';
import type { Method } from '../answer.ts';
import { widest } from '../band.ts';
import { heldThrust } from '../held-thrust.ts';
import type { Surface } from '../question.ts';
import {
  brakingUncertainty,
  frictionUncertainty,
  inputUncertainties,
  modelForm,
} from '../rules/input-uncertainties.ts';

/** Standard deviations of ln s. */
export interface EngineFailureBand {
  readonly stop: number;
  readonly go: number;
  /** of the balanced field: where one of the two grows, the decision speed moves and each takes half of it */
  readonly balanced: number;
}

/** A run at a decision speed, and what is moved of it. */
interface Moved {
  readonly run: EngineFailureRun;
  /** V1, true [m/s] */
  readonly speed: number;
}

/** Density and thrust of all and of the remaining engines in air that is a little off. */
export interface OtherEngineAir {
  readonly density: number;
  readonly all: Thrust;
  readonly remaining: Thrust;
}

const step = 0.1;

/**
 * The 90 % band of the stop, the continued takeoff and the balanced field, from their mean-acceleration estimates.
 *
 * @param run - as stated
 * @param speed - V1, true [m/s]
 * @param surface - for the uncertainty of its friction
 * @param airAt - air and thrust at a temperature off by the first argument [K] and a pressure off by the second [Pa]
 * @see references.Judgement for the uncertainties
 */
export function engineFailureBand(
  run: EngineFailureRun,
  speed: number,
  surface: Surface,
  method: Method,
  airAt: (temperatureOff: number, pressureOff: number) => OtherEngineAir | undefined,
): EngineFailureBand {
  const u = inputUncertainties;
  const form = modelForm[method];
  const base = estimate({ run, speed });
  const squares = { stop: form ** 2, go: form ** 2, balanced: form ** 2 };
  const add = (stop: number, go: number) => {
    squares.stop += stop ** 2;
    squares.go += go ** 2;
    squares.balanced += ((stop + go) / 2) ** 2;
  };
  const move = (change: (by: number) => Moved | undefined) => {
    let stop = Number.NaN;
    let go = Number.NaN;
    for (const by of [-step, step]) {
      const moved = change(by);
      if (moved === undefined) continue;
      const other = estimate(moved);
      if (!Number.isFinite(stop)) stop = Math.log(other.stop / base.stop) / by;
      if (!Number.isFinite(go)) go = Math.log(other.go / base.go) / by;
    }
    add(Number.isFinite(stop) ? stop : form, Number.isFinite(go) ? go : form);
  };
  const inAir = (other: OtherEngineAir | undefined): Moved | undefined => {
    if (other === undefined) return undefined;
    const faster = Math.sqrt(run.allEngines.density / other.density);
    const moved = withThrust(run, other.all, other.remaining);
    return atSpeeds(
      onBoth(moved, (one) => ({ ...one, density: other.density })),
      speed,
      faster,
    );
  };

  move((by) => inAir(airAt(by * u.temperature, 0)));
  move((by) => inAir(airAt(0, -by * u.pressure)));
  move((by) => ({ run: onBoth(run, (one) => ({ ...one, headwind: one.headwind - by * u.wind })), speed }));
  move((by) => {
    const heavier = 1 + by * u.mass;
    return atSpeeds(
      onBoth(run, (one) => ({ ...one, mass: one.mass * heavier })),
      speed,
      Math.sqrt(heavier),
    );
  });
  move((by) => {
    const weaker = (thrust: Thrust): Thrust => ({
      ...thrust,
      at: (airspeed) => (1 - by * u.thrust) * thrust.at(airspeed),
    });
    return {
      run: withThrust(run, weaker(heldThrust(run.allEngines.thrust)), weaker(heldThrust(run.remainingThrust))),
      speed,
    };
  });
  move((by) => atSpeeds(run, speed, 1 + by * u.speed));
  move((by) => {
    const rollingFriction = run.allEngines.rollingFriction + by * frictionUncertainty(surface);
    return { run: { ...run, allEngines: { ...run.allEngines, rollingFriction } }, speed };
  });
  move((by) => {
    const less = 1 - by * brakingUncertainty(surface);
    const { braking } = run.stop;
    return { run: { ...run, stop: { ...run.stop, braking: { ...braking, at: (v) => less * braking.at(v) } } }, speed };
  });
  add(0, (u.technique * base.air) / base.go);
  add(u.startPoint / base.stop, u.startPoint / base.go);
  return {
    stop: Math.min(widest, Math.sqrt(squares.stop)),
    go: Math.min(widest, Math.sqrt(squares.go)),
    balanced: Math.min(widest, Math.sqrt(squares.balanced)),
  };
}

/** Stop and continued takeoff by mean accelerations [m]; not answers by themselves. */
function estimate({ run, speed }: Moved): { readonly stop: number; readonly go: number; readonly air: number } {
  const { allEngines, timeline } = run;
  const oneOut = oneOutRun(run);
  const rollTo = (one: TakeoffRun, airspeed: number) =>
    takeoffEstimate({ ...one, rotationSpeed: airspeed, liftOffSpeed: airspeed, rotationTime: 0 }).groundRoll;
  const accelerated = rollTo(allEngines, speed);
  const delays = timeline.timeAtDecisionSpeed + timeline.continuedAccelerationTime + timeline.transitionTime;
  const { airDistance } = takeoffEstimate(oneOut);
  return {
    stop: accelerated + stopEstimate(run.stop, speed, delays),
    go: accelerated + rollTo(oneOut, run.liftOffSpeed) - rollTo(oneOut, speed) + airDistance,
    air: airDistance,
  };
}

function onBoth(
  run: EngineFailureRun,
  change: <Run extends { readonly mass: number; readonly density: number; readonly headwind: number }>(one: Run) => Run,
): EngineFailureRun {
  return { ...run, allEngines: change(run.allEngines), stop: change(run.stop) };
}

function withThrust(run: EngineFailureRun, all: Thrust, remainingThrust: Thrust): EngineFailureRun {
  return { ...run, allEngines: { ...run.allEngines, thrust: all }, remainingThrust };
}

function atSpeeds(run: EngineFailureRun, speed: number, by: number): Moved {
  const { allEngines } = run;
  return {
    speed: speed * by,
    run: {
      ...run,
      rotationSpeed: run.rotationSpeed * by,
      liftOffSpeed: run.liftOffSpeed * by,
      screenSpeed: run.screenSpeed * by,
      allEngines: {
        ...allEngines,
        rotationSpeed: allEngines.rotationSpeed * by,
        liftOffSpeed: allEngines.liftOffSpeed * by,
        screenSpeed: allEngines.screenSpeed * by,
      },
    },
  };
}
