import type { AeroplaneDefinition } from '../contract/aeroplane-definition.ts';
import { sha256 } from './sha-256.ts';

/**
 * What tells one aeroplane definition from another, by id and inline alike: SHA-256 of its JSON without spaces, members in
 * the order of the schema, configurations in the order of their ids.
 *
 * The order in which configurations are written means nothing, and clients that sort members must get the same digest.
 *
 * @param definition - as its reader returns it, in the schema's order
 * @returns 64 hexadecimal digits
 */
export function digest(definition: AeroplaneDefinition): string {
  return sha256(JSON.stringify({ ...definition, configurations: byId(definition.configurations) }));
}

function byId(configurations: AeroplaneDefinition['configurations']): AeroplaneDefinition['configurations'] {
  const ids = Object.keys(configurations).sort();
  return Object.fromEntries(ids.map((id) => [id, configurations[id] as (typeof configurations)[string]]));
}
