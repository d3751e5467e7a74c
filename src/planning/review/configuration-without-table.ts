import type { FindingTest } from './finding-test.ts';
import { configurationsOf, type Reviewed } from './review-context.ts';

/** A configuration that the flight manual's tables leave out. */
export const configurationWithoutTable: FindingTest = {
  code: 'configuration-without-table',
  severity: 'note',
  meaning: 'There is a flight manual, and none of its tables and graphs is for a configuration in one of its phases.',
  source: 'HouseManual',
  test: (context) =>
    context.tables.length + context.graphs.length === 0
      ? []
      : (['takeoff', 'landing'] as const).flatMap((phase) =>
          configurationsOf(context, phase)
            .filter(({ id }) => !hasSheet(context, phase, id))
            .map(({ id, at }) => ({
              message: `No table of the flight manual is for ${phase} in ${id}: its distances come from physics.`,
              at,
            })),
        ),
};

function hasSheet({ tables, graphs }: Reviewed, phase: 'takeoff' | 'landing', id: string): boolean {
  return [...tables.map(({ table }) => table), ...graphs.map(({ graph }) => graph)].some(
    (sheet) => sheet.phase === phase && sheet.configurations.includes(id),
  );
}
