import type { Factor } from '../answer.ts';
import type { Asked, PhaseRules, SlopeRule } from './rule-set.ts';

/**
 * The factors of the surface and the slope on the reference distance.
 *
 * @returns undefined where the rules do not speak of the surface
 */
export function runwayFactors({ surfaces, slope }: PhaseRules, asked: Asked): readonly Factor[] | undefined {
  const found = surfaces.find(({ holds }) => holds(asked));
  return found && [...found.factors, ...(slope === undefined ? [] : slopeFactors(slope, asked.slope))];
}

/**
 * The factors of what a flight manual does not speak of, on its figure: its own notes go before those of the rules.
 *
 * @param silent - of the surface and the slope, those that it does not speak of
 * @returns undefined where neither speaks of the surface
 * @see references.EuAirOps305, AMC1: the factors are for where the manual holds none
 */
export function factorsBesideManual(
  { surfaces, slope }: PhaseRules,
  asked: Asked,
  silent: readonly string[],
): readonly Factor[] | undefined {
  const found = silent.includes('surface') ? surfaces.find(({ holds }) => holds(asked))?.factors : [];
  return (
    found && [...found, ...(slope !== undefined && silent.includes('slope') ? slopeFactors(slope, asked.slope) : [])]
  );
}

/** The factor of this slope, none the favourable way: of x steps 1 + (F - 1) x, or the larger of that and F^x. */
function slopeFactors({ unfavourable, factor, step, growth }: SlopeRule, slope: number): readonly Factor[] {
  const steps = (unfavourable === 'uphill' ? slope : -slope) / step;
  if (steps <= 0) return [];
  const linear = 1 + (factor.value - 1) * steps;
  const value = growth === 'linear' ? linear : Math.max(linear, factor.value ** steps);
  return [{ ...factor, value }];
}
