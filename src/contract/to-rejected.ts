import type { LastCue, Rejected } from '../planning/engine-failure/rejected-takeoff.ts';
import { present } from './present.ts';
import type { RejectedOnWire } from './rejected.ts';
import { type Presentation, shownQuantity } from './shown-quantity.ts';
import { toAssumed } from './to-basis.ts';
import { toSpeedSet } from './to-speed-set.ts';

/** The rejected takeoff: where the cue may last come goes down, what a stop takes up. */
export function toRejected(how: Presentation, given: Rejected): RejectedOnWire {
  const length = (si: number, direction: 'up' | 'down') => shownQuantity(how, 'distance', si, direction);
  const cue = ({ speed, groundSpeed, distance, stopDistance, shortest, ...rest }: LastCue) =>
    present<RejectedOnWire['lossOfPower']>({
      outcome: rest.outcome,
      why: rest.why,
      speed: speed && toSpeedSet(how, speed),
      groundSpeed: groundSpeed === undefined ? undefined : shownQuantity(how, 'speed', groundSpeed),
      distance: distance === undefined ? undefined : length(distance, 'down'),
      stopDistance: stopDistance === undefined ? undefined : length(stopDistance, 'up'),
      shortest: shortest === undefined ? undefined : length(shortest, 'up'),
    });
  return present<RejectedOnWire>({
    within: given.within && { of: given.within.of, available: length(given.within.available, 'down') },
    reactionTime: shownQuantity(how, 'time', given.reactionTime),
    transitionTime: shownQuantity(how, 'time', given.transitionTime),
    lossOfPower: cue(given.lossOfPower),
    powerHolds: cue(given.powerHolds),
    expected: given.expected.map(({ distance, speed, groundSpeed }) => ({
      distance: length(distance, 'up'),
      speed: toSpeedSet(how, speed),
      groundSpeed: shownQuantity(how, 'speed', groundSpeed),
    })),
    assumed: toAssumed(how, given.assumed),
  });
}
