import type { Runway } from './question.ts';

/** Lengths from the start point [m]; an absent one is not known and is not taken from another. */
export interface Lengths {
  readonly tora?: number;
  readonly toda?: number;
  readonly asda?: number;
}

/** The declared lengths of a takeoff, and what of them counts. */
export interface DeclaredDistances {
  /** as published from the start point, shortened by a start offset and nothing else */
  readonly published: Lengths;
  /** what is compared: line-up loss taken off, clearway capped; never below 0 */
  readonly credited: Lengths;
  /** the part of the clearway that does not count [m], where there is one */
  readonly clearwayNotCredited?: number;
}

/**
 * The declared distances from where the takeoff starts, and the lengths to compare with.
 *
 * A start offset shortens every declared distance by itself; a named point does not, for its distances are published from
 * there. Line-up loss is taken off TORA and TODA (main wheels) and off ASDA (forward wheel). The clearway
 * counts up to a share of the run.
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
  const { tora, toda, asda } = runway.declared ?? {};
  const offset = runway.start.kind === 'offset' ? runway.start.offset : 0;
  const published = lengths(less(tora, offset), less(toda, offset), less(asda, offset));
  const runLoss = runway.lineUp?.tora ?? 0;
  const run = less(published.tora, runLoss);
  const whole = less(published.toda, runLoss);
  const limit = run === undefined ? undefined : run * (1 + clearwayShare);
  const capped = whole !== undefined && limit !== undefined && whole > limit + 1e-6;
  const credited = lengths(run, capped ? limit : whole, less(published.asda, runway.lineUp?.asda ?? 0));
  return capped ? { published, credited, clearwayNotCredited: whole - limit } : { published, credited };
}

function less(length: number | undefined, loss: number): number | undefined {
  return length === undefined ? undefined : Math.max(0, length - loss);
}

function lengths(tora: number | undefined, toda: number | undefined, asda: number | undefined): Lengths {
  return {
    ...(tora === undefined ? {} : { tora }),
    ...(toda === undefined ? {} : { toda }),
    ...(asda === undefined ? {} : { asda }),
  };
}
