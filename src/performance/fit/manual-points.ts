import { standardTemperature } from '../../physics/atmosphere.ts';
import type { ManualAxis, ManualOutput, ManualTable } from '../flight-manual/flight-manual.ts';
import { type FitPoint, type Observation, printedSd } from './fit-point.ts';
import { type Rounding, roundingStep } from './rounding-step.ts';

/** What of the aeroplane and the runway the points of a table have. */
export interface TableRunway {
  /** of the configuration [rad] */
  readonly flap: number;
  readonly rollingFriction: number;
  /** to which the physics computes [m]; a table for a lower one gives heights */
  readonly screenHeight: number;
}

/** Flap angles nearer to each other than this are one setting [rad]. */
const sameFlap = 1e-6;
const sameHeight = 1e-6;
/** What an allowance credits: half of a headwind, one and a half of a tailwind. @see references.Cfr23s51 */
const creditedHeadwind = 0.5;
const creditedTailwind = 1.5;

/**
 * The rows of a table of distances as points of a fit, its own factor and wind allowance taken off; rows of another flap setting
 * are none.
 *
 * A table without a temperature is of the standard day.
 *
 * @param firstRow - number of its first row among all points
 */
export function manualPoints(table: ManualTable, runway: TableRunway, firstRow = 0): FitPoint[] {
  const { axes, nodes, cells, contains, conditions } = table;
  const axis = (name: ManualAxis) => axes.indexOf(name);
  const columns = distanceColumns(table, runway.screenHeight);
  const roundings = columns.map(({ column }) => roundingStep(cells.map((row) => row[column] as number)));
  return nodes.flatMap((node, i): FitPoint[] => {
    const at = (name: ManualAxis): number | undefined => (axis(name) < 0 ? undefined : (node[axis(name)] as number));
    const flap = at('flap');
    if (flap !== undefined && Math.abs(flap - runway.flap) > sameFlap) return [];
    const pressureAltitude = at('pressureAltitude') ?? 0;
    const mass = at('mass') ?? conditions.mass;
    if (mass === undefined) throw new RangeError(`conditions.mass is missing of ${table.id}`);
    const headwind = at('headwind') ?? 0;
    const credit = contains.windAllowance ? (headwind > 0 ? creditedHeadwind : creditedTailwind) : 1;
    return [
      {
        row: firstRow + i,
        mass,
        pressureAltitude,
        temperature: at('temperature') ?? standardTemperature(pressureAltitude) + (at('temperatureDeviation') ?? 0),
        headwind: headwind * credit,
        slope: 0,
        rollingFriction: runway.rollingFriction,
        observations: columns.map(({ column, kind, height }, k) =>
          observed(
            (cells[i] as readonly number[])[column] as number,
            kind,
            height,
            roundings[k] as Rounding,
            contains.factor,
          ),
        ),
      },
    ];
  });
}

const kinds: Readonly<Partial<Record<ManualOutput, 'groundRoll' | 'wholeDistance'>>> = {
  groundRoll: 'groundRoll',
  takeoffDistance: 'wholeDistance',
  landingDistance: 'wholeDistance',
};

interface DistanceColumn {
  readonly column: number;
  readonly kind: 'groundRoll' | 'wholeDistance';
  /** of the screen, where it is not the one to which the physics computes */
  readonly height: number | undefined;
}

function distanceColumns({ outputs, phase, conditions }: ManualTable, screenHeight: number): DistanceColumn[] {
  const own = conditions.screenHeight;
  const height =
    phase === 'landing' || own === undefined || Math.abs(own - screenHeight) < sameHeight ? undefined : own;
  return outputs.flatMap((output, column) => {
    const kind = kinds[output];
    return kind === undefined ? [] : [{ column, kind, height: kind === 'wholeDistance' ? height : undefined }];
  });
}

function observed(
  printed: number,
  kind: 'groundRoll' | 'wholeDistance',
  height: number | undefined,
  { unit, step }: Rounding,
  factor: number,
): Observation {
  const seen = {
    distance: printed / factor,
    relativeSd: printedSd(printed, step),
    printed: { unit: unit / factor, step: step / factor },
  };
  return height === undefined ? { kind, ...seen } : { kind: 'height', height, ...seen };
}
