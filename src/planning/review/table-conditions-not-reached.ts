import type { ManualAxis, ManualTable } from '../../performance/flight-manual/flight-manual.ts';
import { standardTemperature } from '../../physics/atmosphere.ts';
import type { FindingTest, Raised } from './finding-test.ts';
import { columnAt, type ReviewContext, type ReviewedTable, textIn } from './review-context.ts';

const foot = 0.3048;
const celsius = 273.15;
/** Pressure altitudes and temperatures that a small operator meets in a year. @see references.Judgement */
const usual = { lowest: 0, highest: 3000 * foot, coldest: celsius, hottest: celsius + 30 };

/** A table that ends before the conditions in which it will be asked. */
export const tableConditionsNotReached: FindingTest = {
  code: 'table-conditions-not-reached',
  severity: 'note',
  meaning:
    'A table does not reach from sea level to 3 000 ft, to the highest aerodrome on file, or from 0 to 30 °C: beyond it the flight manual has no figures, or its edge stands.',
  source: 'Judgement',
  test: (context) => context.tables.flatMap((one) => [...altitudes(context, one), ...temperatures(context, one)]),
};

function altitudes(context: ReviewContext, one: ReviewedTable): Raised[] {
  const range = rangeOf(one.table, 'pressureAltitude');
  if (range === undefined) return [];
  const { lowest, highest } = range;
  const at = columnAt(one, 'pressureAltitude');
  const text = (metres: number) => textIn(context, 'altitude', metres);
  const found: Raised[] = [];
  const above = context.aerodromes.filter(({ elevation }) => elevation > Math.max(highest, usual.highest));
  const highestField = above.sort((a, b) => b.elevation - a.elevation)[0];
  if (highest < usual.highest || highestField !== undefined) {
    const bound = highestField?.elevation ?? usual.highest;
    const field = highestField === undefined ? '' : `; ${highestField.id} lies at ${text(highestField.elevation)}`;
    found.push({
      message: `${one.table.id} ends at a pressure altitude of ${text(highest)}${field}.`,
      at,
      value: { kind: 'altitude', value: highest },
      threshold: { kind: 'altitude', value: bound },
    });
  }
  if (lowest > usual.lowest) {
    found.push({
      message: `${one.table.id} begins at a pressure altitude of ${text(lowest)}.`,
      at,
      value: { kind: 'altitude', value: lowest },
      threshold: { kind: 'altitude', value: usual.lowest },
    });
  }
  return found;
}

function temperatures(context: ReviewContext, one: ReviewedTable): Raised[] {
  const axis = one.table.axes.includes('temperature') ? 'temperature' : 'temperatureDeviation';
  const range = rangeOf(one.table, axis);
  if (range === undefined) return [];
  const standard = axis === 'temperature' ? 0 : standardTemperature(0);
  const [coldest, hottest] = [range.lowest + standard, range.highest + standard];
  const at = columnAt(one, axis);
  const text = (kelvin: number) => textIn(context, 'temperature', kelvin);
  const found: Raised[] = [];
  if (hottest < usual.hottest - 1) {
    found.push({
      message: `${one.table.id} ends at ${text(hottest)}.`,
      at,
      value: { kind: 'temperature', value: hottest },
      threshold: { kind: 'temperature', value: usual.hottest },
    });
  }
  if (coldest > usual.coldest + 1) {
    found.push({
      message: `${one.table.id} begins at ${text(coldest)}.`,
      at,
      value: { kind: 'temperature', value: coldest },
      threshold: { kind: 'temperature', value: usual.coldest },
    });
  }
  return found;
}

function rangeOf({ axes, nodes }: ManualTable, axis: ManualAxis) {
  const column = axes.indexOf(axis);
  if (column < 0) return undefined;
  const values = nodes.map((node) => node[column] as number);
  return { lowest: Math.min(...values), highest: Math.max(...values) };
}
