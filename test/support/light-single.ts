import type { TakeoffRun } from '../../src/performance/takeoff/takeoff-run.ts';
import { plainRun, quadraticThrust } from './plain-run.ts';

/** T0 [N] and T2 [N s2/m2] of the fixed-pitch single of the published checks: |b| rho D^2 = 0.0564 x 1.225 x 1.905^2. */
export const lightThrust = { atRest: 2366, perSquare: -0.0564 * 1.225 * 1.905 ** 2 };

/** The fixed-pitch single of the published checks: 1043 kg at sea level, paved, level, still air. */
export function lightSingle(changes: Partial<TakeoffRun> = {}): TakeoffRun {
  const stallSpeed = Math.sqrt((2 * 1043 * 9.80665) / (1.225 * 16.2 * 1.6));
  const span = Math.sqrt(7.32 * 16.2);
  return plainRun({
    mass: 1043,
    wingArea: 16.2,
    span,
    wingHeight: 0.2 * span,
    inducedDragFactor: 1 / (Math.PI * 7.32 * 0.72),
    groundDragCoefficient: 0.037,
    airDragCoefficient: 0.037,
    groundLiftCoefficient: 0.35,
    rollingFriction: 0.03,
    thrust: quadraticThrust(lightThrust.atRest, lightThrust.perSquare),
    density: 1.225,
    liftOffSpeed: 1.15 * stallSpeed,
    screenSpeed: 1.2 * stallSpeed,
    ...changes,
  });
}
