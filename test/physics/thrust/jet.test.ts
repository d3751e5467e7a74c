import { describe, expect, it } from 'vitest';
import { jetThrust } from '../../../src/physics/thrust/jet.ts';
import { standardAir } from '../../support/standard-air.ts';
import { expectThrust, slopeRatios } from '../../support/thrust-properties.ts';

const engine = { staticThrust: 118_000, flatRating: 15, thrustFactor: 1 };

describe('jetThrust', () => {
  it('loses 10 % at rest 30 K above standard with a flat rating of 15 K, +-0.5 % [Mattingly, high bypass ratio; read]', () => {
    const ratio = jetThrust(engine, 2, standardAir(0, 30)).at(0) / 236_000;
    expect(Math.abs(ratio - 0.9)).toBeLessThan(0.005);
  });

  it('keeps 0.803 at Mach 0.2 +-0.001 with the general form, 0.792 at a bypass ratio of 6 [Mattingly; read]', () => {
    const airspeed = 0.2 * 340.294;
    expect(Math.abs(jetThrust(engine, 1, standardAir(0)).at(airspeed) / 118_000 - 0.803)).toBeLessThan(0.001);
    const byBypass = jetThrust({ ...engine, bypassRatio: 6 }, 1, standardAir(0)).at(airspeed) / 118_000;
    expect(Math.abs(byBypass - 0.792)).toBeLessThan(0.001);
  });

  it('is rated against the standard temperature of the altitude', () => {
    const altitude = 2000;
    expect(jetThrust(engine, 1, standardAir(altitude, 15)).at(0)).toBeCloseTo(
      (118_000 * standardAir(altitude).pressure) / 101_325,
      4,
    );
    expect(jetThrust(engine, 1, standardAir(altitude, 16)).at(0)).toBeLessThan(
      (118_000 * standardAir(altitude).pressure) / 101_325 - 100,
    );
  });

  it('is never negative, never rises with airspeed below Mach 0.35, and fill equals at', () => {
    for (const air of [standardAir(0), standardAir(2000, 40), standardAir(-300, -40)])
      expectThrust(jetThrust(engine, 2, air), 118);
  });

  it('names the airspeed at which the rating ends, where there is one', () => {
    const thrust = jetThrust(engine, 1, standardAir(0, 13));
    expect(thrust.kinks).toHaveLength(1);
    const [ratio = Number.NaN] = slopeRatios(thrust);
    expect(Math.abs(ratio - 1)).toBeGreaterThan(0.05);
    expect(jetThrust(engine, 1, standardAir(0, 20)).kinks).toEqual([]);
  });

  it('gives low bypass ratios the general form, and never more than that', () => {
    const at = (bypassRatio: number) => jetThrust({ ...engine, bypassRatio }, 1, standardAir(0)).at(70);
    expect(at(3)).toBe(jetThrust(engine, 1, standardAir(0)).at(70));
    expect(at(12)).toBeLessThan(at(6));
    expect(at(20)).toBe(at(15));
  });
});
