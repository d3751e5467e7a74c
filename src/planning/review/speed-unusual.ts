import type { Configuration } from '../../performance/aeroplane.ts';
import type { FindingTest } from './finding-test.ts';
import { overStall } from './over-stall.ts';
import { configurationsOf } from './review-context.ts';

/** Speeds of the procedure over the stall speed, lowest and highest usual. @see references.Raymer */
const usual: Readonly<Record<keyof NonNullable<Configuration['speeds']>, readonly [number, number]>> = {
  rotation: [1, 1.25],
  liftOff: [1.05, 1.3],
  screen: [1.13, 1.5],
  engineOutLiftOff: [1.05, 1.4],
  engineOutScreen: [1.1, 1.5],
  landingReference: [1.2, 1.55],
  touchdown: [1.03, 1.35],
};

/** A speed of the procedure that is nearer to the stall speed, or further from it, than is usual. */
export const speedUnusual: FindingTest = {
  code: 'speed-unusual',
  severity: 'caution',
  meaning:
    'A speed of the procedure over the stall speed is outside what is usual: lift-off 1.05 to 1.30, screen 1.13 to 1.50, with one engine out 1.05 to 1.40 and 1.10 to 1.50, landing reference 1.20 to 1.55, touchdown 1.03 to 1.35, rotation up to 1.25.',
  source: 'Raymer',
  test: (context) =>
    configurationsOf(context).flatMap(({ id, configuration, at }) =>
      (Object.keys(usual) as (keyof typeof usual)[]).flatMap((name) => {
        const speed = configuration.speeds?.[name];
        if (speed === undefined) return [];
        const ratio = overStall(speed, context.aeroplane, configuration);
        const [low, high] = usual[name];
        if (ratio >= low - 1e-9 && ratio <= high + 1e-9) return [];
        return [
          {
            message: `${name} in ${id} is ${ratio.toFixed(2)} times the stall speed; usual is ${low.toFixed(2)} to ${high.toFixed(2)}.`,
            at: `${at}/speeds/${name}`,
            value: ratio,
            threshold: ratio < low ? low : high,
            ...(speed.kind === 'cas'
              ? { hint: 'Check that it is calibrated, its unit, the mass it belongs to, and the stall speed.' }
              : {}),
          },
        ];
      }),
    ),
};
