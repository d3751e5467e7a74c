import type { Assumption } from '../planning/answer.ts';
import type { Refused } from '../planning/fault.ts';
import { measureText } from '../planning/sentences/measure-text.ts';
import type { ReferenceKey } from '../references.ts';
import type { AirRequest, AirResponse } from './air.ts';
import { assumedPresentation, presentationOf } from './assumed-presentation.ts';
import { foundAir } from './found-air.ts';
import { toAdvisory } from './to-advisory.ts';
import { toAir } from './to-air.ts';
import { type Stamp, toAssumed, toSources } from './to-basis.ts';
import { stillAsUnderstood, toKnownStillWeather } from './to-known-weather.ts';
import type { StillWeatherOnWire } from './weather.ts';

/** The air at an aerodrome from gate to gate. */
export function answerAir(request: AirRequest, stamp: Stamp): AirResponse | Refused {
  const weather = toKnownStillWeather(request.weather);
  if (Array.isArray(weather)) return { refused: weather };
  const air = foundAir(weather, request.elevation);
  if (Array.isArray(air)) return { refused: air };
  const how = presentationOf(request);
  const text = (altitude: number) => measureText(how.units, 'altitude', altitude);
  const sentence = `Density altitude ${text(air.densityAltitude)}, pressure altitude ${text(air.pressureAltitude)}.`;
  const { reference, asOf, elevation } = request;
  return {
    outcome: 'computed',
    advisory: toAdvisory(how, sentence, []),
    air: toAir(how, air),
    basis: {
      assumed: toAssumed(how, [...assumedPresentation(request), ...assumedDry(weather)]),
      notGiven: notGivenAir(weather),
      sources: toSources(airSources(weather)),
      modelVersion: stamp.modelVersion,
    },
    question: {
      ...(reference === undefined ? {} : { reference }),
      ...(asOf === undefined ? {} : { asOf }),
      ...(elevation === undefined ? {} : { elevation }),
      weather: stillAsUnderstood(request.weather, weather),
      ...how,
    },
  };
}

/** Without a dew point the air is dry, and said to be. */
export function assumedDry({ dewPoint }: StillWeatherOnWire): Assumption[] {
  if (dewPoint !== undefined) return [];
  return [
    {
      at: '/weather/dewPoint',
      value: 'dry air',
      because: 'no dew point is given; moist air is lighter, so the density altitude is higher than shown',
      source: 'Wmo8',
    },
  ];
}

export function notGivenAir({ dewPoint }: StillWeatherOnWire): string[] {
  return dewPoint === undefined ? ['/weather/dewPoint'] : [];
}

export function airSources({ dewPoint }: StillWeatherOnWire): ReferenceKey[] {
  return dewPoint === undefined ? ['Iso2533', 'Wmo8'] : ['Iso2533', 'Wmo8', 'Cipm2007'];
}
