import type { AeroplaneChanges } from '../question.ts';
import type { CautionTest } from './caution-test.ts';

/** What the caution looks at: any question of an aeroplane. */
export interface AeroplaneContext {
  readonly question: { readonly changes?: AeroplaneChanges };
}

/** So many changes are named one by one. */
const mostNamed = 6;

/** The aeroplane is one on file with changes that came with the question. */
export const aeroplaneChanged: CautionTest<AeroplaneContext> = {
  code: 'aeroplane-changed',
  severity: 'note',
  meaning: 'The aeroplane is one on file with changes that came with the question.',
  source: 'Judgement',
  test: ({ question: { changes } }) => {
    if (changes === undefined) return undefined;
    const { basedOn, revision, changed, because } = changes;
    const named = changed.slice(0, mostNamed).join(', ');
    const more = changed.length > mostNamed ? ` and ${changed.length - mostNamed} more` : '';
    return {
      message: `The aeroplane is ${basedOn}, revision ${revision}, with changes: ${named}${more}. The reason given: "${because}". Every number of the answer is of the changed aeroplane.`,
      at: '/aeroplane/changes',
    };
  },
};
