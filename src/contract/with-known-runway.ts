import type { Fault } from '../planning/fault.ts';
import type { AerodromeLookup } from './aerodrome-lookup.ts';
import type { RunwayOnWire } from './runway.ts';
import type { RunwayChoice } from './runway-choice.ts';
import { toKnownRunway } from './to-known-runway.ts';

/** A question whose runway is whole. */
export type WithKnownRunway<Request> = Omit<Request, 'runway'> & { readonly runway: RunwayOnWire };

/**
 * The question with its runway whole.
 *
 * @throws RangeError where the gate in would not have let the runway pass
 */
export function withKnownRunway<Request extends { readonly runway: RunwayChoice }>(
  request: Request,
  lookup: AerodromeLookup,
  phase: 'takeoff' | 'landing',
): WithKnownRunway<Request> {
  const runway: RunwayOnWire | Fault[] = toKnownRunway(request.runway, lookup, phase);
  if (Array.isArray(runway)) throw new RangeError('runway is not on file');
  return { ...request, runway };
}
