import type { DecisionBound, DecisionBounds } from '../../performance/engine-failure/engine-failure-run.ts';
import type { SpeedSet } from '../answer.ts';
import type { Fault } from '../fault.ts';
import type { TakeoffQuestion } from '../question.ts';
import { measureText } from '../sentences/measure-text.ts';

/** Of a bound as far as rounding goes. */
const alike = 1e-6;

/** A decision speed asked of a single, which has none to go on with. */
export function decisionOfSingle({ aeroplane, decisionSpeed, units }: TakeoffQuestion): Fault | undefined {
  if (decisionSpeed === undefined || aeroplane.engines > 1) return undefined;
  return {
    pointer: '/decisionSpeed',
    code: 'contradiction',
    message: `${aeroplane.name} has one engine: after a failure there is no takeoff to go on with, so no speed decides between going on and stopping.`,
    received: measureText(units, 'speed', decisionSpeed),
    hint: 'Leave decisionSpeed away; detail "rejected" tells from where it still stops.',
  };
}

/**
 * A decision speed asked for outside what the aeroplane allows.
 *
 * @param askedFor - in its kinds
 * @param bounds - true [m/s]
 */
export function decisionFault(
  { units }: Pick<TakeoffQuestion, 'units'>,
  askedFor: SpeedSet,
  { lowest, highest }: DecisionBounds,
): Fault | undefined {
  const text = (tas: number) => measureText(units, 'speed', (tas * askedFor.cas) / askedFor.tas);
  const allowed = `${text(lowest.speed)} to ${text(highest.speed)} calibrated`;
  const received = measureText(units, 'speed', askedFor.cas);
  const fault = (message: string): Fault => ({
    pointer: '/decisionSpeed',
    code: 'contradiction',
    message,
    received,
    allowed,
  });
  if (askedFor.tas < lowest.speed - alike) {
    return fault(
      `A decision speed of ${received} is below ${boundText(lowest)}, ${text(lowest.speed)} calibrated here.`,
    );
  }
  if (askedFor.tas > highest.speed + alike) {
    return fault(
      `A decision speed of ${received} is above ${boundText(highest)}, ${text(highest.speed)} calibrated here.`,
    );
  }
  return undefined;
}

const texts: Readonly<Record<DecisionBound['because'], string>> = {
  'minimum-control-speed-on-the-ground': 'the minimum control speed on the ground',
  'failure-at-standstill': 'that of an engine failure at standstill',
  'rotation-speed': 'the rotation speed',
  'brake-energy': 'the speed from which the brakes still take the heat',
  'tyre-speed': 'the greatest speed of the tyres',
  'takeoff-distance-available': 'the speed from which the continued takeoff fits',
  'accelerate-stop-distance-available': 'the speed up to which the stop fits',
  'asked-for': 'the speed asked for',
};

/** What sets a bound, as a sentence names it. */
export function boundText({ because }: Pick<DecisionBound, 'because'>): string {
  return texts[because];
}
