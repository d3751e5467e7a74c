import { pressureAltitude, qnh as qnhOf, stationPressure } from '../../physics/altimetry.ts';
import { standardPressure } from '../../physics/atmosphere.ts';
import { saturationVapourPressure } from '../../physics/humidity.ts';
import type { Fault } from '../../planning/fault.ts';
import { type Q, si } from '../quantity.ts';
import type { StillWeatherOnWire } from '../weather.ts';
import { written } from '../written.ts';

/** Altimeter settings met on earth [Pa], the bounds of a stated one. */
const settings = { lowest: 87_000, highest: 108_500 };

/**
 * Members of the air against each other and against the elevation.
 *
 * @param elevation - of the aerodrome, where it is given
 */
export function checkAir(weather: StillWeatherOnWire, elevation: Q<'m' | 'km' | 'ft'> | undefined): Fault[] {
  const { temperature, dewPoint } = weather;
  const faults: Fault[] = [];
  if (dewPoint !== undefined && si('temperature', dewPoint) > si('temperature', temperature) + 1e-9) {
    faults.push({
      pointer: '/weather/dewPoint',
      code: 'contradiction',
      message: `The dew point ${written(dewPoint)} is above the temperature ${written(temperature)}.`,
      received: dewPoint.value,
      allowed: `at most ${written(temperature)}`,
      hint: 'Check whether the two were exchanged, and their units.',
    });
  }
  if (elevation !== undefined) faults.push(...checkPressure(weather.pressure, elevation));
  if (faults.length === 0) faults.push(...checkVapour(weather, elevation));
  return faults;
}

/** Vapour may not be more than this part of the pressure: the hottest marsh holds a twentieth; our choice. */
const mostVapour = 0.3;

function checkVapour({ dewPoint, pressure }: StillWeatherOnWire, elevation: Q<'m' | 'km' | 'ft'> | undefined): Fault[] {
  if (dewPoint === undefined) return [];
  const total = pressureOf(pressure, elevation);
  if (total === undefined || saturationVapourPressure(si('temperature', dewPoint)) <= mostVapour * total) return [];
  return [
    {
      pointer: '/weather/dewPoint',
      code: 'implausible',
      message: `At a dew point of ${written(dewPoint)} and ${(total / 100).toFixed(0)} hPa the air would be mostly vapour.`,
      received: dewPoint.value,
      allowed: `at most ${100 * mostVapour} % of the pressure as vapour`,
      hint: 'Check the units of dew point and pressure.',
    },
  ];
}

function pressureOf(
  pressure: StillWeatherOnWire['pressure'],
  elevation: Q<'m' | 'km' | 'ft'> | undefined,
): number | undefined {
  if ('stationPressure' in pressure) return si('pressure', pressure.stationPressure);
  if ('pressureAltitude' in pressure) return standardPressure(si('length', pressure.pressureAltitude));
  return elevation && stationPressure(si('length', elevation), si('pressure', pressure.qnh));
}

/** A pressure altitude or a station pressure must go with the elevation by some altimeter setting met on earth. */
function checkPressure(pressure: StillWeatherOnWire['pressure'], elevation: Q<'m' | 'km' | 'ft'>): Fault[] {
  if ('qnh' in pressure) return [];
  const height = si('length', elevation);
  if ('stationPressure' in pressure) {
    const given = pressure.stationPressure;
    const setting = qnhOf(height, si('pressure', given));
    if (setting >= settings.lowest && setting <= settings.highest) return [];
    return [
      {
        pointer: '/weather/pressure/stationPressure',
        code: 'contradiction',
        message: `A pressure of ${written(given)} at ${written(elevation)} would be an altimeter setting of ${(setting / 100).toFixed(0)} hPa.`,
        received: given.value,
        allowed: 'an altimeter setting of 870 to 1085 hPa',
        hint: 'If it is the altimeter setting, give it as qnh; else check the unit of the elevation.',
      },
    ];
  }
  const given = pressure.pressureAltitude;
  const altitude = si('length', given);
  const lowest = pressureAltitude(height, settings.highest);
  const highest = pressureAltitude(height, settings.lowest);
  if (altitude >= lowest && altitude <= highest) return [];
  const factor = given.unit === 'ft' ? 0.3048 : given.unit === 'km' ? 1000 : 1;
  return [
    {
      pointer: '/weather/pressure/pressureAltitude',
      code: 'contradiction',
      message: `A pressure altitude of ${written(given)} does not go with an elevation of ${written(elevation)}.`,
      received: given.value,
      allowed: `${Math.round(lowest / factor)} to ${Math.round(highest / factor)} ${given.unit}, altimeter settings of 1085 to 870 hPa`,
      hint: 'Check the units of both.',
    },
  ];
}
