import type { Shortfall } from './answer.ts';
import type { NotReached } from './takeoff-runs.ts';

/**
 * What kept a takeoff from the screen, as a number and the bound it missed.
 *
 * @param result - the outcome of the run
 * @param propulsionAt - pointer to the propulsion in the request
 */
export function shortfalls(result: NotReached, propulsionAt: string): readonly Shortfall[] {
  switch (result.outcome) {
    case 'never-reaches-lift-off-speed':
      return [
        { at: '/mass', axis: 'accelerationRatio', given: result.leastAccelerationRatio, bound: 0, side: 'below' },
      ];
    case 'never-reaches-screen-height':
      return [
        {
          at: '/mass',
          axis: 'climbGradient',
          given: { kind: 'gradient', value: result.leastClimbGradient, direction: 'down' },
          bound: { kind: 'gradient', value: result.neededClimbGradient },
          side: 'below',
        },
      ];
    case 'ground-speed-not-positive':
      return [headwindShortfall(result.headwind, 'climbSpeed' in result ? result.climbSpeed : result.liftOffSpeed)];
    case 'outside-stated-data':
      return [
        {
          at: propulsionAt,
          axis: 'trueAirspeed',
          given: { kind: 'speed', value: result.airspeed },
          bound: { kind: 'speed', value: result.bound },
          side: result.airspeed > result.bound ? 'above' : 'below',
        },
      ];
  }
}

/** A headwind at or above the true airspeed [m/s] at which the wheels leave or meet the runway, or the speed forward in the climb. */
export function headwindShortfall(headwind: number, airspeed: number): Shortfall {
  return {
    at: '/weather/wind',
    axis: 'headwind',
    given: { kind: 'speed', value: headwind },
    bound: { kind: 'speed', value: airspeed },
    side: 'above',
  };
}
