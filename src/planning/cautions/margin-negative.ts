import { measureText } from '../sentences/measure-text.ts';
import type { AnswerContext } from './answer-context.ts';
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
    const { required = 0, available = 0, margin, unit } = worst;
    const text = (si: number, direction: 'up' | 'down') => measureText(context.question.units, unit, si, direction);
    const others = failing.length === 1 ? '' : ` ${failing.length} checks fail.`;
    return {
      message: `The check ${worst.code} is short by ${text(-margin, 'up')}: ${text(required, 'up')} required, ${text(available, 'down')} available.${others}`,
      at: unit === 'distance' ? '/runway/declared' : '/mass',
      value: { kind: unit, value: margin, direction: 'down' },
      threshold: { kind: unit, value: 0 },
    };
  },
};
