import type { FindingTest } from './finding-test.ts';
import { textIn } from './review-context.ts';

/** Wing loadings at the maximum takeoff mass of most aeroplanes, by what drives them [kg/m2]. @see references.Judgement */
const usual: Readonly<Record<string, readonly [number, number]>> = {
  'single-piston': [30, 140],
  'single-electric': [30, 140],
  'single-turboprop': [60, 220],
  'single-jet': [80, 350],
  'twin-piston': [60, 240],
  'twin-electric': [50, 240],
  'twin-turboprop': [90, 380],
  'twin-jet': [120, 720],
};

/** Much or little mass for the wing. */
export const wingLoadingUnusual: FindingTest = {
  code: 'wing-loading-unusual',
  severity: 'caution',
  meaning: 'The maximum takeoff mass over the wing area is outside what aeroplanes of the category have.',
  source: 'Judgement',
  test: (context) => {
    const { masses, wing, category } = context.aeroplane;
    const [low, high] = usual[category] as readonly [number, number];
    const loading = masses.maximumTakeoff / wing.area;
    if (loading >= low && loading <= high) return [];
    return [
      {
        message: `${textIn(context, 'mass', masses.maximumTakeoff)} on ${textIn(context, 'area', wing.area)} is a wing loading of ${Math.round(loading)} kg/m²; usual for ${category} is ${low} to ${high} kg/m².`,
        at: '/wing/area',
        value: loading,
        threshold: loading < low ? low : high,
        hint: 'Check the units of the wing area and of the mass.',
      },
    ];
  },
};
