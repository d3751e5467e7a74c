import type { Check } from './answer.ts';
import type { PathStart } from './obstacle-path.ts';
import type { ObstacleDemand } from './rules/rule-set.ts';
import type { Reached } from './takeoff-runs.ts';

/**
 * Where the path past obstacles begins: at the end of the takeoff distance a rule set requires, or of the one computed in the
 * wind that it credits where it asks for no clearance.
 *
 * @returns undefined where there is no such distance
 */
export function pathStart(
  demand: ObstacleDemand | undefined,
  checks: readonly Check[],
  credited: Reached | undefined,
): PathStart | undefined {
  if (demand?.begins === 'required-distance') {
    const required = checks
      .filter(({ of }) => of === 'takeoffDistance')
      .find(({ code }, _, all) => code === 'takeoff-distance' || all.length === 1)?.required;
    return required === undefined ? undefined : { distance: required, because: demand.because };
  }
  return (
    credited && {
      distance: credited.takeoffDistance,
      because: 'the takeoff distance in the credited wind, without factors',
    }
  );
}
