import { definitionLimits, type JsonLimits } from '../contract/reading/json-limits.ts';

/** How much one body may hold. */
export interface BodyLimits {
  readonly bytes: number;
  readonly json: JsonLimits;
}

/** A body with a whole definition, its flight manual typed in. */
export const definitionBody: BodyLimits = { bytes: 2 * 1024 * 1024, json: definitionLimits };
