import type { Aeroplane } from '../performance/aeroplane.ts';
import type { AeroplaneDefinition } from './aeroplane-definition.ts';

/** An aeroplane on file, in SI, with the SHA-256 of its definition in hex. */
export interface KnownAeroplane {
  readonly aeroplane: Aeroplane;
  readonly digest: string;
}

/** What the gate in needs of a catalogue. */
export interface AeroplaneLookup {
  readonly get: (id: string) => KnownAeroplane | undefined;
  /** in the order in which they are listed to users */
  readonly ids: readonly string[];
  /** SHA-256 in hex of a definition that came with the question */
  readonly digestOf: (definition: AeroplaneDefinition) => string;
}
