import type { AeroplaneDefinition } from '../contract/aeroplane-definition.ts';
import { checkAeroplane } from '../contract/check-aeroplane.ts';
import { readDefinition } from '../contract/read-definition.ts';
import { toAeroplane } from '../contract/to-aeroplane.ts';
import type { Aeroplane } from '../performance/aeroplane.ts';
import type { Refused } from '../planning/fault.ts';
import { definitionFile, type FiledEntry, type FileKind } from './definition-file.ts';
import { digest } from './digest.ts';

/** One aeroplane of the catalogue. */
export interface CatalogueEntry extends FiledEntry<AeroplaneDefinition> {
  /** the same in SI */
  readonly aeroplane: Aeroplane;
}

export const aeroplaneFiles: FileKind<AeroplaneDefinition, CatalogueEntry> = {
  noun: 'aeroplane',
  read: readDefinition,
  check: (definition) => checkAeroplane(definition, ''),
  entry: (definition) => ({ definition, aeroplane: toAeroplane(definition), digest: digest(definition) }),
};

/** An aeroplane file: the aeroplane, or every fault in the file. */
export function aeroplaneFile(name: string, bytes: Uint8Array): CatalogueEntry | Refused {
  return definitionFile(aeroplaneFiles, name, bytes);
}
