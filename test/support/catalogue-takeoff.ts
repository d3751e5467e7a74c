import type { Aeroplane } from '../../src/performance/aeroplane.ts';
import { type Air, airOf } from '../../src/performance/air.ts';
import { propulsionThrust } from '../../src/performance/propulsion.ts';
import { configuredStallSpeed } from '../../src/performance/speeds/configured-stall-speed.ts';
import { scheduledSpeed } from '../../src/performance/speeds/scheduled-speed.ts';
import type { TakeoffRun } from '../../src/performance/takeoff/takeoff-run.ts';
import { standardPressure, standardTemperature } from '../../src/physics/atmosphere.ts';
import { inducedDragFactor } from '../../src/physics/drag.ts';

/** Conditions of a takeoff that differ from sea level, standard day, still air, dry pavement. */
export interface TakeoffConditions {
  /** [kg]; absent: the greatest */
  readonly mass?: number;
  /** pressure altitude [m] */
  readonly altitude?: number;
  /** from the standard temperature [K] */
  readonly deviation?: number;
  /** [m/s] */
  readonly headwind?: number;
}

/** The air at a pressure altitude [m] and a deviation [K] from its standard temperature, dry. */
export function dryAir(altitude = 0, deviation = 0): Air {
  const found = airOf({
    temperature: standardTemperature(altitude) + deviation,
    pressure: { kind: 'stationPressure', value: standardPressure(altitude) },
  });
  if (found.outcome !== 'air') throw new Error(found.outcome);
  return found.air;
}

/** The takeoff run of a definition in which nothing is left out, built without the planning room. */
export function catalogueTakeoff(
  aeroplane: Aeroplane,
  configuration: string,
  { mass = aeroplane.masses.maximumTakeoff, altitude = 0, deviation = 0, headwind = 0 }: TakeoffConditions = {},
): TakeoffRun {
  const { wing, drag, propulsion, engines, certification } = aeroplane;
  const setting = stated(aeroplane.configurations[configuration]);
  const air = dryAir(altitude, deviation);
  const stall = configuredStallSpeed(setting.maximumLift, wing.area, mass);
  const trueAirspeed = (name: 'rotation' | 'liftOff' | 'screen') => {
    const eas = scheduledSpeed(stated(setting.speeds?.[name]), mass, stall, air.pressure);
    if (typeof eas !== 'number') throw new Error(eas);
    return eas / Math.sqrt(air.densityRatio);
  };
  return {
    mass,
    wingArea: wing.area,
    span: wing.span,
    wingHeight: wing.heightAboveGround,
    inducedDragFactor: inducedDragFactor(wing.span, wing.area, drag.oswaldFactor),
    groundDragCoefficient: drag.zeroLiftCoefficient + stated(setting.groundDragIncrementCoefficient),
    airDragCoefficient: drag.zeroLiftCoefficient + stated(setting.airDragIncrementCoefficient),
    groundLiftCoefficient: stated(setting.groundLiftCoefficient),
    rollingFriction: propulsion.kind === 'jet' ? 0.02 : 0.03,
    thrust: propulsionThrust(propulsion, engines, air),
    density: air.density,
    headwind,
    slope: 0,
    rotationSpeed: trueAirspeed('rotation'),
    liftOffSpeed: trueAirspeed('liftOff'),
    screenSpeed: trueAirspeed('screen'),
    rotationTime: stated(setting.rotationTime),
    pullUpLoadFactor: stated(setting.pullUpLoadFactor),
    screenHeight: certification.screenHeight,
  };
}

function stated<T>(value: T | undefined): T {
  if (value === undefined) throw new Error('a catalogue aeroplane leaves nothing out');
  return value;
}
