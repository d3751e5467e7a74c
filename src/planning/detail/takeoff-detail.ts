import { takeoffTrajectory } from '../../performance/takeoff/takeoff-trajectory.ts';
import type { TakeoffAnswer } from '../answer.ts';
import { rejectedTakeoff } from '../engine-failure/rejected-takeoff.ts';
import { isRefused } from '../fault.ts';
import { sharesOf } from '../manual/shares.ts';
import { askedAsFitted } from '../method.ts';
import { planTakeoff } from '../plan-takeoff.ts';
import { type PreparedTakeoff, prepareTakeoff } from '../prepare-takeoff.ts';
import type { TakeoffQuestion } from '../question.ts';
import { reached, scaledTakeoff, takeoffOf } from '../takeoff-runs.ts';
import { takeoffWorking } from '../working/takeoff-working.ts';
import type { Changes, Detail, DetailName } from './detail.ts';
import { evenTrajectory, trajectorySteps } from './even-trajectory.ts';
import { type Amount, sharedInputs } from './main-inputs.ts';
import { type Beside, sensitivities, sensitivity } from './sensitivities.ts';

const inputs = sharedInputs<TakeoffQuestion>();

/** A coefficient stated in the question is none that a flight manual speaks of: a little more of it is asked of the run alone. */
const rollingFriction: Amount<TakeoffQuestion> = {
  of: 'rolling-friction',
  at: () => '/runway/surface/rollingFrictionCoefficient',
  per: () => 0.01,
  step: 1e-5,
};

/** An answer to a takeoff with the parts that were asked for. */
export function takeoffDetail(given: TakeoffQuestion, answer: TakeoffAnswer, asked: readonly DetailName[]): Detail {
  const question = askedAsFitted(given, 'takeoff');
  const prepared = prepareTakeoff(question);
  if (isRefused(prepared)) return {};
  const { run, flown } = prepared;
  const base = changesOf(answer);
  const working = asked.includes('working') ? takeoffWorking(question, prepared, answer) : undefined;
  const points =
    base !== undefined && asked.includes('trajectory')
      ? takeoffTrajectory(run, flown.rollingStartAllowance, trajectorySteps)
      : undefined;
  const moved =
    base !== undefined && asked.includes('sensitivities')
      ? [
          ...sensitivities(given, inputs, base, distancesOf),
          sensitivity(given, rollingFriction, base, withRolling(prepared, base)),
        ]
      : undefined;
  return {
    ...(working === undefined ? {} : { working }),
    ...(points === undefined || answer.distances === undefined
      ? {}
      : { trajectory: evenTrajectory(points, answer.distances.takeoffDistance.value, answer.distances) }),
    ...(moved === undefined ? {} : { sensitivities: moved }),
    ...(asked.includes('rejected') ? { rejected: rejectedTakeoff(question, prepared) } : {}),
  };
}

function distancesOf(question: TakeoffQuestion): Changes | undefined {
  const answer = planTakeoff(question);
  return isRefused(answer) ? undefined : changesOf(answer);
}

function changesOf({ distances }: TakeoffAnswer): Changes | undefined {
  if (distances === undefined) return undefined;
  const { groundRoll, airDistance, takeoffDistance } = distances;
  return {
    groundRoll: groundRoll.value,
    airDistance: airDistance.value,
    wholeDistance: takeoffDistance.value,
  };
}

/** The takeoff as stated with so much more rolling friction. */
function withRolling({ run, runConditions, flown }: PreparedTakeoff, base: Changes): Beside {
  if (runConditions.actualFriction === undefined) return () => undefined;
  const takenOff = (by: number) =>
    reached(takeoffOf({ ...run, rollingFriction: run.rollingFriction + by }, flown.rollingStartAllowance));
  const shares = sharesOf(base, takenOff(0));
  return (by) => {
    const found = run.rollingFriction + by < 0 ? undefined : takenOff(by);
    if (found === undefined) return undefined;
    const { groundRoll, airDistance, takeoffDistance: wholeDistance } = scaledTakeoff(found, shares);
    return { groundRoll, airDistance, wholeDistance };
  };
}
