import type * as z from 'zod';
import type { landingRequest } from '../../contract/landing-request.ts';

/** The landing that the document shows: a four-seat tourer back on a wet paved runway with a light headwind. */
export const exampleLanding: z.input<typeof landingRequest> = {
  reference: 'evening return',
  aeroplane: { id: 'vandrelle-tourer' },
  mass: { value: 1150, unit: 'kg' },
  configuration: 'landing-36',
  runway: {
    designator: '25',
    direction: { value: 248, unit: 'deg' },
    directionReference: 'true',
    elevation: { value: 620, unit: 'ft' },
    slope: { value: -0.4, unit: 'percent' },
    surface: { kind: 'paved', state: 'wet' },
    start: 'threshold',
    declared: { lda: { value: 950, unit: 'm' } },
  },
  weather: {
    temperature: { value: 13, unit: 'degC' },
    dewPoint: { value: 12, unit: 'degC' },
    pressure: { qnh: { value: 1004, unit: 'hPa' } },
    wind: {
      from: { value: 270, unit: 'deg' },
      fromReference: 'true',
      speed: { value: 8, unit: 'kt' },
    },
  },
  procedure: { approachSpeedIncrement: { value: 3, unit: 'kt' } },
  ruleSet: 'eu-class-b',
};
