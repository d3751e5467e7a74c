import type { Refused } from '../planning/fault.ts';
import { takeoffProcedureFaults } from '../planning/procedure/takeoff-procedure-faults.ts';
import type { TakeoffQuestion } from '../planning/question.ts';
import type { AeroplaneLookup } from './aeroplane-lookup.ts';
import type { TakeoffRequest } from './takeoff-request.ts';
import { asked, commonFaults, toCommonQuestion } from './to-common-question.ts';
import { toKnownAeroplane } from './to-known-aeroplane.ts';

/**
 * The gate in: a takeoff request as planning's question, in SI.
 *
 * @param request - read by its schema
 * @returns the question, or every fault of meaning in the request at once
 */
export function toQuestion(request: TakeoffRequest, lookup: AeroplaneLookup): TakeoffQuestion | Refused {
  const known = toKnownAeroplane(request.aeroplane, lookup);
  const faults = commonFaults(request, known, 'takeoff');
  if (!('aeroplane' in known)) return { refused: faults };
  const { procedure } = request;
  if (procedure !== undefined) faults.push(...takeoffProcedureFaults({ ...asked(request, known), procedure }));
  if (faults.length > 0) return { refused: faults };
  const common = toCommonQuestion(request, known, 'takeoff');
  const question = { ...common, defaulted: [...common.defaulted, ...defaultedProcedure(procedure)] };
  return procedure === undefined ? question : { ...question, procedure };
}

/** Pointers of what a takeoff takes where its procedure does not say. */
function defaultedProcedure({ power, start }: NonNullable<TakeoffRequest['procedure']> = {}): string[] {
  const pointers: string[] = [];
  if (power === undefined) pointers.push('/procedure/power');
  if (start === undefined) pointers.push('/procedure/start');
  return pointers;
}
