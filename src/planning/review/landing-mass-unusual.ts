import { percentText } from '../sentences/measure-text.ts';
import type { FindingTest } from './finding-test.ts';
import { textIn } from './review-context.ts';

/** Least usual landing over takeoff mass: of jets and of everything else. @see references.Judgement */
const least = { jet: 0.65, other: 0.85 };

/** A landing mass far below the takeoff mass. */
export const landingMassUnusual: FindingTest = {
  code: 'landing-mass-unusual',
  severity: 'note',
  meaning: 'The maximum landing mass is under 85 % of the maximum takeoff mass, for a jet under 65 %.',
  source: 'Judgement',
  test: (context) => {
    const { masses, category } = context.aeroplane;
    const { maximumLanding, maximumTakeoff } = masses;
    if (maximumLanding === undefined) return [];
    const threshold = category.endsWith('jet') ? least.jet : least.other;
    const ratio = maximumLanding / maximumTakeoff;
    if (ratio >= threshold) return [];
    return [
      {
        message: `The maximum landing mass ${textIn(context, 'mass', maximumLanding)} is ${percentText(ratio)} of the maximum takeoff mass ${textIn(context, 'mass', maximumTakeoff)}.`,
        at: '/masses/maximumLanding',
        value: ratio,
        threshold,
        hint: 'Check the units of both.',
      },
    ];
  },
};
