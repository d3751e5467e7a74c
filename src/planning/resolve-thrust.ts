import type { Aeroplane, Propulsion } from '../performance/aeroplane.ts';
import { type PropulsionDefault, propulsionDefaults } from '../performance/propulsion-defaults.ts';
import { propulsionThrustFactor, type ThrustFactor } from '../performance/propulsion-thrust-factor.ts';
import { aeroplanePointer } from './aeroplane-pointer.ts';
import type { Assumption } from './answer.ts';
import type { Assumed } from './assumed.ts';
import { numberText } from './sentences/measure-text.ts';

/** The factor on thrust, and what was taken for what the definition of the propulsion leaves out. */
export interface ResolvedThrust {
  readonly thrustFactor: number;
  readonly assumed: readonly Assumed[];
}

/**
 * What the thrust of an aeroplane rests on beyond its definition.
 *
 * @param aeroplane - propulsion of one engine, number of engines
 * @param aeroplaneAt - pointer to the aeroplane in the request
 * @param liftOffSpeed - at maximum mass, sea level, standard day [m/s]
 * @param moist - whether a dew point is given; without one no power is taken off for moisture
 */
export function resolveThrust(
  { propulsion, engines }: Pick<Aeroplane, 'propulsion' | 'engines'>,
  aeroplaneAt: string,
  liftOffSpeed: number,
  moist: boolean,
): ResolvedThrust {
  const factor = propulsionThrustFactor(propulsion, engines, liftOffSpeed);
  const assumed = propulsionDefaults(propulsion)
    .filter(({ member }) => moist || member !== 'humidityFactor')
    .map((standing) => assumedOf(standing, propulsion, aeroplaneAt, factor));
  return { thrustFactor: factor.value, assumed };
}

function assumedOf(
  standing: PropulsionDefault,
  propulsion: Propulsion,
  aeroplaneAt: string,
  factor: ThrustFactor,
): Assumed {
  const { member, otherEnd, because, source } = standing;
  const isFactor = member === 'thrustFactor';
  const lowered = isFactor && factor.from === 'lowered';
  const assumption: Assumption = {
    at: aeroplanePointer(aeroplaneAt, `/propulsion/${member}`),
    value: shownValue(member, isFactor ? factor.value : standing.value),
    because: lowered
      ? `${because}; lowered from ${numberText(standing.value)}, with which the thrust would exceed the published mean by ${Math.round(((factor.ratioToMean ?? 1) - 1) * 100)} %`
      : because,
    source,
  };
  const other = isFactor ? (otherEnd * factor.value) / standing.value : otherEnd;
  return {
    name: nameOf(member),
    assumption,
    otherEnd: {
      kind: 'propulsion',
      propulsion: isFactor ? propulsion : ({ ...propulsion, [member]: other } as Propulsion),
      thrustFactor: isFactor ? other : factor.value,
      text: member === 'flatRating' ? `${numberText(rounded(other))} °C` : numberText(rounded(other)),
    },
  };
}

function shownValue(member: string, value: number): Assumption['value'] {
  return member === 'flatRating' ? { kind: 'temperatureDifference', value } : value;
}

const names: Readonly<Record<string, string>> = {
  polarSlopeCoefficient: "the slope of the propeller's polar",
  altitudeLapseCoefficient: 'the fall of power with altitude',
  temperatureExponent: 'the fall of power with temperature',
  humidityFactor: 'the loss of power by moisture',
  thrustFactor: 'the factor on thrust',
  profileFactor: "the profile factor of the propeller's disc",
  inducedFactor: "the induced factor of the propeller's disc",
  lapseExponent: "the fall of the turbine's power with temperature",
  flatRating: 'the flat rating',
  bypassRatio: 'the bypass ratio',
};

function nameOf(member: string): string {
  return names[member] ?? member;
}

function rounded(value: number): number {
  return Math.round(value * 1000) / 1000;
}
