import { type ConditionsContext, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** A temperature above the aeroplane's limitation. */
export const temperatureAboveLimit: CautionTest<ConditionsContext> = {
  code: 'temperature-above-limit',
  severity: 'strong',
  meaning: 'The temperature is above the maximum that the aeroplane is approved for.',
  source: 'Cfr25s1501',
  test: (context) => {
    const maximum = context.question.aeroplane.limitations?.maximumTemperature;
    const { temperature } = context.air;
    if (maximum === undefined || temperature <= maximum + 1e-9) return undefined;
    return {
      message: `Temperature ${textIn(context, 'temperature', temperature)} is ${textIn(context, 'temperatureDifference', temperature - maximum)} above the aeroplane's maximum of ${textIn(context, 'temperature', maximum)}. The distances are computed as asked.`,
      at: '/weather/temperature',
      value: { kind: 'temperature', value: temperature },
      threshold: { kind: 'temperature', value: maximum },
    };
  },
};
