import type { Configuration } from '../../performance/aeroplane.ts';
import type { ManualSpeed } from '../../performance/flight-manual/flight-manual.ts';
import { percentText } from '../sentences/measure-text.ts';
import type { FindingTest, Raised } from './finding-test.ts';
import { overStall, stallAt } from './over-stall.ts';
import { type Reviewed, textIn } from './review-context.ts';

/** Ratio beyond which two statements of one speed are not the same. @see references.Judgement */
const same = 0.03;

/** A speed of the configuration that is not the one the manual's speed table prints. */
export const speedTableDiffers: FindingTest = {
  code: 'speed-table-differs',
  severity: 'caution',
  meaning:
    "A speed of the configuration, or its stall speed, is more than 3 % off the one in the manual's speed table.",
  threshold: same,
  source: 'Judgement',
  test: (context) =>
    context.speedTables.flatMap(({ table, at }) =>
      table.configurations.flatMap((id) => {
        const configuration = context.aeroplane.configurations[id];
        if (configuration === undefined) return [];
        return table.speeds.flatMap((name, column) => {
          const off = table.masses.map((mass, row) => {
            const ours = statedSpeed(context, configuration, name, mass);
            const printed = table.cells[row]?.[column] as number;
            return { mass, row, printed, ours, ratio: ours === undefined ? 1 : ours / printed };
          });
          const worst = off.reduce((most, one) => (Math.abs(one.ratio - 1) > Math.abs(most.ratio - 1) ? one : most));
          if (worst.ours === undefined || Math.abs(worst.ratio - 1) <= same) return [];
          const found: Raised = {
            message: `${name} in ${id} at ${textIn(context, 'mass', worst.mass)} is ${textIn(context, 'speed', worst.ours)} by the configuration, ${textIn(context, 'speed', worst.printed)} CAS in ${table.id}: ${percentText(Math.abs(worst.ratio - 1))} ${worst.ratio > 1 ? 'more' : 'less'}.`,
            at: `${at}/rows/${worst.row}`,
            value: worst.ratio - 1,
            hint: 'One of the two may be indicated, in another unit, or of another configuration.',
          };
          return [found];
        });
      }),
    ),
};

/** Calibrated, as the configuration states it [m/s]; undefined where it does not. */
function statedSpeed(
  { aeroplane }: Reviewed,
  configuration: Configuration,
  name: ManualSpeed,
  mass: number,
): number | undefined {
  const stall = stallAt(aeroplane, configuration, mass);
  if (name === 'stall') return stall;
  const speed = configuration.speeds?.[name];
  return speed && overStall(speed, aeroplane, configuration) * stall;
}
