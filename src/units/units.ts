/**
 * The closed lists of units, by quantity, each with its exact factor to SI.
 *
 * Factors: 1 ft = 0.3048 m, 1 in = 0.0254 m, 1 NM = 1852 m, 1 lb = 0.45359237 kg, 1 mile = 1609.344 m are exact by definition;
 * 1 lbf = lb x g0; 1 hp = 550 ft lbf/s; 1 inHg = 3386.389 Pa (conventional, 0 degC); 1 psi = lbf/in2.
 *
 * @see references.SI9, references.Icao5
 */
export const scales = {
  length: { m: 1, km: 1000, ft: 0.3048, NM: 1852, in: 0.0254 },
  area: { m2: 1, ft2: 0.09290304 },
  speed: { 'm/s': 1, kt: 1852 / 3600, 'km/h': 1 / 3.6, mph: 0.44704, 'ft/min': 0.00508 },
  mass: { kg: 1, t: 1000, lb: 0.45359237 },
  temperatureDifference: { deltaC: 1, deltaF: 5 / 9 },
  pressure: { Pa: 1, hPa: 100, kPa: 1000, inHg: 3386.389, bar: 100_000, psi: 6894.757293168361 },
  angle: { deg: Math.PI / 180 },
  time: { s: 1, min: 60, h: 3600 },
  force: { N: 1, kN: 1000, lbf: 4.4482216152605 },
  power: { W: 1, kW: 1000, hp: 745.6998715822702 },
  energy: { J: 1, MJ: 1_000_000 },
  density: { 'kg/m3': 1 },
  rotation: { rpm: Math.PI / 30 },
  proportion: { percent: 0.01 },
} as const;

/** Temperature scales are affine: kelvin = (value + offset) x factor. */
export const temperatureScales = {
  K: { offset: 0, factor: 1 },
  degC: { offset: 273.15, factor: 1 },
  degF: { offset: 459.67, factor: 5 / 9 },
} as const;

export type Scales = typeof scales;
export type Quantity = keyof Scales | 'temperature';
export type TemperatureUnit = keyof typeof temperatureScales;
export type UnitOf<Q extends Quantity> = Q extends keyof Scales ? keyof Scales[Q] & string : TemperatureUnit;
export type Unit = { [Q in Quantity]: UnitOf<Q> }[Quantity];

/** Unit names of a quantity, in the order of the list above. */
export function unitsOf(quantity: Quantity): readonly Unit[] {
  return Object.keys(quantity === 'temperature' ? temperatureScales : scales[quantity]) as Unit[];
}

/**
 * A number in a named unit, in SI.
 *
 * @param quantity - which list the unit belongs to
 * @param value - the number, in the unit
 * @param unit - one of unitsOf(quantity)
 * @returns the number in m, m2, m/s, kg, K, Pa, rad, s, N, W, J, kg/m3, rad/s or 1
 */
export function toSi<Q extends Quantity>(quantity: Q, value: number, unit: UnitOf<Q>): number {
  if (quantity === 'temperature') {
    const scale = temperatureScales[unit as TemperatureUnit];
    return (value + scale.offset) * scale.factor;
  }
  return value * factor(quantity as keyof Scales, unit);
}

/** The inverse of toSi, to the last bit or two. */
export function fromSi<Q extends Quantity>(quantity: Q, si: number, unit: UnitOf<Q>): number {
  if (quantity === 'temperature') {
    const scale = temperatureScales[unit as TemperatureUnit];
    return si / scale.factor - scale.offset;
  }
  return si / factor(quantity as keyof Scales, unit);
}

/** How a unit stands to SI: SI = (value + offset) x factor. */
export function scaleOf<Q extends Quantity>(
  quantity: Q,
  unit: UnitOf<Q>,
): { readonly offset: number; readonly factor: number } {
  return quantity === 'temperature'
    ? temperatureScales[unit as TemperatureUnit]
    : { offset: 0, factor: factor(quantity as keyof Scales, unit) };
}

function factor(quantity: keyof Scales, unit: string): number {
  return (scales[quantity] as Record<string, number>)[unit] as number;
}
