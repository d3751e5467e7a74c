import type { ManualBound } from '../../performance/flight-manual/manual-figures.ts';
import type { Kind, UnitFamily } from '../../units/presentation.ts';
import { measureText } from '../sentences/measure-text.ts';

interface Measured {
  readonly kind: Kind;
  /** as a sentence names it */
  readonly name: string;
  /** pointer into the question */
  readonly at: string;
}

const difference = 'temperatureDifference';

/** What an axis or a note of the manual measures, and where the question says it. */
export const manualMeasures: Readonly<Record<ManualBound['axis'], Measured>> = {
  flap: { kind: 'angle', name: 'flap', at: '/configuration' },
  mass: { kind: 'mass', name: 'mass', at: '/mass' },
  pressureAltitude: { kind: 'altitude', name: 'pressure altitude', at: '/weather/pressure' },
  temperature: { kind: 'temperature', name: 'temperature', at: '/weather/temperature' },
  temperatureDeviation: { kind: difference, name: 'temperature above standard', at: '/weather/temperature' },
  headwind: { kind: 'speed', name: 'headwind', at: '/weather/wind' },
  tailwind: { kind: 'speed', name: 'tailwind', at: '/weather/wind' },
  uphill: { kind: 'gradient', name: 'slope uphill', at: '/runway/slope' },
  downhill: { kind: 'gradient', name: 'slope downhill', at: '/runway/slope' },
  aboveStandard: { kind: difference, name: 'temperature above standard', at: '/weather/temperature' },
  belowStandard: { kind: difference, name: 'temperature below standard', at: '/weather/temperature' },
  aboveMass: { kind: 'mass', name: 'mass above that of the table', at: '/mass' },
  belowMass: { kind: 'mass', name: 'mass below that of the table', at: '/mass' },
  previous: { kind: 'distance', name: 'figure entering the next panel', at: '/aeroplane' },
  surface: { kind: 'distance', name: 'surface', at: '/runway/surface' },
};

/**
 * Where a sheet ends and what was asked of it: 'takeoff-short-field ends at a temperature of 40 °C, and 43 °C is asked'. Of a wind
 * that the rule set makes more of than is given, it is the rule set that asks.
 */
export function manualBoundText(
  { sheet, axis, given, bound, side, isCredited }: ManualBound,
  units: UnitFamily,
): string {
  const { kind, name } = manualMeasures[axis];
  const verb = side === 'above' ? 'ends' : 'begins';
  const asked = measureText(units, kind, given);
  const ends = `${sheet} ${verb} at a ${name} of ${measureText(units, kind, bound)}`;
  return isCredited ? `${ends}, and the rule set counts ${asked}` : `${ends}, and ${asked} is asked`;
}
