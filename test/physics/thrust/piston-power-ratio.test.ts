import { describe, expect, it } from 'vitest';
import { pistonPowerRatio } from '../../../src/physics/thrust/piston-power-ratio.ts';
import { gaggFerrar } from '../../published/engine-power.ts';
import { standardAir } from '../../support/standard-air.ts';

const lapse = { altitudeLapseCoefficient: 0.132 / 1.132, temperatureExponent: 0.5, humidityFactor: 0 };

describe('pistonPowerRatio', () => {
  it.each(gaggFerrar.map((figure) => [figure.title, figure] as const))('%s', (_, { inputs, expected, tolerance }) => {
    const ratio = pistonPowerRatio(lapse, standardAir(inputs.pressureAltitude_ft * 0.3048));
    expect(Math.abs(ratio - expected)).toBeLessThan(tolerance + 1e-4);
  });

  it('loses 1 % for 6 degC at an exponent of 0.5 [engine charts; secondary]', () => {
    expect(pistonPowerRatio(lapse, standardAir(0, 6))).toBeCloseTo(0.99, 3);
  });

  it('holds rated power up to the critical altitude and falls from there without a jump', () => {
    const turbo = { ...lapse, criticalAltitude: 3000 };
    expect(pistonPowerRatio(turbo, standardAir(0))).toBe(1);
    expect(pistonPowerRatio(turbo, standardAir(3000))).toBe(1);
    expect(pistonPowerRatio(turbo, standardAir(3000.001))).toBeCloseTo(1, 6);
    const plain = (altitude: number) => pistonPowerRatio(lapse, standardAir(altitude));
    expect(pistonPowerRatio(turbo, standardAir(5000))).toBeCloseTo(plain(5000) / plain(3000), 12);
  });

  it('takes moisture off only where a vapour pressure is known and a factor asks for it', () => {
    const moist = { ...standardAir(0, 20), vapourPressure: 5600 };
    const dry = pistonPowerRatio(lapse, standardAir(0, 20));
    expect(pistonPowerRatio(lapse, moist)).toBe(dry);
    const once = pistonPowerRatio({ ...lapse, humidityFactor: 1 }, moist) / dry;
    // (p - e)/(p - e_ref) with e_ref 0.403 inHg
    expect(once).toBeCloseTo((101_325 - 5600) / (101_325 - 0.403 * 3386.389), 9);
    const loss = 1 - once;
    expect(pistonPowerRatio({ ...lapse, humidityFactor: 1.5 }, moist) / dry).toBeCloseTo(1 - 1.5 * loss, 9);
    expect(pistonPowerRatio({ ...lapse, humidityFactor: 1.5 }, standardAir(0, 20))).toBe(dry);
  });

  it('is never negative, however high', () => {
    expect(pistonPowerRatio({ ...lapse, altitudeLapseCoefficient: 0.3 }, standardAir(16_000))).toBe(0);
  });
});
