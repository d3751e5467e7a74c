import { T0 } from '../physics/constants.ts';
import type { ReferenceKey } from '../references.ts';
import type { Propulsion } from './aeroplane.ts';

/** A figure the definition left out and the thrust needs. Its source is where the figure comes from, not the formula. */
export interface PropulsionDefault {
  /** the member of the definition's propulsion that would state it */
  readonly member: string;
  /** in SI as in the definition */
  readonly value: number;
  /** the other end of the plausible range: put it in the member to see what the default is worth */
  readonly otherEnd: number;
  readonly because: string;
  readonly source: ReferenceKey;
}

type Row = Omit<PropulsionDefault, 'member'>;

const factor = (value: number, otherEnd: number, because: string, source: ReferenceKey): Row => ({
  value,
  otherEnd,
  because,
  source,
});
const installed = factor(0.85, 0.8, 'a propeller nobody has fitted, its installation included', 'HouseThrustFactor');
const asStated = (of: string) => factor(1, 0.93, `${of} as stated; engines in service give less`, 'HouseThrustFactor');
const profileFactor = factor(0.88, 0.82, 'share left by the profile drag of the blades', 'Judgement');
const inducedFactor = factor(1.15, 1.25, 'excess of the induced power over the ideal disc', 'Judgement');
const humidityFactor = factor(1.5, 2, 'loss of piston power by moisture, mixture enrichment included', 'Judgement');

/** T0 (1.15^(1/n) - 1): the standard-day excess that makes the thermodynamic power 1.15 of the flat rating. */
const flatRatingOf = (reserve: number, exponent: number) => T0 * (reserve ** (1 / exponent) - 1);

const lists: { readonly [K in Propulsion['kind']]: Readonly<Record<string, Row>> } = {
  'fixed-pitch': {
    polarSlopeCoefficient: factor(0.056, 0.07, 'slope of the propeller polar, usual range 0.04 to 0.07', 'Judgement'),
    altitudeLapseCoefficient: factor(0.18, 0.25, 'fits to published trainer tables', 'HousePistonLapse'),
    temperatureExponent: factor(0.9, 1.1, 'fits to published trainer tables', 'HousePistonLapse'),
    humidityFactor,
    thrustFactor: asStated('static thrust'),
  },
  'constant-speed': {
    profileFactor,
    inducedFactor,
    altitudeLapseCoefficient: factor(0.12, 0.18, 'piston power against density', 'GaggFerrar1934'),
    temperatureExponent: factor(0.7, 0.9, 'between engine charts and whole-aeroplane tables', 'Judgement'),
    humidityFactor,
    thrustFactor: installed,
  },
  turboprop: {
    profileFactor,
    inducedFactor,
    lapseExponent: factor(
      2,
      2.5,
      'fall of turbine power with temperature, usual range 1.5 to 2.5',
      'HouseTurbineLapse',
    ),
    thrustFactor: installed,
  },
  jet: {
    flatRating: factor(0, 15, 'no reserve above the standard temperature', 'Judgement'),
    bypassRatio: factor(
      4,
      10,
      'the general form of a high bypass ratio, the same for any ratio below 5',
      'Mattingly2002',
    ),
    thrustFactor: asStated('static thrust'),
  },
  electric: { profileFactor, inducedFactor, thrustFactor: installed },
  measured: { thrustFactor: asStated('measured thrust') },
};

/**
 * What is taken for a member that the definition's propulsion leaves out, in SI.
 *
 * @throws RangeError where the kind has no such default
 */
export function propulsionDefault(kind: Propulsion['kind'], member: string): number {
  const row = lists[kind][member];
  if (row === undefined) throw new RangeError(`member has no default in ${kind}: ${member}`);
  return row.value;
}

/**
 * Flat rating of a turboprop whose definition has none [K]: its thermodynamic power is 1.15 of the flat rating.
 *
 * @param lapseExponent - n, above 0
 * @see references.HouseTurbineLapse
 */
export function flatRatingDefault(lapseExponent: number): number {
  return flatRatingOf(1.15, lapseExponent);
}

/** Every figure taken for what the definition's propulsion leaves out, in the order of its members. */
export function propulsionDefaults(propulsion: Propulsion): readonly PropulsionDefault[] {
  const stated = propulsion as unknown as Readonly<Record<string, unknown>>;
  const absent = Object.entries(lists[propulsion.kind])
    .filter(([member]) => stated[member] === undefined)
    .map(([member, row]) => ({ member, ...row }));
  if (propulsion.kind !== 'turboprop' || propulsion.flatRating !== undefined) return absent;
  const exponent = propulsion.lapseExponent ?? propulsionDefault('turboprop', 'lapseExponent');
  const flatRating = {
    member: 'flatRating',
    value: flatRatingDefault(exponent),
    otherEnd: flatRatingOf(1.5, exponent),
    because: 'thermodynamic power 1.15 of the flat rating, the low end of 1.15 to 1.5',
    source: 'HouseTurbineLapse',
  } as const;
  return [flatRating, ...absent];
}
