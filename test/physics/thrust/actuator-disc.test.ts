import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { actuatorDiscThrust } from '../../../src/physics/thrust/actuator-disc.ts';
import { expectThrust, slopeRatios } from '../../support/thrust-properties.ts';

const disc = { propellerDiameter: 2.08, profileFactor: 0.88, inducedFactor: 1.15, thrustFactor: 1 };
const power = 212_000;
const area = (Math.PI / 4) * 2.08 ** 2;
const atRest = ((0.88 / 1.15) * power) ** (2 / 3) * Math.cbrt(2 * 1.225 * area);

describe('actuatorDiscThrust', () => {
  it('at rest is ((eta0/kappa) P)^(2/3) (2 rho A)^(1/3) to 1e-12 [momentum theory, McCormick ch. 6; memory]', () => {
    expect(actuatorDiscThrust(disc, 1, power, power, 1.225).at(0) / atRest).toBeCloseTo(1, 12);
  });

  it('comes to eta0 P/V at high airspeed to 1 % [momentum theory; memory]', () => {
    const thrust = actuatorDiscThrust(disc, 1, power, power, 1.225);
    expect((thrust.at(150) * 150) / (0.88 * power)).toBeGreaterThan(0.99);
    expect((thrust.at(150) * 150) / (0.88 * power)).toBeLessThan(1);
  });

  it('balances power: T (V + kappa v) = eta0 P with v from the momentum equation, to 1e-9', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 120, noNaN: true }),
        fc.double({ min: 2e4, max: 2e6, noNaN: true }),
        fc.double({ min: 0.5, max: 1.4, noNaN: true }),
        fc.double({ min: 1, max: 1.4, noNaN: true }),
        (airspeed, supplied, density, inducedFactor) => {
          const one = actuatorDiscThrust({ ...disc, inducedFactor }, 1, supplied, supplied, density).at(airspeed);
          const v = -airspeed / 2 + Math.sqrt((airspeed * airspeed) / 4 + one / (2 * density * area));
          expect(Math.abs((one * (airspeed + inducedFactor * v)) / (0.88 * supplied) - 1)).toBeLessThan(1e-7);
        },
      ),
    );
  });

  it('is never negative, never rises with airspeed, and fill equals at', () => {
    expectThrust(actuatorDiscThrust(disc, 2, power, power, 1.225), 200);
    expectThrust(actuatorDiscThrust({ ...disc, staticThrust: 3000 }, 1, power, power, 0.9), 120);
    expectThrust(actuatorDiscThrust(disc, 1, 0, power, 1.225), 100);
  });

  it('is held to a known static thrust up to the airspeed it names as its kink', () => {
    const thrust = actuatorDiscThrust({ ...disc, staticThrust: 0.8 * atRest }, 1, power, power, 1.225);
    expect(thrust.at(0) / atRest).toBeCloseTo(0.8, 12);
    const [corner = Number.NaN] = thrust.kinks;
    expect(thrust.at(corner - 0.01)).toBeCloseTo(0.8 * atRest, 6);
    expect(thrust.at(corner + 0.1)).toBeLessThan(0.8 * atRest - 1);
    const [slope = Number.NaN] = slopeRatios(thrust);
    expect(Math.abs(slope)).toBeGreaterThan(100);
  });

  it('needs no cap where the disc gives less, and keeps the cap in proportion where the air gives less', () => {
    expect(actuatorDiscThrust({ ...disc, staticThrust: 2 * atRest }, 1, power, power, 1.225).kinks).toEqual([]);
    const capped = { ...disc, staticThrust: 0.8 * atRest };
    const thin = actuatorDiscThrust(capped, 1, 0.8 * power, power, 1).at(0);
    const free = actuatorDiscThrust(disc, 1, 0.8 * power, power, 1).at(0);
    expect(thin / free).toBeCloseTo(0.8, 12);
    expect(actuatorDiscThrust(capped, 1, power, power, 1.4).at(0)).toBeCloseTo(0.8 * atRest, 6);
  });
});
