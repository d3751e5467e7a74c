import type { CautionTest } from './caution-test.ts';
import type { TakeoffContext } from './takeoff-context.ts';

/** Every caution a takeoff can raise, in the order in which it is shown. */
export const takeoffCautions: readonly CautionTest<TakeoffContext>[] = [];
