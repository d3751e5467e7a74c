import type { ScheduledSpeed } from '../aeroplane.ts';

/** A takeoff configuration with nothing left out, in SI. */
export interface TakeoffFigures {
  readonly rotation: ScheduledSpeed;
  readonly liftOff: ScheduledSpeed;
  readonly screen: ScheduledSpeed;
  readonly rotationTime: number;
  readonly pullUpLoadFactor: number;
  readonly groundLiftCoefficient: number;
  readonly groundDragIncrement: number;
  readonly airDragIncrement: number;
}
