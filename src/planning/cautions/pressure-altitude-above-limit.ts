import { type ConditionsContext, textIn } from './answer-context.ts';
import type { CautionTest } from './caution-test.ts';

/** A pressure altitude above the aeroplane's limitation. */
export const pressureAltitudeAboveLimit: CautionTest<ConditionsContext> = {
  code: 'pressure-altitude-above-limit',
  severity: 'strong',
  meaning: 'The pressure altitude of the runway is above the maximum that the aeroplane is approved for.',
  source: 'Cfr25s1501',
  test: (context) => {
    const maximum = context.question.aeroplane.limitations?.maximumPressureAltitude;
    const { pressureAltitude } = context.air;
    if (maximum === undefined || pressureAltitude <= maximum + 1e-6) return undefined;
    return {
      message: `Pressure altitude ${textIn(context, 'altitude', pressureAltitude)} is ${textIn(context, 'altitude', pressureAltitude - maximum)} above the aeroplane's maximum of ${textIn(context, 'altitude', maximum)}. The distances are computed as asked.`,
      at: '/runway/elevation',
      value: { kind: 'altitude', value: pressureAltitude },
      threshold: { kind: 'altitude', value: maximum },
    };
  },
};
