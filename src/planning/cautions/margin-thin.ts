import { measureText, percentText } from '../sentences/measure-text.ts';
import { type AnswerContext, measureDown, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** Every check passes, one of them narrowly. */
export const marginThin: CautionTest<AnswerContext> = {
  code: 'margin-thin',
  severity: 'caution',
  meaning:
    'Every check passes, but the least margin is under the figure of the rule set (10 % where it has none), or the high end of the 90 % band with the same factors would not pass.',
  source: 'Judgement',
  test: (context) => {
    const { thin, ruleSet, question } = context;
    if (thin === undefined) return undefined;
    const { check, requiredAtHigh } = thin;
    const { margin = 0, marginRatio = 0, available = 0, required = 0, unit } = check;
    const at = unit === 'distance' ? '/runway/declared' : '/mass';
    if (thin.kind === 'margin') {
      return {
        message: `The check ${check.code} passes with ${measureText(question.units, unit, Math.max(0, margin), 'down')} spare on runway ${question.runway.designator}, ${percentText(Math.max(0, marginRatio), 1, 'down')} of what is required. Under ${percentText(ruleSet.thinMargin.ratio)} a small change uses it up.`,
        at,
        value: marginRatio,
        threshold: ruleSet.thinMargin.ratio,
      };
    }
    return {
      message: `At the high end of the 90 % band, with the same factors, the check ${check.code} would require ${textIn(context, 'distance', requiredAtHigh)}; ${measureDown(context, available)} is available.`,
      at,
      value: marginRatio,
      threshold: requiredAtHigh / required - 1,
    };
  },
};
