import { type Air, airOf } from '../performance/air.ts';
import type { Question, Weather } from './question.ts';

/**
 * The air of a question with its temperature and pressure a little off, for a slope.
 *
 * @param temperatureOff - [K]
 * @param pressureOff - [Pa]; a pressure altitude moves by as much as a standard column of that weight, 8.3 m a hectopascal
 * @returns the air, or undefined where there is none, as with a temperature below the dew point
 */
export function airBeside(
  { weather, runway }: Pick<Question, 'weather' | 'runway'>,
  temperatureOff: number,
  pressureOff: number,
): Air | undefined {
  const pressure = pressureBeside(weather.pressure, pressureOff);
  const found = airOf({ ...weather, temperature: weather.temperature + temperatureOff, pressure }, runway.elevation);
  return found.outcome === 'air' ? found.air : undefined;
}

/** A pressure that is a little off [Pa]; a pressure altitude moves by 8.3 m a hectopascal the other way. */
export function pressureBeside({ kind, value }: Weather['pressure'], off: number): Weather['pressure'] {
  return { kind, value: kind === 'pressureAltitude' ? value - 0.083 * off : value + off };
}
