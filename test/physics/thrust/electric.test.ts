import { describe, expect, it } from 'vitest';
import { electricThrust } from '../../../src/physics/thrust/electric.ts';
import { standardAir } from '../../support/standard-air.ts';
import { expectThrust } from '../../support/thrust-properties.ts';

const motor = { power: 60_000, propellerDiameter: 1.7, profileFactor: 0.88, inducedFactor: 1.15, thrustFactor: 0.85 };

describe('electricThrust', () => {
  it('keeps its power at altitude: the static thrust falls with rho^(1/3) alone', () => {
    const ratio =
      electricThrust(motor, 1, standardAir(3000, 20)).at(0) / electricThrust(motor, 1, standardAir(0)).at(0);
    expect(ratio).toBeCloseTo(Math.cbrt(standardAir(3000, 20).density / 1.225), 6);
  });

  it('is never negative, never rises with airspeed, and fill equals at', () => {
    expectThrust(electricThrust(motor, 2, standardAir(500)), 90);
  });
});
