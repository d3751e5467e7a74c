import type { Configuration } from '../../performance/aeroplane.ts';
import type { FitAsked } from '../../performance/fit/fit-asked.ts';
import { type FitPoint, type Observation, printedSd } from '../../performance/fit/fit-point.ts';
import { roundingStep } from '../../performance/fit/rounding-step.ts';
import type { TableNode } from '../proof/table-node.ts';
import { windInFigures } from '../proof/table-node.ts';
import { columnName, type ReviewedTable } from './review-context.ts';

/** Rows of a table as points of a fit; distances without the factor that they hold. */
export function tablePoints(
  { table }: ReviewedTable,
  nodes: readonly TableNode[],
  rollingFriction: number,
): FitPoint[] {
  const { outputs, cells, contains } = table;
  const columns = outputs.flatMap((output, column) => {
    if (output !== 'groundRoll' && output !== 'takeoffDistance' && output !== 'landingDistance') return [];
    const kind = output === 'groundRoll' ? ('groundRoll' as const) : ('wholeDistance' as const);
    return [{ kind, column, rounding: roundingStep(cells.map((row) => row[column] as number)) }];
  });
  return nodes.map(({ row, mass, pressureAltitude, temperature, headwind }) => ({
    row,
    mass,
    pressureAltitude,
    temperature,
    headwind: windInFigures(table, headwind),
    slope: 0,
    rollingFriction,
    observations: columns.map(({ kind, column, rounding: { unit, step } }): Observation => {
      const printed = cells[row]?.[column] as number;
      const { factor } = contains;
      return {
        kind,
        distance: printed / factor,
        relativeSd: printedSd(printed, step),
        ...(factor === 1 ? { printed: { unit, step } } : {}),
      };
    }),
  }));
}

/** The units that the figures of a table were typed in with, as a fit asks for them. */
export function declaredUnits(
  reviewed: ReviewedTable,
  { maximumLift }: Configuration,
  stallSpeedUnit: string | undefined,
): FitAsked['declared'] {
  const unitOf = (column: Parameters<typeof columnName>[0]) =>
    reviewed.columns.find(({ name }) => name === columnName(column, reviewed))?.unit ?? 'none';
  return {
    groundRoll: unitOf('groundRoll'),
    wholeDistance: unitOf('wholeDistance'),
    distances: unitOf('wholeDistance'),
    mass: reviewed.massUnit ?? unitOf('mass'),
    pressureAltitude: unitOf('pressureAltitude'),
    temperature: unitOf('temperature'),
    speeds: maximumLift.kind === 'stall-speed' ? (stallSpeedUnit ?? 'none') : 'none',
  };
}
