import type { AirReport } from '../performance/air.ts';
import type { Weather, Wind } from '../planning/question.ts';
import type { Draft } from './present.ts';
import { si } from './quantity.ts';
import type { StillWeatherOnWire, WeatherOnWire, WindOnWire } from './weather.ts';

/** Air and wind in SI. */
export function toWeather(given: WeatherOnWire): Weather {
  const weather: Draft<Weather> = {
    temperature: si('temperature', given.temperature),
    pressure: toPressure(given.pressure),
    wind: toWind(given.wind),
  };
  if (given.dewPoint !== undefined) weather.dewPoint = dewPointOf(given.dewPoint, weather.temperature);
  return weather;
}

/** What of the weather is given beside a report, in SI. */
export function toGivenWeather(given: Partial<WeatherOnWire>): Partial<Weather> {
  const beside: Draft<Partial<Weather>> = {};
  if (given.temperature !== undefined) beside.temperature = si('temperature', given.temperature);
  if (given.dewPoint !== undefined) beside.dewPoint = si('temperature', given.dewPoint);
  if (given.pressure !== undefined) beside.pressure = toPressure(given.pressure);
  if (given.wind !== undefined) beside.wind = toWind(given.wind);
  return beside;
}

/** The air in SI. */
export function toAirReport({ temperature, dewPoint, pressure }: StillWeatherOnWire): AirReport {
  const report: Draft<AirReport> = { temperature: si('temperature', temperature), pressure: toPressure(pressure) };
  if (dewPoint !== undefined) report.dewPoint = dewPointOf(dewPoint, report.temperature);
  return report;
}

/**
 * The dew point of a checked question [K]: saturated air may have it a last bit above the temperature, where the two come in
 * different units.
 */
function dewPointOf(given: NonNullable<StillWeatherOnWire['dewPoint']>, temperature: number): number {
  return Math.min(si('temperature', given), temperature);
}

function toPressure(given: StillWeatherOnWire['pressure']): AirReport['pressure'] {
  if ('qnh' in given) return { kind: 'qnh', value: si('pressure', given.qnh) };
  return 'pressureAltitude' in given
    ? { kind: 'pressureAltitude', value: si('length', given.pressureAltitude) }
    : { kind: 'stationPressure', value: si('pressure', given.stationPressure) };
}

function toWind(given: WindOnWire): Wind {
  if (given === 'calm') return { kind: 'calm' };
  if ('headwind' in given) {
    const wind: Draft<Extract<Wind, { kind: 'components' }>> = {
      kind: 'components',
      headwind: si('speed', given.headwind),
    };
    if (given.crosswind !== undefined) wind.crosswind = si('speed', given.crosswind);
    return wind;
  }
  const { gust } = given;
  if (given.from === 'variable') {
    const wind: Draft<Extract<Wind, { kind: 'variable' }>> = { kind: 'variable', speed: si('speed', given.speed) };
    if (gust !== undefined) wind.gust = si('speed', gust);
    return wind;
  }
  const { variable } = given;
  const wind: Draft<Extract<Wind, { kind: 'from' }>> = {
    kind: 'from',
    from: si('angle', given.from),
    fromReference: given.fromReference,
    speed: si('speed', given.speed),
  };
  if (gust !== undefined) wind.gust = si('speed', gust);
  if (variable !== undefined) wind.variable = { from: si('angle', variable.from), to: si('angle', variable.to) };
  return wind;
}
