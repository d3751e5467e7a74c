import type { RunwayConditionCode } from '../physics/runway-condition-code.ts';
import { filmAsWet } from '../physics/runway-surface.ts';
import type { Factor } from './answer.ts';
import type { Surface } from './question.ts';
import type { Asked, PhaseRules, RuledAeroplane, RuleSet, Stage } from './rules/rule-set.ts';

/** The factors that a rule set has for a surface. */
export interface SurfaceInRules {
  readonly ruleSet: string;
  readonly phase: 'takeoff' | 'landing';
  readonly stage?: Stage;
  /** the surface, and for some sets the aeroplane, in the words of the set */
  readonly when: string;
  readonly factors: readonly Factor[];
}

const light: RuledAeroplane = {
  category: 'twin-piston',
  engines: 2,
  certification: { basis: 'none', screenHeight: 50 * 0.3048 },
  masses: { maximumTakeoff: 2000 },
};

/** One aeroplane of each kind that a set may tell apart by its engines. */
const aeroplanes: readonly Pick<Asked, 'aeroplane' | 'reverse'>[] = [
  { aeroplane: light, reverse: false },
  { aeroplane: { ...light, category: 'twin-turboprop' }, reverse: false },
  { aeroplane: { ...light, category: 'twin-jet' }, reverse: false },
  { aeroplane: { ...light, category: 'twin-jet' }, reverse: true },
];

/**
 * What a rule set says of a surface, to any aeroplane.
 *
 * @param isSlippery - neither dry nor wet
 */
export function surfaceInRules(
  { id, takeoff, landing, landingInFlight }: RuleSet,
  surface: Surface,
  isSlippery: boolean,
  conditionCode: RunwayConditionCode | undefined,
): readonly SurfaceInRules[] {
  const found = (phase: 'takeoff' | 'landing', rules: PhaseRules): readonly SurfaceInRules[] => {
    const matching = aeroplanes.flatMap(({ aeroplane, reverse }) => {
      if (rules.appliesTo?.some(({ holds }) => !holds(aeroplane))) return [];
      const asked: Asked = {
        aeroplane,
        surface: filmAsWet(surface),
        isSlippery,
        conditionCode,
        slope: 0,
        published: { tora: undefined, toda: undefined, asda: undefined },
        reverse,
      };
      return rules.surfaces.find(({ holds }) => holds(asked)) ?? [];
    });
    const { stage } = rules;
    return [...new Set(matching)].map(({ when, factors }) => ({
      ruleSet: id,
      phase,
      ...(stage === undefined ? {} : { stage }),
      when,
      factors,
    }));
  };
  return [
    ...found('takeoff', takeoff),
    ...found('landing', landing),
    ...(landingInFlight === undefined ? [] : found('landing', landingInFlight)),
  ];
}
