import type { FindingTest } from './finding-test.ts';
import { columnAt, type ReviewedTable, wholeDistanceOf } from './review-context.ts';

/** Ground roll and whole distance in each other's place. */
export const columnsSwapped: FindingTest = {
  code: 'columns-swapped',
  severity: 'strong',
  meaning:
    'The ground roll is above the whole distance in most rows of a table: two columns stand in each other’s place.',
  source: 'HouseFit',
  test: ({ tables }) =>
    tables.flatMap((one) => {
      const { rows, above } = rollAboveWhole(one);
      if (above <= rows / 2) return [];
      const whole = wholeDistanceOf(one.table.phase);
      return [
        {
          message: `groundRoll of ${one.table.id} is above ${whole} in ${above} of ${rows} rows.`,
          at: columnAt(one, 'groundRoll'),
          value: above / rows,
          hint: `Perhaps groundRoll and ${whole} are exchanged.`,
        },
      ];
    }),
};

function rollAboveWhole({ table }: ReviewedTable): { readonly rows: number; readonly above: number } {
  const roll = table.outputs.indexOf('groundRoll');
  const whole = table.outputs.indexOf(wholeDistanceOf(table.phase));
  if (roll < 0 || whole < 0) return { rows: 0, above: 0 };
  const above = table.cells.filter((row) => (row[roll] as number) > (row[whole] as number)).length;
  return { rows: table.cells.length, above };
}
