import type { ManualAxis, ManualTable } from '../../performance/flight-manual/flight-manual.ts';
import { standardTemperature } from '../../physics/atmosphere.ts';

/** The conditions of one row of a table, nothing left out, in SI. */
export interface TableNode {
  readonly row: number;
  /** where it is an axis [rad] */
  readonly flap: number | undefined;
  readonly mass: number;
  readonly pressureAltitude: number;
  readonly temperature: number;
  readonly standardTemperature: number;
  /** as the row has it [m/s] */
  readonly headwind: number;
}

/**
 * The conditions that a row of a table is for. Without a temperature it is for the standard one, as printed or else of the
 * standard atmosphere; without a wind for calm.
 *
 * @returns undefined where the table says no mass
 */
export function tableNode(table: ManualTable, row: number): TableNode | undefined {
  const { axes, nodes, conditions, standardTemperatures } = table;
  const at = (axis: ManualAxis) => {
    const column = axes.indexOf(axis);
    return column < 0 ? undefined : nodes[row]?.[column];
  };
  const mass = at('mass') ?? conditions.mass;
  const pressureAltitude = at('pressureAltitude');
  if (mass === undefined || pressureAltitude === undefined) return undefined;
  const standard = standardTemperatures?.[row] ?? standardTemperature(pressureAltitude);
  return {
    row,
    flap: at('flap'),
    mass,
    pressureAltitude,
    temperature: at('temperature') ?? standard + (at('temperatureDeviation') ?? 0),
    standardTemperature: standard,
    headwind: at('headwind') ?? 0,
  };
}

/** The wind that the figures of a table are worth: half of a headwind, one and a half of a tailwind, where they hold an allowance [m/s]. */
export function windInFigures({ contains }: Pick<ManualTable, 'contains'>, headwind: number): number {
  if (!contains.windAllowance) return headwind;
  return headwind > 0 ? headwind / 2 : headwind * 1.5;
}
