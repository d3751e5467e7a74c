import { type ConditionsContext, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** Outside these a slip is more likely than the weather [Pa]. */
const lowest = 95_000;
const highest = 105_000;

/** A QNH that is seldom seen. */
export const pressureExtreme: CautionTest<ConditionsContext> = {
  code: 'pressure-extreme',
  severity: 'caution',
  meaning: 'The QNH is below 950 hPa or above 1050 hPa, which weather seldom reaches.',
  source: 'Judgement',
  test: (context) => {
    const { kind, value } = context.question.weather.pressure;
    if (kind !== 'qnh' || (value >= lowest - 1e-6 && value <= highest + 1e-6)) return undefined;
    const bound = value < lowest ? lowest : highest;
    const off = context.air.pressureAltitude - context.question.runway.elevation;
    return {
      message: `QNH ${textIn(context, 'pressure', value)} is ${value < lowest ? 'below' : 'above'} ${textIn(context, 'pressure', bound)}. It puts the pressure altitude ${textIn(context, 'altitude', Math.abs(off))} ${off > 0 ? 'above' : 'below'} the elevation.`,
      at: '/weather/pressure/qnh',
      value: { kind: 'pressure', value },
      threshold: { kind: 'pressure', value: bound },
    };
  },
};
