import type { z } from 'zod';
import type { SpeedSet } from '../planning/answer.ts';
import type { speedSet } from './answer-parts.ts';
import type { Draft } from './present.ts';
import { type Presentation, shownQuantity, shownRatio } from './shown-quantity.ts';

type ShownSpeedSet = z.infer<typeof speedSet>;

/** One speed in its kinds as an answer shows it. */
export function toSpeedSet(how: Presentation, { cas, eas, tas, ias, stallRatio }: SpeedSet) {
  const speeds = {
    cas: shownQuantity(how, 'speed', cas),
    eas: shownQuantity(how, 'speed', eas),
    tas: shownQuantity(how, 'speed', tas),
  } as Draft<ShownSpeedSet>;
  if (ias !== undefined) speeds.ias = shownQuantity(how, 'speed', ias);
  speeds.stallRatio = shownRatio(how, stallRatio);
  return speeds;
}
