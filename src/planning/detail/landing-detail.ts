import { landing } from '../../performance/landing/landing.ts';
import { landingTrajectory } from '../../performance/landing/landing-trajectory.ts';
import type { BrakingFriction } from '../../physics/braking-friction.ts';
import type { LandingAnswer } from '../answer.ts';
import { isRefused } from '../fault.ts';
import { scaledLanding, stopped } from '../landing-runs.ts';
import { sharesOf } from '../manual/shares.ts';
import { askedAsFitted } from '../method.ts';
import { planLanding } from '../plan-landing.ts';
import { type PreparedLanding, prepareLanding } from '../prepare-landing.ts';
import type { LandingQuestion } from '../question.ts';
import { landingWorking } from '../working/landing-working.ts';
import type { Changes, Detail, DetailName } from './detail.ts';
import { evenTrajectory, trajectorySteps } from './even-trajectory.ts';
import { type Amount, sharedInputs } from './main-inputs.ts';
import { type Beside, sensitivities, sensitivity } from './sensitivities.ts';

const inputs = sharedInputs<LandingQuestion>();

/** Friction may change with speed: a little more of it is a little more at every speed. */
const brakingFriction: Amount<LandingQuestion> = {
  of: 'braking-friction',
  at: () => '/runway/surface/brakingFrictionCoefficient',
  per: () => 0.01,
  step: 1e-5,
};

/** The parts of an answer to a landing that were asked for beyond it. */
export function landingDetail(given: LandingQuestion, answer: LandingAnswer, asked: readonly DetailName[]): Detail {
  const question = askedAsFitted(given, 'landing');
  const prepared = prepareLanding(question);
  if (isRefused(prepared)) return {};
  const base = changesOf(answer);
  const { distances } = answer;
  const working = asked.includes('working') ? landingWorking(question, prepared, answer) : undefined;
  const points =
    distances !== undefined && asked.includes('trajectory')
      ? landingTrajectory(prepared.run, trajectorySteps)
      : undefined;
  return {
    ...(working === undefined ? {} : { working }),
    ...(points === undefined || distances === undefined
      ? {}
      : { trajectory: evenTrajectory(points, distances.landingDistance.value, distances) }),
    ...(base === undefined || !asked.includes('sensitivities')
      ? {}
      : {
          sensitivities: [
            ...sensitivities(given, inputs, base, distancesOf),
            sensitivity(question, brakingFriction, base, withBraking(prepared, base)),
          ],
        }),
  };
}

function distancesOf(question: LandingQuestion): Changes | undefined {
  const answer = planLanding(question);
  return isRefused(answer) ? undefined : changesOf(answer);
}

function changesOf({ distances }: LandingAnswer): Changes | undefined {
  if (distances === undefined) return undefined;
  const { groundRoll, airDistance, landingDistance } = distances;
  return { groundRoll: groundRoll.value, airDistance: airDistance.value, wholeDistance: landingDistance.value };
}

/** The landing as stated with so much more friction under the brakes. */
function withBraking({ run }: PreparedLanding, base: Changes): Beside {
  const shares = sharesOf(base, stopped(landing(run)));
  return (by) => {
    const more = (braking: BrakingFriction): BrakingFriction => ({
      ...braking,
      at: (groundSpeed) => braking.at(groundSpeed) + by,
    });
    const stretches = run.stretches?.map((stretch) => ({ ...stretch, braking: more(stretch.braking) }));
    const found = stopped(landing({ ...run, braking: more(run.braking), stretches }));
    if (found === undefined) return undefined;
    const { groundRoll, airDistance, landingDistance: wholeDistance } = scaledLanding(found, shares);
    return { groundRoll, airDistance, wholeDistance };
  };
}
