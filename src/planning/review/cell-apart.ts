import { percentText } from '../sentences/measure-text.ts';
import type { FindingTest } from './finding-test.ts';
import { columnAt, columnName, textIn } from './review-context.ts';

/** One cell that does not go with the rest of its table. */
export const cellApart: FindingTest = {
  code: 'cell-apart',
  severity: 'caution',
  meaning:
    "A cell is far from what the aeroplane's physics, fitted to the other cells, gives there: a slip of the pen, or two digits exchanged.",
  source: 'HouseFit',
  test: (context) =>
    context.compared.flatMap((one) =>
      one.slips.flatMap((finding) => {
        if (finding.code !== 'outlier' || (finding.kind !== 'groundRoll' && finding.kind !== 'wholeDistance'))
          return [];
        const { factor } = one.table.contains;
        const [given, computed] = [finding.given * factor, finding.computed * factor];
        const name = columnName(finding.kind, one);
        const off = given / computed - 1;
        return [
          {
            message: `${name} in row ${finding.row} of ${one.table.id} is ${textIn(context, 'distance', given)}; physics fitted to the other cells gives ${textIn(context, 'distance', computed)}, ${percentText(Math.abs(off))} ${off > 0 ? 'less' : 'more'}.`,
            at: columnAt(one, name, finding.row),
            value: given / computed,
            hint:
              finding.exchanged === undefined
                ? 'Check the cell against the manual.'
                : `Perhaps ${textIn(context, 'distance', finding.exchanged * factor)}, with two digits exchanged; check the cell against the manual.`,
          },
        ];
      }),
    ),
};
