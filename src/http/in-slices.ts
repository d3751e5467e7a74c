import { setImmediate as otherWork } from 'node:timers/promises';
import type { Work } from '../numerics/work.ts';

/** Time for which work holds the thread at once [ms]; its own steps are shorter. */
const slice = 8;

/**
 * Does work in slices with other requests between them.
 *
 * @param isWanted - asked after each slice: work that nobody waits for any more ends
 * @returns the result; undefined where it was not wanted to the end
 */
export async function inSlices<Result>(work: Work<Result>, isWanted: () => boolean): Promise<Result | undefined> {
  for (;;) {
    const until = performance.now() + slice;
    while (performance.now() < until) {
      const step = work.next();
      if (step.done === true) return step.value;
    }
    await otherWork();
    if (!isWanted()) return undefined;
  }
}
