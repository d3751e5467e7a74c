import { aerodromeDefinition } from './aerodrome-definition.ts';
import { reader } from './reading/reader.ts';

/** Reads a whole aerodrome. */
export const readAerodrome = reader(aerodromeDefinition);
