import { tasFromEas } from '../../physics/airspeed.ts';
import { inducedDragFactor } from '../../physics/drag.ts';
import type { Aeroplane, MaximumLift, ScheduledSpeed } from '../aeroplane.ts';
import { type Air, airOf } from '../air.ts';
import { propulsionThrust } from '../propulsion.ts';
import { configuredStallSpeed } from '../speeds/configured-stall-speed.ts';
import { scheduledSpeed } from '../speeds/scheduled-speed.ts';
import { groundRoll } from '../takeoff/ground-roll.ts';
import { rollBetween } from '../takeoff/roll-between.ts';
import { rollForces } from '../takeoff/roll-forces.ts';
import { takeoff } from '../takeoff/takeoff.ts';
import type { TakeoffFigures } from '../takeoff/takeoff-figures.ts';
import type { TakeoffRun } from '../takeoff/takeoff-run.ts';
import type { FitModel } from './fit-model.ts';
import type { FitPoint, Observation } from './fit-point.ts';
import {
  fittedPropulsion,
  fittedPullUpLoadFactor,
  type TakeoffParameter,
  takeoffParametersOf,
} from './takeoff-parameters.ts';

/** The aeroplane of a fit: what of its definition the distances hang on. */
export type FitAeroplane = Pick<
  Aeroplane,
  'wing' | 'drag' | 'propulsion' | 'engines' | 'certification' | 'masses' | 'category'
>;

/** One point with all but thrust and drag in the air settled. */
interface Ready {
  readonly air: Air;
  readonly run: TakeoffRun;
  readonly observations: readonly Observation[];
}

/**
 * Takeoff distances against thrust factor, shift of the drag in the air, and the two lapses of piston power.
 *
 * @param aeroplane - its propulsion's own figures for these are not used
 * @param maximumLift - of the configuration
 * @param figuresAt - the procedure at a mass; its load factor of the pull-up is not used
 * @param points - mass [kg], pressure altitude [m], temperature [K], headwind [m/s]; heights at or below the screen
 * @returns undefined where a point lies outside the standard atmosphere or a speed is not subsonic
 */
export function takeoffModel(
  aeroplane: FitAeroplane,
  maximumLift: MaximumLift,
  figuresAt: (mass: number) => TakeoffFigures,
  points: readonly FitPoint[],
): FitModel<TakeoffParameter> | undefined {
  const { propulsion, engines } = aeroplane;
  const parameters = takeoffParametersOf(propulsion);
  const ready: Ready[] = [];
  for (const point of points) {
    const one = readyPoint(aeroplane, maximumLift, figuresAt(point.mass), point);
    if (one === undefined) return undefined;
    ready.push(one);
  }
  return {
    parameters,
    points,
    at: (values) => {
      const [thrustFactor = 1, shift = 0, altitudeLapseCoefficient, temperatureExponent] = values;
      const engine = fittedPropulsion(
        propulsion,
        altitudeLapseCoefficient === undefined || temperatureExponent === undefined
          ? { thrustFactor }
          : { thrustFactor, altitudeLapseCoefficient, temperatureExponent },
      );
      return (point, out) => {
        const { air, run, observations } = ready[point] as Ready;
        const thrust = propulsionThrust(engine, engines, air);
        return observe({ ...run, thrust, airDragCoefficient: run.airDragCoefficient + shift }, observations, air, out);
      };
    },
  };
}

function readyPoint(
  { wing, drag, certification, propulsion, engines }: FitAeroplane,
  maximumLift: MaximumLift,
  figures: TakeoffFigures,
  point: FitPoint,
): Ready | undefined {
  const { mass, pressureAltitude, temperature, headwind, slope, rollingFriction, observations } = point;
  const found = airOf({ temperature, pressure: { kind: 'pressureAltitude', value: pressureAltitude } });
  if (found.outcome !== 'air') return undefined;
  const { air } = found;
  const stallEas = configuredStallSpeed(maximumLift, wing.area, mass);
  const speed = (schedule: ScheduledSpeed): number => {
    const eas = scheduledSpeed(schedule, mass, stallEas, air.pressure);
    return eas === 'not-subsonic' ? Number.POSITIVE_INFINITY : tasFromEas(eas, air.density);
  };
  const rotationSpeed = speed(figures.rotation);
  const liftOffSpeed = speed(figures.liftOff);
  const screenSpeed = speed(figures.screen);
  if (!Number.isFinite(rotationSpeed + liftOffSpeed + screenSpeed)) return undefined;
  return {
    air,
    observations,
    run: {
      mass,
      wingArea: wing.area,
      span: wing.span,
      wingHeight: wing.heightAboveGround,
      inducedDragFactor: inducedDragFactor(wing.span, wing.area, drag.oswaldFactor),
      groundDragCoefficient: drag.zeroLiftCoefficient + figures.groundDragIncrement,
      airDragCoefficient: drag.zeroLiftCoefficient + figures.airDragIncrement,
      groundLiftCoefficient: figures.groundLiftCoefficient,
      rollingFriction,
      thrust: propulsionThrust(propulsion, engines, air),
      density: air.density,
      headwind,
      slope,
      rotationSpeed,
      liftOffSpeed,
      screenSpeed,
      rotationTime: figures.rotationTime,
      pullUpLoadFactor: fittedPullUpLoadFactor,
      screenHeight: certification.screenHeight,
    },
  };
}

/** Writes each observation's distance; false where one has none. */
function observe(run: TakeoffRun, observations: readonly Observation[], air: Air, out: Float64Array): boolean {
  const whole = observations.some(({ kind }) => kind === 'wholeDistance') ? takeoff(run) : undefined;
  if (whole !== undefined && whole.outcome !== 'reaches-screen') return false;
  for (let i = 0; i < observations.length; i++) {
    const distance = observed(run, observations[i] as Observation, air, whole);
    if (!(distance > 0)) return false;
    out[i] = distance;
  }
  return true;
}

function observed(
  run: TakeoffRun,
  observation: Observation,
  air: Air,
  whole: { readonly groundRoll: number; readonly takeoffDistance: number } | undefined,
): number {
  if (observation.kind === 'wholeDistance') return whole?.takeoffDistance ?? Number.NaN;
  if (observation.kind === 'groundRoll') return whole?.groundRoll ?? rollOf(run);
  if (observation.kind === 'height') return toHeight(run, observation.height);
  const { speed, of } = observation;
  const airspeed = of === 'ground' ? speed + run.headwind : trueOf(speed, air);
  if (!(airspeed > run.headwind && airspeed <= run.liftOffSpeed)) return Number.NaN;
  const { reaches, sum } = rollBetween(rollForces(run), run.headwind, run.headwind, airspeed);
  return reaches ? sum.distance : Number.NaN;
}

function rollOf(run: TakeoffRun): number {
  const roll = groundRoll(run);
  return roll.outcome === 'lifts-off' ? roll.distance : Number.NaN;
}

/** The same path as to the screen, as far as a lower height: the square of the speed grows with height as it does there. */
function toHeight(run: TakeoffRun, height: number): number {
  const square = run.liftOffSpeed ** 2;
  const growth = Math.max(0, run.screenSpeed ** 2 - square) / run.screenHeight;
  const result = takeoff({ ...run, screenHeight: height, screenSpeed: Math.sqrt(square + growth * height) });
  return result.outcome === 'reaches-screen' ? result.takeoffDistance : Number.NaN;
}

function trueOf(cas: number, air: Air): number {
  const eas = scheduledSpeed({ kind: 'cas', cas, mass: 1 }, 1, 1, air.pressure);
  return eas === 'not-subsonic' ? Number.NaN : tasFromEas(eas, air.density);
}
