import { percentText } from '../sentences/measure-text.ts';
import type { FindingTest } from './finding-test.ts';
import { columnAt, wholeDistanceOf } from './review-context.ts';

/** Ground roll over whole distance of printed tables. @see references.Judgement */
const usual = { lowest: 0.3, highest: 0.88 };

/** A ground roll that is an uncommon share of the whole distance. */
export const rollShareUnusual: FindingTest = {
  code: 'roll-share-unusual',
  severity: 'caution',
  meaning:
    'In most rows of a table the ground roll is under 30 % or over 88 % of the whole distance: one of the columns may be in another unit.',
  source: 'Judgement',
  test: ({ tables }) =>
    tables.flatMap((one) => {
      const { table } = one;
      const roll = table.outputs.indexOf('groundRoll');
      const name = wholeDistanceOf(table.phase);
      const whole = table.outputs.indexOf(name);
      if (roll < 0 || whole < 0) return [];
      const shares = table.cells.map((row) => (row[roll] as number) / (row[whole] as number)).sort((a, b) => a - b);
      const middle = shares[shares.length >> 1] as number;
      if ((middle >= usual.lowest && middle <= usual.highest) || middle > 1) return [];
      return [
        {
          message: `The ground roll of ${table.id} is ${percentText(middle)} of ${name} in the middle of its rows.`,
          at: columnAt(one, 'groundRoll'),
          value: middle,
          threshold: middle < usual.lowest ? usual.lowest : usual.highest,
          hint: 'Check the units of both columns.',
        },
      ];
    }),
};
