import { z } from 'zod';
import {
  type ManualAxis,
  type ManualOutput,
  type ManualSpeed,
  manualAxes,
  manualOutputs,
  manualSpeedNames,
} from '../../performance/flight-manual/flight-manual.ts';
import type { Quantity, Unit } from '../../units/units.ts';

export type ColumnName = ManualAxis | ManualOutput | ManualSpeed | 'standardTemperature';

/** What a column holds: its quantity, the units that a manual prints it in, and bounds in SI that stop a slip of unit. */
export interface ColumnKind {
  readonly quantity: Quantity;
  readonly units: readonly [Unit, ...Unit[]];
  readonly lowest: number;
  readonly highest: number;
}

const degrees = Math.PI / 180;
const airspeedUnits = ['kt', 'km/h', 'mph', 'm/s'] as const;
const temperature: ColumnKind = {
  quantity: 'temperature',
  units: ['degC', 'degF', 'K'],
  lowest: 213.15,
  highest: 333.15,
};
const distance: ColumnKind = { quantity: 'length', units: ['m', 'ft'], lowest: 10, highest: 10_000 };
const airspeed: ColumnKind = { quantity: 'speed', units: airspeedUnits, lowest: 5, highest: 150 };

export const columnKinds: Readonly<Record<ColumnName, ColumnKind>> = {
  flap: { quantity: 'angle', units: ['deg'], lowest: -15 * degrees, highest: 70 * degrees },
  mass: { quantity: 'mass', units: ['kg', 't', 'lb'], lowest: 20, highest: 400_000 },
  pressureAltitude: { quantity: 'length', units: ['m', 'km', 'ft'], lowest: -1200, highest: 7500 },
  temperature,
  temperatureDeviation: {
    quantity: 'temperatureDifference',
    units: ['deltaC', 'deltaF'],
    lowest: -60,
    highest: 60,
  },
  headwind: { quantity: 'speed', units: airspeedUnits, lowest: -60, highest: 60 },
  standardTemperature: temperature,
  groundRoll: distance,
  takeoffDistance: distance,
  landingDistance: distance,
  climbGradient: { quantity: 'proportion', units: ['percent'], lowest: -0.3, highest: 1 },
  climbRate: { quantity: 'speed', units: ['ft/min', 'm/s'], lowest: -20, highest: 60 },
  liftOff: airspeed,
  screen: airspeed,
  landingReference: airspeed,
  rotation: airspeed,
  touchdown: airspeed,
  stall: airspeed,
};

/** The schema of a column heading: a name of a list, its unit of that quantity's list. */
function heading<const N extends ColumnName>(names: readonly [N, ...N[]]) {
  const branches = names.map((name) =>
    z.strictObject({ name: z.literal(name), unit: z.enum(columnKinds[name].units as [string, ...string[]]) }),
  );
  return z.discriminatedUnion('name', branches as unknown as [z.ZodObject, ...z.ZodObject[]]) as unknown as z.ZodType<
    Heading<N>
  >;
}

/** A column's name and the unit of all its numbers. */
export interface Heading<N extends ColumnName = ColumnName> {
  readonly name: N;
  readonly unit: string;
}

export const tableColumn = heading([...manualAxes, 'standardTemperature', ...manualOutputs]).meta({
  id: 'ManualColumn',
  description: 'A column of a table: what it holds, and the unit of all its numbers.',
});
export const speedColumn = heading(['mass', ...manualSpeedNames]).meta({
  id: 'ManualSpeedColumn',
  description: 'A column of a speed table: mass first, then speeds.',
});
export const graphAxis = heading([...manualAxes]).meta({
  id: 'ManualGraphAxis',
  description: 'An axis of a panel, with the unit of its numbers.',
});
export const graphOutput = heading([...manualOutputs]).meta({
  id: 'ManualGraphOutput',
  description: 'What the graph gives, with the unit of the heights of all its panels.',
});
