import type { FindingTest } from './finding-test.ts';
import { configurationsOf } from './review-context.ts';

/** What a review leaves aside of a large flight manual. */
export const rowsNotCompared: FindingTest = {
  code: 'rows-not-compared',
  severity: 'note',
  meaning: 'Not every row of a table was compared with physics: a review compares 480 rows of 12 tables at most.',
  source: 'Judgement',
  test: (context) =>
    context.tables.flatMap(({ table, at }) => {
      if (table.phase === 'climb') return [];
      const ids = configurationsOf(context, table.phase).map(({ id }) => id);
      const own = table.configurations.filter((id) => ids.includes(id));
      const compared = context.compared.filter((one) => one.at === at);
      const rows = compared.reduce((sum, one) => sum + one.rows.length, 0);
      const isWhole = compared.length === own.length && compared.every((one) => one.rows.length === one.rowsOfTable);
      if (isWhole) return [];
      return [
        {
          message: `Of ${table.id}, with ${table.nodes.length} rows for ${own.length === 1 ? '1 configuration' : `${own.length} configurations`}, ${rows} rows are compared with physics.`,
          at,
          value: rows,
          hint: 'A fault of the definition stands in the way, or there are more rows than one review compares.',
        },
      ];
    }),
};
