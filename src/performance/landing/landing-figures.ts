import type { ScheduledSpeed } from '../aeroplane.ts';

/** What a fit needs of a landing configuration, nothing left out, in SI. */
export interface LandingFigures {
  readonly landingReference: ScheduledSpeed;
  readonly touchdown: ScheduledSpeed;
  /** [m]; 50 ft */
  readonly screenHeight: number;
  readonly flareLoadFactor: number;
  readonly freeRollTime: number;
  /** of the whole aeroplane [N] */
  readonly idleThrust: number;
  readonly groundLiftCoefficient: number;
  readonly groundDragIncrement: number;
}
