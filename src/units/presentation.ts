import { type Quantity, scaleOf, type Unit, type UnitOf } from './units.ts';

/** The unit families an answer can be asked in. */
export const unitFamilies = ['m-kt-kg', 'ft-kt-lb', 'si'] as const;
export type UnitFamily = (typeof unitFamilies)[number];

/** What an answer's number is, which decides its unit in a family and its rounding step. */
export type Kind =
  | 'distance'
  | 'altitude'
  | 'depth'
  | 'speed'
  | 'mass'
  | 'temperature'
  | 'temperatureDifference'
  | 'pressure'
  | 'density'
  | 'gradient'
  | 'angle'
  | 'time'
  | 'force'
  | 'area'
  | 'power'
  | 'rateOfClimb'
  | 'energy';

/** Which way a number may move when rounded: required up, available and margin down, all else to the nearest. */
export type Direction = 'up' | 'down' | 'nearest';

interface Form {
  readonly unit: Unit;
  /** value in the unit = SI / factor - offset; kept here because an answer shows a hundred numbers */
  readonly factor: number;
  readonly offset: number;
  /** decimals shown; a negative step of 5 ft is written as step 5 */
  readonly step: number;
}

function form<Q extends Quantity>(quantity: Q, unit: UnitOf<Q>, step: number): Form {
  return { unit: unit as Unit, ...scaleOf(quantity, unit), step };
}

const metres = form('length', 'm', 1);
const knots = form('speed', 'kt', 0.1);
const celsius = form('temperature', 'degC', 0.1);
const deltaC = form('temperatureDifference', 'deltaC', 0.1);
const density = form('density', 'kg/m3', 0.0001);
const gradient = form('proportion', 'percent', 0.01);
const angle = form('angle', 'deg', 0.1);
const time = form('time', 's', 0.1);
const squareMetres = form('area', 'm2', 0.01);
const kilowatts = form('power', 'kW', 0.1);
const megajoules = form('energy', 'MJ', 0.01);
const feetPerMinute = form('speed', 'ft/min', 1);
const shared = { density, gradient, angle, time, temperatureDifference: deltaC, energy: megajoules };

const forms: Record<UnitFamily, Record<Kind, Form>> = {
  'm-kt-kg': {
    ...shared,
    distance: metres,
    depth: form('length', 'm', 0.001),
    altitude: form('length', 'ft', 1),
    speed: knots,
    mass: form('mass', 'kg', 1),
    temperature: celsius,
    pressure: form('pressure', 'hPa', 0.01),
    force: form('force', 'N', 1),
    area: squareMetres,
    power: kilowatts,
    rateOfClimb: feetPerMinute,
  },
  'ft-kt-lb': {
    ...shared,
    distance: form('length', 'ft', 5),
    depth: form('length', 'in', 0.05),
    altitude: form('length', 'ft', 1),
    speed: knots,
    mass: form('mass', 'lb', 1),
    temperature: celsius,
    pressure: form('pressure', 'inHg', 0.001),
    force: form('force', 'lbf', 1),
    area: form('area', 'ft2', 0.1),
    power: form('power', 'hp', 0.1),
    rateOfClimb: feetPerMinute,
  },
  si: {
    ...shared,
    distance: metres,
    depth: form('length', 'm', 0.001),
    altitude: form('length', 'm', 0.1),
    speed: form('speed', 'm/s', 0.1),
    mass: form('mass', 'kg', 1),
    temperature: form('temperature', 'K', 0.1),
    pressure: form('pressure', 'Pa', 1),
    force: form('force', 'N', 1),
    area: squareMetres,
    power: form('power', 'W', 1),
    rateOfClimb: form('speed', 'm/s', 0.01),
  },
};

/** The unit in which a family writes a kind of number. */
export function unitFor(family: UnitFamily, kind: Kind): Unit {
  return forms[family][kind].unit;
}

/** The step to which a family rounds a kind of number, in that unit. */
export function stepFor(family: UnitFamily, kind: Kind): number {
  return forms[family][kind].step;
}

/**
 * A number from SI into a family's unit, rounded the safe way.
 *
 * A value within 1e-9 of a step counts as being on it, so that 897.0000000000001 is not shown as 898.
 *
 * @param si - the number in SI
 * @param direction - up for what is required, down for what is available or spare
 * @param rounding - 'none' gives the converted number as it stands
 * @returns the number to show, in unitFor(family, kind); never -0
 */
export function shown(
  family: UnitFamily,
  kind: Kind,
  si: number,
  direction: Direction = 'nearest',
  rounding: 'safe' | 'none' = 'safe',
): number {
  const { factor, offset, step } = forms[family][kind];
  const value = si / factor - offset;
  return rounding === 'none' ? value + 0 : roundTo(value, step, direction);
}

/** Rounds to a multiple of the step; the step's reciprocal is a whole number or the step is. */
export function roundTo(value: number, step: number, direction: Direction): number {
  if (!Number.isFinite(value)) throw new RangeError(`value must be finite: ${value}`);
  const inverse = step < 1 ? Math.round(1 / step) : 1 / step;
  const steps = value * inverse;
  const nearest = Math.round(steps);
  const near = Math.abs(steps - nearest) <= 1e-9 * Math.max(1, Math.abs(steps));
  const whole = direction === 'nearest' || near ? nearest : direction === 'up' ? Math.ceil(steps) : Math.floor(steps);
  return step < 1 ? whole / inverse + 0 : whole * step + 0;
}
