import { percentText } from '../sentences/measure-text.ts';
import type { FindingTest } from './finding-test.ts';
import { textIn } from './review-context.ts';

/** Empty over maximum takeoff mass of most aeroplanes. @see references.Judgement */
const usual = { lowest: 0.4, highest: 0.82 };

/** An empty mass that leaves uncommonly much or little for people and fuel. */
export const emptyMassUnusual: FindingTest = {
  code: 'empty-mass-unusual',
  severity: 'note',
  meaning: 'The empty mass is under 40 % or over 82 % of the maximum takeoff mass.',
  source: 'Judgement',
  test: (context) => {
    const { empty, maximumTakeoff } = context.aeroplane.masses;
    if (empty === undefined) return [];
    const ratio = empty / maximumTakeoff;
    if (ratio >= usual.lowest && ratio <= usual.highest) return [];
    return [
      {
        message: `The empty mass ${textIn(context, 'mass', empty)} is ${percentText(ratio)} of the maximum takeoff mass ${textIn(context, 'mass', maximumTakeoff)}.`,
        at: '/masses/empty',
        value: ratio,
        threshold: ratio < usual.lowest ? usual.lowest : usual.highest,
        hint: 'Check the units of both.',
      },
    ];
  },
};
