import type { Configuration } from '../../performance/aeroplane.ts';
import { maximumLiftCoefficient } from '../../performance/speeds/maximum-lift-coefficient.ts';
import { type UnitFamily, unitFor } from '../../units/presentation.ts';
import { toSi } from '../../units/units.ts';
import { configurationPointer } from '../aeroplane-pointer.ts';
import { pressureBeside } from '../air-beside.ts';
import type { Measure } from '../answer.ts';
import type { Question } from '../question.ts';
import { windAlong } from '../wind-along.ts';

/** An input, and how much more of it a change is told for. */
export interface Amount<Q extends Question> {
  readonly of: string;
  readonly at: (question: Q) => string;
  readonly per: (units: UnitFamily) => Measure | number;
  /** small enough for a slope, large enough for the arithmetic, in SI */
  readonly step: number;
}

/** One input of a question that a distance hangs on. */
export interface MainInput<Q extends Question> extends Amount<Q> {
  /** the question with so much more of it; undefined where it cannot have more, or less */
  readonly moved: (question: Q, by: number) => Q | undefined;
}

/** So many of the family's own unit. */
function inUnits(kind: 'mass' | 'speed', count: number): (units: UnitFamily) => Measure {
  return (units) => ({ kind, value: toSi(kind, count, unitFor(units, kind) as never) });
}

/** The inputs that a takeoff and a landing share, in the order of the question. */
export function sharedInputs<Q extends Question>(): readonly MainInput<Q>[] {
  return [
    {
      of: 'mass',
      at: () => '/mass',
      per: inUnits('mass', 10),
      step: 0.1,
      moved: (question, by) => ({ ...question, mass: question.mass + by }),
    },
    {
      of: 'maximum-lift-coefficient',
      at: (question) => configurationPointer(question, 'maximumLift'),
      per: () => 0.1,
      step: 1e-4,
      moved: withMaximumLift,
    },
    {
      of: 'slope',
      at: () => '/runway/slope',
      per: () => ({ kind: 'gradient', value: 0.01 }),
      step: 1e-5,
      moved: (question, by) => ({ ...question, runway: steeper(question.runway, by) }),
    },
    {
      of: 'temperature',
      at: () => '/weather/temperature',
      per: () => ({ kind: 'temperatureDifference', value: 1 }),
      step: 0.01,
      moved: ({ weather, ...rest }, by) =>
        ({ ...rest, weather: { ...weather, temperature: weather.temperature + by } }) as Q,
    },
    {
      of: 'pressure',
      at: ({ weather: { pressure } }) => `/weather/pressure/${pressure.kind}`,
      per: (units) => ({ kind: 'pressure', value: units === 'ft-kt-lb' ? 338.6389 : 100 }),
      step: 5,
      moved: ({ weather, ...rest }, by) =>
        ({ ...rest, weather: { ...weather, pressure: pressureBeside(weather.pressure, by) } }) as Q,
    },
    {
      of: 'headwind',
      at: () => '/weather/wind',
      per: inUnits('speed', 1),
      step: 0.01,
      moved: withHeadwind,
    },
  ];
}

/** A runway that rises so much more throughout; of a ground line each stretch does. */
function steeper(runway: Question['runway'], by: number): Question['runway'] {
  const { profile, slope } = runway;
  const risen = { ...runway, slope: slope + by };
  return profile === undefined
    ? risen
    : { ...risen, profile: { ...profile, slopes: profile.slopes.map((stretch) => stretch + by) } };
}

function withHeadwind<Q extends Question>(question: Q, by: number): Q | undefined {
  const wind = windAlong(question.runway, question.weather.wind);
  if ('code' in wind) return undefined;
  const { headwind, crosswind } = wind;
  const components = { kind: 'components', headwind: headwind + by } as const;
  return {
    ...question,
    weather: { ...question.weather, wind: crosswind === undefined ? components : { ...components, crosswind } },
  };
}

function withMaximumLift<Q extends Question>(question: Q, by: number): Q | undefined {
  const { aeroplane, configuration: id } = question;
  const configuration = aeroplane.configurations[id];
  if (configuration === undefined) return undefined;
  const { maximumLift } = configuration;
  const coefficient = maximumLiftCoefficient(maximumLift, aeroplane.wing.area);
  // a stated stall speed stays one: rules tell its kinds apart
  const more: Configuration['maximumLift'] =
    maximumLift.kind === 'coefficient'
      ? { kind: 'coefficient', coefficient: coefficient + by }
      : { ...maximumLift, cas: maximumLift.cas * Math.sqrt(coefficient / (coefficient + by)) };
  const moved: Configuration = { ...configuration, maximumLift: more };
  return { ...question, aeroplane: { ...aeroplane, configurations: { ...aeroplane.configurations, [id]: moved } } };
}
