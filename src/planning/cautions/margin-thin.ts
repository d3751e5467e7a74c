import { percentText } from '../sentences/measure-text.ts';
import type { CautionTest } from './caution-test.ts';
import { measureDown, type TakeoffContext, textIn } from './takeoff-context.ts';

/** Every check passes, one of them narrowly. */
export const marginThin: CautionTest<TakeoffContext> = {
  code: 'margin-thin',
  severity: 'caution',
  meaning:
    'Every check passes, but the least margin is under the figure of the rule set (10 % where it has none), or the high end of the 90 % band with the same factors would not pass.',
  source: 'Judgement',
  test: (context) => {
    const { thin, governing, ruleSet, question, distances } = context;
    if (thin === undefined || governing?.margin === undefined) return undefined;
    const { margin, marginRatio = 0, available = 0, required = 0 } = governing;
    const shared = { at: '/runway/declared', value: marginRatio } as const;
    if (thin === 'margin') {
      return {
        ...shared,
        message: `The check ${governing.code} passes with ${measureDown(context, Math.max(0, margin))} spare, ${percentText(Math.max(0, marginRatio))} of what is required; under ${percentText(ruleSet.thinMargin.ratio)} is thin on runway ${question.runway.designator}.`,
        threshold: ruleSet.thinMargin.ratio,
      };
    }
    const band = governing.of === 'groundRoll' ? distances?.groundRoll : distances?.takeoffDistance;
    const high = band === undefined ? required : (required * band.high) / band.value;
    return {
      ...shared,
      message: `At the high end of the 90 % band, with the same factors, the check ${governing.code} would require ${textIn(context, 'distance', high)}; ${measureDown(context, available)} is available.`,
      threshold: high / required - 1,
    };
  },
};
