import { isRefused, type Refused } from './fault.ts';
import { type Found, found } from './found.ts';
import { takeoffByManual } from './manual/takeoff-by-manual.ts';
import { type PreparedTakeoff, prepareTakeoff } from './prepare-takeoff.ts';
import type { TakeoffQuestion } from './question.ts';
import { type NotReached, notReached, reached, type TakeoffRuns } from './takeoff-runs.ts';

/** The distances of a takeoff, from the flight manual where it has them, else from physics. */
export function foundTakeoff(
  question: TakeoffQuestion,
  prepared: PreparedTakeoff,
  physics: TakeoffRuns,
): Found<NotReached> {
  const { fullPowerRatio, rollingStartAllowance } = prepared.flown;
  return found({
    phase: 'takeoff',
    question,
    conditions: prepared.conditions,
    chosen: prepared.conditions.chosen,
    physics,
    partsOf: reached,
    notReachedOf: notReached,
    flownOtherwise: fullPowerRatio !== 1 || rollingStartAllowance !== 0,
    byManual: (reading, silences, needsReference) => {
      const asManual = asManualHasIt(question, prepared);
      return isRefused(asManual) ? undefined : takeoffByManual(prepared, asManual, reading, silences, needsReference);
    },
  });
}

/** The takeoff of the aeroplane that the manual is of, from standing at full power. */
function asManualHasIt(question: TakeoffQuestion, prepared: PreparedTakeoff): PreparedTakeoff | Refused {
  const { procedure, changes, ...rest } = question;
  if (procedure === undefined && changes?.flewAs === undefined) return prepared;
  return prepareTakeoff({ ...rest, aeroplane: changes?.flewAs ?? question.aeroplane });
}
