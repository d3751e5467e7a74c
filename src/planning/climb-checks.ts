import type { Check } from './answer.ts';
import type { ClimbDemand, RuledAeroplane } from './rules/rule-set.ts';

/** A climb that was computed, or why it was not. */
export type Climbed =
  | {
      /** height over distance in still air */
      readonly gradient: number;
      /** [m/s] */
      readonly rate: number;
      /** the aeroplane climbs at least so well, for this reason: less than what is asked for shows nothing */
      readonly atLeastBecause?: string;
    }
  | { readonly why: string };

/**
 * The climbs a rule set asks of this aeroplane, each as a check of a gradient.
 *
 * One that is not computed stands as not assessed, so that nothing a rule asks for is passed over in silence.
 *
 * @param climbOf - the climb that is asked for, or why it is not computed
 */
export function climbChecks(
  demands: readonly ClimbDemand[] | undefined,
  aeroplane: RuledAeroplane,
  climbOf: (demand: ClimbDemand) => Climbed,
): readonly Check[] {
  return (demands ?? [])
    .filter(({ appliesTo }) => appliesTo(aeroplane))
    .map((demand) => {
      const { code, source, gradient: required } = demand;
      const shared = { code, of: 'climbGradient', factors: [], unit: 'gradient' as const, required, source };
      const climbed = climbOf(demand);
      if ('why' in climbed) return { ...shared, result: 'not-assessed', why: climbed.why };
      const { gradient, atLeastBecause } = climbed;
      const margin = gradient - required;
      const passes = demand.positive === true ? margin > 0 : margin >= 0;
      if (!passes && atLeastBecause !== undefined) {
        return { ...shared, available: gradient, result: 'not-assessed', why: atLeastBecause };
      }
      const compared = { ...shared, available: gradient, margin, result: passes ? 'passes' : 'fails' } as const;
      return required === 0 ? compared : { ...compared, marginRatio: margin / required };
    });
}

/** A climb with all engines, where thrust is known at its airspeed. */
export function climbedWithAll(climb: { readonly gradient: number; readonly rate: number } | undefined): Climbed {
  return climb ?? { why: 'thrust is not known at the airspeed of the climb' };
}
