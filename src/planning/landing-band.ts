import { landingEstimate } from '../performance/landing/landing-estimate.ts';
import type { LandingRun } from '../performance/landing/landing-run.ts';
import { scaledBraking } from '../physics/braking-friction.ts';
import type { Band } from './band.ts';
import { BandParts, type Parts } from './band-parts.ts';
import type { Surface } from './question.ts';
import { brakingUncertainty, inputUncertainties } from './rules/input-uncertainties.ts';

type Changing = { -readonly [K in keyof LandingRun]: LandingRun[K] };

/**
 * The 90 % band of a landing, from its mean-deceleration estimate.
 *
 * @param stated - the run as stated
 * @param result - its distances
 * @param form - what the method itself may be off, as a share of each distance
 * @param windCoding - standard deviation of the wind along the runway from what a report rounds [m/s]; 0 without one
 * @param surface - for the uncertainty of its braking friction
 * @param densityAt - at a temperature off by the first argument [K] and a pressure off by the second [Pa]
 * @see references.Judgement for the uncertainties
 */
export function landingBand(
  stated: LandingRun,
  result: Parts,
  surface: Surface,
  form: number,
  windCoding: number,
  densityAt: (temperatureOff: number, pressureOff: number) => number | undefined,
): Band {
  const run: Changing = { ...stated };
  const movable = { estimate: () => landingEstimate(run), restore: () => restore(run, stated) };
  const parts = new BandParts(movable, result, form);
  const u = inputUncertainties;
  const braking = brakingUncertainty(surface);
  const inAir = (density: number | undefined): void => {
    run.density = density ?? Number.NaN;
    faster(run, Math.sqrt(stated.density / run.density));
  };

  parts.move('temperature', (by) => inAir(densityAt(by * u.temperature, 0)));
  parts.move('pressure', (by) => inAir(densityAt(0, -by * u.pressure)));
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
  parts.move('speeds', (by) => faster(run, 1 + by * u.speed));
  parts.move('approach speed', (by) => {
    run.referenceSpeed += by * u.approachSpeed;
  });
  parts.move('braking friction', (by) => {
    run.braking = scaledBraking(stated.braking, 1 - by * braking);
  });
  parts.add('technique', 0, u.technique);
  parts.add('height over the threshold', 0, u.screenHeight / Math.tan(stated.approachAngle) / result.airDistance);
  return parts.band();
}

function faster(run: Changing, by: number): void {
  run.referenceSpeed *= by;
  run.touchdownSpeed *= by;
}

/** Undoes what a change may have moved. */
function restore(run: Changing, stated: LandingRun): void {
  run.density = stated.density;
  run.mass = stated.mass;
  run.headwind = stated.headwind;
  run.braking = stated.braking;
  run.referenceSpeed = stated.referenceSpeed;
  run.touchdownSpeed = stated.touchdownSpeed;
}
