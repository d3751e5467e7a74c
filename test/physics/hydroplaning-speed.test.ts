import { describe, expect, it } from 'vitest';
import { hydroplaningSpeed } from '../../src/physics/hydroplaning-speed.ts';
import { hydroplaningSpeeds } from '../published/contaminated-runways.ts';
import { expectNear, expectRatio } from '../support/near.ts';

const psi = 6894.757293168361;
const knot = 1852 / 3600;

describe('hydroplaningSpeed', () => {
  it.each(hydroplaningSpeeds.map((figure) => [figure.title, figure] as const))(
    '%s',
    (_, { inputs, expected, tolerance }) => {
      expectNear(hydroplaningSpeed(inputs.tyre_psi * psi, 'takeoff') / knot, expected, tolerance);
    },
  );

  it('is 0.0558 sqrt(p) in m/s and Pa, to 0.1 % [the same formula in SI; computed]', () => {
    expectRatio(hydroplaningSpeed(400_000, 'takeoff'), 0.0558 * Math.sqrt(400_000), 1e-3);
  });

  it('is 7.7/9 of that for wheels that spin up at touchdown: 42.2 kt at 30 psi [Horne; memory]', () => {
    expectNear(hydroplaningSpeed(30 * psi, 'landing') / knot, 42.17, 0.01);
  });

  it('asks for a pressure', () => {
    expect(() => hydroplaningSpeed(0, 'takeoff')).toThrow(/tyrePressure/);
  });
});
