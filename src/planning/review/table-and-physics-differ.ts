import { physicsSpread } from '../rules/physics-spread.ts';
import { percentText } from '../sentences/measure-text.ts';
import type { FindingTest, Raised } from './finding-test.ts';
import { type ComparedTable, columnAt, type ReviewContext, textIn, wholeDistanceOf } from './review-context.ts';

/** Distances that physics of the definition as it stands does not give. */
export const tableAndPhysicsDiffer: FindingTest = {
  code: 'table-and-physics-differ',
  severity: 'caution',
  meaning:
    "A table and the aeroplane's physics as the definition states it differ by more than twice what the physics is usually off, in one or more cells.",
  source: 'HouseManual',
  test: (context) =>
    context.compared.flatMap((one) =>
      (['groundRoll', wholeDistanceOf(one.table.phase)] as const).flatMap((output) => beyond(context, one, output)),
    ),
};

/** The cell of a column that is furthest apart, with how many are. */
function beyond(
  context: ReviewContext,
  one: ComparedTable,
  output: 'groundRoll' | 'takeoffDistance' | 'landingDistance',
): Raised[] {
  const { table, rows, physics, configuration } = one;
  const column = table.outputs.indexOf(output);
  if (column < 0) return [];
  const cells = rows.flatMap(({ node, figures }) => {
    const computed = figures[output];
    const printed = table.cells[node.row]?.[column] as number;
    return computed === undefined ? [] : [{ row: node.row, printed, computed, off: Math.log(printed / computed) }];
  });
  const threshold = physicsSpread[physics.method];
  const apart = cells.filter(({ off }) => Math.abs(off) > threshold);
  if (apart.length === 0) return [];
  const worst = apart.reduce((most, cell) => (Math.abs(cell.off) > Math.abs(most.off) ? cell : most));
  const ratios = cells.map(({ off }) => Math.exp(off)).sort((a, b) => a - b);
  const middle = ratios[ratios.length >> 1] as number;
  return [
    {
      message: `${output} of ${table.id} and ${physics.method} physics of ${configuration} differ by more than ${percentText(Math.exp(threshold) - 1, 0)} in ${apart.length} of ${cells.length} cells: row ${worst.row} is ${textIn(context, 'distance', worst.printed)}, physics gives ${textIn(context, 'distance', worst.computed)}; the middle ratio is ${middle.toFixed(2)}.`,
      at: columnAt(one, output, worst.row),
      value: Math.exp(worst.off),
      threshold: Math.exp(Math.sign(worst.off) * threshold),
      ...(hintOf(middle, ratios) ?? {}),
    },
  ];
}

/** Factors that a whole column has where its unit is another one. */
const factors = [
  [3.2808, 'The column may be in ft.'],
  [0.3048, 'The column may be in m.'],
] as const;

/** Cells whose ratios stay within this of each other are at one ratio, as a unit makes them. */
const constant = 1.35;

function hintOf(middle: number, ratios: readonly number[]): { readonly hint: string } | undefined {
  const isConstant = (ratios.at(-1) as number) / (ratios[0] as number) < constant;
  const unit = isConstant ? factors.find(([factor]) => Math.abs(Math.log(middle / factor)) < 0.3) : undefined;
  return unit && { hint: unit[1] };
}
