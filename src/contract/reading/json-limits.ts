/** How much a body may hold. */
export interface JsonLimits {
  /** levels of arrays and objects */
  readonly depth: number;
  /** values and member names together */
  readonly tokens: number;
}

/** A batched question with an inline definition needs 11 levels; our choice of bounds for both. */
export const questionLimits: JsonLimits = { depth: 12, tokens: 20_000 };

/** A definition with every sheet of its flight manual: 24 tables of 1 000 rows and 12 columns are 312 000 values. */
export const definitionLimits: JsonLimits = { depth: 12, tokens: 400_000 };

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

/** What a byte outside strings is: part of a scalar, or one of those that end one. */
const scalar = 0;
const blank = 1;
const opening = 2;
const closing = 3;
const colon = 4;
const string = 5;
const kinds = new Uint8Array(256);
kinds.fill(blank, 0, 0x21);
kinds[0x2c] = blank;
kinds[0x7b] = opening;
kinds[0x5b] = opening;
kinds[0x7d] = closing;
kinds[0x5d] = closing;
kinds[0x3a] = colon;
kinds[quote] = string;

/**
 * Counts levels, tokens and colons in one pass over the bytes, before anything is built from them.
 *
 * Bytes that are not JSON give counts without meaning; JSON.parse judges them afterwards. The pass ends early once a limit
 * is passed, so that a hostile body costs no more than a lawful one.
 *
 * @param bytes - UTF-8
 */
export function countJson(bytes: Uint8Array, { depth: mostDepth, tokens: mostTokens }: JsonLimits): JsonCount {
  let level = 0;
  let depth = 0;
  let tokens = 0;
  let colons = 0;
  let odd = false;
  const end = bytes.length;
  let i = 0;
  while (i < end && depth <= mostDepth && tokens <= mostTokens) {
    const kind = kinds[bytes[i] as number];
    i++;
    if (kind === string) {
      tokens++;
      for (let inside = bytes[i]; i < end && inside !== quote; inside = bytes[i]) {
        if (inside === backslash) {
          odd = true;
          i++;
        } else if (inside === 0x7f || inside === 0xc2) odd = true;
        i++;
      }
      i++;
    } else if (kind === scalar) {
      tokens++;
      while (i < end && kinds[bytes[i] as number] === scalar) i++;
    } else if (kind === colon) colons++;
    else if (kind === opening) {
      tokens++;
      level++;
      if (level > depth) depth = level;
    } else if (kind === closing) level--;
  }
  return { depth, tokens, colons, odd };
}
