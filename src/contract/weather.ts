import { z } from 'zod';
import { direction, headwind, pressureAltitude, qnh, stationPressure, temperature, windSpeed } from './quantities.ts';

export const north = z
  .enum(['true', 'magnetic'])
  .meta({ description: 'The north a direction is measured from: reports use true, runways are painted magnetic.' });

/** Exactly one of three. */
export const pressure = z
  .union([z.strictObject({ qnh }), z.strictObject({ pressureAltitude }), z.strictObject({ stationPressure })])
  .meta({
    id: 'Pressure',
    description:
      'The pressure in exactly one form: the altimeter setting, the pressure altitude of the aerodrome, or the pressure measured there.',
  });

const windFrom = z.strictObject({
  from: direction.meta({ description: 'Direction the wind blows from.' }),
  fromReference: north,
  speed: windSpeed.meta({ description: 'Mean speed of the wind.' }),
  gust: windSpeed
    .meta({ description: 'Highest speed in gusts, at least the mean; it is never credited as headwind.' })
    .exactOptional(),
  variable: z
    .strictObject({ from: direction, to: direction })
    .meta({
      description: 'Extremes of a varying direction, clockwise from the first to the second, in the same reference.',
    })
    .exactOptional(),
});

const windAllRound = z.strictObject({
  from: z.literal('variable').meta({ description: 'The direction varies all round.' }),
  speed: windSpeed.meta({ description: 'Mean speed, which may come from any side.' }),
  gust: windSpeed.meta({ description: 'Highest speed in gusts, at least the mean.' }).exactOptional(),
});

const windComponents = z.strictObject({
  headwind,
  crosswind: windSpeed.meta({ description: 'Size of the wind across the runway, from either side.' }).exactOptional(),
});

/** Exactly one of four forms. */
export const wind = z.union([windFrom, windAllRound, windComponents, z.literal('calm')]).meta({
  id: 'Wind',
  description:
    'The wind in exactly one form: direction and speed, a speed from all round, components along and across the runway, or calm.',
});

const air = {
  temperature: temperature.meta({ description: 'Temperature of the outside air.' }),
  dewPoint: temperature
    .meta({ description: 'Dew point, not above the temperature. Without it the air is taken as dry, and said to be.' })
    .exactOptional(),
  pressure,
};

export const weather = z
  .strictObject({ ...air, wind })
  .meta({ id: 'Weather', description: 'The air and the wind at the aerodrome.' });

/** The most characters of a report. */
export const longestReport = 512;

export const reportText = z
  .string()
  .min(1)
  .max(longestReport)
  .meta({ description: 'A METAR or SPECI as received, of at most 512 characters.' });

/** A report, with what stands in its place. */
export const weatherByReport = z
  .strictObject({
    report: reportText,
    temperature: air.temperature.exactOptional(),
    dewPoint: air.dewPoint,
    pressure: pressure.exactOptional(),
    wind: wind.exactOptional(),
  })
  .meta({
    id: 'WeatherByReport',
    description:
      'A report of the weather. What is given beside it takes the place of what the report says, and is said.',
  });

/** The weather member by member, or by a report. */
export const weatherChoice = z.union([weather, weatherByReport]).meta({
  id: 'WeatherChoice',
  description: 'The weather in exactly one of two forms: member by member, or a report.',
});

export const stillWeather = z
  .strictObject(air)
  .meta({ id: 'StillWeather', description: 'The air at the aerodrome, without its wind.' });

/** A report of which the air alone is taken, with what stands in its place. */
export const stillWeatherByReport = z
  .strictObject({
    report: reportText,
    temperature: air.temperature.exactOptional(),
    dewPoint: air.dewPoint,
    pressure: pressure.exactOptional(),
  })
  .meta({
    id: 'StillWeatherByReport',
    description:
      'A report of which temperature, dew point and pressure are taken, and what is given here in their place.',
  });

/** The air member by member, or by a report. */
export const stillWeatherChoice = z.union([stillWeather, stillWeatherByReport]).meta({
  id: 'StillWeatherChoice',
  description: 'The air in exactly one of two forms: member by member, or a report.',
});

export type StillWeatherChoice = z.infer<typeof stillWeatherChoice>;
export type WeatherOnWire = z.infer<typeof weather>;
export type WeatherByReport = z.infer<typeof weatherByReport>;
export type WeatherChoice = z.infer<typeof weatherChoice>;
export type StillWeatherOnWire = z.infer<typeof stillWeather>;
export type WindOnWire = z.infer<typeof wind>;
export type PressureOnWire = z.infer<typeof pressure>;
