import { constantSpeedThrust } from '../physics/thrust/constant-speed.ts';
import { electricThrust } from '../physics/thrust/electric.ts';
import type { EngineAir } from '../physics/thrust/engine-air.ts';
import { fixedPitchThrust } from '../physics/thrust/fixed-pitch.ts';
import { jetThrust } from '../physics/thrust/jet.ts';
import { measuredThrust } from '../physics/thrust/measured.ts';
import type { Thrust } from '../physics/thrust/thrust.ts';
import { turbopropThrust } from '../physics/thrust/turboprop.ts';
import type { Disc, Propulsion } from './aeroplane.ts';
import { flatRatingDefault, propulsionDefault } from './propulsion-defaults.ts';

/**
 * Thrust of the running engines of a definition, in one state of the air.
 *
 * @param propulsion - figures of one engine; members absent take propulsionDefaults
 * @param runningEngines - 1 or more
 * @param air - at the runway
 * @param thrustFactor - of propulsionThrustFactor; absent: the definition's, else the kind's default
 * @returns the thrust of all of them together against true airspeed
 */
export function propulsionThrust(
  propulsion: Propulsion,
  runningEngines: number,
  air: EngineAir,
  thrustFactor?: number,
): Thrust {
  if (!(runningEngines >= 1)) throw new RangeError(`runningEngines must be 1 or more: ${runningEngines}`);
  const factor = thrustFactor ?? propulsion.thrustFactor ?? propulsionDefault(propulsion.kind, 'thrustFactor');
  switch (propulsion.kind) {
    case 'fixed-pitch':
      return fixedPitchThrust(
        {
          staticThrust: propulsion.staticThrust,
          propellerDiameter: propulsion.propellerDiameter,
          polarSlopeCoefficient:
            propulsion.polarSlopeCoefficient ?? propulsionDefault('fixed-pitch', 'polarSlopeCoefficient'),
          altitudeLapseCoefficient:
            propulsion.altitudeLapseCoefficient ?? propulsionDefault('fixed-pitch', 'altitudeLapseCoefficient'),
          temperatureExponent:
            propulsion.temperatureExponent ?? propulsionDefault('fixed-pitch', 'temperatureExponent'),
          humidityFactor: propulsion.humidityFactor ?? propulsionDefault('fixed-pitch', 'humidityFactor'),
          thrustFactor: factor,
        },
        runningEngines,
        air,
      );
    case 'constant-speed':
      return constantSpeedThrust(
        {
          power: propulsion.power,
          ...disc(propulsion, factor),
          altitudeLapseCoefficient:
            propulsion.altitudeLapseCoefficient ?? propulsionDefault('constant-speed', 'altitudeLapseCoefficient'),
          temperatureExponent:
            propulsion.temperatureExponent ?? propulsionDefault('constant-speed', 'temperatureExponent'),
          humidityFactor: propulsion.humidityFactor ?? propulsionDefault('constant-speed', 'humidityFactor'),
          ...(propulsion.criticalAltitude === undefined ? {} : { criticalAltitude: propulsion.criticalAltitude }),
        },
        runningEngines,
        air,
      );
    case 'turboprop': {
      const lapseExponent = propulsion.lapseExponent ?? propulsionDefault('turboprop', 'lapseExponent');
      const flatRating = propulsion.flatRating ?? flatRatingDefault(lapseExponent);
      const engine = { power: propulsion.power, ...disc(propulsion, factor), flatRating, lapseExponent };
      return turbopropThrust(engine, runningEngines, air);
    }
    case 'electric':
      return electricThrust({ power: propulsion.power, ...disc(propulsion, factor) }, runningEngines, air);
    case 'jet':
      return jetThrust(
        {
          staticThrust: propulsion.staticThrust,
          flatRating: propulsion.flatRating ?? propulsionDefault('jet', 'flatRating'),
          ...(propulsion.bypassRatio === undefined ? {} : { bypassRatio: propulsion.bypassRatio }),
          thrustFactor: factor,
        },
        runningEngines,
        air,
      );
    case 'measured':
      return measuredThrust({ ...propulsion, thrustFactor: factor }, runningEngines, air);
  }
}

function disc(propulsion: Disc & { readonly kind: 'constant-speed' | 'turboprop' | 'electric' }, thrustFactor: number) {
  return {
    propellerDiameter: propulsion.propellerDiameter,
    profileFactor: propulsion.profileFactor ?? propulsionDefault(propulsion.kind, 'profileFactor'),
    inducedFactor: propulsion.inducedFactor ?? propulsionDefault(propulsion.kind, 'inducedFactor'),
    thrustFactor,
    ...(propulsion.staticThrust === undefined ? {} : { staticThrust: propulsion.staticThrust }),
  };
}
