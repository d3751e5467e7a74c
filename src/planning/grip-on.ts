import type { BrakingFriction } from '../physics/braking-friction.ts';
import { type CodeBrakes, codeBraking } from '../physics/code-braking.ts';
import { poorerBraking } from '../physics/poorer-braking.ts';
import type { RunwayConditionCode } from '../physics/runway-condition-code.ts';

/**
 * The poorer of what a surface and what its code give; either alone where the other has no data.
 *
 * @param found - of the surface
 * @param brakes - of the aeroplane
 * @returns before the share of the weight on the braked wheels
 * @see references.HouseContaminant
 */
export function gripOn(
  found: BrakingFriction | 'no-data',
  code: RunwayConditionCode | undefined,
  brakes: CodeBrakes,
): BrakingFriction | 'no-data' {
  if (code === undefined || code === 6) return found;
  const byCode = codeBraking(code, brakes);
  if (found === 'no-data' || byCode === 'no-data') return byCode;
  return poorerBraking(found, byCode);
}
