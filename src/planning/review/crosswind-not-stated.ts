import type { FindingTest } from './finding-test.ts';

/** No crosswind to compare the wind with. */
export const crosswindNotStated: FindingTest = {
  code: 'crosswind-not-stated',
  severity: 'note',
  meaning: 'No demonstrated or limiting crosswind is stated: no answer can say that the crosswind exceeds it.',
  source: 'Cfr23s233',
  test: ({ aeroplane: { limitations } }) =>
    limitations?.demonstratedCrosswind !== undefined || limitations?.crosswind !== undefined
      ? []
      : [
          {
            message: 'No demonstrated crosswind is stated: answers compare the crosswind of a question with nothing.',
            at: '/limitations/demonstratedCrosswind',
          },
        ],
};
