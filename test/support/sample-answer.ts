import type { Factor, SpeedSet, TakeoffAnswer } from '../../src/planning/answer.ts';

const factor: Factor = {
  code: 'overall',
  value: 1.25,
  because: 'takeoff distance against TORA',
  source: 'EuAirOps305',
  status: 'read',
};

function speeds(cas: number): SpeedSet {
  return { cas, eas: cas * 0.999, tas: cas * 1.06, ias: cas - 1, stallRatio: cas / 25 };
}

/** An answer with every member that a takeoff answer can have; its numbers lie between the steps of every family. */
export function sampleAnswer(): TakeoffAnswer {
  return {
    outcome: 'not-enough',
    sentence: 'Not enough: short by 207 m.',
    cautions: [
      {
        code: 'margin-negative',
        severity: 'caution',
        message: 'The check takeoff-run is short.',
        at: '/runway/declared',
        value: { kind: 'distance', value: -206.3 },
        threshold: 0.123456,
        source: 'Judgement',
      },
      { code: 'method-is-estimate', severity: 'note', message: 'Computed.' },
    ],
    air: {
      temperature: 304.1234,
      temperatureDeviation: 18.7123,
      pressure: 96_421.234,
      pressureAltitude: 416.37,
      density: 1.095512,
      densityRatio: 0.894299,
      densityAltitude: 1148.71,
      dewPoint: 291.1678,
      relativeHumidity: 0.459321,
    },
    wind: { headwind: -4.1234, crosswind: 2.9321, crosswindFrom: 'right', creditedHeadwind: -6.1851 },
    speeds: { stall: speeds(25), rotation: speeds(27.5), liftOff: speeds(30.1), screen: speeds(31.7) },
    distances: {
      screenHeight: 15.24,
      groundRoll: { value: 602.3, low: 398.7, high: 906.2, method: 'stated' },
      airDistance: { value: 285.4, low: 192.8, high: 421.3, method: 'stated' },
      takeoffDistance: { value: 887.7, low: 612.6, high: 1285.3, method: 'stated' },
      groundRollTime: 30.87,
      airTime: 7.66,
    },
    assessment: {
      ruleSet: 'eu-class-b',
      checks: [
        {
          code: 'takeoff-run',
          of: 'takeoffDistance',
          startsFrom: 'reference',
          distance: 766.2,
          factors: [factor, { ...factor, code: 'slope', value: 1 / 0.7, source: 'EuAirOps305Amc2' }],
          alternative: {
            startsFrom: 'credited',
            distance: 968.2,
            factors: [{ ...factor, source: 'EuAirOps305Amc1' }],
            required: 1113.2,
            because: 'physics asks for less',
          },
          unit: 'distance',
          required: 1036.2,
          available: 829.9,
          margin: -206.3,
          marginRatio: -206.3 / 1036.2,
          result: 'fails',
          source: 'EuAirOps305',
        },
        {
          code: 'takeoff-distance',
          of: 'takeoffDistance',
          startsFrom: 'reference',
          factors: [],
          unit: 'distance',
          result: 'not-assessed',
          why: 'TODA is not given',
          source: 'EuAirOps305',
        },
      ],
      governing: 'takeoff-run',
    },
    shortfall: [
      {
        at: '/weather/temperature',
        axis: 'temperature',
        table: 'takeoff',
        given: { kind: 'temperature', value: 304.1234 },
        bound: { kind: 'temperature', value: 303.15 },
        side: 'above',
      },
    ],
    basis: {
      method: 'stated',
      band: [{ of: 'wind', groundRoll: 0.07823, airDistance: 0.04171, wholeDistance: 0.06639 }],
      assumed: [
        {
          at: '/aeroplane#/configurations/takeoff-10/pullUpLoadFactor',
          value: 1.1,
          because: 'not stated',
          effectRatio: 0.0312345,
          source: 'Raymer',
        },
        { at: '/units', value: 'm-kt-kg', because: 'no units are asked for' },
        { at: '/x', value: { kind: 'time', value: 1.04 }, because: 'not stated' },
      ],
      notGiven: ['/runway/obstacles'],
      sources: ['Iso2533', 'EuAirOps305'],
    },
  };
}
