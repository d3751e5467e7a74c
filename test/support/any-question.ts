import fc from 'fast-check';
import { readCatalogue } from '../../src/catalogue/read-catalogue.ts';
import type { AeroplaneDefinition } from '../../src/contract/aeroplane-definition.ts';
import type { CatalogueLookup } from '../../src/contract/catalogue-lookup.ts';
import type { LandingRequest } from '../../src/contract/landing-request.ts';
import type { TakeoffRequest } from '../../src/contract/takeoff-request.ts';
import type { WindOnWire } from '../../src/contract/weather.ts';
import { catalogueLookup } from '../../src/http/catalogue-lookup.ts';
import { warmUpStates } from '../../src/http/warm-up-states.ts';
import type { StatedRequest } from './stated-request.ts';

const catalogue = readCatalogue({ builtIn: true });
export const builtIn: CatalogueLookup = catalogueLookup(catalogue);

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const q = <U extends string>(unit: U, min: number, max: number) => between(min, max).map((value) => ({ value, unit }));

/** Definitions that between them state everything and nothing. */
const definitions: readonly AeroplaneDefinition[] = [
  ...catalogue.list().map(({ definition }) => definition),
  ...warmUpStates('takeoff').map(({ aeroplane: { definition } }) => definition),
  ...warmUpStates('takeoff').map(({ aeroplane: { definition } }) => calibrated(definition)),
];

/** The same with a calibration, stated speeds, a minimum speed for the stall, and a known static thrust where there may be one. */
function calibrated(definition: AeroplaneDefinition): AeroplaneDefinition {
  const { propulsion } = definition;
  const known = {
    ...propulsion,
    ...('power' in propulsion ? { staticThrust: { value: 2500, unit: 'N' } } : {}),
    ...(propulsion.kind === 'constant-speed' ? { criticalAltitude: { value: 3000, unit: 'ft' } } : {}),
    powerSettings: { reduced: { fullPowerRatio: 0.92 } },
  };
  const mass = { value: 1040, unit: 'kg' } as const;
  return {
    ...definition,
    propulsion: known as AeroplaneDefinition['propulsion'],
    configurations: {
      takeoff: {
        for: ['takeoff'],
        flap: { value: 12, unit: 'deg' },
        maximumLift: { stallSpeed: { value: 46, unit: 'kt' }, type: 'cas', kind: 'minimum', mass },
        speeds: {
          rotation: { cas: { value: 52, unit: 'kt' }, mass },
          liftOff: { cas: { value: 58, unit: 'kt' }, mass },
          screen: { stallRatio: 1.25 },
        },
        rotationTime: { value: 1.5, unit: 's' },
        rollingStartAllowance: { value: 35, unit: 'm' },
      },
      landing: {
        for: ['landing'],
        flap: { value: 30, unit: 'deg' },
        maximumLift: { stallSpeed: { value: 43, unit: 'kt' }, type: 'cas', kind: 'minimum', mass },
        speeds: { landingReference: { cas: { value: 62, unit: 'kt' }, mass } },
        approachAngle: { value: 4.5, unit: 'deg' },
        freeRollTime: { value: 1, unit: 's' },
      },
    },
    airspeedCalibration: {
      columns: [
        { name: 'indicated', unit: 'kt' },
        { name: 'calibrated', unit: 'kt' },
      ],
      rows: [
        [38, 45],
        [60, 61.5],
        [100, 99],
      ],
    },
  };
}

const wind: fc.Arbitrary<WindOnWire> = fc.oneof(
  fc.constant('calm' as const),
  fc.record({ headwind: q('kt', -10, 25) }),
  fc.record({ headwind: q('kt', -10, 25), crosswind: q('kt', 0, 20) }),
  fc.record({
    from: q('deg', 1, 360),
    fromReference: fc.constantFrom('true' as const, 'magnetic' as const),
    speed: q('kt', 1, 20),
  }),
  fc.record({
    from: fc.constant({ value: 240, unit: 'deg' as const }),
    fromReference: fc.constant('true' as const),
    speed: q('kt', 3, 15),
    variable: fc.constant({ from: { value: 200, unit: 'deg' as const }, to: { value: 280, unit: 'deg' as const } }),
  }),
);

type Question = Omit<StatedRequest<TakeoffRequest>, 'aeroplane' | 'mass' | 'configuration' | 'procedure' | 'detail'>;

/** Weather, runway and rules with every choice of form. */
const anySurroundings = (phase: 'takeoff' | 'landing'): fc.Arbitrary<Question> =>
  fc
    .record({
      altitude: between(0, 6000),
      temperature: q('degC', -15, 38),
      dew: fc.option(between(0, 20), { nil: undefined }),
      pressure: fc.constantFrom('qnh' as const, 'pressureAltitude' as const, 'stationPressure' as const),
      setting: between(985, 1040),
      slope: fc.oneof(
        { weight: 4, arbitrary: q('percent', -2, 2) },
        {
          weight: 1,
          arbitrary: fc.array(between(-8, 8), { minLength: 4, maxLength: 4 }).map((heights) => ({
            profile: {
              units: ['m', 'm'] as ['m', 'm'],
              points: [0, ...heights].map((height, i): [number, number] => [i * 700, height]),
            },
          })),
        },
      ),
      obstacles: fc.boolean(),
      surface: fc.constantFrom<Question['runway']['surface']>(
        { kind: 'paved', state: 'dry' },
        { kind: 'paved', state: 'wet' },
        { kind: 'grass', state: 'wet', grass: 'short', firmness: 'firm' },
        { kind: 'grass', state: 'dry', rollingFrictionCoefficient: 0.06, brakingFrictionCoefficient: 0.21 },
      ),
      start: fc.constantFrom('threshold' as const, { offset: { value: 60, unit: 'm' as const } }),
      lineUp: fc.boolean(),
      magnetic: fc.boolean(),
      declared: fc.constantFrom(['tora', 'lda'], ['tora', 'toda', 'lda'], ['tora', 'toda', 'asda', 'lda'], []),
      wind,
      ruleSet: fc.constantFrom('unfactored', 'eu-class-b'),
      units: fc.constantFrom('m-kt-kg' as const, 'ft-kt-lb' as const, 'si' as const),
      rounding: fc.constantFrom('safe' as const, 'none' as const),
    })
    .map((any): Question => {
      const { temperature, dew, altitude } = any;
      const lengths = { tora: 1900, toda: 2400, asda: 2000, lda: 1800 } as const;
      return {
        runway: {
          designator: '25',
          direction: { value: 247, unit: 'deg' },
          directionReference: any.magnetic ? 'magnetic' : 'true',
          magneticVariation: { value: 4, unit: 'deg' },
          elevation: { value: altitude, unit: 'ft' },
          slope: any.declared.length === 0 && 'profile' in any.slope ? { value: 1, unit: 'percent' } : any.slope,
          surface: any.surface,
          start: any.start,
          ...(any.lineUp ? { lineUp: { tora: { value: 12, unit: 'm' }, asda: { value: 15, unit: 'm' } } } : {}),
          ...(any.obstacles && phase === 'takeoff'
            ? {
                obstacles: {
                  from: 'brake-release',
                  list: [{ distance: { value: 3100, unit: 'm' }, height: { value: 40, unit: 'm' } }],
                },
              }
            : {}),
          declared: Object.fromEntries(
            any.declared.map((name) => [name, { value: lengths[name as keyof typeof lengths], unit: 'm' }]),
          ),
        },
        weather: {
          temperature,
          ...(dew === undefined ? {} : { dewPoint: { value: temperature.value - dew, unit: 'degC' } }),
          pressure:
            any.pressure === 'qnh'
              ? { qnh: { value: any.setting, unit: 'hPa' } }
              : any.pressure === 'pressureAltitude'
                ? { pressureAltitude: { value: altitude, unit: 'ft' } }
                : { stationPressure: { value: any.setting * (1 - altitude / 40_000), unit: 'hPa' } },
          wind: any.wind,
        },
        ruleSet: any.ruleSet,
        units: any.units,
        rounding: any.rounding,
      };
    });

/** One of the definitions in a configuration for this phase, at a mass up to the greatest of the phase. */
const anyState = (phase: 'takeoff' | 'landing') =>
  fc.record({ definition: fc.constantFrom(...definitions), share: between(0.75, 1) }).map(({ definition, share }) => {
    const found = Object.entries(definition.configurations).find(([, one]) => one.for.includes(phase));
    const [configuration, stated] = found as NonNullable<typeof found>;
    const { maximumTakeoff, maximumLanding = maximumTakeoff } = definition.masses;
    const { value, unit } = phase === 'takeoff' ? maximumTakeoff : maximumLanding;
    return {
      stated,
      definition,
      asked: { aeroplane: { definition }, mass: { value: value * share, unit }, configuration },
    };
  });

/** Takeoffs with every choice of form, of which most but not all have distances. */
export const anyTakeoff: fc.Arbitrary<StatedRequest<TakeoffRequest>> = fc
  .tuple(anyState('takeoff'), anySurroundings('takeoff'), fc.boolean(), fc.boolean())
  .map(([{ definition, stated, asked }, surroundings, rolling, reduced]) => ({
    ...asked,
    ...surroundings,
    procedure: {
      ...(rolling && stated.rollingStartAllowance !== undefined ? { start: 'rolling' as const } : {}),
      ...(reduced && 'reduced' in (definition.propulsion.powerSettings ?? {}) ? { power: 'reduced' } : {}),
    },
  }));

/** Landings with every choice of form, of which most but not all have distances. */
export const anyLanding: fc.Arbitrary<StatedRequest<LandingRequest>> = fc
  .tuple(anyState('landing'), anySurroundings('landing'), fc.boolean(), fc.boolean())
  .map(([{ definition, stated, asked }, surroundings, flown, reverse]) => {
    const { speeds, approachAngle, freeRollTime } = stated;
    return {
      ...asked,
      ...surroundings,
      procedure: {
        ...(flown && speeds?.landingReference !== undefined
          ? { approachSpeedIncrement: { value: 4, unit: 'kt' as const } }
          : {}),
        ...(flown && approachAngle !== undefined ? { approachAngle: { value: 3.3, unit: 'deg' as const } } : {}),
        ...(flown && freeRollTime !== undefined ? { reactionTime: { value: 3, unit: 's' as const } } : {}),
        ...(reverse && definition.reverseThrust !== undefined ? { reverse: true } : {}),
      },
    };
  });
