import type { Configuration } from '../performance/aeroplane.ts';
import type { LandingRun } from '../performance/landing/landing-run.ts';
import type { TakeoffRun } from '../performance/takeoff/takeoff-run.ts';
import type { ConfigurationFigures } from './configuration-figures.ts';
import type { StandingDefault } from './rules/standing-default.ts';

/** The lift and the drag of a configuration on its wheels. */
export interface GroundFigures {
  readonly groundLiftCoefficient: number;
  readonly groundDragIncrement: number;
}

/** Lift and drag on the wheels as the configuration states them, or the defaults, said. */
export function groundFigures(
  figures: ConfigurationFigures<TakeoffRun> | ConfigurationFigures<LandingRun>,
  { groundLiftCoefficient, groundDragIncrementCoefficient }: Configuration,
  lift: StandingDefault,
  drag: StandingDefault,
): GroundFigures {
  return {
    groundLiftCoefficient: figures.figure({
      member: 'groundLiftCoefficient',
      name: 'the lift coefficient of the roll',
      stated: groundLiftCoefficient,
      standing: lift,
      runMember: 'groundLiftCoefficient',
    }),
    groundDragIncrement: figures.figure({
      member: 'groundDragIncrementCoefficient',
      name: 'the drag increment on the ground',
      stated: groundDragIncrementCoefficient,
      standing: drag,
      runMember: 'groundDragCoefficient',
      increment: true,
    }),
  };
}
