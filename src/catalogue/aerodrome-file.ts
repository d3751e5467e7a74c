import type { AerodromeDefinition } from '../contract/aerodrome-definition.ts';
import { checkAerodrome } from '../contract/check-aerodrome.ts';
import { readAerodrome } from '../contract/read-aerodrome.ts';
import type { FiledEntry, FileKind } from './definition-file.ts';
import { sha256 } from './sha-256.ts';

/** One aerodrome of the catalogue. */
export type AerodromeEntry = FiledEntry<AerodromeDefinition>;

/** The folder of the aerodromes, beside the built-in aeroplanes or within the operator's own folder. */
export const aerodromesFolder = 'aerodromes';

export const aerodromeFiles: FileKind<AerodromeDefinition, AerodromeEntry> = {
  noun: 'aerodrome',
  read: readAerodrome,
  check: checkAerodrome,
  entry: (definition) => ({ definition, digest: sha256(JSON.stringify(definition)) }),
};
