import type { AeroplaneDefinition } from '../../src/contract/aeroplane-definition.ts';
import type { CatalogueLookup } from '../../src/contract/catalogue-lookup.ts';
import type { LandingRequest } from '../../src/contract/landing-request.ts';
import type { TakeoffRequest } from '../../src/contract/takeoff-request.ts';
import { toAeroplane } from '../../src/contract/to-aeroplane.ts';
import type { Fault } from '../../src/planning/fault.ts';

/** An invented aeroplane with every member that a definition can have. */
export function sampleDefinition(): AeroplaneDefinition {
  return {
    id: 'sample-tourer',
    revision: '3',
    name: 'Sample Tourer (invented)',
    category: 'single-piston',
    engines: 1,
    certification: { basis: 'cs-23-amendment-4', screenHeight: { value: 50, unit: 'ft' } },
    masses: {
      empty: { value: 640, unit: 'kg' },
      maximumTakeoff: { value: 1030, unit: 'kg' },
      maximumLanding: { value: 1000, unit: 'kg' },
    },
    wing: {
      area: { value: 15.4, unit: 'm2' },
      span: { value: 10.4, unit: 'm' },
      heightAboveGround: { value: 0.9, unit: 'm' },
      taperRatio: 0.7,
      sweep: { value: 1, unit: 'deg' },
      washout: { value: 2, unit: 'deg' },
      section: '2412',
    },
    drag: { zeroLiftCoefficient: 0.034, oswaldFactor: 0.74 },
    configurations: {
      'takeoff-10': {
        for: ['takeoff'],
        flap: { value: 10, unit: 'deg' },
        maximumLift: { stallSpeed: { value: 50, unit: 'kt' }, type: 'cas', mass: { value: 1030, unit: 'kg' } },
        groundDragIncrementCoefficient: 0.004,
        airDragIncrementCoefficient: 0.004,
        groundLiftCoefficient: 0.4,
        speeds: {
          rotation: { stallRatio: 1.08 },
          liftOff: { cas: { value: 60, unit: 'kt' }, mass: { value: 1030, unit: 'kg' } },
          screen: { stallRatio: 1.25 },
        },
        rotationTime: { value: 1, unit: 's' },
        pullUpLoadFactor: 1.1,
        rollingStartAllowance: { value: 30, unit: 'm' },
      },
      'landing-full': {
        for: ['landing'],
        flap: { value: 30, unit: 'deg' },
        maximumLift: { coefficient: 1.9 },
        speeds: { landingReference: { stallRatio: 1.3 }, touchdown: { stallRatio: 1.15 } },
        approachAngle: { value: 3, unit: 'deg' },
        flareLoadFactor: 1.2,
        floatDecelerationRatio: 0.13,
        freeRollTime: { value: 2, unit: 's' },
        idleThrust: { value: 150, unit: 'N' },
      },
    },
    propulsion: {
      kind: 'fixed-pitch',
      staticThrust: { value: 2400, unit: 'N' },
      propellerDiameter: { value: 1.85, unit: 'm' },
      polarSlopeCoefficient: 0.055,
      altitudeLapseCoefficient: 0.12,
      temperatureExponent: 0.5,
      humidityFactor: 1,
      thrustFactor: 1,
      powerSettings: { 'reduced-90': { fullPowerRatio: 0.9 } },
    },
    wheels: {
      arrangement: 'tricycle',
      tyrePressure: { value: 2, unit: 'bar' },
      tyreSpeedLimit: { value: 120, unit: 'kt' },
      tyres: 3,
      maximumTyreWidth: { value: 0.17, unit: 'm' },
      tyreDeflection: { value: 1, unit: 'in' },
      sprayLength: { value: 10, unit: 'ft' },
    },
    brakes: {
      brakingFrictionCoefficient: 0.4,
      loadFactor: 0.85,
      antiSkid: 'none',
      energyLimit: { value: 1, unit: 'MJ' },
    },
    reverseThrust: { thrust: { value: 0.8, unit: 'kN' }, cutOffSpeed: { value: 20, unit: 'kt' } },
    limitations: {
      demonstratedCrosswind: { value: 15, unit: 'kt' },
      crosswind: { value: 20, unit: 'kt' },
      tailwind: { value: 10, unit: 'kt' },
      maximumTemperature: { value: 45, unit: 'degC' },
      maximumPressureAltitude: { value: 10_000, unit: 'ft' },
    },
    airspeedCalibration: {
      columns: [
        { name: 'indicated', unit: 'kt' },
        { name: 'calibrated', unit: 'kt' },
      ],
      rows: [
        [40, 46],
        [60, 62],
        [100, 99],
      ],
    },
  };
}

/** A takeoff of it with every member that a question can have, by id. */
export function sampleTakeoff(): TakeoffRequest {
  return {
    reference: 'flight 12',
    asOf: '2026-05-04T06:30:00Z',
    aeroplane: { id: 'sample-tourer' },
    mass: { value: 1010, unit: 'kg' },
    configuration: 'takeoff-10',
    runway: {
      designator: '07',
      direction: { value: 72, unit: 'deg' },
      directionReference: 'magnetic',
      magneticVariation: { value: 3, unit: 'deg' },
      elevation: { value: 1250, unit: 'ft' },
      slope: { value: 0.8, unit: 'percent' },
      surface: { kind: 'grass', state: 'wet', grass: 'short', firmness: 'firm', rollingFrictionCoefficient: 0.08 },
      start: { offset: { value: 60, unit: 'm' } },
      lineUp: { tora: { value: 10, unit: 'm' }, asda: { value: 14, unit: 'm' } },
      declared: {
        tora: { value: 900, unit: 'm' },
        toda: { value: 960, unit: 'm' },
        asda: { value: 900, unit: 'm' },
        lda: { value: 850, unit: 'm' },
      },
    },
    weather: {
      temperature: { value: 31, unit: 'degC' },
      dewPoint: { value: 18, unit: 'degC' },
      pressure: { qnh: { value: 1009, unit: 'hPa' } },
      wind: {
        from: { value: 240, unit: 'deg' },
        fromReference: 'true',
        speed: { value: 8, unit: 'kt' },
        gust: { value: 14, unit: 'kt' },
        variable: { from: { value: 210, unit: 'deg' }, to: { value: 270, unit: 'deg' } },
      },
    },
    ruleSet: 'eu-class-b',
    stage: 'dispatch',
    units: 'm-kt-kg',
    rounding: 'safe',
  };
}

/** A landing of it with every member that a question can have, by id. */
export function sampleLanding(): LandingRequest {
  const { procedure: _, detail: _d, ...common } = sampleTakeoff();
  return {
    ...common,
    mass: { value: 960, unit: 'kg' },
    configuration: 'landing-full',
    runway: {
      ...common.runway,
      surface: { kind: 'paved', state: 'wet', brakingFrictionCoefficient: 0.21 },
    },
    procedure: {
      approachSpeedIncrement: { value: 4, unit: 'kt' },
      approachAngle: { value: 3.5, unit: 'deg' },
      reverse: true,
      antiSkid: 'inoperative',
      reactionTime: { value: 2.5, unit: 's' },
    },
  };
}

/** A lookup that knows these definitions; digests are made of the id. */
export function sampleLookup(...definitions: readonly AeroplaneDefinition[]): CatalogueLookup {
  const known = new Map(
    definitions.map((definition) => [
      definition.id,
      { aeroplane: toAeroplane(definition), definition, digest: `digest of ${definition.id}` },
    ]),
  );
  return {
    get: (id) => known.get(id),
    ids: [...known.keys()],
    digestOf: (definition) => `digest of ${definition.id}`,
    digestOfJson: () => 'digest',
    aerodromes: { get: () => undefined, ids: [] },
  };
}

/** A copy with one member, named by a pointer, replaced; undefined takes it away. */
export function withMember<T>(whole: T, pointer: string, value: unknown): T {
  const copy = structuredClone(whole) as Record<string, unknown>;
  const path = pointer.split('/').slice(1);
  const last = path.pop() as string;
  let parent = copy;
  for (const name of path) {
    parent[name] ??= {};
    parent = parent[name] as Record<string, unknown>;
  }
  if (value === undefined) delete parent[last];
  else parent[last] = value;
  return copy as T;
}

/** Code and pointer of each fault, as one word each. */
export function named(faults: readonly Fault[]): string[] {
  return faults.map(({ code, pointer }) => `${code} ${pointer}`);
}
