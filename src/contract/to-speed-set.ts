import type { SpeedSet } from '../planning/answer.ts';
import { type Presentation, shownQuantity, shownRatio } from './shown-quantity.ts';

/** One speed in its kinds as an answer shows it. */
export function toSpeedSet(how: Presentation, { cas, eas, tas, ias, stallRatio }: SpeedSet) {
  return {
    cas: shownQuantity(how, 'speed', cas),
    eas: shownQuantity(how, 'speed', eas),
    tas: shownQuantity(how, 'speed', tas),
    ...(ias === undefined ? {} : { ias: shownQuantity(how, 'speed', ias) }),
    stallRatio: shownRatio(how, stallRatio),
  };
}
