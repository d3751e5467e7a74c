import { describe, expect, it } from 'vitest';
import type { Propulsion } from '../../src/performance/aeroplane.ts';
import { propulsionThrust } from '../../src/performance/propulsion.ts';
import { propulsionDefaults } from '../../src/performance/propulsion-defaults.ts';
import { standardAir } from '../support/standard-air.ts';
import { expectThrust } from '../support/thrust-properties.ts';

const bare: readonly Propulsion[] = [
  { kind: 'fixed-pitch', staticThrust: 2366, propellerDiameter: 1.905 },
  { kind: 'constant-speed', power: 212_000, propellerDiameter: 2.08 },
  { kind: 'turboprop', power: 634_000, propellerDiameter: 2.5 },
  { kind: 'jet', staticThrust: 118_000 },
  { kind: 'electric', power: 60_000, propellerDiameter: 1.7 },
  { kind: 'measured', airspeeds: [0, 60, 120], thrusts: [3000, 2400, 1000], density: 1.225, densityExponent: 1 },
];
const airs = [standardAir(0), standardAir(2500, 20), { ...standardAir(500, 15), vapourPressure: 3000 }];

describe('propulsionThrust', () => {
  it.each(bare.map((propulsion) => [propulsion.kind, propulsion] as const))(
    '%s: a default is the same as stating it',
    (_, propulsion) => {
      const defaults = propulsionDefaults(propulsion);
      const stated = Object.assign(
        {},
        propulsion,
        ...defaults.map(({ member, value }) => ({ [member]: value })),
      ) as Propulsion;
      expect(propulsionDefaults(stated)).toEqual([]);
      for (const air of airs) {
        const thrust = propulsionThrust(propulsion, 2, air);
        expectThrust(thrust, 110);
        for (const airspeed of [0, 15, 60]) {
          expect(thrust.at(airspeed)).toBe(propulsionThrust(stated, 2, air).at(airspeed));
          expect(thrust.at(airspeed) / propulsionThrust(propulsion, 1, air).at(airspeed)).toBeCloseTo(2, 12);
        }
      }
    },
  );

  it.each(bare.map((propulsion) => [propulsion.kind, propulsion] as const))(
    '%s: the other end of every default moves the thrust somewhere',
    (_, propulsion) => {
      for (const { member, otherEnd, value } of propulsionDefaults(propulsion)) {
        expect(otherEnd).not.toBe(value);
        const other = { ...propulsion, [member]: otherEnd } as Propulsion;
        const moved = [...airs, standardAir(0, 35)].some(
          (air) => propulsionThrust(other, 1, air).at(40) !== propulsionThrust(propulsion, 1, air).at(40),
        );
        expect(moved, member).toBe(true);
      }
    },
  );

  it('has the defaults of a thrust nobody has fitted: 0.85 for governed propellers, 1 elsewhere [derived]', () => {
    const factors = bare.map(
      (propulsion) => propulsionDefaults(propulsion).find(({ member }) => member === 'thrustFactor')?.value,
    );
    expect(factors).toEqual([1, 0.85, 0.85, 1, 0.85, 1]);
  });

  it('says every figure it chooses: none cites the document of the formula for a value that is not in it', () => {
    const sources = Object.fromEntries(
      bare.map((propulsion) => [
        propulsion.kind,
        Object.fromEntries(propulsionDefaults(propulsion).map(({ member, source }) => [member, source])),
      ]),
    );
    const disc = { profileFactor: 'Judgement', inducedFactor: 'Judgement' };
    expect(sources).toEqual({
      'fixed-pitch': {
        polarSlopeCoefficient: 'Judgement',
        altitudeLapseCoefficient: 'HousePistonLapse',
        temperatureExponent: 'HousePistonLapse',
        humidityFactor: 'Judgement',
        thrustFactor: 'HouseThrustFactor',
      },
      'constant-speed': {
        ...disc,
        altitudeLapseCoefficient: 'GaggFerrar1934',
        temperatureExponent: 'Judgement',
        humidityFactor: 'Judgement',
        thrustFactor: 'HouseThrustFactor',
      },
      turboprop: {
        ...disc,
        flatRating: 'HouseTurbineLapse',
        lapseExponent: 'HouseTurbineLapse',
        thrustFactor: 'HouseThrustFactor',
      },
      jet: { flatRating: 'Judgement', bypassRatio: 'Mattingly2002', thrustFactor: 'HouseThrustFactor' },
      electric: { ...disc, thrustFactor: 'HouseThrustFactor' },
      measured: { thrustFactor: 'HouseThrustFactor' },
    });
  });

  it('multiplies by the factor handed in, which goes before the definition', () => {
    for (const propulsion of bare) {
      const one = propulsionThrust({ ...propulsion, thrustFactor: 1 }, 1, standardAir(0)).at(20);
      expect(propulsionThrust({ ...propulsion, thrustFactor: 1 }, 1, standardAir(0), 0.7).at(20) / one).toBeCloseTo(
        0.7,
        12,
      );
    }
  });

  it('refuses no engine', () => {
    expect(() => propulsionThrust(bare[0] as Propulsion, 0, standardAir(0))).toThrow(/runningEngines/);
  });
});
