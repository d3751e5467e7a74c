import { isRefused, type Refused } from './fault.ts';
import { type Found, found } from './found.ts';
import { type LandingRuns, type NotStopped, notStopped, stopped } from './landing-runs.ts';
import { landingByManual } from './manual/landing-by-manual.ts';
import { type PreparedLanding, prepareLanding } from './prepare-landing.ts';
import type { LandingQuestion } from './question.ts';

/** The distances of a landing, from the flight manual where it has them, else from physics. */
export function foundLanding(
  question: LandingQuestion,
  prepared: PreparedLanding,
  physics: LandingRuns,
): Found<NotStopped> {
  return found({
    phase: 'landing',
    question,
    conditions: prepared.conditions,
    chosen: prepared.conditions.chosen,
    physics,
    partsOf: stopped,
    notReachedOf: notStopped,
    flownOtherwise: isFlownOtherwise(question),
    byManual: (reading, silences, needsReference) => {
      const asManual = asManualHasIt(question, prepared);
      return isRefused(asManual) ? undefined : landingByManual(prepared, asManual, reading, silences, needsReference);
    },
  });
}

function isFlownOtherwise({ procedure }: LandingQuestion): boolean {
  if (procedure === undefined) return false;
  const { approachSpeedIncrement, approachAngle, reverse, antiSkid, reactionTime } = procedure;
  return (
    (approachSpeedIncrement ?? 0) !== 0 ||
    approachAngle !== undefined ||
    reverse === true ||
    antiSkid === 'inoperative' ||
    reactionTime !== undefined
  );
}

/** The landing of the aeroplane that the manual is of, without a procedure of its own. */
function asManualHasIt(question: LandingQuestion, prepared: PreparedLanding): PreparedLanding | Refused {
  const { procedure, changes, ...rest } = question;
  if (procedure === undefined && changes?.flewAs === undefined) return prepared;
  return prepareLanding({ ...rest, aeroplane: changes?.flewAs ?? question.aeroplane });
}
