import type { Work } from '../../numerics/work.ts';
import { type FitAsked, liftOf, nodesInside } from './fit-asked.ts';
import { fitDistances, isFit, placed } from './fit-distances.ts';
import { heldBecause } from './shown-parameters.ts';
import { type Slip, slipsOf } from './slips.ts';
import { spreadPoints } from './spread-points.ts';

/** How well a reading of a table goes with its aeroplane, by a robust fit to a few of its rows. */
export interface Screened {
  /** rms of ln(computed/given) over its standard deviation, the worst tenth left out */
  readonly misfit: number;
  /** rms of ln(computed/given), the worst tenth left out */
  readonly rms: number;
  /** misfit small, parameters where they belong */
  readonly fits: boolean;
  /** and maximum lift and conditions too */
  readonly sound: boolean;
  /** of all parameters */
  readonly values: Float64Array;
}

/** Parameters to a tenth of their uncertainty tell a slip from a table. */
const coarse = { flatness: 1e-2, greatestIterations: 15 };
/** Rows of a screening. */
const fewPoints = 12;
/** Share of the figures that may be far off without speaking against the rest. */
const leftOut = 0.1;
/** Misfit up to which a reading goes with its aeroplane: twice the scatter of published figures. */
const soundMisfit = 2;

/**
 * Fits a few rows, spread over the conditions, robustly: enough to tell a slip from a table.
 *
 * @returns work, and then how well it goes; undefined where nothing can be computed
 */
export function* screened(asked: FitAsked): Work<Screened | undefined> {
  const { points } = asked;
  const model = asked.model({ ...asked, points: spreadPoints(points, fewPoints) });
  if (model === undefined) return undefined;
  const free = model.parameters.map((parameter) => heldBecause(parameter, points, asked.free) === undefined);
  const fit = yield* fitDistances(model, { free, robust: true, search: coarse });
  if (!isFit(fit)) return undefined;
  const places = placed(model);
  const kept = Array.from(fit.logRatios, (ratio, i) => ({ ratio, sd: places[i]?.observation.relativeSd ?? 1 }))
    .sort((a, b) => Math.abs(a.ratio / a.sd) - Math.abs(b.ratio / b.sd))
    .slice(0, Math.ceil((1 - leftOut) * places.length));
  const rmsOf = (value: (one: (typeof kept)[number]) => number) =>
    Math.sqrt(kept.reduce((sum, one) => sum + value(one) ** 2, 0) / kept.length);
  const misfit = rmsOf(({ ratio, sd }) => ratio / sd);
  const plausible = model.parameters.every(({ plausible: [low, high] }, j) => {
    const value = fit.values[j] as number;
    return free[j] !== true || (fit.atBound[j] === undefined && value >= low && value <= high);
  });
  const { coefficient, range } = liftOf(asked);
  const lifts = coefficient >= range[0] && coefficient <= range[1];
  const fits = misfit < soundMisfit && plausible;
  return {
    misfit,
    rms: rmsOf(({ ratio }) => ratio),
    fits,
    sound: fits && lifts && nodesInside(asked),
    values: fit.values,
  };
}

/**
 * The slip that best explains a table which does not go with its aeroplane as it is declared: of the readings that go, the one
 * with the least misfit.
 *
 * @returns work, and then the slip; undefined where none explains it
 */
export function* explainingSlip(
  asked: FitAsked,
): Work<{ readonly slip: Slip; readonly screened: Screened } | undefined> {
  let best: { readonly slip: Slip; readonly screened: Screened } | undefined;
  for (const slip of slipsOf(asked)) {
    const found = yield* screened(slip.meant(asked));
    yield;
    if (found?.sound === true && (best === undefined || found.misfit < best.screened.misfit))
      best = { slip, screened: found };
  }
  return best;
}
