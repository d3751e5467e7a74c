import type { Propulsion } from '../../src/performance/aeroplane.ts';
import { type TakeoffVector, type VectorAeroplane, vectorAeroplanes } from '../published/takeoff-vectors.ts';

const q = (value: number, unit: string) => ({ value, unit });

/** A published vector as the question a script would send: an inline definition, SI, unrounded. */
export function vectorQuestion({ aeroplane: name, air, rollingFriction, headwind, slope }: TakeoffVector): object {
  const aeroplane: VectorAeroplane = vectorAeroplanes[name];
  const jet = name === 'jet';
  const hot = air.temperature > 300;
  return {
    aeroplane: {
      definition: {
        id: `vector-${name}`,
        revision: '1',
        name: 'Reference case (invented)',
        category: jet ? 'twin-jet' : 'single-piston',
        engines: aeroplane.engines,
        certification: { basis: jet ? 'cs-25' : 'cs-23-amendment-4', screenHeight: q(aeroplane.screenHeight, 'm') },
        masses: { maximumTakeoff: q(aeroplane.mass, 'kg') },
        wing: {
          area: q(aeroplane.wingArea, 'm2'),
          span: q(aeroplane.span, 'm'),
          heightAboveGround: q(aeroplane.wingHeightRatio * aeroplane.span, 'm'),
        },
        drag: { zeroLiftCoefficient: aeroplane.airDragCoefficient, oswaldFactor: aeroplane.oswaldFactor },
        configurations: {
          takeoff: {
            for: ['takeoff'],
            flap: q(10, 'deg'),
            maximumLift: { coefficient: aeroplane.maximumLiftCoefficient },
            groundDragIncrementCoefficient: aeroplane.groundDragCoefficient - aeroplane.airDragCoefficient,
            airDragIncrementCoefficient: 0,
            groundLiftCoefficient: aeroplane.groundLiftCoefficient,
            speeds: { liftOff: { stallRatio: aeroplane.liftOffRatio }, screen: { stallRatio: aeroplane.screenRatio } },
            rotationTime: q(0, 's'),
            pullUpLoadFactor: aeroplane.pullUpLoadFactor,
          },
        },
        propulsion: onWire(aeroplane.propulsion),
      },
    },
    mass: q(aeroplane.mass, 'kg'),
    configuration: 'takeoff',
    runway: {
      designator: '01',
      direction: q(10, 'deg'),
      directionReference: 'true',
      elevation: q(hot ? 1600 : 0, 'm'),
      slope: q(slope * 100, 'percent'),
      surface: { kind: 'paved', state: 'dry', rollingFrictionCoefficient: rollingFriction },
      start: 'threshold',
      declared: { tora: q(6000, 'm'), toda: q(6000, 'm') },
    },
    weather: {
      temperature: q(air.temperature, 'K'),
      ...(hot ? { dewPoint: q(12, 'degC') } : {}),
      pressure: { qnh: hot ? q(1010, 'hPa') : q(1013.25, 'hPa') },
      wind: { headwind: q(headwind, 'm/s') },
    },
    ruleSet: 'unfactored',
    units: 'si',
    rounding: 'none',
  };
}

const units: Readonly<Record<string, string>> = {
  staticThrust: 'N',
  propellerDiameter: 'm',
  power: 'W',
  flatRating: 'deltaC',
};

function onWire(propulsion: Propulsion): object {
  return Object.fromEntries(
    Object.entries(propulsion).map(([name, value]) => [name, units[name] ? q(value as number, units[name]) : value]),
  );
}
