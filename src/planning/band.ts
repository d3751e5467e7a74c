import type { TakeoffEstimate } from '../performance/takeoff/takeoff-estimate.ts';
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
  const run = { ...stated, thrust: heldThrust(stated.thrust) };
  const base = takeoffEstimate(run);
  const u = inputUncertainties;
  const share = result.groundRoll / result.takeoffDistance;
  const contributions: BandContribution[] = [];

  function add(of: string, groundRoll: number, airDistance: number): void {
    const takeoffDistance = groundRoll * share + airDistance * (1 - share);
    contributions.push({ of, groundRoll, airDistance, takeoffDistance });
  }
  function moved(of: string, other: TakeoffRun | undefined, back?: TakeoffRun): void {
    const one = slopes(base, other);
    const change = one ?? slopes(base, back);
    add(of, change?.groundRoll ?? modelForm[method], change?.airDistance ?? modelForm[method]);
  }
  const inAir = (other: OtherAir | undefined): TakeoffRun | undefined => {
    if (other === undefined) return undefined;
    const speeds = Math.sqrt(run.density / other.density);
    return faster({ ...run, density: other.density, thrust: heldThrust(other.thrust) }, speeds);
  };
  const heavier = (by: number) => faster({ ...run, mass: run.mass * by }, Math.sqrt(by));
  const thrustBy = (by: number) => ({ ...run, thrust: scaled(run.thrust, by) });

  const form = modelForm[method];
  add('model form', form, form);
  moved('temperature', inAir(airAt(-step * u.temperature, 0)), inAir(airAt(step * u.temperature, 0)));
  moved('pressure', inAir(airAt(0, step * u.pressure)), inAir(airAt(0, -step * u.pressure)));
  moved('wind', { ...run, headwind: run.headwind - step * u.wind }, { ...run, headwind: run.headwind + step * u.wind });
  moved('mass', heavier(1 - step * u.mass), heavier(1 + step * u.mass));
  moved('thrust', thrustBy(1 + step * u.thrust), thrustBy(1 - step * u.thrust));
  moved('speeds', faster(run, 1 + step * u.speed), faster(run, 1 - step * u.speed));
  const friction = step * frictionUncertainty(surface);
  moved('rolling friction', { ...run, rollingFriction: run.rollingFriction + friction });
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

/** Change of ln s for one standard deviation, with its sign; undefined where either estimate does not exist. */
function slopes(
  base: TakeoffEstimate,
  run: TakeoffRun | undefined,
): { readonly groundRoll: number; readonly airDistance: number } | undefined {
  if (run === undefined) return undefined;
  const other = takeoffEstimate(run);
  const groundRoll = Math.log(other.groundRoll / base.groundRoll) / step;
  const airDistance = Math.log(other.airDistance / base.airDistance) / step;
  return Number.isFinite(groundRoll) && Number.isFinite(airDistance) ? { groundRoll, airDistance } : undefined;
}

function together(
  contributions: readonly BandContribution[],
  of: 'groundRoll' | 'airDistance' | 'takeoffDistance',
): number {
  let squares = 0;
  for (const contribution of contributions) squares += contribution[of] ** 2;
  return Math.min(widest, Math.sqrt(squares));
}

function faster(run: TakeoffRun, by: number): TakeoffRun {
  return {
    ...run,
    rotationSpeed: run.rotationSpeed * by,
    liftOffSpeed: run.liftOffSpeed * by,
    screenSpeed: run.screenSpeed * by,
  };
}

function scaled(thrust: Thrust, by: number): Thrust {
  return { ...thrust, at: (airspeed) => by * thrust.at(airspeed) };
}
