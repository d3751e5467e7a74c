import { arithmeticSlack } from './arithmetic-slack.ts';
import type { Runway } from './question.ts';

/** The declared distances that count in each phase. */
export const countingDistances = { takeoff: ['tora', 'toda', 'asda'], landing: ['lda'] } as const;

/** Lengths from the start point [m]; an absent one is not known and is not taken from another. */
export interface Lengths {
  readonly tora: number | undefined;
  readonly toda: number | undefined;
  readonly asda: number | undefined;
  readonly lda?: number | undefined;
}

/** The declared lengths, and what of them counts. */
export interface DeclaredDistances {
  /** as published from the start point, shortened by a start offset and nothing else */
  readonly published: Lengths;
  /** what is compared: line-up loss taken off, clearway capped; never below 0 */
  readonly credited: Lengths;
  /** the part of the clearway that does not count [m]; undefined where all of it does */
  readonly clearwayNotCredited?: number | undefined;
}

/**
 * The declared distances from where the takeoff or landing starts, and the lengths to compare with.
 *
 * A start offset shortens every declared distance by itself; a named point does not, for its distances are published from
 * there. Line-up loss is taken off TORA and TODA (main wheels) and off ASDA (forward wheel), none off LDA. The
 * clearway counts up to a share of the run.
 *
 * @param runway - start, declared distances [m], line-up loss [m]
 * @param clearwayShare - the most that counts of a clearway, over the run; 0.5 in every set of rules
 * @returns published and credited lengths [m]
 * @see references.EuAirOps205, (b) and AMC1; references.Annex14
 */
export function declaredDistances(
  runway: Pick<Runway, 'start' | 'declared' | 'lineUp'>,
  clearwayShare: number,
): DeclaredDistances {
  const { tora, toda, asda, lda } = runway.declared ?? {};
  const offset = runway.start.kind === 'offset' ? runway.start.offset : 0;
  const published = {
    tora: less(tora, offset),
    toda: less(toda, offset),
    asda: less(asda, offset),
    lda: less(lda, offset),
  };
  const runLoss = runway.lineUp?.tora ?? 0;
  const run = less(published.tora, runLoss);
  const whole = less(published.toda, runLoss);
  const stop = less(published.asda, runway.lineUp?.asda ?? 0);
  const limit = run === undefined ? undefined : run * (1 + clearwayShare);
  const beyond = whole === undefined || limit === undefined ? 0 : whole - limit;
  if (beyond <= arithmeticSlack) {
    return {
      published,
      credited: { tora: run, toda: whole, asda: stop, lda: published.lda },
      clearwayNotCredited: undefined,
    };
  }
  return {
    published,
    credited: { tora: run, toda: limit, asda: stop, lda: published.lda },
    clearwayNotCredited: beyond,
  };
}

function less(length: number | undefined, loss: number): number | undefined {
  return length === undefined ? undefined : Math.max(0, length - loss);
}
