import { takeoffTrajectory } from '../../performance/takeoff/takeoff-trajectory.ts';
import type { TakeoffAnswer } from '../answer.ts';
import { isRefused } from '../fault.ts';
import { askedAsFitted } from '../method.ts';
import { planTakeoff } from '../plan-takeoff.ts';
import { prepareTakeoff } from '../prepare-takeoff.ts';
import type { TakeoffQuestion } from '../question.ts';
import { resolveFriction } from '../resolve-friction.ts';
import { takeoffWorking } from '../working/takeoff-working.ts';
import type { Changes, Detail, DetailName } from './detail.ts';
import { evenTrajectory, trajectorySteps } from './even-trajectory.ts';
import { type MainInput, sharedInputs } from './main-inputs.ts';
import { sensitivities } from './sensitivities.ts';

/** What the distances of a takeoff hang on beside what they share with those of a landing. */
const inputs: readonly MainInput<TakeoffQuestion>[] = [
  ...sharedInputs<TakeoffQuestion>(),
  {
    of: 'rolling-friction',
    at: () => '/runway/surface/rollingFrictionCoefficient',
    per: () => 0.01,
    step: 1e-5,
    moved: withFriction,
  },
];

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
    base !== undefined && asked.includes('sensitivities') ? sensitivities(given, inputs, base, distancesOf) : undefined;
  return {
    ...(working === undefined ? {} : { working }),
    ...(points === undefined || answer.distances === undefined
      ? {}
      : { trajectory: evenTrajectory(points, answer.distances.takeoffDistance.value, answer.distances) }),
    ...(moved === undefined ? {} : { sensitivities: moved }),
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

function withFriction(question: TakeoffQuestion, by: number): TakeoffQuestion | undefined {
  const { surface } = question.runway;
  const { actual } = resolveFriction(question, surface);
  if (actual === undefined || actual + by < 0) return undefined;
  const moved = { ...surface, rollingFrictionCoefficient: actual + by };
  return { ...question, runway: { ...question.runway, surface: moved } };
}
