import { aeroplanePointer } from './aeroplane-pointer.ts';
import { countingDistances } from './declared-distances.ts';
import type { Question } from './question.ts';

/** Pointers of optional members that the question leaves out and an answer would use, in the order of the request. */
export function notGiven(
  { aeroplane, aeroplaneAt, runway, weather }: Question,
  phase: 'takeoff' | 'landing',
): readonly string[] {
  const pointers: string[] = [];
  const missing = (value: unknown, pointer: string) => {
    if (value === undefined) pointers.push(pointer);
  };
  const inAeroplane = (member: string) => aeroplanePointer(aeroplaneAt, member);
  const { limitations } = aeroplane;
  if (phase === 'landing') missing(aeroplane.masses.maximumLanding, inAeroplane('/masses/maximumLanding'));
  if (phase === 'landing' && aeroplane.engines > 1) missing(aeroplane.engineOut?.vmc, inAeroplane('/engineOut/vmc'));
  missing(aeroplane.airspeedCalibration, inAeroplane('/airspeedCalibration'));
  missing(
    limitations?.demonstratedCrosswind ?? limitations?.crosswind,
    inAeroplane('/limitations/demonstratedCrosswind'),
  );
  missing(limitations?.tailwind, inAeroplane('/limitations/tailwind'));
  missing(limitations?.maximumTemperature, inAeroplane('/limitations/maximumTemperature'));
  missing(limitations?.maximumPressureAltitude, inAeroplane('/limitations/maximumPressureAltitude'));
  if (phase === 'takeoff') missing(runway.lineUp, '/runway/lineUp');
  for (const name of countingDistances[phase]) missing(runway.declared?.[name], `/runway/declared/${name}`);
  if (phase === 'takeoff') missing(runway.obstacles, '/runway/obstacles');
  missing(weather.dewPoint, '/weather/dewPoint');
  if (weather.wind.kind === 'components') missing(weather.wind.crosswind, '/weather/wind/crosswind');
  return pointers;
}
