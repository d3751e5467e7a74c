import { type AnswerContext, measureDown, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** A check that fails. */
export const marginNegative: CautionTest<AnswerContext> = {
  code: 'margin-negative',
  severity: 'caution',
  meaning: 'More is required than is available in at least one check.',
  threshold: { kind: 'distance', value: 0 },
  source: 'SpaEfbAmc5',
  test: (context) => {
    const failing = context.checks.filter(({ result }) => result === 'fails');
    const worst = context.governing;
    if (failing.length === 0 || worst?.margin === undefined) return undefined;
    const { required = 0, available = 0, margin } = worst;
    const others = failing.length === 1 ? '' : ` ${failing.length} checks fail.`;
    return {
      message: `The check ${worst.code} is short by ${textIn(context, 'distance', -margin)}: ${textIn(context, 'distance', required)} required, ${measureDown(context, available)} available.${others}`,
      at: '/runway/declared',
      value: { kind: 'distance', value: margin, direction: 'down' },
    };
  },
};
