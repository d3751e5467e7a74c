import { type RunwayConditionCode, runwayConditionCode } from '../physics/runway-condition-code.ts';
import type { Surface } from './question.ts';

/**
 * The runway condition code that counts of a surface: the worst that is reported for any third, and none better than what lies on
 * the runway allows.
 *
 * @param surface - with what was reported of it
 * @param temperature - of the air [K]
 * @returns undefined where nothing was reported and the matrix does not speak of the surface
 * @see references.Rcam
 */
export function conditionCode(surface: Surface, temperature: number): RunwayConditionCode | undefined {
  const reported = surface.runwayConditionCode;
  const found = runwayConditionCode(surface, temperature);
  const codes = [...(reported === undefined ? [] : [reported].flat()), ...(found === 'no-data' ? [] : [found.code])];
  return codes.length === 0 ? undefined : (Math.min(...codes) as RunwayConditionCode);
}
