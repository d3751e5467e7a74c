import type { ReferenceKey } from '../../references.ts';
import type { Caution, Measure, Severity } from '../answer.ts';

/**
 * One kind of caution: its code, what it means and the test that raises it.
 *
 * @typeParam Context - what the test may look at
 */
export interface CautionTest<Context> {
  readonly code: string;
  /** the severity it has, or the highest it can have */
  readonly severity: Severity;
  /** one sentence for the list of cautions */
  readonly meaning: string;
  /** the figure that decides, where one does */
  readonly threshold?: Measure | number;
  readonly source?: ReferenceKey;
  readonly test: (context: Context) => Raised | undefined;
}

/** What a test finds; code, severity, threshold and source are the caution's own unless it says otherwise. */
export type Raised = Omit<Caution, 'code' | 'severity'> & { readonly severity?: Severity };

/** The cautions that a list of tests raises in a context, in the order of the list. */
export function raisedCautions<Context>(tests: readonly CautionTest<Context>[], context: Context): Caution[] {
  const raised: Caution[] = [];
  for (const { code, severity, threshold, source, test } of tests) {
    const found = test(context);
    if (found === undefined) continue;
    raised.push({
      code,
      severity: found.severity ?? severity,
      message: found.message,
      at: found.at,
      value: found.value,
      threshold: found.threshold ?? threshold,
      source: found.source ?? source,
    });
  }
  return raised;
}
