import type * as z from 'zod';
import type { takeoffRequest } from '../../contract/takeoff-request.ts';

/** The takeoff that the document shows: a two-seat trainer from a short grass field on a warm afternoon. */
export const exampleTakeoff: z.input<typeof takeoffRequest> = {
  reference: 'afternoon lesson',
  aeroplane: { id: 'pellibrin-trainer' },
  mass: { value: 720, unit: 'kg' },
  configuration: 'takeoff-12',
  runway: {
    designator: '07',
    direction: { value: 68, unit: 'deg' },
    directionReference: 'true',
    elevation: { value: 410, unit: 'ft' },
    slope: { value: 0.5, unit: 'percent' },
    surface: { kind: 'grass', state: 'dry', grass: 'short', firmness: 'firm' },
    start: 'threshold',
    declared: { tora: { value: 720, unit: 'm' } },
  },
  weather: {
    temperature: { value: 24, unit: 'degC' },
    dewPoint: { value: 13, unit: 'degC' },
    pressure: { qnh: { value: 1012, unit: 'hPa' } },
    wind: {
      from: { value: 90, unit: 'deg' },
      fromReference: 'true',
      speed: { value: 9, unit: 'kt' },
      gust: { value: 14, unit: 'kt' },
    },
  },
  ruleSet: 'eu-class-b',
};
