import type { AeroplaneDefinition } from '../contract/aeroplane-definition.ts';
import { orderOfIds } from '../contract/order-of-ids.ts';
import { sha256 } from './sha-256.ts';

/**
 * What tells one aeroplane definition from another, by id and inline alike: SHA-256 of its JSON without spaces, members in
 * the order of the schema, configurations, power settings and fits in the order of their ids.
 *
 * @param definition - as its reader returns it, in the schema's order
 * @returns 64 hexadecimal digits
 */
export function digest(definition: AeroplaneDefinition): string {
  return sha256(JSON.stringify(orderOfIds(definition)));
}
