import type { Runway } from './question.ts';

/**
 * Where the thirds of the runway end, from the point where a landing's distances begin [m].
 *
 * Of the landing distance available, else of the run available; a start offset moves both.
 *
 * @returns undefined where neither is declared
 */
export function runwayThirds({
  declared = {},
  start,
}: Pick<Runway, 'declared' | 'start'>): readonly number[] | undefined {
  const length = declared.lda ?? declared.tora;
  if (length === undefined) return undefined;
  const offset = start.kind === 'offset' ? start.offset : 0;
  return [length / 3 - offset, (2 * length) / 3 - offset, length - offset];
}
