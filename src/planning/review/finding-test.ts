import type { ReferenceKey } from '../../references.ts';
import type { Measure, Severity } from '../answer.ts';
import type { ReviewContext } from './review-context.ts';

/** One kind of finding about a definition: its code, what it means and the test that raises it, once or several times. */
export interface FindingTest {
  readonly code: string;
  /** the severity it has, or the highest it can have */
  readonly severity: Severity;
  /** one sentence for a list of findings */
  readonly meaning: string;
  /** the figure that decides, where one does */
  readonly threshold?: Measure | number;
  readonly source?: ReferenceKey;
  readonly test: (context: ReviewContext) => readonly Raised[];
}

/** Something odd about a definition; nothing that is odd makes it unusable. */
export interface Finding {
  readonly code: string;
  readonly severity: Severity;
  readonly message: string;
  /** pointer into the definition */
  readonly at: string;
  readonly value?: Measure | number | undefined;
  readonly threshold?: Measure | number | undefined;
  readonly source?: ReferenceKey | undefined;
  /** what was probably meant, or where to look */
  readonly hint?: string | undefined;
}

/** What a test finds; severity, threshold and source are the finding's own unless it says otherwise. */
export type Raised = Omit<Finding, 'code' | 'severity'> & { readonly severity?: Severity };

/** What a list of tests finds, in the order of the list. */
export function findingsOf(tests: readonly FindingTest[], context: ReviewContext): Finding[] {
  return tests.flatMap(({ code, severity, threshold, source, test }) =>
    test(context).map((found) => ({
      code,
      severity: found.severity ?? severity,
      message: found.message,
      at: found.at,
      value: found.value,
      threshold: found.threshold ?? threshold,
      source: found.source ?? source,
      hint: found.hint,
    })),
  );
}
