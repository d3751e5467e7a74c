import type { Work } from '../../numerics/work.ts';
import { comparedTables } from './compared-tables.ts';
import { type Finding, findingsOf } from './finding-test.ts';
import { findingTests } from './findings.ts';
import type { ComparedTable, Reviewed } from './review-context.ts';

/** What is odd about a definition, and its tables beside physics. */
export interface Review {
  readonly findings: readonly Finding[];
  readonly compared: readonly ComparedTable[];
}

/**
 * Everything that is odd about a definition which can be read.
 *
 * @param faulty - ids of configurations, or 'all', where a fault leaves physics nothing to go by
 * @returns work that yields between its parts
 */
export function* review(reviewed: Reviewed, faulty: ReadonlySet<string> = new Set()): Work<Review> {
  const compared = yield* comparedTables(reviewed, faulty);
  return { findings: findingsOf(findingTests, { ...reviewed, compared }), compared };
}
