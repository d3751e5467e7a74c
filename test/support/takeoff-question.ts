import type { Aeroplane, Configuration } from '../../src/performance/aeroplane.ts';
import type { TakeoffAnswer } from '../../src/planning/answer.ts';
import { isRefused } from '../../src/planning/fault.ts';
import { planTakeoff } from '../../src/planning/plan-takeoff.ts';
import type { Question, TakeoffQuestion } from '../../src/planning/question.ts';

const ft = 0.3048;
const kt = 1852 / 3600;

/** The aeroplane of the worked case: every figure stated, so that nothing is assumed but the friction. */
export const statedTrainer: Aeroplane = {
  id: 'stated-trainer',
  revision: '1',
  name: 'Stated Trainer (invented)',
  category: 'single-piston',
  engines: 1,
  certification: { basis: 'cs-23-amendment-4', screenHeight: 50 * ft },
  masses: { empty: 680, maximumTakeoff: 1050 },
  wing: { area: 16.2, span: Math.sqrt(7.32 * 16.2), heightAboveGround: 0.2 * Math.sqrt(7.32 * 16.2) },
  drag: { zeroLiftCoefficient: 0.04, oswaldFactor: 0.72 },
  configurations: {
    takeoff: {
      for: ['takeoff'],
      flap: Math.PI / 18,
      maximumLift: { kind: 'coefficient', coefficient: 1.75 },
      groundDragIncrementCoefficient: 0,
      airDragIncrementCoefficient: 0,
      groundLiftCoefficient: 0.4,
      speeds: {
        rotation: { kind: 'stall-ratio', ratio: 1.15 },
        liftOff: { kind: 'stall-ratio', ratio: 1.15 },
        screen: { kind: 'stall-ratio', ratio: 1.2 },
      },
      rotationTime: 0,
      pullUpLoadFactor: 1.1,
    },
    landing: {
      for: ['landing'],
      flap: Math.PI / 6,
      maximumLift: { kind: 'coefficient', coefficient: 2 },
    },
  },
  propulsion: {
    kind: 'fixed-pitch',
    staticThrust: 2366,
    propellerDiameter: 1.905,
    polarSlopeCoefficient: 0.0564,
    altitudeLapseCoefficient: 0.12,
    temperatureExponent: 0.5,
    humidityFactor: 0,
    thrustFactor: 1,
  },
  limitations: {
    demonstratedCrosswind: 15 * kt,
    tailwind: 12 * kt,
    maximumTemperature: 313.15,
    maximumPressureAltitude: 10_000 * ft,
  },
};

/** A calm, cool, dry, long, paved runway near sea level: nothing to say but that the method is an estimate. */
export const plainQuestion: TakeoffQuestion = {
  aeroplane: statedTrainer,
  aeroplaneDigest: '0'.repeat(64),
  aeroplaneAt: '/aeroplane/definition',
  mass: 1010,
  configuration: 'takeoff',
  runway: {
    designator: '07',
    direction: (70 * Math.PI) / 180,
    directionReference: 'true',
    elevation: 100,
    slope: 0,
    surface: { kind: 'paved', state: 'dry', rollingFrictionCoefficient: 0.03 },
    start: { kind: 'threshold' },
    declared: { tora: 1500, toda: 1500, asda: 1500 },
  },
  weather: {
    temperature: 288.15,
    dewPoint: 278.15,
    pressure: { kind: 'qnh', value: 101_325 },
    wind: { kind: 'calm' },
  },
  ruleSet: 'unfactored',
  units: 'm-kt-kg',
  defaulted: [],
};

/** The worked case of four readings: hot, wet short grass, uphill, a tailwind of 11.9 kt. */
export function fourReadings(tora: number): TakeoffQuestion {
  return {
    ...plainQuestion,
    runway: {
      ...plainQuestion.runway,
      elevation: 1250 * ft,
      slope: 0.008,
      surface: { kind: 'grass', state: 'wet', grass: 'short', firmness: 'firm' },
      declared: { tora },
    },
    weather: {
      temperature: 304.15,
      dewPoint: 291.15,
      pressure: { kind: 'qnh', value: 100_900 },
      wind: { kind: 'components', headwind: -11.9 * kt },
    },
    ruleSet: 'eu-class-b',
  };
}

/** What a question may be changed in; a member given replaces the whole of it. */
export interface Changes<Asked extends Question = TakeoffQuestion> {
  readonly aeroplane?: Partial<Aeroplane>;
  readonly configuration?: Partial<Configuration>;
  readonly runway?: Partial<Question['runway']>;
  readonly weather?: Partial<Question['weather']>;
  readonly question?: Partial<Asked>;
}

/** A question with some of it changed. */
export function changed<Asked extends Question>(
  base: Asked,
  { aeroplane, configuration, runway, weather, question }: Changes<Asked>,
): Asked {
  const id = base.configuration;
  const own = { ...(base.aeroplane.configurations[id] as Configuration), ...configuration };
  return {
    ...base,
    aeroplane: {
      ...base.aeroplane,
      configurations: { ...base.aeroplane.configurations, [id]: own },
      ...aeroplane,
    },
    runway: { ...base.runway, ...runway },
    weather: { ...base.weather, ...weather },
    ...question,
  };
}

/** The answer, where the question must have one. */
export function answered(question: TakeoffQuestion): TakeoffAnswer {
  const answer = planTakeoff(question);
  if (isRefused(answer))
    throw new Error(answer.refused.map(({ pointer, message }) => `${pointer}: ${message}`).join('; '));
  return answer;
}
