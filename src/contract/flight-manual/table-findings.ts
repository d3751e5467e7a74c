import type { ManualTable } from '../../performance/flight-manual/flight-manual.ts';
import { speaks } from '../../performance/flight-manual/off-conditions.ts';
import { edgeSides } from '../../performance/flight-manual/read-level.ts';
import { standingEdges } from '../../performance/flight-manual/standing-edges.ts';
import { list } from '../reading/allowed.ts';
import type { TableFinding } from './table-request.ts';

/** What is worth knowing of a table that is in order: where it has no figures, and on what it is silent. */
export function tableFindings(table: ManualTable): TableFinding[] {
  return [...holes(table), ...edges(table), ...silences(table)];
}

function holes({ axes, nodes }: ManualTable): TableFinding[] {
  const combinations = axes.reduce((count, _, i) => count * new Set(nodes.map((node) => node[i])).size, 1);
  if (combinations === nodes.length) return [];
  const message = `${nodes.length} of ${combinations} combinations are printed; next to a blank one there is no figure.`;
  return [{ code: 'not-every-combination', message }];
}

function edges(table: ManualTable): TableFinding[] {
  const standing = standingEdges(table);
  return table.axes
    .filter((axis) => edgeSides[axis] !== undefined && !standing.has(axis))
    .map((axis) => ({
      code: 'no-edge',
      message: `${edgeSides[axis] === 'below' ? 'Below the least' : 'Above the greatest'} ${axis} there is no figure: the table does not show its edge to be the longer there.`,
    }));
}

function silences({ phase, axes, notes }: ManualTable): TableFinding[] {
  const hasTemperature = axes.includes('temperature') || axes.includes('temperatureDeviation');
  const isOnGround = phase !== 'climb';
  const silent = [
    ...(isOnGround
      ? (['headwind', 'tailwind'] as const).filter((wind) => !axes.includes('headwind') && !speaks(notes, wind))
      : []),
    ...(isOnGround ? (['uphill', 'downhill'] as const).filter((slope) => !speaks(notes, slope)) : []),
    ...(isOnGround && !speaks(notes, 'surface') ? ['other surfaces'] : []),
    ...(hasTemperature || speaks(notes, 'aboveStandard') ? [] : ['days warmer than standard']),
  ];
  if (silent.length === 0) return [];
  return [{ code: 'not-spoken-of', message: `No column and no note speaks of ${list(silent, 'or')}.` }];
}
