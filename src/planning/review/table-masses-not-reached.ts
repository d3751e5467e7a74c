import type { FindingTest } from './finding-test.ts';
import { columnAt, configurationsOf, massesOf, maximumMassOf, type ReviewContext, textIn } from './review-context.ts';

/** Tables that end below the maximum mass. */
export const tableMassesNotReached: FindingTest = {
  code: 'table-masses-not-reached',
  severity: 'caution',
  meaning:
    'No table of a configuration reaches the maximum mass of its phase: above the heaviest one the flight manual has no figures.',
  source: 'HouseManual',
  test: (context) =>
    (['takeoff', 'landing'] as const).flatMap((phase) =>
      configurationsOf(context, phase).flatMap(({ id }) => heaviestShort(context, phase, id)),
    ),
};

function heaviestShort(context: ReviewContext, phase: 'takeoff' | 'landing', id: string) {
  const tables = context.tables.filter(({ table }) => table.phase === phase && table.configurations.includes(id));
  const [first] = tables;
  if (first === undefined || tables.some(({ table }) => table.notes.some(({ about }) => about === 'aboveMass')))
    return [];
  const maximum = maximumMassOf(context, phase);
  const heaviest = Math.max(...tables.flatMap(({ table }) => massesOf(table)));
  if (!(heaviest < maximum * (1 - 5e-3))) return [];
  const inAxis = first.table.axes.includes('mass');
  return [
    {
      message: `The tables for ${phase} in ${id} end at ${textIn(context, 'mass', heaviest)}; the maximum is ${textIn(context, 'mass', maximum)}.`,
      at: inAxis ? columnAt(first, 'mass') : `${first.at}/conditions/mass`,
      value: { kind: 'mass' as const, value: heaviest },
      threshold: { kind: 'mass' as const, value: maximum },
    },
  ];
}
