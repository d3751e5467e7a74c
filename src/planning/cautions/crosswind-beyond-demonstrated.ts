import { type ConditionsContext, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** A crosswind, gusts counted, beyond what was demonstrated or is allowed. */
export const crosswindBeyondDemonstrated: CautionTest<ConditionsContext> = {
  code: 'crosswind-beyond-demonstrated',
  severity: 'strong',
  meaning:
    'The wind across the runway, gusts counted, is beyond what was demonstrated; beyond a limitation it is strong.',
  source: 'Cfr23s233',
  test: (context) => {
    const { demonstratedCrosswind, crosswind: limitation } = context.question.aeroplane.limitations ?? {};
    const mean = context.wind.crosswind;
    if (mean === undefined) return undefined;
    const component = Math.max(mean, context.wind.gust?.crosswind ?? 0);
    const isLimited = limitation !== undefined && component > limitation + 1e-9;
    const limit = isLimited ? limitation : demonstratedCrosswind;
    if (limit === undefined || component <= limit + 1e-9) return undefined;
    const gusts = component > mean ? ' in gusts' : '';
    const name = isLimited ? 'limitation' : 'demonstrated';
    return {
      severity: isLimited ? 'strong' : 'caution',
      message: `Crosswind ${textIn(context, 'speed', component)}${gusts} on runway ${context.question.runway.designator} is ${textIn(context, 'speed', component - limit)} beyond the ${name} ${textIn(context, 'speed', limit)}.`,
      at: '/weather/wind',
      value: { kind: 'speed', value: component },
      threshold: { kind: 'speed', value: limit },
    };
  },
};
