import type { Method } from '../answer.ts';
import { isPhysicsByName } from '../method.ts';
import { type AnswerContext, measureDown, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** Distances from stated figures and physics, not from the flight manual. */
export const methodIsEstimate: CautionTest<AnswerContext> = {
  code: 'method-is-estimate',
  severity: 'note',
  meaning:
    "The distances are computed from the aeroplane's stated figures by physics, not read from its flight manual.",
  source: 'SpaEfbAmc5',
  test: (context) => {
    const distance = context.wholeDistance;
    const { flightManual } = context.found;
    const isCarried = flightManual !== undefined && !isPhysicsByName(context.question);
    if (distance === undefined || distance.method === 'flight-manual' || isCarried) return undefined;
    return {
      message: `The distances are computed ${origin(context.phase, distance.method)}, not read from the flight manual. The ${context.phase} distance of ${textIn(context, 'distance', distance.value)} has a 90 % band from ${measureDown(context, distance.low)} to ${textIn(context, 'distance', distance.high)}.`,
      at: '/aeroplane',
    };
  },
};

function origin(phase: 'takeoff' | 'landing', method: Method): string {
  if (method === 'fitted') return 'by physics fitted to published or measured distances';
  return phase === 'takeoff' ? 'from stated thrust, lift and drag' : 'from stated lift, drag and brakes';
}
