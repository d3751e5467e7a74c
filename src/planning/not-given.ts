import { aeroplanePointer } from './aeroplane-pointer.ts';
import type { Question } from './question.ts';

/** Pointers of optional members that the question leaves out and an answer would use, in the order of the request. */
export function notGiven({ aeroplane, aeroplaneAt, runway, weather }: Question): readonly string[] {
  const pointers: string[] = [];
  const missing = (value: unknown, pointer: string) => {
    if (value === undefined) pointers.push(pointer);
  };
  const inAeroplane = (member: string) => aeroplanePointer(aeroplaneAt, member);
  const { limitations } = aeroplane;
  missing(aeroplane.airspeedCalibration, inAeroplane('/airspeedCalibration'));
  missing(
    limitations?.demonstratedCrosswind ?? limitations?.crosswind,
    inAeroplane('/limitations/demonstratedCrosswind'),
  );
  missing(limitations?.tailwind, inAeroplane('/limitations/tailwind'));
  missing(limitations?.maximumTemperature, inAeroplane('/limitations/maximumTemperature'));
  missing(limitations?.maximumPressureAltitude, inAeroplane('/limitations/maximumPressureAltitude'));
  missing(runway.lineUp, '/runway/lineUp');
  missing(runway.declared?.tora, '/runway/declared/tora');
  missing(runway.declared?.toda, '/runway/declared/toda');
  missing(runway.declared?.asda, '/runway/declared/asda');
  pointers.push('/runway/obstacles');
  missing(weather.dewPoint, '/weather/dewPoint');
  if (weather.wind.kind === 'components') missing(weather.wind.crosswind, '/weather/wind/crosswind');
  return pointers;
}
