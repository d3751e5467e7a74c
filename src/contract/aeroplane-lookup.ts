import type { Aeroplane } from '../performance/aeroplane.ts';
import type { AeroplaneChanges } from '../planning/question.ts';
import type { AeroplaneDefinition } from './aeroplane-definition.ts';

/** An aeroplane as its definition says and in SI, with the SHA-256 of the definition in hex. */
export interface KnownAeroplane {
  readonly definition: AeroplaneDefinition;
  readonly aeroplane: Aeroplane;
  readonly digest: string;
  /** where it is one on file with changes */
  readonly changes?: AeroplaneChanges;
}

/** What the gate in needs of a catalogue. */
export interface AeroplaneLookup {
  readonly get: (id: string) => KnownAeroplane | undefined;
  /** in the order in which they are listed to users */
  readonly ids: readonly string[];
  /** SHA-256 in hex of a definition that came with the question */
  readonly digestOf: (definition: AeroplaneDefinition) => string;
  /** SHA-256 in hex of the JSON of anything that a reader returned */
  readonly digestOfJson: (value: unknown) => string;
}
