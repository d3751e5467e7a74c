import type { Air } from '../planning/answer.ts';
import { type Presentation, shownQuantity, shownRatio } from './shown-quantity.ts';

/** The state of the air as an answer shows it. */
export function toAir(how: Presentation, air: Air) {
  return {
    temperature: shownQuantity(how, 'temperature', air.temperature),
    temperatureDeviation: shownQuantity(how, 'temperatureDifference', air.temperatureDeviation),
    pressure: shownQuantity(how, 'pressure', air.pressure),
    pressureAltitude: shownQuantity(how, 'altitude', air.pressureAltitude),
    density: shownQuantity(how, 'density', air.density),
    densityRatio: shownRatio(how, air.densityRatio),
    densityAltitude: shownQuantity(how, 'altitude', air.densityAltitude),
    ...(air.dewPoint === undefined ? {} : { dewPoint: shownQuantity(how, 'temperature', air.dewPoint) }),
    ...(air.relativeHumidity === undefined
      ? {}
      : { relativeHumidity: shownQuantity(how, 'gradient', air.relativeHumidity) }),
  };
}
