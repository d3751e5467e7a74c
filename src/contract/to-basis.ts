import type { z } from 'zod';
import type { Assumption } from '../planning/answer.ts';
import { type ReferenceKey, references } from '../references.ts';
import type { assumption } from './answer-parts.ts';
import type { Draft } from './present.ts';
import { type Presentation, shownPercent } from './shown-quantity.ts';
import { toMeasure } from './to-advisory.ts';

type ShownAssumption = z.infer<typeof assumption>;

/** What stands behind every number of the service: its version and the digest of its rules. */
export interface Stamp {
  readonly modelVersion: string;
  /** SHA-256 of the rule sets, hex */
  readonly rulesDigest: string;
}

/** Assumptions as an answer shows them. */
export function toAssumed(how: Presentation, assumed: readonly Assumption[]) {
  return assumed.map(({ at, value, because, effectRatio, source }) => {
    const shown: Draft<ShownAssumption> = {
      at,
      value: typeof value === 'string' ? value : toMeasure(how, value),
      because,
    };
    if (effectRatio !== undefined) shown.effectPercent = shownPercent(how, effectRatio, 'nearest');
    if (source !== undefined) shown.source = source;
    return shown;
  });
}

/** Sources by name, each once, in the order they are given. */
export function toSources(...keys: readonly (readonly ReferenceKey[])[]) {
  const seen: ReferenceKey[] = [];
  for (const list of keys) for (const key of list) if (!seen.includes(key)) seen.push(key);
  return seen.map(namedSource);
}

/** A source with its key. */
export function namedSource(key: ReferenceKey) {
  const { title, status } = references[key];
  return { key, title, status };
}
