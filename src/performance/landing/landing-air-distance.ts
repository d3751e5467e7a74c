import { g0 } from '../../physics/constants.ts';
import { landingArc } from './landing-arc.ts';
import type { LandingRun } from './landing-run.ts';

/** The way from the screen to touchdown over the ground. */
export interface LandingAirDistance {
  /** float included [m], [s] */
  readonly distance: number;
  readonly time: number;
  readonly floatDistance: number;
  readonly from: 'arc' | 'seven-seconds';
  readonly flareAboveScreen: boolean;
}

/** Time from the screen to touchdown [s] and mean speed over the reference speed of an ordinary landing. @see references.Ac25s32 */
export const ordinaryTime = 7;
export const ordinaryMeanRatio = 0.98;
/** Touchdown speed of an ordinary landing over the reference speed: below it the aeroplane floats. @see references.Ac25s32 */
export const ordinaryTouchdownRatio = 0.96;

/**
 * Distance over the ground from the screen to touchdown.
 *
 * A fitted aeroplane: the arc of landingArc less the wind times its time. One that nobody has fitted: the longer of that and
 * 7 s x (0.98 V_REF - w), plus, where V_TD is below V_a = 0.96 V_REF, the float
 * max(0, (V_a^2 - V_TD^2)/(2 g (D - T)/W) - R sin gamma) x (1 - w/V_m), V_m = (V_a + V_TD)/2.
 *
 * @param run - floatDecelerationRatio, (D - T)/W, present where nobody has fitted the flare
 * @returns distance [m] and time [s]
 * @remarks The arc alone has no float: its flare would ask for some 0.5 g of deceleration.
 * @see references.Ac25s32, time in the air; references.Raymer, ch. 17; references.HouseEnergyPath for the float
 */
export function landingAirDistance(run: LandingRun): LandingAirDistance {
  const { headwind, referenceSpeed, touchdownSpeed, floatDecelerationRatio } = run;
  const arc = landingArc(run);
  const overGround = arc.straight + arc.flare - headwind * arc.time;
  const flareAboveScreen = arc.flareHeight > run.screenHeight;
  if (floatDecelerationRatio === undefined) {
    return { distance: overGround, time: arc.time, floatDistance: 0, from: 'arc', flareAboveScreen };
  }
  if (!(floatDecelerationRatio > 0)) {
    throw new RangeError(`floatDecelerationRatio must be above 0: ${floatDecelerationRatio}`);
  }
  const ordinary = ordinaryTime * (ordinaryMeanRatio * referenceSpeed - headwind);
  const longerArc = overGround >= ordinary;
  const floatFrom = ordinaryTouchdownRatio * referenceSpeed;
  const lost = floatFrom ** 2 - touchdownSpeed ** 2;
  const still = lost > 0 ? Math.max(0, lost / (2 * g0 * floatDecelerationRatio) - arc.flare) : 0;
  const mean = (floatFrom + touchdownSpeed) / 2;
  const floatDistance = still * (1 - headwind / mean);
  return {
    distance: (longerArc ? overGround : ordinary) + floatDistance,
    time: (longerArc ? arc.time : ordinaryTime) + still / mean,
    floatDistance,
    from: longerArc ? 'arc' : 'seven-seconds',
    flareAboveScreen,
  };
}
