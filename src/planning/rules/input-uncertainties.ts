import type { Method } from '../answer.ts';
import type { Surface } from '../question.ts';

/**
 * How far the inputs of a question are usually off, as standard deviations; every figure is our choice within what is
 * published of each.
 *
 * @see references.Wmo306 for the coding of reports; references.Judgement
 */
export const inputUncertainties = {
  /** [K]: half a degree of coding, and the runway's own heat */
  temperature: 1.5,
  /** [Pa]: one hectopascal of coding */
  pressure: 100,
  /** steady component along the runway [m/s]: 3 kt, since a report is a mean over ten minutes at a mast */
  wind: (3 * 1852) / 3600,
  /** share of the mass: standard masses of people and bags */
  mass: 0.02,
  /** share of the thrust, root mean square about the rated figure: age 4 % low and 3 % about it, propeller 3 % */
  thrust: 0.058,
  /** share of each speed: stall speed and how it is flown */
  speed: 0.03,
  /** share of the air distance: technique of rotation and pull-up */
  technique: 0.15,
  /** [m]: where the wheels stand when the brakes are let go */
  startPoint: 15,
  /** on the approach, above the landing reference speed [m/s]: 5 kt */
  approachSpeed: (5 * 1852) / 3600,
  /** height over the threshold [m]: 15 ft */
  screenHeight: 15 * 0.3048,
} as const;

/** Model form: what the method itself may be off, as a share of the distance. @see references.Judgement */
export const modelForm: Readonly<Record<Method, number>> = {
  'flight-manual': 0.05,
  fitted: 0.05,
  stated: 0.15,
  geometry: 0.25,
};

/** Standard deviation of the drag of a loose contaminant, as a share of it: its depth is seldom known better. @see references.Judgement */
export const contaminantDragUncertainty = 0.3;

/** Standard deviation of the rolling friction coefficient: 0.005 paved, 0.02 firm ground, 0.05 soft. @see references.Judgement */
export function frictionUncertainty({ kind, state, firmness }: Surface): number {
  if (firmness === 'soft') return 0.05;
  if (kind === 'paved' || kind === 'ice') return 0.005;
  return kind === 'dirt' && state !== 'dry' ? 0.05 : 0.02;
}

/** Standard deviation of the braking friction coefficient, as a share of it: 0.15 on dry pavement, 0.25 elsewhere. @see references.Judgement */
export function brakingUncertainty({ kind, state }: Surface): number {
  return kind === 'paved' && state === 'dry' ? 0.15 : 0.25;
}
