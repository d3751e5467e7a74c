import { takeoffEstimate } from '../performance/takeoff/takeoff-estimate.ts';
import type { TakeoffRun } from '../performance/takeoff/takeoff-run.ts';
import type { Thrust } from '../physics/thrust/thrust.ts';
import type { BandContribution, BandedDistance, Method } from './answer.ts';
import { heldThrust } from './held-thrust.ts';
import type { Surface } from './question.ts';
import { frictionUncertainty, inputUncertainties, modelForm } from './rules/input-uncertainties.ts';
import type { Reached } from './takeoff-runs.ts';

/** Standard deviations from the middle to either end of a 90 % band of a normal distribution. */
export const ninetyPerCent = 1.6448536269514722;

/** A linear band says nothing beyond this standard deviation of ln s; it is held there. @see references.Judgement */
export const widest = 1;

/** Standard deviations of ln s, and what they are made of. */
export interface Band {
  readonly groundRoll: number;
  readonly airDistance: number;
  readonly takeoffDistance: number;
  readonly contributions: readonly BandContribution[];
}

/** Density and thrust in air that is a little off. */
export interface OtherAir {
  readonly density: number;
  readonly thrust: Thrust;
}

type Changing = { -readonly [K in keyof TakeoffRun]: TakeoffRun[K] };

/** A tenth of a standard deviation: small enough for a slope, and an estimate near its end still exists. */
const step = 0.1;

/**
 * The 90 % band of a takeoff, linear in ln s.
 *
 * Each input is moved by a tenth of its standard deviation, the mean-acceleration estimate is taken again, and the change of
 * ln s is scaled to one standard deviation; the parts add as squares, with the model form of the method. In the takeoff
 * distance roll and air distance move together.
 *
 * @param stated - the run as stated
 * @param result - its distances, which weigh roll against air distance
 * @param surface - for the uncertainty of its friction
 * @param airAt - air and thrust at a temperature off by the first argument [K] and a pressure off by the second [Pa]
 * @see references.Judgement for the uncertainties
 */
export function takeoffBand(
  stated: TakeoffRun,
  result: Reached,
  surface: Surface,
  method: Method,
  airAt: (temperatureOff: number, pressureOff: number) => OtherAir | undefined,
): Band {
  const thrust = heldThrust(stated.thrust);
  const run: Changing = { ...stated, thrust };
  const base = takeoffEstimate(run);
  const u = inputUncertainties;
  const share = result.groundRoll / result.takeoffDistance;
  const contributions: BandContribution[] = [];

  function add(of: string, groundRoll: number, airDistance: number): void {
    const takeoffDistance = groundRoll * share + airDistance * (1 - share);
    contributions.push({ of, groundRoll, airDistance, takeoffDistance });
  }
  /** Better by a tenth of a standard deviation, or worse: where one estimate does not exist the other does. */
  function moved(of: string, change: (by: number) => void): void {
    let groundRoll = Number.NaN;
    let airDistance = Number.NaN;
    for (const by of [-step, step]) {
      if (Number.isFinite(groundRoll) && Number.isFinite(airDistance)) break;
      change(by);
      const other = takeoffEstimate(run);
      groundRoll = Math.log(other.groundRoll / base.groundRoll) / by;
      airDistance = Math.log(other.airDistance / base.airDistance) / by;
      restore(run, stated, thrust);
    }
    const form = modelForm[method];
    add(of, Number.isFinite(groundRoll) ? groundRoll : form, Number.isFinite(airDistance) ? airDistance : form);
  }
  const inAir = (other: OtherAir | undefined): void => {
    if (other === undefined) {
      run.density = Number.NaN;
      return;
    }
    run.density = other.density;
    run.thrust = heldThrust(other.thrust);
    faster(run, Math.sqrt(stated.density / other.density));
  };

  const form = modelForm[method];
  const friction = frictionUncertainty(surface);
  add('model form', form, form);
  moved('temperature', (by) => inAir(airAt(by * u.temperature, 0)));
  moved('pressure', (by) => inAir(airAt(0, -by * u.pressure)));
  moved('wind', (by) => {
    run.headwind -= by * u.wind;
  });
  moved('mass', (by) => {
    run.mass *= 1 + by * u.mass;
    faster(run, Math.sqrt(1 + by * u.mass));
  });
  moved('thrust', (by) => {
    run.thrust = { ...thrust, at: (airspeed) => (1 - by * u.thrust) * thrust.at(airspeed) };
  });
  moved('speeds', (by) => faster(run, 1 + by * u.speed));
  moved('rolling friction', (by) => {
    run.rollingFriction += by * friction;
  });
  add('technique', 0, u.technique);
  const metres = u.startPoint;
  contributions.push({
    of: 'start point',
    groundRoll: metres / result.groundRoll,
    airDistance: 0,
    takeoffDistance: metres / result.takeoffDistance,
  });
  return {
    groundRoll: together(contributions, 'groundRoll'),
    airDistance: together(contributions, 'airDistance'),
    takeoffDistance: together(contributions, 'takeoffDistance'),
    contributions,
  };
}

/** A distance with its 90 % band. */
export function banded(value: number, deviation: number, method: Method): BandedDistance {
  const over = highOver(deviation);
  return { value, low: value / over, high: value * over, method };
}

/** The high end of the band over its middle. */
export function highOver(deviation: number): number {
  return Math.exp(ninetyPerCent * deviation);
}

function together(
  contributions: readonly BandContribution[],
  of: 'groundRoll' | 'airDistance' | 'takeoffDistance',
): number {
  let squares = 0;
  for (const contribution of contributions) squares += contribution[of] ** 2;
  return Math.min(widest, Math.sqrt(squares));
}

function faster(run: Changing, by: number): void {
  run.rotationSpeed *= by;
  run.liftOffSpeed *= by;
  run.screenSpeed *= by;
}

/** Undoes what a change may have moved. */
function restore(run: Changing, stated: TakeoffRun, thrust: Thrust): void {
  run.thrust = thrust;
  run.density = stated.density;
  run.mass = stated.mass;
  run.headwind = stated.headwind;
  run.rollingFriction = stated.rollingFriction;
  run.rotationSpeed = stated.rotationSpeed;
  run.liftOffSpeed = stated.liftOffSpeed;
  run.screenSpeed = stated.screenSpeed;
}
