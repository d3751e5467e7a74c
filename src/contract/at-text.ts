import type { Fault } from '../planning/fault.ts';
import type { ReportFault } from '../weather/report-fault.ts';

/**
 * A fault of a report where the question has the report; its message tells the place in it.
 *
 * The request itself was read, so that a group which cannot be is a text of the wrong form.
 */
export function atText({ at: _, token: __, code, ...fault }: ReportFault, pointer: string): Fault {
  return { ...fault, code: code === 'unreadable' ? 'wrong-type' : code, pointer };
}
