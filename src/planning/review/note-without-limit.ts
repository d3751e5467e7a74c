import type { ManualNote, ManualSheet } from '../../performance/flight-manual/flight-manual.ts';
import type { FindingTest } from './finding-test.ts';

/** What is taken where a note states no limit, in words. */
const taken: Readonly<Partial<Record<ManualNote['about'], string>>> = {
  headwind: '20 kt',
  tailwind: '20 kt',
  uphill: '2 %',
  downhill: '2 %',
  aboveStandard: '40 °C',
  belowStandard: '40 °C',
};

/** A note that does not say how far it goes. */
export const noteWithoutLimit: FindingTest = {
  code: 'note-without-limit',
  severity: 'note',
  meaning: 'A note of a sheet states no limit: one is taken for it (20 kt of wind, 2 % of slope, 40 °C).',
  source: 'HouseManual',
  test: ({ tables, graphs }) => {
    const sheets: { readonly sheet: ManualSheet; readonly at: string }[] = [
      ...tables.map(({ table, at }) => ({ sheet: table, at })),
      ...graphs.map(({ graph, at }) => ({ sheet: graph, at })),
    ];
    return sheets.flatMap(({ sheet, at }) =>
      sheet.notes.flatMap((note, i) => {
        const limit = taken[note.about];
        if (note.about === 'surface' || note.limit !== undefined || limit === undefined) return [];
        return [
          {
            message: `The note on ${words(note.about)} of ${sheet.id} states no limit; ${limit} is taken.`,
            at: `${at}/notes/${i}/limit`,
            hint: 'Where the manual or its limitations state one, give it.',
          },
        ];
      }),
    );
  },
};

function words(about: ManualNote['about']): string {
  return about.replaceAll(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);
}
