import type { RunwayOnWire } from '../../src/contract/runway.ts';
import type { WeatherOnWire } from '../../src/contract/weather.ts';

/** A request with its runway and its weather member by member. */
export type StatedRequest<Request> = Omit<Request, 'runway' | 'weather'> & {
  readonly runway: RunwayOnWire;
  readonly weather: WeatherOnWire;
};
