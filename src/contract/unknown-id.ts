import type { Fault } from '../planning/fault.ts';
import { nearestNames } from './reading/nearest-name.ts';

/**
 * The fault of an id that is not on a list: the list, and what was probably meant.
 *
 * @param of - what the list holds, as in 'configuration of lark-tourer'
 * @param mayBeMeant - which of the list may be offered as what was meant
 */
export function unknownId(
  pointer: string,
  of: string,
  given: string,
  known: readonly string[],
  mayBeMeant: (known: string) => boolean = () => true,
): Fault {
  const near = nearestNames(given, known.filter(mayBeMeant));
  return {
    pointer,
    code: 'unknown-id',
    message: `There is no ${of} '${given}'.`,
    received: given,
    allowed: known.join(', '),
    ...(near.length === 0 ? {} : { hint: `Perhaps ${near.join(' or ')}.` }),
  };
}
