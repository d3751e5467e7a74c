import { pressureAltitudeOfPressure, pressureAltitude as pressureAltitudeOfQnh } from '../physics/altimetry.ts';
import {
  highestAltitude,
  lowestAltitude,
  standardPressure,
  standardTemperature,
  withinStandardAtmosphere,
} from '../physics/atmosphere.ts';
import { rho0 } from '../physics/constants.ts';
import { airDensity } from '../physics/density.ts';
import { densityAltitude as densityAltitudeOf } from '../physics/density-altitude.ts';
import { saturationVapourPressure } from '../physics/humidity.ts';

/** What is known of the air: temperatures [K], pressure setting or station pressure [Pa] or pressure altitude [m]. */
export interface AirReport {
  readonly temperature: number;
  readonly dewPoint?: number;
  readonly pressure: { readonly kind: 'qnh' | 'pressureAltitude' | 'stationPressure'; readonly value: number };
}

/** The air at the runway, in SI. */
export interface Air {
  readonly temperature: number;
  /** from the standard temperature at the pressure altitude [K] */
  readonly temperatureDeviation: number;
  readonly pressure: number;
  readonly pressureAltitude: number;
  readonly density: number;
  /** over 1.225 kg/m3 */
  readonly densityRatio: number;
  readonly densityAltitude: number;
  readonly dewPoint?: number;
  /** over water, a ratio */
  readonly relativeHumidity?: number;
  /** [Pa]; absent where no dew point was given */
  readonly vapourPressure?: number;
}

/** The air, or why it cannot be told. */
export type AirOutcome =
  | { readonly outcome: 'air'; readonly air: Air }
  | { readonly outcome: 'elevation-needed' }
  | { readonly outcome: 'dew-point-above-temperature'; readonly dewPoint: number; readonly temperature: number }
  | {
      readonly outcome: 'outside-standard-atmosphere';
      readonly of: 'pressureAltitude' | 'densityAltitude';
      /** [m] */
      readonly lowest: number;
      readonly highest: number;
    };

/**
 * The state of the air from what is known of it. Without a dew point it is computed as dry.
 *
 * @param report - one of QNH, station pressure, pressure altitude
 * @param elevation - [m]; needed with a QNH only
 * @returns the air, or the name of why not
 * @see references.Iso2533; references.Wmo8
 */
export function airOf(report: AirReport, elevation?: number): AirOutcome {
  const { temperature, dewPoint } = report;
  if (dewPoint !== undefined && dewPoint > temperature) {
    return { outcome: 'dew-point-above-temperature', dewPoint, temperature };
  }
  const pressureAltitude = pressureAltitudeOf(report.pressure, elevation);
  if (pressureAltitude === 'elevation-needed') return { outcome: pressureAltitude };
  if (pressureAltitude === 'outside-standard-atmosphere') return outside('pressureAltitude');
  const pressure =
    report.pressure.kind === 'stationPressure' ? report.pressure.value : standardPressure(pressureAltitude);
  const vapourPressure = dewPoint === undefined ? undefined : saturationVapourPressure(dewPoint);
  const density = airDensity(pressure, temperature, vapourPressure);
  const densityAltitude = densityAltitudeOf(density);
  if (densityAltitude === 'outside-standard-atmosphere') return outside('densityAltitude');
  const temperatureDeviation = temperature - standardTemperature(pressureAltitude);
  const densityRatio = density / rho0;
  const dry = { temperature, temperatureDeviation, pressure, pressureAltitude, density, densityRatio, densityAltitude };
  if (dewPoint === undefined || vapourPressure === undefined) return { outcome: 'air', air: dry };
  const relativeHumidity = vapourPressure / saturationVapourPressure(temperature);
  // written out: a spread costs more than all the physics above
  return {
    outcome: 'air',
    air: {
      temperature,
      temperatureDeviation,
      pressure,
      pressureAltitude,
      density,
      densityRatio,
      densityAltitude,
      dewPoint,
      relativeHumidity,
      vapourPressure,
    },
  };
}

function pressureAltitudeOf(
  given: AirReport['pressure'],
  elevation: number | undefined,
): number | 'elevation-needed' | 'outside-standard-atmosphere' {
  if (given.kind === 'stationPressure') return pressureAltitudeOfPressure(given.value);
  if (given.kind === 'pressureAltitude') return withinStandardAtmosphere(given.value);
  if (elevation === undefined) return 'elevation-needed';
  return withinStandardAtmosphere(pressureAltitudeOfQnh(elevation, given.value));
}

function outside(of: 'pressureAltitude' | 'densityAltitude'): AirOutcome {
  return { outcome: 'outside-standard-atmosphere', of, lowest: lowestAltitude, highest: highestAltitude };
}
