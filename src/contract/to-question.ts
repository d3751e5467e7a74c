import type { Refused } from '../planning/fault.ts';
import { takeoffProcedureFaults } from '../planning/procedure/takeoff-procedure-faults.ts';
import type { TakeoffQuestion } from '../planning/question.ts';
import type { CatalogueLookup } from './catalogue-lookup.ts';
import { si } from './quantity.ts';
import type { TakeoffRequest } from './takeoff-request.ts';
import { asked, commonFaults, toCommonQuestion } from './to-common-question.ts';
import { toKnownAeroplane } from './to-known-aeroplane.ts';
import { toKnownRunway } from './to-known-runway.ts';
import { toKnownWeather } from './to-known-weather.ts';

/**
 * The gate in: a takeoff request as planning's question, in SI.
 *
 * @param request - read by its schema
 * @returns the question, or every fault of meaning in the request at once
 */
export function toQuestion(request: TakeoffRequest, lookup: CatalogueLookup): TakeoffQuestion | Refused {
  const known = toKnownAeroplane(request.aeroplane, lookup);
  const runway = toKnownRunway(request.runway, lookup.aerodromes, 'takeoff');
  const weather = toKnownWeather(request.weather, request.asOf);
  const faults = commonFaults(request, runway, weather, known, 'takeoff');
  if (Array.isArray(runway) || Array.isArray(weather) || !('aeroplane' in known)) return { refused: faults };
  const { procedure, decisionSpeed } = request;
  if (procedure !== undefined) faults.push(...takeoffProcedureFaults({ ...asked(request, known), procedure }));
  if (faults.length > 0) return { refused: faults };
  const common = toCommonQuestion({ ...request, runway, known: weather }, known, 'takeoff');
  const question = { ...common, defaulted: [...common.defaulted, ...defaultedProcedure(procedure)] };
  return {
    ...question,
    ...(procedure === undefined ? {} : { procedure }),
    ...(decisionSpeed === undefined ? {} : { decisionSpeed: si('speed', decisionSpeed) }),
  };
}

/** Pointers of what a takeoff takes where its procedure does not say. */
function defaultedProcedure({ power, start }: NonNullable<TakeoffRequest['procedure']> = {}): string[] {
  const pointers: string[] = [];
  if (power === undefined) pointers.push('/procedure/power');
  if (start === undefined) pointers.push('/procedure/start');
  return pointers;
}
