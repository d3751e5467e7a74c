import { configurationPointer } from '../planning/aeroplane-pointer.ts';
import type { Fault } from '../planning/fault.ts';
import type { Question } from '../planning/question.ts';
import type { AeroplaneDefinition } from './aeroplane-definition.ts';
import type { KnownAeroplane } from './aeroplane-lookup.ts';
import type { LandingRequest } from './landing-request.ts';
import { landingResponse } from './landing-response.ts';
import { si } from './quantity.ts';
import { checkAir } from './question-checks/check-air.ts';
import { checkConfigurationId } from './question-checks/check-configuration-id.ts';
import { checkMass } from './question-checks/check-mass.ts';
import { checkRuleSet } from './question-checks/check-rule-set.ts';
import { checkRunway } from './question-checks/check-runway.ts';
import { checkWind } from './question-checks/check-wind.ts';
import { defaultUnits } from './question-frame.ts';
import type { RuleSetChoice } from './rule-set-choice.ts';
import type { RunwayOnWire } from './runway.ts';
import { selectFaults } from './selection/select-faults.ts';
import type { TakeoffRequest } from './takeoff-request.ts';
import { takeoffResponse } from './takeoff-response.ts';
import { aeroplaneAt } from './to-known-aeroplane.ts';
import type { KnownWeather } from './to-known-weather.ts';
import { toRunway } from './to-runway.ts';
import { toWeather } from './to-weather.ts';
import type { Whole } from './whole-request.ts';

/** What a takeoff and a landing are asked alike; of the detail a landing knows less. */
export type CommonRequest = Omit<TakeoffRequest, 'procedure' | 'decisionSpeed'> &
  Omit<LandingRequest, 'procedure' | 'detail'>;

/**
 * Faults of meaning in what a takeoff and a landing are asked alike.
 *
 * @param runway - whole, or what was not found of it
 * @param weather - whole, or the faults of its report
 * @param known - the aeroplane, or its own faults
 * @param phase - what the configuration must be for, and which declared distances count
 */
export function commonFaults(
  request: CommonRequest,
  runway: RunwayOnWire | Fault[],
  weather: KnownWeather | Fault[],
  known: KnownAeroplane | Fault[],
  phase: 'takeoff' | 'landing',
): Fault[] {
  return [
    ...('aeroplane' in known
      ? [
          ...checkMass(request.mass, known.aeroplane),
          ...checkConfigurationId(request.configuration, known.aeroplane, phase),
        ]
      : known),
    ...(Array.isArray(runway) ? runway : checkRunway(runway, phase)),
    ...weatherFaults(weather, Array.isArray(runway) ? undefined : runway),
    ...checkRuleSet(request.ruleSet),
    ...selectFaults(request.select ?? [], phase === 'takeoff' ? takeoffResponse : landingResponse, request.detail),
  ];
}

function weatherFaults(weather: KnownWeather | Fault[], runway: RunwayOnWire | undefined): Fault[] {
  if (Array.isArray(weather)) return weather;
  const air = checkAir(weather.weather, runway?.elevation);
  return runway === undefined ? air : [...air, ...checkWind(weather.weather.wind, runway)];
}

/** What a procedure is checked against. */
export function asked({ aeroplane, configuration }: CommonRequest, known: KnownAeroplane) {
  return { aeroplane: known.aeroplane, aeroplaneAt: aeroplaneAt(aeroplane), configuration };
}

/** What a takeoff and a landing share, in SI. */
export function toCommonQuestion(
  request: Whole<CommonRequest>,
  known: KnownAeroplane,
  phase: 'takeoff' | 'landing',
): Question {
  return {
    aeroplane: known.aeroplane,
    aeroplaneDigest: known.digest,
    aeroplaneAt: aeroplaneAt(request.aeroplane),
    ...(known.changes === undefined ? {} : { changes: known.changes }),
    mass: si('mass', request.mass),
    configuration: request.configuration,
    runway: toRunway(request.runway, phase),
    weather: toWeather(request.known.weather),
    ...(request.known.report === undefined ? {} : { report: request.known.report }),
    ...toRuleSet(request.ruleSet),
    ...(request.stage === undefined ? {} : { stage: request.stage }),
    ...(request.method === undefined ? {} : { method: request.method }),
    ...(request.edges === undefined ? {} : { edges: request.edges }),
    units: request.units ?? defaultUnits,
    defaulted: defaulted(request, known.definition),
  };
}

function toRuleSet(given: RuleSetChoice): Pick<Question, 'ruleSet' | 'operatorRules'> {
  if (typeof given === 'string') return { ruleSet: given };
  return { ruleSet: given.basedOn, operatorRules: { name: given.name, factors: given.factors } };
}

/** Pointers of what the gate fills in. */
function defaulted(
  { units, rounding, method, edges, aeroplane, configuration }: CommonRequest,
  { configurations, flightManual }: AeroplaneDefinition,
): string[] {
  const pointers: string[] = [];
  if (units === undefined) pointers.push('/units');
  if (rounding === undefined) pointers.push('/rounding');
  if (flightManual !== undefined) {
    if (method === undefined) pointers.push('/method');
    if (edges === undefined && method !== 'stated' && method !== 'fitted') pointers.push('/edges');
  }
  const lift = configurations[configuration]?.maximumLift;
  if (lift && 'stallSpeed' in lift && lift.kind === undefined) {
    pointers.push(configurationPointer({ aeroplaneAt: aeroplaneAt(aeroplane), configuration }, 'maximumLift/kind'));
  }
  return pointers;
}
