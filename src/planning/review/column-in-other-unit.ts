import { percentText } from '../sentences/measure-text.ts';
import type { FindingTest } from './finding-test.ts';
import { columnAt, columnName } from './review-context.ts';

/** A column that goes with the aeroplane's physics as soon as its unit is another one. */
export const columnInOtherUnit: FindingTest = {
  code: 'column-in-other-unit',
  severity: 'strong',
  meaning:
    "A column of a table does not go with the aeroplane's physics in the unit stated, and does in another one: the unit of the column is probably wrong.",
  source: 'HouseFit',
  test: ({ compared }) =>
    compared.flatMap((one) =>
      one.slips.flatMap((finding) => {
        if (finding.code !== 'unit-error') return [];
        const { column, printed, declared, rmsIfSo } = finding;
        const name = columnName(column, one);
        const conditions = column === 'mass' && one.massUnit !== undefined;
        const named = column === 'distances' ? 'groundRoll and the whole distance' : name;
        return [
          {
            message: `${named} of ${one.table.id} in ${declared} does not go with the physics of ${one.configuration}; read in ${printed} it does, within ${percentText(rmsIfSo)}.`,
            at: conditions ? `${one.at}/conditions/mass` : `${columnAt(one, name)}/unit`,
            value: rmsIfSo,
            hint: `Perhaps ${printed}; check the heading of the column in the manual.`,
          },
        ];
      }),
    ),
};
