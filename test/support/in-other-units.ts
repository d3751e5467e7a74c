/** For each unit another of its quantity, and the number in it, by the definitions of the units. */
const other: Record<string, readonly [unit: string, convert: (value: number) => number]> = {
  m: ['ft', (v) => v / 0.3048],
  ft: ['m', (v) => v * 0.3048],
  m2: ['ft2', (v) => v / 0.3048 ** 2],
  kt: ['km/h', (v) => v * 1.852],
  'm/s': ['mph', (v) => (v * 3600) / 1609.344],
  kg: ['lb', (v) => v / 0.45359237],
  lb: ['t', (v) => (v * 0.45359237) / 1000],
  degC: ['degF', (v) => v * 1.8 + 32],
  degF: ['K', (v) => (v + 459.67) / 1.8],
  deltaC: ['deltaF', (v) => v * 1.8],
  hPa: ['inHg', (v) => (v * 100) / 3386.389],
  bar: ['psi', (v) => (v * 1e5 * 0.0254 ** 2) / (0.45359237 * 9.80665)],
  N: ['lbf', (v) => v / (0.45359237 * 9.80665)],
  kW: ['hp', (v) => (v * 1000) / (550 * 0.3048 * 0.45359237 * 9.80665)],
  MJ: ['J', (v) => v * 1e6],
};

/** A copy of a question or a definition in which each quantity that has another unit is written in it. */
export function inOtherUnits<T>(node: T): T {
  if (Array.isArray(node)) return node.map(inOtherUnits) as T;
  if (typeof node !== 'object' || node === null) return node;
  const { value, unit } = node as { value?: unknown; unit?: unknown };
  if (typeof value === 'number' && typeof unit === 'string') {
    const [name, convert] = other[unit] ?? [unit, (same: number) => same];
    return { value: convert(value), unit: name } as T;
  }
  return Object.fromEntries(Object.entries(node).map(([name, child]) => [name, inOtherUnits(child)])) as T;
}

/** The numbers of a tree with the path to each, in order. */
export function numbersIn(node: unknown, path = ''): [path: string, value: number][] {
  if (typeof node === 'number') return [[path, node]];
  if (typeof node !== 'object' || node === null) return [];
  return Object.entries(node).flatMap(([name, child]) => numbersIn(child, `${path}/${name}`));
}
