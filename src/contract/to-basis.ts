import type { z } from 'zod';
import type { Answer, Assumption, BandContribution } from '../planning/answer.ts';
import { type ReferenceKey, references } from '../references.ts';
import type { assumption } from './answer-parts.ts';
import type { BasisOnWire } from './basis.ts';
import type { Draft } from './present.ts';
import { type Presentation, shownPercent } from './shown-quantity.ts';
import { toMeasure } from './to-advisory.ts';
import { toManualUse, toOtherMethod } from './to-manual-use.ts';

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

/** By how much ground roll and air distance move with one input. */
export function toContribution(how: Presentation, { of, groundRoll, airDistance }: BandContribution) {
  return {
    of,
    groundRollPercent: shownPercent(how, groundRoll, 'nearest'),
    airDistancePercent: shownPercent(how, airDistance, 'nearest'),
  };
}

/**
 * What an answer rests on.
 *
 * @param toBand - an entry of the band as this kind of answer writes it
 */
export function toBasis<Band>(
  how: Presentation,
  answer: Answer,
  aeroplaneDigest: string,
  stamp: Stamp,
  toBand: (contribution: BandContribution) => Band,
) {
  const { method, other, flightManual, band, assumed, notGiven, sources } = answer.basis;
  const basis = { method } as Draft<BasisOnWire<Band>>;
  if (other !== undefined) basis.other = toOtherMethod(how, other);
  if (flightManual !== undefined) basis.flightManual = toManualUse(how, flightManual);
  if (band !== undefined) basis.band = band.map(toBand);
  basis.assumed = toAssumed(how, assumed);
  basis.notGiven = [...notGiven];
  basis.sources = toSources(sources, citedBy(answer));
  basis.modelVersion = stamp.modelVersion;
  basis.digests = { aeroplane: aeroplaneDigest, rules: stamp.rulesDigest };
  return basis;
}

/** Sources that checks, factors, cautions and assumptions name: an answer names no key that it does not list. */
function citedBy({ assessment, cautions, basis, detail }: Answer): ReferenceKey[] {
  const keys: ReferenceKey[] = [];
  for (const check of assessment?.checks ?? []) {
    keys.push(check.source);
    for (const factor of check.factors) keys.push(factor.source);
    for (const { factors } of [check.alternative ?? [], check.furtherAlternatives ?? []].flat()) {
      for (const factor of factors) keys.push(factor.source);
    }
  }
  for (const { source } of cautions) if (source !== undefined) keys.push(source);
  for (const { source } of basis.assumed) if (source !== undefined) keys.push(source);
  for (const { source } of detail?.working ?? []) if (source !== undefined) keys.push(source);
  return keys;
}
