import { overallSlope, type SlopeProfile } from './slope-profile.ts';

/**
 * Height of the ground line above the start point [m].
 *
 * h = slope x, or along a profile the sum of its stretches up to x.
 *
 * @param ground - slope, uphill positive, and the profile where there is one
 * @param distance - x from the start point in the direction of movement [m], at least 0
 * @returns [m], above the start point positive; beyond a profile its last slope holds
 */
export function groundRise(
  { slope, profile }: { readonly slope: number; readonly profile?: SlopeProfile | undefined },
  distance: number,
): number {
  if (profile === undefined) return slope * distance;
  return distance > 0 ? overallSlope(profile, distance) * distance : 0;
}
