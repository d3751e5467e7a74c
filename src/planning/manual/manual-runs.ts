import type { ManualFigures } from '../../performance/flight-manual/manual-figures.ts';
import type { Parts } from '../band-parts.ts';
import type { Runs } from '../runs.ts';
import { carriedParts } from './carried-parts.ts';
import type { ManualReading } from './manual-reading.ts';
import type { Silence } from './silence.ts';

/** What carries the manual's figures to what is asked. */
export interface Carrying<Run, Result> {
  readonly reading: Pick<ManualReading, 'stated' | 'credited'>;
  /** what the manual does not speak of; with none its figures stand */
  readonly silences: readonly Silence[];
  /** as asked, in the wind as given; undefined where physics does not speak of the surface */
  readonly asked: Run | undefined;
  /** of the aeroplane that the manual is of, flown as the manual has it, on the runway and in the wind as given */
  readonly asManual: Run;
  /** [m/s] */
  readonly creditedHeadwind: number;
  /** the run on the runway that the manual's figure is for: dry pavement and level where it does not speak of others */
  readonly onManualRunway: (run: Run) => Run;
  /** as asked, but level; undefined where a slope that helps is the manual's own to credit, or there is none */
  readonly level: Run | undefined;
  /** as asked, on the runway that factors are meant to multiply; undefined where the rule set does not start from it */
  readonly reference: Run | undefined;
  /** what comes of a run flown as asked, and of one flown as the manual has it */
  readonly compute: (run: Run) => Result;
  readonly computeAsManual: (run: Run) => Result;
  /** its distances; undefined where there are none */
  readonly partsOf: (result: Result) => Parts | undefined;
}

/** The manual's distances for each of the runs behind an answer, or the run of physics without which there are none. */
export type ManualRuns<Result> =
  | { readonly outcome: 'found'; readonly runs: Runs<Parts> }
  | { readonly outcome: 'not-reached'; readonly result: Result };

/**
 * The manual's figures as asked, in the credited wind, and on the runway that factors multiply, each carried by the ratio of
 * physics as asked to physics as the manual has it.
 */
export function manualRuns<Run extends { readonly headwind: number }, Result>(
  carrying: Carrying<Run, Result>,
): ManualRuns<Result> {
  const { reading, asked, level, reference, creditedHeadwind, asManual } = carrying;
  const runs: Record<keyof Runs<Parts>, Parts | undefined> = {
    stated: undefined,
    credited: undefined,
    level: undefined,
    reference: undefined,
  };
  const wanted = [
    ['stated', reading.stated, asked, asManual.headwind],
    ['credited', reading.credited, asked, creditedHeadwind],
    ['level', reading.credited, level, creditedHeadwind],
    ['reference', reading.credited, reference, creditedHeadwind],
  ] as const;
  for (const [name, figures, run, headwind] of wanted) {
    if (run === undefined) continue;
    const found = carried(carrying, figures, run, headwind);
    if (found.outcome === 'not-reached') return found;
    runs[name] = found.parts;
  }
  return { outcome: 'found', runs };
}

type Carried<Result> =
  | { readonly outcome: 'carried'; readonly parts: Parts }
  | { readonly outcome: 'not-reached'; readonly result: Result };

function carried<Run extends { readonly headwind: number }, Result>(
  { silences, asManual, onManualRunway, compute, computeAsManual, partsOf }: Carrying<Run, Result>,
  figures: ManualFigures,
  asked: Run,
  headwind: number,
): Carried<Result> {
  const { groundRoll, wholeDistance } = figures;
  if (silences.length === 0 && groundRoll !== undefined && wholeDistance !== undefined) {
    return { outcome: 'carried', parts: { groundRoll, airDistance: wholeDistance - groundRoll } };
  }
  const to = compute({ ...asked, headwind });
  const toParts = partsOf(to);
  if (toParts === undefined) return { outcome: 'not-reached', result: to };
  const from = computeAsManual(onManualRunway({ ...asManual, headwind: silences.includes('wind') ? 0 : headwind }));
  const fromParts = partsOf(from);
  if (fromParts === undefined) return { outcome: 'not-reached', result: from };
  return { outcome: 'carried', parts: carriedParts(figures, fromParts, toParts) };
}
