import type { Assumption } from '../planning/answer.ts';
import { defaultRounding, defaultUnits } from './question-frame.ts';
import type { Presentation } from './shown-quantity.ts';

interface Asked {
  readonly units?: Presentation['units'];
  readonly rounding?: Presentation['rounding'];
}

/** How the answer is to be written, with what the question does not say filled in. */
export function presentationOf({ units = defaultUnits, rounding = defaultRounding }: Asked): Presentation {
  return { units, rounding };
}

/** What was filled in of how the answer is written. */
export function assumedPresentation({ units, rounding }: Asked): Assumption[] {
  const assumed: Assumption[] = [];
  if (units === undefined) {
    assumed.push({ at: '/units', value: defaultUnits, because: 'no units are asked for' });
  }
  if (rounding === undefined) {
    assumed.push({ at: '/rounding', value: defaultRounding, because: 'no rounding is asked for' });
  }
  return assumed;
}
