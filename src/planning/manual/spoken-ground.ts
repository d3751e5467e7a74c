import { filmAsWet, type RunwaySurface } from '../../physics/runway-surface.ts';
import type { Surface } from '../question.ts';
import type { RunwayCondition } from '../runway-condition.ts';

/** What every manual's figures are for unless it says otherwise. */
export const dryPavement: RunwaySurface = { kind: 'paved', state: 'dry' };

/** The least condition code that is no worse than a wet runway. @see references.Rcam */
const goodToWet = 5;

/**
 * The surface that a flight manual may be asked about; undefined for one that no manual speaks of in words: friction stated as a
 * number, a contaminant or a condition code worse than wet, a surface on which nothing is computed.
 */
export function spokenGround(surface: Surface, condition: RunwayCondition): RunwaySurface | undefined {
  const isStated = surface.rollingFrictionCoefficient !== undefined || surface.brakingFrictionCoefficient !== undefined;
  const isPoor = condition.isSlippery || (condition.given !== undefined && Math.min(...condition.given) < goodToWet);
  return isStated || isPoor || condition.refusal !== undefined ? undefined : filmAsWet(surface);
}
