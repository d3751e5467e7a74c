import { describe, expect, it } from 'vitest';
import * as z from 'zod';
import * as quantities from '../../src/contract/quantities.ts';

interface Branch {
  readonly unit: string;
  readonly lowest: number;
  readonly highest: number;
}

/** Units and bounds of a family as the published document states them. */
function branchesOf(schema: z.ZodType): Branch[] {
  const { $defs } = z.toJSONSchema(schema) as unknown as { $defs: Record<string, Documented> };
  return (Object.values($defs)[0] as Documented).oneOf.map(({ properties: { unit, value } }) => ({
    unit: unit.const,
    lowest: value.minimum,
    highest: value.maximum,
  }));
}

interface Documented {
  readonly oneOf: readonly {
    readonly properties: {
      readonly unit: { readonly const: string };
      readonly value: { readonly minimum: number; readonly maximum: number };
    };
  }[];
}

const families = Object.entries(quantities) as [string, z.ZodType][];
const familyOf = new Map(families);

/** Exact factors and offsets to SI, by the definitions of the units. */
const toSi: Record<string, (value: number) => number> = {
  m: (v) => v,
  km: (v) => v * 1000,
  ft: (v) => v * 0.3048,
  NM: (v) => v * 1852,
  in: (v) => v * 0.0254,
  m2: (v) => v,
  ft2: (v) => v * 0.3048 ** 2,
  'm/s': (v) => v,
  kt: (v) => (v * 1852) / 3600,
  'km/h': (v) => v / 3.6,
  mph: (v) => (v * 1609.344) / 3600,
  'ft/min': (v) => (v * 0.3048) / 60,
  kg: (v) => v,
  t: (v) => v * 1000,
  lb: (v) => v * 0.45359237,
  degC: (v) => v + 273.15,
  degF: (v) => (v + 459.67) / 1.8,
  K: (v) => v,
  deltaC: (v) => v,
  deltaF: (v) => v / 1.8,
  Pa: (v) => v,
  hPa: (v) => v * 100,
  kPa: (v) => v * 1000,
  bar: (v) => v * 1e5,
  inHg: (v) => v * 3386.389,
  psi: (v) => (v * 0.45359237 * 9.80665) / 0.0254 ** 2,
  deg: (v) => (v * Math.PI) / 180,
  s: (v) => v,
  N: (v) => v,
  kN: (v) => v * 1000,
  lbf: (v) => v * 0.45359237 * 9.80665,
  W: (v) => v,
  kW: (v) => v * 1000,
  hp: (v) => v * 550 * 0.3048 * 0.45359237 * 9.80665,
  J: (v) => v,
  MJ: (v) => v * 1e6,
  'kg/m3': (v) => v,
  percent: (v) => v / 100,
};

describe('quantity families', () => {
  it.each(families)(
    '%s has finite bounds in each unit, the same range in all to two parts in a thousand',
    (_, schema) => {
      const ranges = branchesOf(schema).map(({ unit, lowest, highest }) => {
        expect(Number.isFinite(lowest) && Number.isFinite(highest), unit).toBe(true);
        return [toSi[unit]?.(lowest) as number, toSi[unit]?.(highest) as number] as const;
      });
      const lowest = ranges.map(([low]) => low);
      const highest = ranges.map(([, high]) => high);
      const size = Math.max(...highest) - Math.min(...lowest);
      expect(Math.max(...lowest) - Math.min(...lowest)).toBeLessThanOrEqual(0.002 * size);
      expect(Math.max(...highest) - Math.min(...highest)).toBeLessThanOrEqual(0.002 * size);
    },
  );

  it.each(families)('%s takes its bounds, nothing beyond, and no unit of another family', (_, schema) => {
    for (const { unit, lowest, highest } of branchesOf(schema)) {
      const takes = (value: unknown) => schema.safeParse({ value, unit }).success;
      expect([lowest, highest, (lowest + highest) / 2].map(takes), unit).toEqual([true, true, true]);
      const beyond = [lowest - 0.001 - Math.abs(lowest) * 1e-6, highest + 0.001 + Math.abs(highest) * 1e-6];
      for (const value of [...beyond, Number.NaN, Infinity, '1', null, [1], true]) {
        expect(takes(value), `${value} ${unit}`).toBe(false);
      }
      expect(schema.safeParse({ value: lowest, unit: 'furlong' }).success).toBe(false);
      expect(schema.safeParse({ value: lowest, unit, note: 1 }).success).toBe(false);
      expect(schema.safeParse({ value: lowest }).success).toBe(false);
    }
  });

  it.each([
    ['qnh', 'hPa', 870, 1085, 0.01],
    ['qnh', 'inHg', 25.7, 32.04, 0.02],
    ['temperature', 'degC', -60, 60, 0.01],
    ['temperature', 'degF', -76, 140, 0.01],
    ['temperature', 'K', 213.15, 333.15, 1],
    ['slope', 'percent', -10, 10, 0.01],
    ['runwayLength', 'm', 0, 10_000, 0.01],
    ['runwayLength', 'ft', 0, 32_808, 5],
    ['elevation', 'm', -500, 6000, 0.01],
    ['direction', 'deg', 0, 360, 0.01],
  ] as const)('%s in %s reaches from %d to %d and not far beyond', (name, unit, lowest, highest, slack) => {
    const schema = familyOf.get(name) as z.ZodType;
    const takes = (value: number) => schema.safeParse({ value, unit }).success;
    expect(takes(lowest) && takes(highest)).toBe(true);
    expect(takes(lowest - slack) || takes(highest + slack)).toBe(false);
  });

  it('a pressure in hPa is not one in inHg, nor a temperature in K one in degC: no value fits both', () => {
    const fits = (schema: z.ZodType, unit: string, value: number) => schema.safeParse({ value, unit }).success;
    for (let value = 20; value < 1200; value += 0.5) {
      expect(fits(quantities.qnh, 'hPa', value) && fits(quantities.qnh, 'inHg', value)).toBe(false);
      expect(fits(quantities.qnh, 'hPa', value) && fits(quantities.qnh, 'kPa', value)).toBe(false);
      expect(fits(quantities.temperature, 'K', value) && fits(quantities.temperature, 'degC', value)).toBe(false);
    }
  });
});
