import type { Aeroplane } from '../performance/aeroplane.ts';
import type { Refused } from '../planning/fault.ts';
import { landingProcedureFaults } from '../planning/procedure/landing-procedure-faults.ts';
import type { LandingProcedure, LandingQuestion } from '../planning/question.ts';
import type { CatalogueLookup } from './catalogue-lookup.ts';
import type { LandingRequest } from './landing-request.ts';
import type { Draft } from './present.ts';
import type { LandingProcedureOnWire } from './procedure.ts';
import { si } from './quantity.ts';
import { asked, commonFaults, toCommonQuestion } from './to-common-question.ts';
import { toKnownAeroplane } from './to-known-aeroplane.ts';
import { toKnownRunway } from './to-known-runway.ts';
import { toKnownWeather } from './to-known-weather.ts';

/**
 * The gate in: a landing request as planning's question, in SI.
 *
 * @param request - read by its schema
 * @returns the question, or every fault of meaning in the request at once
 */
export function toLandingQuestion(request: LandingRequest, lookup: CatalogueLookup): LandingQuestion | Refused {
  const known = toKnownAeroplane(request.aeroplane, lookup);
  const runway = toKnownRunway(request.runway, lookup.aerodromes, 'landing');
  const weather = toKnownWeather(request.weather, request.asOf);
  const faults = commonFaults(request, runway, weather, known, 'landing');
  if (Array.isArray(runway) || Array.isArray(weather) || !('aeroplane' in known)) return { refused: faults };
  const procedure = request.procedure && toLandingProcedure(request.procedure);
  if (procedure !== undefined) faults.push(...landingProcedureFaults({ ...asked(request, known), procedure }));
  if (faults.length > 0) return { refused: faults };
  const common = toCommonQuestion({ ...request, runway, known: weather }, known, 'landing');
  const question = { ...common, defaulted: [...common.defaulted, ...defaultedProcedure(known.aeroplane, procedure)] };
  return procedure === undefined ? question : { ...question, procedure };
}

/** Pointers of what a landing takes where its procedure does not say, of what the aeroplane has. */
function defaultedProcedure({ reverseThrust, brakes }: Aeroplane, procedure: LandingProcedure = {}): string[] {
  const pointers: string[] = [];
  if (procedure.approachSpeedIncrement === undefined) pointers.push('/procedure/approachSpeedIncrement');
  if (procedure.reverse === undefined && reverseThrust !== undefined) pointers.push('/procedure/reverse');
  const antiSkid = brakes?.antiSkid ?? 'none';
  if (procedure.antiSkid === undefined && antiSkid !== 'none') pointers.push('/procedure/antiSkid');
  return pointers;
}

function toLandingProcedure(given: LandingProcedureOnWire): LandingProcedure {
  const procedure: Draft<LandingProcedure> = {};
  if (given.approachSpeedIncrement !== undefined) {
    procedure.approachSpeedIncrement = si('speed', given.approachSpeedIncrement);
  }
  if (given.approachAngle !== undefined) procedure.approachAngle = si('angle', given.approachAngle);
  if (given.reverse !== undefined) procedure.reverse = given.reverse;
  if (given.antiSkid !== undefined) procedure.antiSkid = given.antiSkid;
  if (given.reactionTime !== undefined) procedure.reactionTime = si('time', given.reactionTime);
  return procedure;
}
