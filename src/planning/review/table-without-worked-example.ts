import type { FindingTest } from './finding-test.ts';

/** A table that nothing verifies. */
export const tableWithoutWorkedExample: FindingTest = {
  code: 'table-without-worked-example',
  severity: 'note',
  meaning:
    "A table has none of the manual's own worked examples: nothing shows that columns, notes and their order are read as meant.",
  source: 'HouseManual',
  test: ({ tables }) =>
    tables
      .filter(({ table }) => table.workedExamples.length === 0)
      .map(({ table, at }) => ({
        message: `${table.id} has no worked example.`,
        at: `${at}/workedExamples`,
        hint: "Type in the manual's own example, where the page has one.",
      })),
};
