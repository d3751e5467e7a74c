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
  readonly test: (context: Context) => Caution | undefined;
}
