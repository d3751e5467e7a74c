import { fromSi, toSi } from '../../units/units.ts';
import type { FindingTest } from './finding-test.ts';
import { columnAt, textIn } from './review-context.ts';

const celsius = 273.15;
/** Where tables are made [K]. @see references.HouseFit */
const usual = { lowest: celsius - 45, highest: celsius + 50 };
/** The coldest column of most tables is not above this [K]; degrees Fahrenheit begin at 32 and more. @see references.Judgement */
const coldestUsual = celsius + 25;

/** Temperatures that look like degrees Fahrenheit under a heading of degrees Celsius. */
export const tableTemperatureUnusual: FindingTest = {
  code: 'table-temperature-unusual',
  severity: 'strong',
  meaning:
    'The temperatures of a table lie outside -45 to 50 °C, or all above 25 °C: they look like another unit, mostly degF under a heading of degC.',
  source: 'HouseFit',
  test: (context) =>
    context.tables.flatMap((one) => {
      const axis = one.table.axes.indexOf('temperature');
      if (axis < 0) return [];
      const temperatures = one.table.nodes.map((node) => node[axis] as number);
      const [coldest, hottest] = [Math.min(...temperatures), Math.max(...temperatures)];
      if (coldest >= usual.lowest && hottest <= usual.highest && coldest <= coldestUsual) return [];
      const declared = one.columns.find(({ name }) => name === 'temperature')?.unit as 'degC' | 'degF';
      const other = declared === 'degF' ? 'degC' : 'degF';
      const meant = (kelvin: number) => toSi('temperature', fromSi('temperature', kelvin, declared), other);
      const fits = meant(coldest) >= usual.lowest && meant(hottest) <= usual.highest && meant(coldest) <= coldestUsual;
      return [
        {
          message: `The temperatures of ${one.table.id} go from ${textIn(context, 'temperature', coldest)} to ${textIn(context, 'temperature', hottest)}.`,
          at: `${columnAt(one, 'temperature')}/unit`,
          value: { kind: 'temperature', value: hottest },
          threshold: { kind: 'temperature', value: usual.highest },
          ...(fits ? { hint: `In ${other} they would be usual.` } : { hint: 'Check the unit of the column.' }),
        },
      ];
    }),
};
