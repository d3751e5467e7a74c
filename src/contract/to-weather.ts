import type { AirReport } from '../performance/air.ts';
import type { Weather, Wind } from '../planning/question.ts';
import { si } from './quantity.ts';
import type { StillWeatherOnWire, WeatherOnWire, WindOnWire } from './weather.ts';

/** Air and wind in SI. */
export function toWeather(given: WeatherOnWire): Weather {
  return { ...toAirReport(given), wind: toWind(given.wind) };
}

/** The air in SI. */
export function toAirReport({ temperature, dewPoint, pressure }: StillWeatherOnWire): AirReport {
  return {
    temperature: si('temperature', temperature),
    ...(dewPoint === undefined ? {} : { dewPoint: si('temperature', dewPoint) }),
    pressure:
      'qnh' in pressure
        ? { kind: 'qnh', value: si('pressure', pressure.qnh) }
        : 'pressureAltitude' in pressure
          ? { kind: 'pressureAltitude', value: si('length', pressure.pressureAltitude) }
          : { kind: 'stationPressure', value: si('pressure', pressure.stationPressure) },
  };
}

function toWind(given: WindOnWire): Wind {
  if (given === 'calm') return { kind: 'calm' };
  if ('headwind' in given) {
    return {
      kind: 'components',
      headwind: si('speed', given.headwind),
      ...(given.crosswind === undefined ? {} : { crosswind: si('speed', given.crosswind) }),
    };
  }
  return {
    kind: 'from',
    from: si('angle', given.from),
    fromReference: given.fromReference,
    speed: si('speed', given.speed),
    ...(given.gust === undefined ? {} : { gust: si('speed', given.gust) }),
    ...(given.variable === undefined
      ? {}
      : { variable: { from: si('angle', given.variable.from), to: si('angle', given.variable.to) } }),
  };
}
