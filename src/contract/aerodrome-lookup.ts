import type { AerodromeDefinition } from './aerodrome-definition.ts';

/** What the gate in needs of the aerodromes on file. */
export interface AerodromeLookup {
  readonly get: (id: string) => { readonly definition: AerodromeDefinition } | undefined;
  /** in the order in which they are listed to users */
  readonly ids: readonly string[];
}
