import { describe, expect, it } from 'vitest';
import { coastFor } from '../../../src/performance/engine-failure/coast-for.ts';
import { constantBraking } from '../../../src/physics/braking-friction.ts';
import { block, inWind } from '../../support/engine-failure-block.ts';
import { expectNear } from '../../support/near.ts';

const g = 9.80665;
const at = { speed: 20, distance: 50, time: 5 };

/** Free wheels hold back by 1 m/s2, on a slope [m/s2, uphill positive]. */
function rolling(uphill = 0, wind = 0) {
  const run = inWind(block(5), wind);
  const slope = uphill / g;
  return {
    takeoff: { ...run.allEngines, rollingFriction: 1 / g, slope },
    stop: { ...run.stop, slope },
  };
}

describe('coastFor', () => {
  it('slows down on free wheels, by hand: 20 to 17 m/s in 3 s over 55.5 m', () => {
    const { takeoff, stop } = rolling();
    const after = coastFor(3, at, takeoff, stop);
    expectNear(after.speed, 17, 1e-8);
    expectNear(after.distance, 105.5, 1e-7);
    expect(after.time).toBe(8);
    const windy = rolling(0, 6);
    expectNear(coastFor(3, { ...at, speed: 26 }, windy.takeoff, windy.stop).distance, 105.5, 1e-7);
  });

  it('meets a rise where it is: 2 m/s2 from 40 m on', () => {
    const { takeoff, stop } = rolling();
    const profile = { ends: [40, 1000], slopes: [0, 1 / g] };
    const after = coastFor(3, at, { ...takeoff, profile }, { ...stop, profile });
    expectNear(after.speed, 14, 1e-8);
    expectNear(after.distance, 101, 1e-7);
  });

  it('gains speed downhill, and holds it where nothing pulls either way', () => {
    const down = rolling(-2);
    const after = coastFor(3, at, down.takeoff, down.stop);
    expectNear(after.speed, 23, 1e-8);
    expectNear(after.distance, 50 + 64.5, 1e-7);
    const even = rolling(-1);
    const held = coastFor(3, at, even.takeoff, even.stop);
    expectNear(held.speed, 20, 1e-5);
    expectNear(held.distance, 110, 1e-4);
  });

  it('stands still where the time is more than enough', () => {
    const { takeoff, stop } = rolling();
    const after = coastFor(30, at, takeoff, stop);
    expect(after.speed).toBe(0);
    expectNear(after.distance, 250, 1e-7);
    expect(after.time).toBe(35);
  });

  it('feels idle thrust and the drag of the takeoff roll, and none of the brakes', () => {
    const { takeoff, stop } = rolling();
    const pulled = coastFor(3, at, takeoff, { ...stop, idleThrust: 0.5, braking: constantBraking(0.5) });
    expectNear(pulled.speed, 18.5, 1e-8);
    const stretches = [
      { end: 1, braking: constantBraking(0.5) },
      { end: 2, braking: constantBraking(0.1) },
    ];
    expectNear(coastFor(3, at, takeoff, { ...stop, stretches }).speed, 17, 1e-8);
    const reversed = { ...stop, reverseThrust: { thrust: 3, cutOffSpeed: 0 } };
    expectNear(coastFor(3, at, takeoff, reversed).speed, 17, 1e-8);
    const dragged = coastFor(3, at, { ...takeoff, groundDragCoefficient: 0.01, rollingFriction: 0 }, stop);
    expectNear(dragged.speed, 20 / (1 + 0.005 * 20 * 3), 1e-7);
  });
});
