import type { Propulsion } from '../aeroplane.ts';
import { propulsionDefault } from '../propulsion-defaults.ts';
import type { ModelParameter } from './fit-model.ts';

export const takeoffParameters = [
  'thrustFactor',
  'airDragShift',
  'altitudeLapseCoefficient',
  'temperatureExponent',
] as const;
export type TakeoffParameter = (typeof takeoffParameters)[number];

/** Load factor of the pull-up of a fitted aeroplane; freed, it would only stand for the drag of the climb. @see references.HouseFit */
export const fittedPullUpLoadFactor = 1.15;

/** What may be fitted to a takeoff: two lapses where the power is a piston's. @see references.HouseFit */
export function takeoffParametersOf(propulsion: Propulsion): readonly ModelParameter<TakeoffParameter>[] {
  const factor: ModelParameter<TakeoffParameter> = {
    name: 'thrustFactor',
    low: 0.75,
    high: 1.25,
    prior: { mean: 1, sd: 0.1 },
    held: propulsion.thrustFactor ?? propulsionDefault(propulsion.kind, 'thrustFactor'),
    plausible: [0.8, 1.1],
  };
  const drag: ModelParameter<TakeoffParameter> = {
    name: 'airDragShift',
    low: -0.04,
    high: 0.06,
    prior: { mean: 0, sd: 0.015 },
    held: 0,
    plausible: [-0.025, 0.03],
  };
  if (propulsion.kind !== 'fixed-pitch' && propulsion.kind !== 'constant-speed') return [factor, drag];
  const lapse = propulsionDefault(propulsion.kind, 'altitudeLapseCoefficient');
  const exponent = propulsionDefault(propulsion.kind, 'temperatureExponent');
  return [
    factor,
    drag,
    {
      name: 'altitudeLapseCoefficient',
      low: 0.08,
      high: 0.25,
      prior: { mean: lapse, sd: 0.04 },
      held: propulsion.altitudeLapseCoefficient ?? lapse,
      plausible: [0.08, 0.25],
    },
    {
      name: 'temperatureExponent',
      low: 0.4,
      high: 1.2,
      prior: { mean: exponent, sd: 0.15 },
      held: propulsion.temperatureExponent ?? exponent,
      plausible: [0.4, 1.2],
    },
  ];
}

/** The propulsion with a fit's figures; piston power without humidity, which the tables that were fitted hold already. */
export function fittedPropulsion(
  propulsion: Propulsion,
  values: Readonly<Partial<Record<TakeoffParameter, number>>>,
  humidityFactor = 0,
): Propulsion {
  const { thrustFactor, altitudeLapseCoefficient, temperatureExponent } = values;
  const factor = thrustFactor === undefined ? {} : { thrustFactor };
  if (propulsion.kind !== 'fixed-pitch' && propulsion.kind !== 'constant-speed') return { ...propulsion, ...factor };
  return {
    ...propulsion,
    ...factor,
    ...(altitudeLapseCoefficient === undefined ? {} : { altitudeLapseCoefficient }),
    ...(temperatureExponent === undefined ? {} : { temperatureExponent }),
    humidityFactor,
  };
}
