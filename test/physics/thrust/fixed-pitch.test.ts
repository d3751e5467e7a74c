import { describe, expect, it } from 'vitest';
import { fixedPitchThrust } from '../../../src/physics/thrust/fixed-pitch.ts';
import { lowryTrainer } from '../../published/engine-power.ts';
import { standardAir } from '../../support/standard-air.ts';
import { expectThrust } from '../../support/thrust-properties.ts';

const engine = {
  staticThrust: 2366,
  propellerDiameter: 1.905,
  polarSlopeCoefficient: 0.0564,
  altitudeLapseCoefficient: 0.12,
  temperatureExponent: 0.5,
  humidityFactor: 0,
  thrustFactor: 1,
};

describe('fixedPitchThrust', () => {
  it.each(lowryTrainer.map((figure) => [figure.title, figure] as const))('%s', (_, { inputs, expected, tolerance }) => {
    expect(Math.abs(fixedPitchThrust(engine, 1, standardAir(0)).at(inputs.airspeed_ms) - expected)).toBeLessThan(
      tolerance,
    );
  });

  it('is never negative, never rises with airspeed, and fill equals at', () => {
    for (const air of [standardAir(0), standardAir(3000, 30), standardAir(-500, -40)]) {
      expectThrust(fixedPitchThrust(engine, 2, air), 150);
    }
  });

  it('says where it comes to nothing', () => {
    const thrust = fixedPitchThrust(engine, 1, standardAir(0));
    expect(thrust.kinks).toHaveLength(1);
    const [end = Number.NaN] = thrust.kinks;
    expect(thrust.at(end * (1 - 1e-9))).toBeCloseTo(0, 4);
    expect(thrust.at(end * 1.01)).toBe(0);
    expect(thrust.at(end * 0.99)).toBeGreaterThan(1);
  });

  it('multiplies both terms by the factor and the number of engines', () => {
    const one = fixedPitchThrust(engine, 1, standardAir(1000));
    const two = fixedPitchThrust({ ...engine, thrustFactor: 0.9 }, 2, standardAir(1000));
    for (const airspeed of [0, 10, 40]) expect(two.at(airspeed) / one.at(airspeed)).toBeCloseTo(1.8, 12);
  });

  it('falls with altitude in the static part and with true density in the other', () => {
    const hot = fixedPitchThrust(engine, 1, standardAir(2000, 25));
    const cool = fixedPitchThrust(engine, 1, standardAir(2000, 0));
    const lost = (thrust: typeof hot) => thrust.at(0) - thrust.at(20);
    expect(lost(hot) / lost(cool)).toBeCloseTo(standardAir(2000, 25).density / standardAir(2000).density, 9);
    expect(hot.at(0) / cool.at(0)).toBeCloseTo(
      Math.sqrt(standardAir(2000).temperature / standardAir(2000, 25).temperature),
      12,
    );
  });
});
