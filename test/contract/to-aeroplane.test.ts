import { describe, expect, it } from 'vitest';
import type { AeroplaneDefinition } from '../../src/contract/aeroplane-definition.ts';
import { toAeroplane } from '../../src/contract/to-aeroplane.ts';
import { inOtherUnits, numbersIn } from '../support/in-other-units.ts';
import { sampleDefinition, withMember } from '../support/sample-questions.ts';

type PropulsionOnWire = AeroplaneDefinition['propulsion'];

const disc = { propellerDiameter: { value: 2, unit: 'm' }, profileFactor: 0.88, inducedFactor: 1.15 } as const;
const power = { value: 150, unit: 'kW' } as const;
const kinds: PropulsionOnWire[] = [
  sampleDefinition().propulsion,
  { kind: 'constant-speed', power, ...disc, criticalAltitude: { value: 3000, unit: 'm' }, temperatureExponent: 0.5 },
  { kind: 'turboprop', power, ...disc, flatRating: { value: 15, unit: 'deltaC' }, lapseExponent: 0.8 },
  { kind: 'jet', staticThrust: { value: 9000, unit: 'N' }, flatRating: { value: 15, unit: 'deltaC' }, bypassRatio: 3 },
  { kind: 'electric', power, ...disc, staticThrust: { value: 3000, unit: 'N' } },
  {
    kind: 'measured',
    columns: [
      { name: 'trueAirspeed', unit: 'km/h' },
      { name: 'thrust', unit: 'kN' },
    ],
    rows: [
      [0, 2.4],
      [36, 2.2],
      [180, 1.1],
    ],
    density: { value: 1.2, unit: 'kg/m3' },
    densityExponent: 1,
  },
];

describe('a definition in SI', () => {
  const { configurations, ...rest } = toAeroplane(sampleDefinition());

  it('holds the same members as bare SI numbers, by hand', () => {
    expect(rest).toEqual({
      id: 'sample-tourer',
      revision: '3',
      name: 'Sample Tourer (invented)',
      category: 'single-piston',
      engines: 1,
      certification: { basis: 'cs-23-amendment-4', screenHeight: expect.closeTo(15.24, 12) },
      masses: { empty: 640, maximumTakeoff: 1030, maximumLanding: 1000 },
      wing: { area: 15.4, span: 10.4, heightAboveGround: 0.9, taperRatio: 0.7, sweep: expect.closeTo(0.0174532925, 9) },
      drag: { zeroLiftCoefficient: 0.034, oswaldFactor: 0.74 },
      propulsion: {
        kind: 'fixed-pitch',
        staticThrust: 2400,
        propellerDiameter: 1.85,
        polarSlopeCoefficient: 0.055,
        altitudeLapseCoefficient: 0.12,
        temperatureExponent: 0.5,
        humidityFactor: 1,
        thrustFactor: 1,
        powerSettings: { 'reduced-90': { fullPowerRatio: 0.9 } },
      },
      wheels: {
        arrangement: 'tricycle',
        tyrePressure: 200_000,
        tyreSpeedLimit: expect.closeTo(61.7333333333, 9),
        tyres: 3,
        maximumTyreWidth: 0.17,
        tyreDeflection: expect.closeTo(0.0254, 12),
        sprayLength: expect.closeTo(3.048, 12),
      },
      brakes: { brakingFrictionCoefficient: 0.4, loadFactor: 0.85, antiSkid: 'none', energyLimit: 1e6 },
      reverseThrust: { thrust: 800, cutOffSpeed: expect.closeTo(10.2888888889, 9) },
      limitations: {
        demonstratedCrosswind: expect.closeTo(7.7166666667, 9),
        crosswind: expect.closeTo(10.2888888889, 9),
        tailwind: expect.closeTo(5.1444444444, 9),
        maximumTemperature: expect.closeTo(318.15, 9),
        maximumPressureAltitude: expect.closeTo(3048, 9),
      },
      airspeedCalibration: {
        indicated: [
          expect.closeTo(20.5777777778, 9),
          expect.closeTo(30.8666666667, 9),
          expect.closeTo(51.4444444444, 9),
        ],
        calibrated: [expect.closeTo(23.6644444444, 9), expect.closeTo(31.8955555556, 9), expect.closeTo(50.93, 9)],
      },
    });
  });

  it('holds each configuration, by hand', () => {
    expect(configurations).toEqual({
      'takeoff-10': {
        for: ['takeoff'],
        flap: expect.closeTo(0.1745329252, 9),
        maximumLift: { kind: 'stall-speed', cas: expect.closeTo(25.7222222222, 9), mass: 1030, definition: 'one-g' },
        groundDragIncrementCoefficient: 0.004,
        airDragIncrementCoefficient: 0.004,
        groundLiftCoefficient: 0.4,
        speeds: {
          rotation: { kind: 'stall-ratio', ratio: 1.08 },
          liftOff: { kind: 'cas', cas: expect.closeTo(30.8666666667, 9), mass: 1030 },
          screen: { kind: 'stall-ratio', ratio: 1.25 },
        },
        rotationTime: 1,
        pullUpLoadFactor: 1.1,
        rollingStartAllowance: 30,
      },
      'landing-full': {
        for: ['landing'],
        flap: expect.closeTo(0.5235987756, 9),
        maximumLift: { kind: 'coefficient', coefficient: 1.9 },
        speeds: {
          landingReference: { kind: 'stall-ratio', ratio: 1.3 },
          touchdown: { kind: 'stall-ratio', ratio: 1.15 },
        },
        approachAngle: expect.closeTo(0.0523598776, 9),
        flareLoadFactor: 1.2,
        floatDecelerationRatio: 0.13,
        freeRollTime: 2,
        idleThrust: 150,
      },
    });
  });

  it('leaves out what is left out: no member is undefined', () => {
    const bare = ['wheels', 'brakes', 'limitations', 'airspeedCalibration'].reduce(
      (definition, member) => withMember(definition, `/${member}`, undefined),
      sampleDefinition(),
    );
    const made = toAeroplane(bare);
    expect(Object.keys(made)).not.toContain('wheels');
    const text = JSON.stringify(made, (_, value) => (value === undefined ? 'undefined!' : value));
    expect(text).not.toContain('undefined!');
    expect(made.configurations['landing-full']).not.toHaveProperty('rotationTime');
  });

  it('makes an indicated stall speed calibrated by the table', () => {
    const indicated = withMember(sampleDefinition(), '/configurations/takeoff-10/maximumLift/type', 'ias');
    const minimum = withMember(indicated, '/configurations/takeoff-10/maximumLift/kind', 'minimum');
    expect(toAeroplane(minimum).configurations['takeoff-10']?.maximumLift).toEqual({
      kind: 'stall-speed',
      cas: expect.closeTo(27.78, 9),
      mass: 1030,
      definition: 'minimum',
    });
  });

  it.each(kinds.map((propulsion) => [propulsion.kind, propulsion] as const))(
    '%s is the same aeroplane in other units, to 1e-12',
    (_, propulsion) => {
      const definition = withMember(sampleDefinition(), '/propulsion', propulsion);
      const ours = numbersIn(toAeroplane(definition));
      const theirs = numbersIn(toAeroplane(inOtherUnits(definition)));
      expect(theirs.map(([path]) => path)).toEqual(ours.map(([path]) => path));
      ours.forEach(([path, value], i) => {
        const apart = Math.abs((theirs[i]?.[1] as number) - value);
        expect(apart, path).toBeLessThanOrEqual(1e-12 * Math.max(Math.abs(value), 1e-3));
      });
    },
  );

  it('puts measured thrust in columns of SI', () => {
    const made = toAeroplane(withMember(sampleDefinition(), '/propulsion', kinds.at(-1)));
    expect(made.propulsion).toEqual({
      kind: 'measured',
      airspeeds: [0, expect.closeTo(10, 12), expect.closeTo(50, 12)],
      thrusts: [2400, 2200, 1100],
      density: 1.2,
      densityExponent: 1,
    });
  });
});
