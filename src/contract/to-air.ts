import type { z } from 'zod';
import type { Air } from '../planning/answer.ts';
import type { air as airSchema } from './answer-parts.ts';
import type { Draft } from './present.ts';
import { type Presentation, shownQuantity, shownRatio } from './shown-quantity.ts';

type ShownAir = z.infer<typeof airSchema>;

/** The state of the air as an answer shows it. */
export function toAir(how: Presentation, air: Air) {
  const shown: Draft<ShownAir> = {
    temperature: shownQuantity(how, 'temperature', air.temperature),
    temperatureDeviation: shownQuantity(how, 'temperatureDifference', air.temperatureDeviation),
    pressure: shownQuantity(how, 'pressure', air.pressure),
    pressureAltitude: shownQuantity(how, 'altitude', air.pressureAltitude),
    density: shownQuantity(how, 'density', air.density),
    densityRatio: shownRatio(how, air.densityRatio),
    densityAltitude: shownQuantity(how, 'altitude', air.densityAltitude),
  };
  if (air.dewPoint !== undefined) shown.dewPoint = shownQuantity(how, 'temperature', air.dewPoint);
  if (air.relativeHumidity !== undefined) shown.relativeHumidity = shownQuantity(how, 'gradient', air.relativeHumidity);
  return shown;
}
