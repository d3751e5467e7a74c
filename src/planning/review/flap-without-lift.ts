import { maximumLiftCoefficient } from '../../performance/speeds/maximum-lift-coefficient.ts';
import type { FindingTest } from './finding-test.ts';
import { configurationsOf, textIn } from './review-context.ts';

/** More flap, and less lift. */
export const flapWithoutLift: FindingTest = {
  code: 'flap-without-lift',
  severity: 'caution',
  meaning: 'A configuration with more flap has a lower maximum lift coefficient: two stall speeds may be exchanged.',
  source: 'Judgement',
  test: (context) => {
    const { wing } = context.aeroplane;
    const byFlap = configurationsOf(context)
      .map((one) => ({ ...one, lift: maximumLiftCoefficient(one.configuration.maximumLift, wing.area) }))
      .sort((a, b) => a.configuration.flap - b.configuration.flap);
    return byFlap.flatMap(({ id, at, lift, configuration }, i) => {
      const before = byFlap
        .slice(0, i)
        .filter((other) => other.configuration.flap < configuration.flap)
        .find((other) => other.lift > lift * (1 + 1e-9));
      if (before === undefined) return [];
      return [
        {
          message: `${id} with ${textIn(context, 'angle', configuration.flap)} of flap has a maximum lift coefficient of ${lift.toFixed(2)}, ${before.id} with ${textIn(context, 'angle', before.configuration.flap)} has ${before.lift.toFixed(2)}.`,
          at: `${at}/maximumLift`,
          value: lift,
          threshold: before.lift,
        },
      ];
    });
  },
};
