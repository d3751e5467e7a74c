import type { CautionTest } from './caution-test.ts';
import { measureDown, type TakeoffContext, textIn } from './takeoff-context.ts';

/** Distances from stated figures and physics, not from the flight manual. */
export const methodIsEstimate: CautionTest<TakeoffContext> = {
  code: 'method-is-estimate',
  severity: 'caution',
  meaning:
    "The distances are computed from the aeroplane's stated figures by physics, not read from its flight manual.",
  source: 'SpaEfbAmc5',
  test: (context) => {
    const distance = context.distances?.takeoffDistance;
    if (distance === undefined || distance.method === 'flight-manual') return undefined;
    return {
      message: `The distances are computed from stated thrust, lift and drag, not read from the flight manual. The takeoff distance of ${textIn(context, 'distance', distance.value)} has a 90 % band from ${measureDown(context, distance.low)} to ${textIn(context, 'distance', distance.high)}.`,
      at: '/aeroplane',
    };
  },
};
