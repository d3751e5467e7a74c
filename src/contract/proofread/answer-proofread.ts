import type { Work } from '../../numerics/work.ts';
import type { Fault } from '../../planning/fault.ts';
import type { Finding } from '../../planning/review/finding-test.ts';
import { type ConfigurationMethods, possibleMethods } from '../../planning/review/possible-methods.ts';
import { review } from '../../planning/review/review.ts';
import { assumedPresentation, presentationOf } from '../assumed-presentation.ts';
import type { CatalogueLookup } from '../catalogue-lookup.ts';
import { type Draft, present } from '../present.ts';
import type { Presentation } from '../shown-quantity.ts';
import { toAdvisory, toMeasure } from '../to-advisory.ts';
import { type Stamp, toAssumed, toSources } from '../to-basis.ts';
import type { ProofreadRequest } from './proofread-request.ts';
import type { DefinitionFinding, ProofreadResponse } from './proofread-response.ts';
import { readablePart } from './readable-part.ts';
import { toReviewed } from './to-reviewed.ts';

/**
 * A definition in, everything wrong or odd out, from gate to gate.
 *
 * @returns work that yields between its parts
 */
export function* answerProofread(
  request: ProofreadRequest,
  lookup: CatalogueLookup,
  stamp: Stamp,
): Work<ProofreadResponse> {
  const { reference, asOf, units } = request;
  const how = presentationOf({ ...(units === undefined ? {} : { units }), rounding: 'safe' });
  const part = readablePart(request.definition);
  yield;
  const { faults, definition, faulty, remainder } = part;
  const reviewed = definition && toReviewed(definition, part, how.units, lookup);
  const found = reviewed && (yield* review(reviewed, faulty));
  const findings = found?.findings ?? [];
  const methods = reviewed === undefined ? [] : possibleMethods(reviewed, faulty);
  const isWhole = faults.length === 0;
  return {
    outcome: reviewed === undefined ? 'not-readable' : remainder.leftOut.length > 0 ? 'proofread-in-part' : 'proofread',
    advisory: toAdvisory(how, sentenceOf(faults, findings, reviewed !== undefined), []),
    findings: [...faults.map(toFault), ...findings.map((finding) => toOddity(how, finding))],
    methods: methods.map(toMethods),
    notReviewed: reviewed === undefined ? [''] : [...new Set(remainder.leftOut)],
    basis: {
      assumed: toAssumed(how, assumedPresentation({ ...request, rounding: 'safe' })),
      sources: toSources(findings.flatMap(({ source }) => (source === undefined ? [] : [source]))),
      modelVersion: stamp.modelVersion,
      digests: isWhole && definition !== undefined ? { aeroplane: lookup.digestOf(definition) } : {},
    },
    question: present<ProofreadResponse['question']>({ reference, asOf, units: how.units }),
  };
}

function toFault({ pointer, code, message, received, allowed, hint }: Fault): DefinitionFinding {
  return present<Extract<DefinitionFinding, { kind: 'fault' }>>({
    kind: 'fault',
    code,
    severity: 'strong',
    message,
    at: pointer,
    received,
    allowed,
    hint,
  });
}

function toOddity(how: Presentation, finding: Finding): DefinitionFinding {
  const { code, severity, message, at, value, threshold, source, hint } = finding;
  const shown: Draft<Extract<DefinitionFinding, { kind: 'oddity' }>> = { kind: 'oddity', code, severity, message, at };
  if (value !== undefined) shown.value = toMeasure(how, value);
  if (threshold !== undefined) shown.threshold = toMeasure(how, threshold);
  if (source !== undefined) shown.source = source;
  if (hint !== undefined) shown.hint = hint;
  return shown;
}

function toMethods({ configuration, phase, methods }: ConfigurationMethods): ProofreadResponse['methods'][number] {
  return {
    configuration,
    phase,
    methods: methods.map(({ method, possible, sheets, missing, assumed }) => ({
      method,
      possible,
      sheets: [...sheets],
      missing: missing.map(({ at, message }) => ({ at, message })),
      assumed: [...assumed],
    })),
  };
}

function sentenceOf(faults: readonly Fault[], findings: readonly Finding[], isReadable: boolean): string {
  const counted = (severity: Finding['severity']) => findings.filter((one) => one.severity === severity).length;
  const parts = [
    plural(faults.length, 'fault'),
    plural(counted('strong'), 'strong finding'),
    plural(counted('caution'), 'caution'),
    plural(counted('note'), 'note'),
  ].filter((part) => part !== undefined);
  const what = isReadable ? 'the definition' : 'the definition, which cannot be read further';
  if (parts.length === 0) return `Nothing is found wrong or odd in ${what}.`;
  return `${parts.join(', ')} on ${what}.`.replace(/^[a-z]/, (letter) => letter.toUpperCase());
}

function plural(count: number, word: string): string | undefined {
  return count === 0 ? undefined : `${count} ${word}${count === 1 ? '' : 's'}`;
}
