import type { Fault, Refused } from '../../planning/fault.ts';

export interface JsonLimits {
  /** levels of arrays and objects */
  readonly depth: number;
  /** values and member names together */
  readonly tokens: number;
}

export const questionLimits: JsonLimits = { depth: 12, tokens: 20_000 };

/** A tree as JSON.parse gives it, and the slips that leave it readable: unprintable text. */
export interface StrictJson {
  readonly value: unknown;
  readonly slips: readonly Fault[];
}

export function readStrictJson(bytes: Uint8Array, limits: JsonLimits = questionLimits): StrictJson | Refused {
  throw new RangeError(`not built yet: ${bytes.length} ${limits.depth}`);
}
