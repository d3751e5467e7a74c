import type { FlightManual, SpeedTable } from './flight-manual.ts';
import type { ManualBound, ManualSpeeds, OutsideManual } from './manual-figures.ts';
import { between, nodeShare } from './node-share.ts';

/**
 * The speeds of the procedure that the manual prints for a configuration at a mass, calibrated, linear between masses.
 *
 * Below the lightest mass its speeds stand, named as an edge; above the heaviest there are none.
 *
 * @param mass - [kg]
 * @returns undefined where the manual has no speed table for the configuration
 */
export function manualSpeeds(
  { speedTables }: FlightManual,
  configuration: string,
  mass: number,
  edges: 'use' | 'refuse' = 'use',
): ManualSpeeds | OutsideManual | undefined {
  const table = speedTables.find(({ configurations }) => configurations.includes(configuration));
  if (table === undefined) return undefined;
  const { node, share, beyond } = nodeShare(table.masses, mass);
  const bounds: ManualBound[] =
    beyond === undefined
      ? []
      : [{ sheet: table.id, axis: 'mass', given: mass, bound: table.masses[node] as number, side: beyond }];
  if (beyond === 'above' || (beyond === 'below' && edges === 'refuse')) {
    return { outcome: 'outside-flight-manual', bounds };
  }
  return {
    outcome: 'speeds',
    speeds: speedsAt(table, node, share),
    sheet: { id: table.id, page: table.page },
    edges: bounds,
  };
}

function speedsAt({ speeds, cells }: SpeedTable, node: number, share: number): ManualSpeeds['speeds'] {
  const from = cells[node] as readonly number[];
  const to = cells[node + 1] ?? from;
  return Object.fromEntries(speeds.map((name, i) => [name, between(from[i] as number, to[i] as number, share)]));
}
