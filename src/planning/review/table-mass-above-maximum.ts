import type { FindingTest } from './finding-test.ts';
import { columnAt, massesOf, maximumMassOf, textIn } from './review-context.ts';

const pound = 0.45359237;

/** A table for masses that the aeroplane may not have. */
export const tableMassAboveMaximum: FindingTest = {
  code: 'table-mass-above-maximum',
  severity: 'caution',
  meaning:
    'A table is for a mass above the maximum of its phase: another unit, another model, or a maximum that is wrong.',
  source: 'HouseFit',
  test: (context) =>
    context.tables.flatMap((one) => {
      const maximum = maximumMassOf(context, one.table.phase);
      const heaviest = Math.max(...massesOf(one.table));
      if (!(heaviest > maximum * (1 + 1e-3))) return [];
      const inAxis = one.table.axes.includes('mass');
      const unit = inAxis ? one.columns.find(({ name }) => name === 'mass')?.unit : one.massUnit;
      return [
        {
          message: `${one.table.id} is for ${textIn(context, 'mass', heaviest)}; the maximum for ${one.table.phase} is ${textIn(context, 'mass', maximum)}.`,
          at: inAxis ? columnAt(one, 'mass') : `${one.at}/conditions/mass`,
          value: { kind: 'mass', value: heaviest },
          threshold: { kind: 'mass', value: maximum },
          ...(unit === 'kg' && heaviest * pound <= maximum * (1 + 1e-3) ? { hint: 'In lb it would fit.' } : {}),
        },
      ];
    }),
};
