import type { FindingTest } from './finding-test.ts';
import { textIn } from './review-context.ts';

/** Greatest takeoff mass and passenger seats of each basis: 12 500 lb and 9, commuter 19 000 lb and 19. */
const bounds = {
  'cs-23-amendment-4': { mass: 5670, seats: 9 },
  'cs-23-commuter': { mass: 8618, seats: 19 },
} as const;

/** An aeroplane too heavy or with too many seats for its certification basis, or of a kind that has another. */
export const certificationUnusual: FindingTest = {
  code: 'certification-unusual',
  severity: 'caution',
  meaning:
    'The aeroplane is heavier or has more seats than its certification basis reaches (5 670 kg and 9; commuter 8 618 kg and 19), or pistons under cs-25.',
  source: 'Cfr23s51',
  test: (context) => {
    const { certification, masses, passengerSeats = 0, category } = context.aeroplane;
    const { basis } = certification;
    const at = '/certification/basis';
    if (basis === 'none') return [];
    if (basis === 'cs-25') {
      if (!category.endsWith('piston') && !category.endsWith('electric')) return [];
      return [
        { message: `The basis is cs-25 and the category ${category}.`, at, hint: 'cs-23-amendment-4 is usual for it.' },
      ];
    }
    const { mass, seats } = bounds[basis];
    if (masses.maximumTakeoff > mass * (1 + 1e-3)) {
      return [
        {
          message: `The maximum takeoff mass is ${textIn(context, 'mass', masses.maximumTakeoff)}; ${basis} reaches ${textIn(context, 'mass', mass)}.`,
          at,
          value: { kind: 'mass', value: masses.maximumTakeoff },
          threshold: { kind: 'mass', value: mass },
        },
      ];
    }
    if (passengerSeats <= seats) return [];
    return [
      {
        message: `There are ${passengerSeats} passenger seats; ${basis} reaches ${seats}.`,
        at,
        value: passengerSeats,
        threshold: seats,
      },
    ];
  },
};
