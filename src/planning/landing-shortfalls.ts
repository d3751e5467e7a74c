import type { Shortfall } from './answer.ts';
import type { NotStopped } from './landing-runs.ts';
import { headwindShortfall } from './shortfalls.ts';

/** What kept a landing from a stop, as a number and the bound it missed. */
export function landingShortfalls(result: NotStopped): readonly Shortfall[] {
  if (result.outcome === 'ground-speed-not-positive') {
    return [headwindShortfall(result.headwind, result.touchdownSpeed)];
  }
  return [
    {
      at: '/runway/surface',
      axis: 'decelerationRatio',
      given: result.leastDecelerationRatio,
      bound: 0,
      side: 'below',
    },
  ];
}
