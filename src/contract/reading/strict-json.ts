import type { Fault, Refused } from '../../planning/fault.ts';
import { countJson, type JsonLimits, questionLimits } from './json-limits.ts';
import { jsonSlip } from './json-slip.ts';
import { settleTree } from './settle-tree.ts';

/** A tree as JSON.parse builds it, and the slips that leave it readable: text that cannot be shown. */
export interface StrictJson {
  readonly value: unknown;
  readonly slips: readonly Fault[];
}

const utf8 = new TextDecoder('utf-8', { fatal: true, ignoreBOM: true });

/**
 * Reads JSON as RFC 8259 writes it and nothing looser: UTF-8 without a byte order mark, bounded depth and size, no member
 * named twice, no member that reaches for an object's prototype; -0 becomes 0.
 *
 * JSON.parse builds the tree; a duplicate shows as fewer members in the tree than colons in the text, and only then does an
 * exact scanner look for it.
 *
 * @param bytes - the body as received
 * @see references.Rfc8259, sec. 4 and 8.1
 */
export function readStrictJson(bytes: Uint8Array, limits: JsonLimits = questionLimits): StrictJson | Refused {
  if (bytes.length === 0) return unreadable('The body is empty.');
  if (bytes[0] === 0xef && bytes[1] === 0xbb && bytes[2] === 0xbf) {
    return unreadable('The body begins with a byte order mark.', 'Send UTF-8 without a byte order mark.');
  }
  const text = decoded(bytes);
  if (text === undefined) return unreadable('The body is not UTF-8.');

  const count = countJson(bytes, limits);
  if (count.depth > limits.depth) {
    return refusal('too-deep', `The body nests arrays and objects deeper than ${limits.depth} levels.`, {
      allowed: `at most ${limits.depth} levels`,
    });
  }
  if (count.tokens > limits.tokens) {
    return refusal('too-many-tokens', `The body holds more than ${limits.tokens} values and member names.`, {
      allowed: `at most ${limits.tokens} values and member names`,
    });
  }

  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    return placed(text);
  }
  const settled = settleTree(value, count.odd);
  if (settled.reaching !== undefined) {
    return refusal('unreadable', `The member ${settled.reaching} is never part of a question.`, {
      pointer: settled.reaching,
    });
  }
  if (settled.members !== count.colons) return placed(text);
  return { value: settled.value, slips: settled.slips };
}

function decoded(bytes: Uint8Array): string | undefined {
  try {
    return utf8.decode(bytes);
  } catch {
    return undefined;
  }
}

function placed(text: string): Refused {
  const slip = jsonSlip(text);
  if (slip?.kind === 'duplicate') {
    return refusal('duplicate-member', `The member ${slip.pointer} appears twice in one object.`, {
      pointer: slip.pointer,
      hint: `The second one begins at character ${slip.position}.`,
    });
  }
  return refusal(
    'unreadable',
    slip === undefined ? 'The body is not JSON.' : `The body is not JSON from character ${slip.position} on.`,
    { pointer: slip?.pointer ?? '', allowed: 'JSON as in RFC 8259: no comments, no trailing commas, no NaN' },
  );
}

function unreadable(message: string, hint?: string): Refused {
  return refusal('unreadable', message, hint === undefined ? {} : { hint });
}

function refusal(code: Fault['code'], message: string, rest: Partial<Fault>): Refused {
  return { refused: [{ pointer: '', code, message, ...rest }] };
}
