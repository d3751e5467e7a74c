import type { Aeroplane, Configuration } from '../aeroplane.ts';
import { propulsionDefault } from '../propulsion-defaults.ts';
import type { LandingFit, TakeoffFit } from './fit.ts';
import { fittedPropulsion, fittedPullUpLoadFactor } from './takeoff-parameters.ts';

/** The aeroplane as its fit of a takeoff configuration makes it; undefined where it has none. */
export function fittedForTakeoff(aeroplane: Aeroplane, configurationId: string): Aeroplane | undefined {
  const fit = aeroplane.fit?.takeoff?.[configurationId];
  const configuration = aeroplane.configurations[configurationId];
  return fit && configuration && withTakeoffFit(aeroplane, fit, configurationId, configuration);
}

/** The aeroplane as its fit of a landing configuration makes it; undefined where it has none. */
export function fittedForLanding(aeroplane: Aeroplane, configurationId: string): Aeroplane | undefined {
  const fit = aeroplane.fit?.landing?.[configurationId];
  const configuration = aeroplane.configurations[configurationId];
  return fit && configuration && withLandingFit(aeroplane, fit, configurationId, configuration);
}

/**
 * Thrust factor and lapses as fitted, drag in the air shifted, the pull-up as in the fit. Moisture takes no power unless the
 * tables state dry air: what they show holds the humidity of their day.
 *
 * @see references.HouseFit
 */
export function withTakeoffFit(
  aeroplane: Aeroplane,
  { values, dryAir = false }: TakeoffFit,
  configurationId: string,
  configuration: Configuration,
): Aeroplane {
  const { propulsion } = aeroplane;
  const humidityFactor =
    !dryAir || (propulsion.kind !== 'fixed-pitch' && propulsion.kind !== 'constant-speed')
      ? 0
      : (propulsion.humidityFactor ?? propulsionDefault(propulsion.kind, 'humidityFactor'));
  return {
    ...aeroplane,
    propulsion: fittedPropulsion(propulsion, values, humidityFactor),
    configurations: {
      ...aeroplane.configurations,
      [configurationId]: {
        ...configuration,
        airDragIncrementCoefficient: (configuration.airDragIncrementCoefficient ?? 0) + (values.airDragShift ?? 0),
        pullUpLoadFactor: fittedPullUpLoadFactor,
      },
    },
  };
}

/**
 * Braking friction on the whole weight and approach angle as fitted; the air distance the arc alone, without float.
 *
 * @see references.HouseFit
 */
export function withLandingFit(
  aeroplane: Aeroplane,
  { values }: LandingFit,
  configurationId: string,
  configuration: Configuration,
): Aeroplane {
  const { brakingFrictionCoefficient, approachAngle } = values;
  return {
    ...aeroplane,
    brakes: {
      ...aeroplane.brakes,
      ...(brakingFrictionCoefficient === undefined ? {} : { brakingFrictionCoefficient }),
      loadFactor: 1,
    },
    configurations: {
      ...aeroplane.configurations,
      [configurationId]: {
        ...configuration,
        ...(approachAngle === undefined ? {} : { approachAngle }),
        flareFitted: true,
      },
    },
  };
}
