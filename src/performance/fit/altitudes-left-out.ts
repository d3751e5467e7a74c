import type { Work } from '../../numerics/work.ts';
import type { FitAsked } from './fit-asked.ts';
import { fitDistances, isFit, type Placed, placed } from './fit-distances.ts';
import type { FitModel } from './fit-model.ts';
import type { FitPoint } from './fit-point.ts';
import type { AltitudeLeftOut } from './fit-result.ts';
import { heldBecause } from './shown-parameters.ts';

/** With more altitudes than these, as runs have, several are left out together. */
const mostGroups = 10;

/** From the whole fit it is a step or two. */
const near = { flatness: 1e-3, greatestIterations: 20 };

/**
 * The error of each pressure altitude as predicted from a fit to the others.
 *
 * A parameter that the others do not show is held where the whole fit has it not free, at what is taken for it.
 *
 * @param values - of the whole fit: where each search begins
 * @param leftOut - observations that count nowhere
 * @returns work, and then one entry an altitude; none with fewer than three altitudes, or where a fit fails
 */
export function* altitudesLeftOut(
  asked: FitAsked,
  model: FitModel,
  values: Float64Array,
  leftOut: ReadonlySet<Placed>,
  places = placed(model),
): Work<AltitudeLeftOut[]> {
  const altitudes = [...new Set(model.points.map(({ pressureAltitude }) => pressureAltitude))].sort((a, b) => a - b);
  if (altitudes.length < 3 || altitudes.length > mostGroups) return [];
  const outOf: AltitudeLeftOut[] = [];
  for (const altitude of altitudes) {
    const isHere = ({ point }: Placed) => (model.points[point] as FitPoint).pressureAltitude === altitude;
    const others = model.points.filter(({ pressureAltitude }) => pressureAltitude !== altitude);
    const free = model.parameters.map((parameter) => heldBecause(parameter, others, asked.free) === undefined);
    const start = Float64Array.from(values, (value, j) =>
      free[j] === true ? value : (model.parameters[j] as FitModel['parameters'][number]).held,
    );
    const counts = (place: Placed) => !isHere(place) && !leftOut.has(place);
    const fit = yield* fitDistances(model, { free, counts, start, places, search: near });
    if (!isFit(fit)) return [];
    const here = places.flatMap((place, i) =>
      isHere(place) && !leftOut.has(place) ? [fit.logRatios[i] as number] : [],
    );
    if (here.length === 0) continue;
    outOf.push({
      pressureAltitude: altitude,
      rms: Math.sqrt(here.reduce((sum, ratio) => sum + ratio * ratio, 0) / here.length),
      greatest: Math.max(...here.map(Math.abs)),
    });
  }
  return outOf;
}
