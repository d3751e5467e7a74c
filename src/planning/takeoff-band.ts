import { takeoffEstimate } from '../performance/takeoff/takeoff-estimate.ts';
import type { TakeoffRun } from '../performance/takeoff/takeoff-run.ts';
import type { Thrust } from '../physics/thrust/thrust.ts';
import type { Band } from './band.ts';
import { BandParts, type Parts } from './band-parts.ts';
import { heldThrust } from './held-thrust.ts';
import type { Surface } from './question.ts';
import { contaminantDragUncertainty, frictionUncertainty, inputUncertainties } from './rules/input-uncertainties.ts';

/** Density and thrust in air that is a little off. */
export interface OtherAir {
  readonly density: number;
  readonly thrust: Thrust;
}

type Changing = { -readonly [K in keyof TakeoffRun]: TakeoffRun[K] };

/**
 * The 90 % band of a takeoff, from its mean-acceleration estimate.
 *
 * @param stated - the run as stated
 * @param result - its distances
 * @param form - what the method itself may be off, as a share of each distance
 * @param windCoding - standard deviation of the wind along the runway from what a report rounds [m/s]; 0 without one
 * @param surface - for the uncertainty of its friction
 * @param airAt - air and thrust at a temperature off by the first argument [K] and a pressure off by the second [Pa]
 * @see references.Judgement for the uncertainties
 */
export function takeoffBand(
  stated: TakeoffRun,
  result: Parts,
  surface: Surface,
  form: number,
  windCoding: number,
  airAt: (temperatureOff: number, pressureOff: number) => OtherAir | undefined,
): Band {
  const thrust = heldThrust(stated.thrust);
  const run: Changing = { ...stated, thrust };
  const movable = { estimate: () => takeoffEstimate(run), restore: () => restore(run, stated, thrust) };
  const parts = new BandParts(movable, result, form);
  const u = inputUncertainties;
  const friction = frictionUncertainty(surface);
  const inAir = (other: OtherAir | undefined): void => {
    if (other === undefined) {
      run.density = Number.NaN;
      return;
    }
    run.density = other.density;
    run.thrust = heldThrust(other.thrust);
    faster(run, Math.sqrt(stated.density / other.density));
  };

  parts.move('temperature', (by) => inAir(airAt(by * u.temperature, 0)));
  parts.move('pressure', (by) => inAir(airAt(0, -by * u.pressure)));
  parts.move('wind', (by) => {
    run.headwind -= by * u.wind;
  });
  if (windCoding > 0) {
    parts.move('rounding of the reported wind', (by) => {
      run.headwind -= by * windCoding;
    });
  }
  parts.move('mass', (by) => {
    run.mass *= 1 + by * u.mass;
    faster(run, Math.sqrt(1 + by * u.mass));
  });
  parts.move('thrust', (by) => {
    run.thrust = { ...thrust, at: (airspeed) => (1 - by * u.thrust) * thrust.at(airspeed) };
  });
  parts.move('speeds', (by) => faster(run, 1 + by * u.speed));
  parts.move('rolling friction', (by) => {
    run.rollingFriction += by * friction;
  });
  const { contaminantDrag } = stated;
  if (contaminantDrag !== undefined) {
    parts.move('drag of the contaminant', (by) => {
      run.contaminantDrag = contaminantDrag * (1 + by * contaminantDragUncertainty);
    });
  }
  parts.add('technique', 0, u.technique);
  parts.add('start point', u.startPoint / result.groundRoll, 0);
  return parts.band();
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
  run.contaminantDrag = stated.contaminantDrag;
  run.rotationSpeed = stated.rotationSpeed;
  run.liftOffSpeed = stated.liftOffSpeed;
  run.screenSpeed = stated.screenSpeed;
}
