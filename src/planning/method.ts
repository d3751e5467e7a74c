import { fittedForLanding, fittedForTakeoff } from '../performance/fit/fitted-aeroplane.ts';
import type { FlightManual, ManualPhase } from '../performance/flight-manual/flight-manual.ts';
import type { Method } from './answer.ts';
import type { Fault } from './fault.ts';
import type { Question } from './question.ts';

/** Where the distances of an answer come from. */
export interface ChosenMethod {
  /** the physics that computes what the manual does not speak of, or everything */
  readonly physics: Extract<Method, 'fitted' | 'stated'>;
  /** the aeroplane's flight manual, where it has a sheet of this phase for the configuration */
  readonly manual: FlightManual | undefined;
  /** whether the distances are its own, or it is only shown beside them */
  readonly byManual: boolean;
}

/**
 * The method of a question: the flight manual first, where it has a sheet for the configuration, then physics.
 *
 * @returns the method, or a fault where one is asked for by name that the aeroplane does not have
 */
export function chosenMethod(
  { aeroplane, configuration, method = 'best' }: Question,
  phase: 'takeoff' | 'landing',
): ChosenMethod | Fault {
  const manual = hasSheet(aeroplane.flightManual, phase, configuration) ? aeroplane.flightManual : undefined;
  if (method === 'flight-manual' && manual === undefined)
    return unknownMethod(method, phase, 'table of the flight manual');
  const isFitted = aeroplane.fit?.[phase]?.[configuration] !== undefined;
  if (method === 'fitted' && !isFitted) return unknownMethod(method, phase, 'fit to a flight manual');
  return {
    physics: isFitted && method !== 'stated' ? 'fitted' : 'stated',
    manual,
    byManual: manual !== undefined && !isPhysicsByName({ method }),
  };
}

/**
 * A question asked of the aeroplane as its physics was fitted to the flight manual; of the aeroplane as stated where it was not, or
 * stated figures are asked for.
 */
export function askedAsFitted<Q extends Question>(question: Q, phase: 'takeoff' | 'landing'): Q {
  const { aeroplane, configuration, method, changes } = question;
  if (method === 'stated' || aeroplane.fit?.[phase]?.[configuration] === undefined) return question;
  const fitted = phase === 'takeoff' ? fittedForTakeoff : fittedForLanding;
  const flewAs = changes?.flewAs;
  return {
    ...question,
    aeroplane: fitted(aeroplane, configuration) ?? aeroplane,
    ...(changes === undefined || flewAs === undefined
      ? {}
      : { changes: { ...changes, flewAs: fitted(flewAs, configuration) ?? flewAs } }),
  };
}

/** Whether physics is asked for by name, whatever the flight manual has. */
export function isPhysicsByName({ method }: Pick<Question, 'method'>): boolean {
  return method === 'stated' || method === 'fitted';
}

function unknownMethod(method: string, phase: string, missing: string): Fault {
  return {
    pointer: '/method',
    code: 'contradiction',
    message: `The aeroplane has no ${missing} for ${phase} in this configuration.`,
    received: method,
    allowed: 'best, or a method that the aeroplane has figures for',
  };
}

function hasSheet(manual: FlightManual | undefined, phase: ManualPhase, configuration: string): boolean {
  if (manual === undefined) return false;
  return [...manual.tables, ...manual.graphs].some(
    (sheet) => sheet.phase === phase && sheet.configurations.includes(configuration),
  );
}
