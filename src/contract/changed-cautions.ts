import type { Caution } from '../planning/answer.ts';
import { aeroplaneChanged } from '../planning/cautions/aeroplane-changed.ts';
import { raisedCautions } from '../planning/cautions/caution-test.ts';
import type { KnownAeroplane } from './aeroplane-lookup.ts';

/** What an answer without a story of its own says of an aeroplane that was changed. */
export function changedCautions(known: Pick<KnownAeroplane, 'changes'> = {}): Caution[] {
  return raisedCautions([aeroplaneChanged], { question: known });
}
