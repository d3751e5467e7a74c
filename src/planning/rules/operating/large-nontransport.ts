import { isCommuter, isTransport } from '../named-aeroplanes.ts';
import type { Asked } from '../rule-set.ts';

/** A small aeroplane has at most 12 500 lb of maximum takeoff mass [kg]. @see references.Cfr1s1 */
const heaviestSmall = 12_500 * 0.45359237;

/** Whether an aeroplane is a large one of neither the transport nor the commuter category. */
export function isLargeNontransport({ aeroplane }: Pick<Asked, 'aeroplane'>): boolean {
  return !isTransport(aeroplane) && !isCommuter(aeroplane) && aeroplane.masses.maximumTakeoff > heaviestSmall;
}
