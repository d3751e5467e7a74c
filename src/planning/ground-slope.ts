import { overallSlope, type SlopeProfile } from '../performance/slope-profile.ts';
import type { Assumption } from './answer.ts';
import { declaredDistances } from './declared-distances.ts';
import type { Runway } from './question.ts';
import { clearwayShare } from './rules/clearway-share.ts';

const over = { takeoff: 'tora', landing: 'lda' } as const;

/**
 * The one slope of a ground line where a rule or an estimate asks for one: of the straight line from the start point to the end of
 * TORA, or in a landing of LDA; where that is not declared, to the end of the profile.
 *
 * @param profile - from the start point on
 * @param runway - start and declared distances [m]
 * @returns uphill positive, dimensionless
 * @see references.EuAirOps305Amc2, whose factor is for a slope without saying between which points
 */
export function groundSlope(
  profile: SlopeProfile,
  runway: Pick<Runway, 'start' | 'declared'>,
  phase: 'takeoff' | 'landing',
): number {
  const length = declaredDistances(runway, clearwayShare).published[over[phase]];
  return length === undefined || length <= 0 ? overallSlope(profile) : overallSlope(profile, length);
}

/** What is said of a slope that was made from a profile. */
export function groundSlopeAssumed(
  { profile, slope, declared }: Pick<Runway, 'profile' | 'slope' | 'declared'>,
  phase: 'takeoff' | 'landing',
): readonly Assumption[] {
  if (profile === undefined) return [];
  const name = over[phase];
  const end = declared?.[name] === undefined ? 'the profile' : name.toUpperCase();
  return [
    {
      at: '/runway/slope/profile',
      value: { kind: 'gradient', value: slope },
      because: `the straight line from the start point to the end of ${end}, where a factor, a band or an estimate asks for one slope; distances follow the profile`,
      source: 'Judgement',
    },
  ];
}
