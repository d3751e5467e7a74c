import { tasFromEas } from '../../physics/airspeed.ts';
import { constantBraking } from '../../physics/braking-friction.ts';
import { inducedDragFactor } from '../../physics/drag.ts';
import type { MaximumLift, ScheduledSpeed } from '../aeroplane.ts';
import { airOf } from '../air.ts';
import { landing } from '../landing/landing.ts';
import type { LandingFigures } from '../landing/landing-figures.ts';
import type { LandingRun } from '../landing/landing-run.ts';
import { configuredStallSpeed } from '../speeds/configured-stall-speed.ts';
import { scheduledSpeed } from '../speeds/scheduled-speed.ts';
import type { FitModel, ModelParameter } from './fit-model.ts';
import type { FitPoint, Observation } from './fit-point.ts';
import type { FitAeroplane } from './takeoff-model.ts';

export const landingParameters = ['brakingFrictionCoefficient', 'approachAngle'] as const;
export type LandingParameter = (typeof landingParameters)[number];

const degree = Math.PI / 180;

/** Effective braking friction on the whole weight, and the angle of the approach [rad]. @see references.HouseFit */
export const landingParametersOfFit: readonly ModelParameter<LandingParameter>[] = [
  {
    name: 'brakingFrictionCoefficient',
    low: 0.15,
    high: 0.45,
    prior: { mean: 0.3, sd: 0.05 },
    held: 0.3,
    plausible: [0.15, 0.45],
  },
  {
    name: 'approachAngle',
    low: 2 * degree,
    high: 8 * degree,
    prior: { mean: 3.5 * degree, sd: 1.5 * degree },
    held: 3 * degree,
    plausible: [2 * degree, 8 * degree],
  },
];

/**
 * Landing distances against effective braking friction and approach angle; the air distance is the arc alone.
 *
 * @param figuresAt - the procedure at a mass
 * @param points - with ground roll, whole distance or both
 * @returns undefined where a point lies outside the standard atmosphere or a speed is not subsonic
 */
export function landingModel(
  { wing, drag }: FitAeroplane,
  maximumLift: MaximumLift,
  figuresAt: (mass: number) => LandingFigures,
  points: readonly FitPoint[],
): FitModel<LandingParameter> | undefined {
  const ready: {
    readonly run: Omit<LandingRun, 'braking' | 'approachAngle'>;
    readonly observations: readonly Observation[];
  }[] = [];
  for (const { mass, pressureAltitude, temperature, headwind, slope, observations } of points) {
    const found = airOf({ temperature, pressure: { kind: 'pressureAltitude', value: pressureAltitude } });
    if (found.outcome !== 'air') return undefined;
    const { air } = found;
    const figures = figuresAt(mass);
    const stallEas = configuredStallSpeed(maximumLift, wing.area, mass);
    const speed = (schedule: ScheduledSpeed): number => {
      const eas = scheduledSpeed(schedule, mass, stallEas, air.pressure);
      return eas === 'not-subsonic' ? Number.POSITIVE_INFINITY : tasFromEas(eas, air.density);
    };
    const referenceSpeed = speed(figures.landingReference);
    const touchdownSpeed = speed(figures.touchdown);
    if (!Number.isFinite(referenceSpeed + touchdownSpeed)) return undefined;
    ready.push({
      observations,
      run: {
        mass,
        wingArea: wing.area,
        span: wing.span,
        wingHeight: wing.heightAboveGround,
        inducedDragFactor: inducedDragFactor(wing.span, wing.area, drag.oswaldFactor),
        groundDragCoefficient: drag.zeroLiftCoefficient + figures.groundDragIncrement,
        groundLiftCoefficient: figures.groundLiftCoefficient,
        idleThrust: figures.idleThrust,
        density: air.density,
        headwind,
        slope,
        referenceSpeed,
        touchdownSpeed,
        flareLoadFactor: figures.flareLoadFactor,
        screenHeight: figures.screenHeight,
        freeRollTime: figures.freeRollTime,
      },
    });
  }
  return {
    parameters: landingParametersOfFit,
    points,
    at: ([friction = 0, approachAngle = 0]) => {
      const braking = constantBraking(friction);
      return (point, out) => {
        const { run, observations } = ready[point] as (typeof ready)[number];
        const result = landing({ ...run, braking, approachAngle });
        if (result.outcome !== 'stops') return false;
        observations.forEach(({ kind }, i) => {
          out[i] = kind === 'groundRoll' ? result.groundRoll : result.landingDistance;
        });
        return true;
      };
    },
  };
}
