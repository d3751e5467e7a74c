import type { Check } from './answer.ts';
import type { ClimbDemand, RuledAeroplane } from './rules/rule-set.ts';

/**
 * The climbs a rule set asks of this aeroplane, each as a check of a gradient.
 *
 * A climb with all engines is compared with the gradient computed for its phase. One on the remaining engine, or on the approach, is
 * not computed: it stands as not assessed, so that nothing a rule asks for is passed over in silence.
 *
 * @param gradient - with all engines in the climb of this phase, dimensionless; undefined where the thrust is not known there
 */
export function climbChecks(
  demands: readonly ClimbDemand[] | undefined,
  aeroplane: RuledAeroplane,
  gradient: number | undefined,
): readonly Check[] {
  return (demands ?? [])
    .filter(({ appliesTo }) => appliesTo(aeroplane))
    .map((demand) => {
      const { code, source, gradient: required } = demand;
      const shared = { code, of: 'climbGradient', factors: [], unit: 'gradient' as const, required, source };
      const why = notComputed(demand, gradient);
      if (why !== undefined || gradient === undefined) return { ...shared, result: 'not-assessed', why };
      const margin = gradient - required;
      const passes = demand.positive === true ? margin > 0 : margin >= 0;
      const compared = { ...shared, available: gradient, margin, result: passes ? 'passes' : 'fails' } as const;
      return required === 0 ? compared : { ...compared, marginRatio: margin / required };
    });
}

function notComputed({ engines, of }: ClimbDemand, gradient: number | undefined): string | undefined {
  if (engines === 'one-out') return 'the climb with one engine out is not computed';
  if (of === 'approach') return 'the climb on the approach is not computed';
  return gradient === undefined ? 'thrust is not known at the airspeed of the climb' : undefined;
}
