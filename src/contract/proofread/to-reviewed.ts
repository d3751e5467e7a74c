import type { Reviewed, ReviewedTable } from '../../planning/review/review-context.ts';
import type { UnitFamily } from '../../units/presentation.ts';
import type { AeroplaneDefinition } from '../aeroplane-definition.ts';
import type { CatalogueLookup } from '../catalogue-lookup.ts';
import { si } from '../quantity.ts';
import { toAeroplane } from '../to-aeroplane.ts';
import type { ReadablePart } from './readable-part.ts';

/** A definition as its review asks for it: in SI, with the units it was typed in with and where everything stands. */
export function toReviewed(
  definition: AeroplaneDefinition,
  { remainder: { numbers } }: ReadablePart,
  units: UnitFamily,
  { aerodromes }: CatalogueLookup,
): Reviewed {
  const aeroplane = toAeroplane(definition);
  const { tables = [] } = definition.flightManual ?? {};
  const { flightManual } = aeroplane;
  return {
    aeroplane,
    tables: (flightManual?.tables ?? []).map((table, i): ReviewedTable => {
      const given = tables[i] as (typeof tables)[number];
      return {
        table,
        at: `/flightManual/tables/${numbers.tables[i]}`,
        columns: given.columns,
        massUnit: given.conditions.mass?.unit,
      };
    }),
    speedTables: (flightManual?.speedTables ?? []).map((table, i) => ({
      table,
      at: `/flightManual/speedTables/${numbers.speedTables[i]}`,
    })),
    graphs: (flightManual?.graphs ?? []).map((graph, i) => ({
      graph,
      at: `/flightManual/graphs/${numbers.graphs[i]}`,
    })),
    stallSpeedUnits: Object.fromEntries(
      Object.entries(definition.configurations).flatMap(([id, { maximumLift }]) =>
        'stallSpeed' in maximumLift ? [[id, maximumLift.stallSpeed.unit]] : [],
      ),
    ),
    aerodromes: aerodromes.ids.flatMap((id) => {
      const found = aerodromes.get(id);
      return found === undefined ? [] : [{ id, elevation: si('length', found.definition.elevation) }];
    }),
    units,
  };
}
