import type { Aeroplane, Configuration } from '../../performance/aeroplane.ts';
import type { FitColumn, FitFinding } from '../../performance/fit/fit-finding.ts';
import type { ManualGraph, ManualTable, SpeedTable } from '../../performance/flight-manual/flight-manual.ts';
import type { Kind, UnitFamily } from '../../units/presentation.ts';
import type { PhysicsFigures, TablePhysics } from '../proof/physics-at-node.ts';
import type { TableNode } from '../proof/table-node.ts';
import { measureText } from '../sentences/measure-text.ts';

/** A column as it was typed in. */
export interface TypedColumn {
  readonly name: string;
  readonly unit: string;
}

/** A table with where it stands in the definition and the units it was typed in with. */
export interface ReviewedTable {
  readonly table: ManualTable;
  /** pointer into the definition */
  readonly at: string;
  readonly columns: readonly TypedColumn[];
  /** unit of the mass in its conditions, where it stands there */
  readonly massUnit: string | undefined;
}

/** What is reviewed, in SI, with pointers into the definition. */
export interface Reviewed {
  readonly aeroplane: Aeroplane;
  readonly tables: readonly ReviewedTable[];
  readonly speedTables: readonly { readonly table: SpeedTable; readonly at: string }[];
  readonly graphs: readonly { readonly graph: ManualGraph; readonly at: string }[];
  /** unit in which the stall speed of a configuration was typed in, where one was */
  readonly stallSpeedUnits: Readonly<Record<string, string>>;
  /** aerodromes that the aeroplane may be asked about: id and elevation [m] */
  readonly aerodromes: readonly { readonly id: string; readonly elevation: number }[];
  /** in which the findings are written */
  readonly units: UnitFamily;
}

/** A table of distances beside the physics of one of its configurations. */
export interface ComparedTable extends ReviewedTable {
  readonly configuration: string;
  readonly physics: TablePhysics;
  /** some or all of its rows, evenly spread, each with what physics makes of it */
  readonly rows: readonly { readonly node: TableNode; readonly figures: PhysicsFigures }[];
  /** how many it has for the configuration */
  readonly rowsOfTable: number;
  /** what fitting physics to those rows finds wrong or odd */
  readonly slips: readonly FitFinding[];
}

/** What the tests of a review may look at. */
export interface ReviewContext extends Reviewed {
  readonly compared: readonly ComparedTable[];
}

/** A configuration with its id and where it stands. */
export interface Placed {
  readonly id: string;
  readonly configuration: Configuration;
  readonly at: string;
}

/** The configurations for a phase, or all of them. */
export function configurationsOf({ aeroplane }: Reviewed, phase?: 'takeoff' | 'landing'): Placed[] {
  return Object.entries(aeroplane.configurations)
    .filter(([, configuration]) => phase === undefined || configuration.for.includes(phase))
    .map(([id, configuration]) => ({ id, configuration, at: `/configurations/${id}` }));
}

/** Pointer to a column of a table, or to its cell in a row. */
export function columnAt({ at, columns }: Pick<ReviewedTable, 'at' | 'columns'>, name: string, row?: number): string {
  const column = columns.findIndex((one) => one.name === name);
  return row === undefined ? `${at}/columns/${column}` : `${at}/rows/${row}/${column}`;
}

/** The whole distance that a sheet of a phase gives. */
export function wholeDistanceOf(phase: ManualTable['phase']): 'takeoffDistance' | 'landingDistance' {
  return phase === 'takeoff' ? 'takeoffDistance' : 'landingDistance';
}

/** The column that a finding of a fit is about, as the table names it. */
export function columnName(
  column: FitColumn | 'groundRoll' | 'wholeDistance',
  { table, columns }: ReviewedTable,
): string {
  if (column === 'wholeDistance' || column === 'distances') return wholeDistanceOf(table.phase);
  if (column === 'temperature' && !columns.some(({ name }) => name === 'temperature')) return 'temperatureDeviation';
  return column;
}

/** A number in the units of the review. */
export function textIn({ units }: Pick<Reviewed, 'units'>, kind: Kind, si: number): string {
  return measureText(units, kind, si);
}

/** The masses that a table is for [kg]. */
export function massesOf({ axes, nodes, conditions }: ManualTable): number[] {
  const axis = axes.indexOf('mass');
  if (axis >= 0) return nodes.map((node) => node[axis] as number);
  return conditions.mass === undefined ? [] : [conditions.mass];
}

/** The greatest mass of a phase [kg]. */
export function maximumMassOf({ aeroplane: { masses } }: Reviewed, phase: ManualTable['phase']): number {
  return phase === 'landing' ? (masses.maximumLanding ?? masses.maximumTakeoff) : masses.maximumTakeoff;
}
