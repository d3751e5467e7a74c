import type { Check } from './answer.ts';
import type { PathStart } from './obstacle-path.ts';
import type { ObstacleDemand } from './rules/rule-set.ts';

/**
 * Where the path past obstacles begins: at the end of the takeoff distance a rule set requires, or of the one computed in the
 * wind that it credits where it asks for no clearance.
 *
 * @param credited - the takeoff distance in the credited wind, without factors [m]; undefined where there is none
 * @returns undefined where there is no such distance
 */
export function pathStart(
  demand: ObstacleDemand | undefined,
  checks: readonly Check[],
  credited: number | undefined,
): PathStart | undefined {
  if (demand?.begins === 'required-distance') {
    const required = checks
      .filter(({ of }) => of === 'takeoffDistance')
      .find(({ code }, _, all) => code === 'takeoff-distance' || all.length === 1)?.required;
    return required === undefined ? undefined : { distance: required, because: demand.because };
  }
  return credited === undefined
    ? undefined
    : { distance: credited, because: 'the takeoff distance in the credited wind, without factors' };
}
