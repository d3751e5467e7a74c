import { type ConditionsContext, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** Deviation beyond which a slip is as likely as the weather [K]. */
const far = 30;

/** A temperature far from the standard of its altitude. */
export const temperatureFarFromStandard: CautionTest<ConditionsContext> = {
  code: 'temperature-far-from-standard',
  severity: 'caution',
  meaning: 'The temperature is more than 30 °C from the standard at this pressure altitude.',
  threshold: { kind: 'temperatureDifference', value: far },
  source: 'Judgement',
  test: (context) => {
    const { temperature, temperatureDeviation } = context.air;
    if (Math.abs(temperatureDeviation) <= far + 1e-9) return undefined;
    const side = temperatureDeviation > 0 ? 'above' : 'below';
    const density = temperature / (temperature - temperatureDeviation);
    const share = Math.abs(Math.round((1 / density - 1) * 1000) / 10);
    return {
      message: `Temperature ${textIn(context, 'temperature', temperature)} is ${textIn(context, 'temperatureDifference', Math.abs(temperatureDeviation))} ${side} standard. The air is ${share} % ${temperatureDeviation > 0 ? 'thinner' : 'denser'} than on a standard day.`,
      at: '/weather/temperature',
      value: { kind: 'temperatureDifference', value: temperatureDeviation },
    };
  },
};
