import type { Aeroplane } from '../../performance/aeroplane.ts';
import { fitLanding } from '../../performance/fit/fit-landing.ts';
import type { FitResult } from '../../performance/fit/fit-result.ts';
import { fitTakeoff } from '../../performance/fit/fit-takeoff.ts';
import { isFault } from '../chosen.ts';
import { isRefused } from '../fault.ts';
import { prepareLanding } from '../prepare-landing.ts';
import { prepareTakeoff } from '../prepare-takeoff.ts';
import { tablePhysics } from '../proof/physics-at-node.ts';
import { questionAtNode } from '../proof/question-at.ts';
import { type TableNode, tableNode } from '../proof/table-node.ts';
import type { ComparedTable, Reviewed, ReviewedTable } from './review-context.ts';
import { declaredUnits, tablePoints } from './table-points.ts';

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
export function* comparedTables(
  reviewed: Reviewed,
  faulty: ReadonlySet<string>,
): Generator<undefined, ComparedTable[], undefined> {
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
    const fit = yield* fitOf(
      reviewed,
      one,
      id,
      rows.map(({ node }) => node),
    );
    compared.push({ ...one, configuration: id, physics, rows, rowsOfTable: all.length, fit });
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

function* fitOf(
  { aeroplane, stallSpeedUnits }: Reviewed,
  one: ReviewedTable,
  id: string,
  nodes: readonly TableNode[],
): Generator<undefined, FitResult | undefined, undefined> {
  const configuration = aeroplane.configurations[id];
  const [first] = nodes;
  if (configuration === undefined || first === undefined) return undefined;
  const asked = questionAtNode(aeroplane, one.table, id, first);
  const declared = declaredUnits(one, configuration, stallSpeedUnits[id]);
  const { screenHeight } = one.table.conditions;
  if (one.table.phase === 'takeoff') {
    const prepared = prepareTakeoff(asked);
    if (isRefused(prepared) || prepared.friction.actual === undefined) return undefined;
    const { certification } = aeroplane;
    return yield* fitTakeoff({
      aeroplane: {
        ...aeroplane,
        certification: { ...certification, screenHeight: screenHeight ?? certification.screenHeight },
      },
      configuration,
      figures: prepared.resolved,
      points: tablePoints(one, nodes, prepared.friction.actual),
      declared,
    });
  }
  const prepared = prepareLanding(asked);
  if (isRefused(prepared) || isFault(prepared.landingSpeeds) || prepared.braking.actual === undefined) return undefined;
  const { resolved, run, landingSpeeds } = prepared;
  return yield* fitLanding({
    aeroplane,
    configuration,
    figures: {
      ...resolved,
      landingReference: resolved.landingReference ?? {
        kind: 'stall-ratio',
        ratio: landingSpeeds.reference.stallRatio,
      },
      screenHeight: screenHeight ?? run.screenHeight,
    },
    points: tablePoints(one, nodes, 0),
    declared,
  });
}
