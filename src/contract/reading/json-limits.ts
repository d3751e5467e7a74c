/** How much a body may hold. */
export interface JsonLimits {
  /** levels of arrays and objects */
  readonly depth: number;
  /** values and member names together */
  readonly tokens: number;
}

/** A batched question with an inline definition needs 11 levels; our choice of bounds for both. */
export const questionLimits: JsonLimits = { depth: 12, tokens: 20_000 };

export interface JsonCount {
  readonly depth: number;
  readonly tokens: number;
  /** colons outside strings: one a member, duplicates included */
  readonly colons: number;
  /** an escape, DEL or a lead byte of U+0080 to U+00BF inside a string: its text needs a closer look */
  readonly odd: boolean;
}

const quote = 0x22;
const backslash = 0x5c;

/**
 * Counts levels, tokens and colons in one pass over the bytes, before anything is built from them.
 *
 * Bytes that are not JSON give counts without meaning; JSON.parse judges them afterwards. The pass ends early once a limit
 * is passed, so that a hostile body costs no more than a lawful one.
 *
 * @param bytes - UTF-8
 */
export function countJson(bytes: Uint8Array, limits: JsonLimits): JsonCount {
  let level = 0;
  let depth = 0;
  let tokens = 0;
  let colons = 0;
  let odd = false;
  let inScalar = false;
  const end = bytes.length;
  for (let i = 0; i < end; i++) {
    const byte = bytes[i] as number;
    if (byte === quote) {
      tokens++;
      inScalar = false;
      for (i++; i < end; i++) {
        const inside = bytes[i] as number;
        if (inside === quote) break;
        if (inside === backslash) {
          odd = true;
          i++;
        } else if (inside === 0x7f || inside === 0xc2) odd = true;
      }
    } else if (byte === 0x3a) {
      colons++;
      inScalar = false;
    } else if (byte === 0x7b || byte === 0x5b) {
      tokens++;
      inScalar = false;
      level++;
      if (level > depth) depth = level;
    } else if (byte === 0x7d || byte === 0x5d) {
      level--;
      inScalar = false;
    } else if (byte === 0x2c || byte <= 0x20) inScalar = false;
    else if (!inScalar) {
      inScalar = true;
      tokens++;
    }
    if (depth > limits.depth || tokens > limits.tokens) break;
  }
  return { depth, tokens, colons, odd };
}
