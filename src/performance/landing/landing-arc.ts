import { g0 } from '../../physics/constants.ts';
import type { LandingRun } from './landing-run.ts';

/** The approach and flare through still air. */
export interface LandingArc {
  /** of the flare [m] */
  readonly radius: number;
  /** straight approach from the screen to the flare, and the flare along the ground [m] */
  readonly straight: number;
  readonly flare: number;
  /** height at which the flare begins [m]; above the screen: there is no straight part */
  readonly flareHeight: number;
  /** screen to touchdown [s] */
  readonly time: number;
}

/**
 * Approach and flare without float.
 *
 * R = V_F^2/(g (n - 1)), V_F = (V_REF + V_TD)/2; h_F = R (1 - cos gamma); s = (h_s - h_F)/tan gamma + R sin gamma;
 * t = (h_s - h_F)/(V_REF sin gamma) + R gamma/V_F. Where h_F exceeds h_s, s = sqrt(R^2 - (R - h_s)^2) on the arc alone.
 *
 * @param run - speeds true [m/s], gamma = approachAngle [rad], n = flareLoadFactor above 1
 * @returns lengths [m] through still air, relative to the runway's plane
 * @see references.Raymer, ch. 17, approach and flare
 */
export function landingArc(run: LandingRun): LandingArc {
  const { referenceSpeed, touchdownSpeed, approachAngle, flareLoadFactor, screenHeight } = run;
  if (!(approachAngle > 0 && approachAngle < Math.PI / 2)) {
    throw new RangeError(`approachAngle must lie between 0 and 90 degrees: ${approachAngle}`);
  }
  if (!(flareLoadFactor > 1)) throw new RangeError(`flareLoadFactor must be above 1: ${flareLoadFactor}`);
  const flareSpeed = (referenceSpeed + touchdownSpeed) / 2;
  const radius = flareSpeed ** 2 / (g0 * (flareLoadFactor - 1));
  const flareHeight = 2 * radius * Math.sin(approachAngle / 2) ** 2;
  if (flareHeight > screenHeight) {
    const angle = 2 * Math.asin(Math.sqrt(screenHeight / (2 * radius)));
    return {
      radius,
      straight: 0,
      flare: Math.sqrt(screenHeight * (2 * radius - screenHeight)),
      flareHeight,
      time: (radius * angle) / flareSpeed,
    };
  }
  const height = screenHeight - flareHeight;
  return {
    radius,
    straight: height / Math.tan(approachAngle),
    flare: radius * Math.sin(approachAngle),
    flareHeight,
    time: height / (referenceSpeed * Math.sin(approachAngle)) + (radius * approachAngle) / flareSpeed,
  };
}
