import type { MaximumLift } from '../aeroplane.ts';
import { coldestNode, type FitAsked, hottestNode, liftOf, massRounding } from './fit-asked.ts';
import type { DistanceFit } from './fit-distances.ts';
import type { FitFinding } from './fit-finding.ts';
import type { ModelParameter } from './fit-model.ts';
import type { FitPoint } from './fit-point.ts';
import type { Screened } from './screened.ts';
import type { Slip } from './slips.ts';

/** Above it no wing lifts without power: a speed in another unit, not an indicated one. @see references.HouseFit */
const noWing = 3.5;

/** What is wrong with the conditions of a table at sight: rows beyond where tables are made. */
export function findingsBefore({ points, maximumMass }: FitAsked): FitFinding[] {
  return [
    ...outside(points, 'mass', maximumMass, massRounding * maximumMass, 1),
    ...outside(points, 'temperature', hottestNode, 1e-9, 1),
    ...outside(points, 'temperature', coldestNode, 1e-9, -1),
  ];
}

/** One finding for all the rows beyond a bound, of the row farthest beyond. */
function outside(
  points: readonly FitPoint[],
  column: 'mass' | 'temperature',
  bound: number,
  slack: number,
  side: 1 | -1,
): FitFinding[] {
  const beyond = points.filter((point) => side * (point[column] - bound) > slack);
  const [first, ...rest] = beyond;
  if (first === undefined) return [];
  const worst = rest.reduce((most, point) => (side * (point[column] - most[column]) > 0 ? point : most), first);
  return [{ code: 'node-outside', column, row: worst.row, rows: beyond.length, given: worst[column], bound }];
}

/** What a maximum lift outside the range of such wings says of the stall speed behind it. */
export function liftFinding({ coefficient, range }: ReturnType<typeof liftOf>, { kind }: MaximumLift): FitFinding[] {
  if (coefficient >= range[0] && coefficient <= range[1]) return [];
  if (kind === 'coefficient') return [{ code: 'maximum-lift-odd', coefficient, range }];
  const indicated = coefficient > range[1] && coefficient <= noWing;
  return [{ code: indicated ? 'stall-speed-indicated' : 'stall-speed-unit', coefficient, range }];
}

/** The finding of a slip that explains what is declared. */
export function slipFinding(
  { slip, screened }: { readonly slip: Slip; readonly screened: Screened },
  asked: FitAsked,
): FitFinding {
  const { code, column, printed, declared } = slip;
  if (code === 'columns-swapped') return { code, rows: asked.points.length };
  if (code === 'stall-speed-unit') return { code, ...liftOf(asked), printed, declared };
  return { code, column, printed, declared, rmsIfSo: screened.rms };
}

/** Parameters where a slip is likelier than such an aeroplane. */
export function parameterFindings(
  parameters: readonly ModelParameter[],
  free: readonly boolean[],
  { values, atBound }: DistanceFit,
): FitFinding[] {
  return parameters.flatMap(({ name, low, high, plausible }, j): FitFinding[] => {
    const value = values[j] as number;
    if (free[j] !== true) return [];
    if (atBound[j] !== undefined) return [{ code: 'parameter-at-bound', parameter: name, value, range: [low, high] }];
    if (value >= plausible[0] && value <= plausible[1]) return [];
    return [{ code: 'parameter-implausible', parameter: name, value, range: plausible }];
  });
}
