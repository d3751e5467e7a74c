import { aeroplaneDefinition } from './aeroplane-definition.ts';
import { reader } from './reading/reader.ts';

/** Reads a whole definition that is not part of a larger question: of a file, or with changes merged in. */
export const readDefinition = reader(aeroplaneDefinition);
