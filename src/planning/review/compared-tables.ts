import type { Work } from '../../numerics/work.ts';
import type { Aeroplane, Configuration, MaximumLift } from '../../performance/aeroplane.ts';
import type { FitColumn, FitFinding } from '../../performance/fit/fit-finding.ts';
import { isRefused } from '../fault.ts';
import { planFit } from '../fit/plan-fit.ts';
import { tablePhysics } from '../proof/physics-at-node.ts';
import { askedAeroplaneAt } from '../proof/question-at.ts';
import { type TableNode, tableNode } from '../proof/table-node.ts';
import { type ComparedTable, columnName, type Reviewed, type ReviewedTable } from './review-context.ts';

/** What a review may cost, our choice: pairs of a table and a configuration, rows of one table, rows of all, rows that a fit needs. */
const mostPairs = 12;
const mostRows = 120;
const mostRowsOfAll = 480;
const fewestRows = 12;
/** A flap setting of a row within this of a configuration's is that configuration's [rad]. */
const sameFlap = 1e-3;

/**
 * Each table of distances beside the physics of each of its configurations, and fitted.
 *
 * @param faulty - ids of configurations, or 'all', whose physics has nothing to go by
 * @returns work that yields between its parts
 */
export function* comparedTables(reviewed: Reviewed, faulty: ReadonlySet<string>): Work<ComparedTable[]> {
  const { aeroplane, tables } = reviewed;
  if (faulty.has('all')) return [];
  const pairs = tables.flatMap((one) =>
    one.table.configurations
      .filter((id) => !faulty.has(id))
      .filter((id) => aeroplane.configurations[id]?.for.some((phase) => phase === one.table.phase))
      .map((id) => ({ one, id })),
  );
  const compared: ComparedTable[] = [];
  const rowsEach = Math.min(mostRows, Math.max(fewestRows, Math.floor(mostRowsOfAll / pairs.length)));
  for (const { one, id } of pairs.slice(0, mostPairs)) {
    const physics = tablePhysics(aeroplane, one.table, id);
    if (physics === undefined) continue;
    const all = nodesOf(aeroplane, one, id);
    const nodes = spread(all, rowsEach);
    const rows = nodes.flatMap((node) => {
      const figures = physics.at(node);
      return figures === undefined ? [] : [{ node, figures }];
    });
    yield;
    if (rows.length === 0) continue;
    const slips = yield* fitFindings(
      reviewed,
      one,
      id,
      rows.map(({ node }) => node),
    );
    compared.push({ ...one, configuration: id, physics, rows, rowsOfTable: all.length, slips });
  }
  return compared;
}

function nodesOf(aeroplane: Aeroplane, { table }: ReviewedTable, id: string): TableNode[] {
  const flap = aeroplane.configurations[id]?.flap as number;
  return table.nodes.flatMap((_, row) => {
    const node = tableNode(table, row);
    return node === undefined || (node.flap !== undefined && Math.abs(node.flap - flap) > sameFlap) ? [] : [node];
  });
}

/** So many of them at most, evenly apart, the first and the last among them. */
function spread(nodes: readonly TableNode[], most: number): readonly TableNode[] {
  if (nodes.length <= most) return nodes;
  return Array.from({ length: most }, (_, i) => nodes[Math.round((i * (nodes.length - 1)) / (most - 1))] as TableNode);
}

/** What a fit of physics to these rows finds, rows numbered as in the table; nothing where it is refused. */
function* fitFindings(
  { aeroplane, stallSpeedUnits, units }: Reviewed,
  { table, ...one }: ReviewedTable,
  id: string,
  nodes: readonly TableNode[],
): Work<readonly FitFinding[]> {
  const { maximumLift } = aeroplane.configurations[id] as Configuration;
  const standard = table.standardTemperatures;
  const answer = yield* planFit({
    aeroplane,
    aeroplaneAt: askedAeroplaneAt,
    configuration: id,
    phase: table.phase === 'landing' ? 'landing' : 'takeoff',
    tables: [
      {
        table: {
          ...table,
          nodes: nodes.map(({ row }) => table.nodes[row] as readonly number[]),
          cells: nodes.map(({ row }) => table.cells[row] as readonly number[]),
          ...(standard === undefined ? {} : { standardTemperatures: nodes.map(({ row }) => standard[row] as number) }),
        },
        at: () => one.at,
      },
    ],
    runs: [],
    stalls: [],
    declared: declaredUnits({ table, ...one }, maximumLift, stallSpeedUnits[id]),
    units,
  });
  if (isRefused(answer)) return [];
  return answer.findings.map(({ finding }) =>
    'row' in finding ? { ...finding, row: nodes[finding.row]?.row ?? finding.row } : finding,
  );
}

/** The units that the figures of a table were typed in with; one that no slip is known of where there is none. */
function declaredUnits(
  reviewed: ReviewedTable,
  { kind }: MaximumLift,
  stallSpeedUnit = 'none',
): Readonly<Partial<Record<FitColumn, string>>> {
  const unitOf = (column: FitColumn) =>
    reviewed.columns.find(({ name }) => name === columnName(column, reviewed))?.unit ?? 'none';
  return {
    groundRoll: unitOf('groundRoll'),
    wholeDistance: unitOf('wholeDistance'),
    distances: unitOf('distances'),
    mass: reviewed.massUnit ?? unitOf('mass'),
    pressureAltitude: unitOf('pressureAltitude'),
    temperature: unitOf('temperature'),
    speeds: kind === 'stall-speed' ? stallSpeedUnit : 'none',
  };
}
