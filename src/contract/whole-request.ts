import type { Fault } from '../planning/fault.ts';
import type { AerodromeLookup } from './aerodrome-lookup.ts';
import type { RunwayOnWire } from './runway.ts';
import type { RunwayChoice } from './runway-choice.ts';
import { toKnownRunway } from './to-known-runway.ts';
import { type KnownWeather, toKnownWeather } from './to-known-weather.ts';
import type { WeatherChoice } from './weather.ts';

/** A question whose runway and weather are whole. */
export type Whole<Request> = Omit<Request, 'runway' | 'weather'> & {
  readonly runway: RunwayOnWire;
  readonly known: KnownWeather;
  /** as given, for the question as understood */
  readonly weather: WeatherChoice;
};

/**
 * The question with its runway and its weather whole.
 *
 * @throws RangeError where the gate in would not have let them pass
 */
export function wholeRequest<
  Request extends { readonly runway: RunwayChoice; readonly weather: WeatherChoice; readonly asOf?: string },
>(request: Request, lookup: AerodromeLookup, phase: 'takeoff' | 'landing'): Whole<Request> {
  const runway: RunwayOnWire | Fault[] = toKnownRunway(request.runway, lookup, phase);
  if (Array.isArray(runway)) throw new RangeError('runway is not on file');
  const known = toKnownWeather(request.weather, request.asOf);
  if (Array.isArray(known)) throw new RangeError('weather is not whole');
  return { ...request, runway, known };
}
