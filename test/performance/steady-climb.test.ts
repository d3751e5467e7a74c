import { describe, expect, it } from 'vitest';
import { steadyClimb } from '../../src/performance/steady-climb.ts';

const g = 9.80665;
const climb = {
  mass: 1000,
  wingArea: 16,
  zeroLiftDragCoefficient: 0.09,
  inducedDragFactor: 0.06,
  density: 1.225,
  airspeed: 30,
  thrust: 2000,
};
const weight = 1000 * g;
const q = 0.5 * 1.225 * 900 * 16;
const drag = q * (0.09 + 0.06 * (weight / q) ** 2);

describe('steadyClimb', () => {
  it('is the excess of thrust over drag as a part of the weight, by hand [Anderson, Aircraft Performance, ch. 5]', () => {
    const { gradient, rate } = steadyClimb(climb);
    const sine = (2000 - drag) / weight;
    expect(rate).toBeCloseTo(30 * sine, 10);
    expect(gradient).toBeCloseTo(Math.tan(Math.asin(sine)), 10);
  });
  it('is nothing where thrust is drag, and sinks below', () => {
    expect(steadyClimb({ ...climb, thrust: drag }).gradient).toBeCloseTo(0, 12);
    const { gradient, rate } = steadyClimb({ ...climb, thrust: 0 });
    expect(gradient).toBeLessThan(0);
    expect(rate).toBeCloseTo((-30 * drag) / weight, 10);
  });
  it('is less with mass, with drag and with less thrust', () => {
    const { gradient } = steadyClimb(climb);
    expect(steadyClimb({ ...climb, mass: 1100 }).gradient).toBeLessThan(gradient);
    expect(steadyClimb({ ...climb, zeroLiftDragCoefficient: 0.1 }).gradient).toBeLessThan(gradient);
    expect(steadyClimb({ ...climb, thrust: 1900 }).gradient).toBeLessThan(gradient);
  });
});
