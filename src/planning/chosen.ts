import type { Configuration } from '../performance/aeroplane.ts';
import { type Air, airOf } from '../performance/air.ts';
import type { Fault } from './fault.ts';
import type { Question } from './question.ts';
import type { RuleSet } from './rules/rule-set.ts';
import { ruleSetOf, ruleSets } from './rules/rule-sets.ts';

/** A fault found where a value was looked for. */
export function isFault(found: object): found is Fault {
  return 'pointer' in found && 'code' in found && 'message' in found;
}

/** The rule set of the question. */
export function chosenRuleSet(id: string): RuleSet | Fault {
  return (
    ruleSetOf(id) ?? {
      pointer: '/ruleSet',
      code: 'unknown-id',
      message: 'There is no rule set with this id.',
      received: id,
      allowed: ruleSets.map((set) => set.id).join(', '),
    }
  );
}

/** The configuration of the question, for this phase of flight. */
export function chosenConfiguration(
  { aeroplane, configuration: id }: Pick<Question, 'aeroplane' | 'configuration'>,
  phase: 'takeoff' | 'landing',
): Configuration | Fault {
  const found = Object.hasOwn(aeroplane.configurations, id) ? aeroplane.configurations[id] : undefined;
  if (found?.for.includes(phase)) return found;
  const allowed = Object.keys(aeroplane.configurations).filter((one) =>
    aeroplane.configurations[one]?.for.includes(phase),
  );
  return {
    pointer: '/configuration',
    code: found === undefined ? 'unknown-id' : 'contradiction',
    message:
      found === undefined
        ? 'The aeroplane has no configuration with this id.'
        : `This configuration of the aeroplane is not for ${phase}.`,
    received: id,
    allowed: allowed.join(', '),
  };
}

/** The air of the question. */
export function airAtRunway({ weather, runway }: Pick<Question, 'weather' | 'runway'>): Air | Fault {
  const found = airOf(weather, runway.elevation);
  switch (found.outcome) {
    case 'air':
      return found.air;
    case 'elevation-needed':
      return { pointer: '/runway/elevation', code: 'missing', message: 'A QNH says nothing without the elevation.' };
    case 'dew-point-above-temperature':
      return {
        pointer: '/weather/dewPoint',
        code: 'contradiction',
        message: 'The dew point is above the temperature.',
      };
    case 'outside-standard-atmosphere':
      return {
        pointer: '/weather',
        code: 'out-of-range',
        message: `The ${found.of === 'pressureAltitude' ? 'pressure altitude' : 'density altitude'} that follows is outside the standard atmosphere.`,
        allowed: `${found.lowest} m to ${found.highest} m`,
      };
  }
}
