import type { LandingRun } from '../../performance/landing/landing-run.ts';
import type { BrakingFriction } from '../../physics/braking-friction.ts';
import type { BalkedLanding, LandingAnswer } from '../answer.ts';
import type { Stopped } from '../landing-runs.ts';
import type { LandingSpeeds } from '../landing-speeds.ts';
import type { LandingQuestion } from '../question.ts';
import type { AnswerContext } from './answer-context.ts';

/** What the cautions of a landing may look at. */
export interface LandingContext extends AnswerContext {
  readonly question: LandingQuestion;
  readonly speeds: LandingAnswer['speeds'];
  /** the landing reference speed without increment, and whether it was raised */
  readonly reference: LandingSpeeds['reference'];
  readonly raised: LandingSpeeds['raised'];
  readonly run: LandingRun;
  /** what came of the run as stated, where physics speaks of the surface and it stops */
  readonly stated: Stopped | undefined;
  /** what would come of it with some of it changed */
  readonly landedWith: (change: Partial<LandingRun>) => Stopped | undefined;
  /** the braking friction with the aeroplane's own anti-skid system */
  readonly brakingWithAntiSkid: () => Pick<LandingRun, 'braking' | 'stretches'> | undefined;
  /** on dry pavement, brakes as they are */
  readonly dryPavementBraking: BrakingFriction;
  readonly balkedLanding: BalkedLanding;
}
