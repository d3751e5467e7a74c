import type { BalancedField } from '../../performance/engine-failure/engine-failure-run.ts';
import type { Question } from '../question.ts';
import { measureText, percentText } from '../sentences/measure-text.ts';
import { boundText } from './decision-fault.ts';

/** Why a stop and a continued takeoff cannot be compared, in words. */
export function fieldWhy(field: BalancedField, units: Question['units']): string {
  const speed = (si: number) => `${measureText(units, 'speed', si)} true airspeed`;
  switch (field.outcome) {
    case 'single-engine-cannot-continue':
      return field.because === 'climb'
        ? `with one engine out the aeroplane does not climb to the screen: the least gradient is ${percentText(field.least, 2)}`
        : `with one engine out the aeroplane does not reach lift-off: the least acceleration is ${percentText(field.least, 2)} of gravity`;
    case 'no-decision-speed': {
      const { lowest, highest } = field.bounds;
      return `the lowest decision speed, ${speed(lowest.speed)} by ${boundText(lowest)}, is above the highest, ${speed(highest.speed)} by ${boundText(highest)}`;
    }
    case 'never-reaches-decision-speed':
      return `with all engines the aeroplane does not get beyond ${speed(field.atAirspeed)}`;
    case 'never-stops':
      return `the brakes do not stop the aeroplane below ${measureText(units, 'speed', field.atGroundSpeed)} over the ground`;
    case 'ground-speed-not-positive':
      return `the headwind of ${measureText(units, 'speed', field.headwind)} leaves no speed over the ground`;
    case 'outside-stated-data':
      return `thrust is not known at ${speed(field.airspeed)}; its data end at ${speed(field.bound)}`;
    default:
      return 'the distance is not computed at this decision speed';
  }
}
