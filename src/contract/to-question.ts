import type { Fault, Refused } from '../planning/fault.ts';
import type { Question } from '../planning/question.ts';
import { ruleSetOf, ruleSets } from '../planning/rules/rule-sets.ts';
import type { AeroplaneLookup } from './aeroplane-lookup.ts';
import { si } from './quantity.ts';
import { checkAir } from './question-checks/check-air.ts';
import { checkConfigurationId } from './question-checks/check-configuration-id.ts';
import { checkMass } from './question-checks/check-mass.ts';
import { checkRunway } from './question-checks/check-runway.ts';
import { checkWind } from './question-checks/check-wind.ts';
import { defaultUnits } from './question-frame.ts';
import type { TakeoffRequest } from './takeoff-request.ts';
import { aeroplaneAt, toKnownAeroplane } from './to-known-aeroplane.ts';
import { toRunway } from './to-runway.ts';
import { toWeather } from './to-weather.ts';
import { unknownId } from './unknown-id.ts';

/**
 * The gate in: a takeoff request as planning's question, in SI.
 *
 * @param request - read by its schema
 * @returns the question, or every fault of meaning in the request at once
 */
export function toQuestion(request: TakeoffRequest, lookup: AeroplaneLookup): Question | Refused {
  const known = toKnownAeroplane(request.aeroplane, lookup);
  const faults = [
    ...('aeroplane' in known
      ? [
          ...checkMass(request.mass, known.aeroplane),
          ...checkConfigurationId(request.configuration, known.aeroplane, 'takeoff'),
        ]
      : known),
    ...checkRunway(request.runway),
    ...checkAir(request.weather, request.runway.elevation),
    ...checkWind(request.weather.wind, request.runway),
    ...checkRuleSet(request.ruleSet),
  ];
  if (!('aeroplane' in known) || faults.length > 0) return { refused: faults };
  return {
    aeroplane: known.aeroplane,
    aeroplaneDigest: known.digest,
    aeroplaneAt: aeroplaneAt(request.aeroplane),
    mass: si('mass', request.mass),
    configuration: request.configuration,
    runway: toRunway(request.runway),
    weather: toWeather(request.weather),
    ruleSet: request.ruleSet,
    ...(request.stage === undefined ? {} : { stage: request.stage }),
    units: request.units ?? defaultUnits,
    defaulted: defaulted(request),
  };
}

function checkRuleSet(given: string): Fault[] {
  return ruleSetOf(given) === undefined
    ? [
        unknownId(
          '/ruleSet',
          'rule set',
          given,
          ruleSets.map(({ id }) => id),
        ),
      ]
    : [];
}

/** Pointers of what the gate fills in. */
function defaulted({ units, rounding, aeroplane, configuration }: TakeoffRequest): string[] {
  const pointers: string[] = [];
  if (units === undefined) pointers.push('/units');
  if (rounding === undefined) pointers.push('/rounding');
  const lift = 'definition' in aeroplane && aeroplane.definition.configurations[configuration]?.maximumLift;
  if (lift && 'stallSpeed' in lift && lift.kind === undefined) {
    pointers.push(`/aeroplane/definition/configurations/${configuration}/maximumLift/kind`);
  }
  return pointers;
}
