import { aeroplanePointer } from '../aeroplane-pointer.ts';
import type { Fault } from '../fault.ts';
import type { Question } from '../question.ts';

/**
 * The fault of a procedure that the aeroplane has no data for.
 *
 * @param member - of the procedure
 * @param needed - pointer to the member that its definition would need, beginning with '/'
 */
export function noDataFault(
  { aeroplane, aeroplaneAt }: Pick<Question, 'aeroplane' | 'aeroplaneAt'>,
  member: string,
  received: Fault['received'] | undefined,
  needed: string,
): Fault {
  return {
    pointer: `/procedure/${member}`,
    code: 'missing',
    message: `The definition of ${aeroplane.id} has no data for this: it would need ${needed.slice(1).replaceAll('/', '.')}.`,
    ...(received === undefined ? {} : { received }),
    allowed: `a definition with ${aeroplanePointer(aeroplaneAt, needed)}`,
    hint: `Leave ${member} away, or give a definition that states it.`,
  };
}
