import { sha256 } from '../catalogue/sha-256.ts';
import { ruleSetFigures } from '../contract/rule-set-figures.ts';
import type { Stamp } from '../contract/to-basis.ts';
import { modelVersion } from '../planning/model-version.ts';
import { ruleSets } from '../planning/rules/rule-sets.ts';

const rulesDigest = sha256(JSON.stringify(ruleSets.map(ruleSetFigures)));

/** What every answer carries of the service itself, so that a record can be replayed; worked out once. */
export function stamp(): Stamp {
  return { modelVersion, rulesDigest };
}
