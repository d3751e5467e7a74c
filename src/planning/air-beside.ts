import { type Air, airOf } from '../performance/air.ts';
import type { Question } from './question.ts';

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
  const { kind, value } = weather.pressure;
  const pressure = { kind, value: kind === 'pressureAltitude' ? value - 0.083 * pressureOff : value + pressureOff };
  const found = airOf({ ...weather, temperature: weather.temperature + temperatureOff, pressure }, runway.elevation);
  return found.outcome === 'air' ? found.air : undefined;
}
