import { describe, expect, it } from 'vitest';
import { rollAlong } from '../../../src/performance/takeoff/roll-along.ts';
import { expectNear } from '../../support/near.ts';
import { plainRun, quadraticThrust } from '../../support/plain-run.ts';

const run = plainRun({ thrust: quadraticThrust(4) });

describe('rollAlong', () => {
  it('rolls in parts that add up, by hand: 0 to 20 to 30 m/s at 4 m/s2', () => {
    const roll = rollAlong(run);
    expectNear(roll(0, 20, 0).sum.distance, 50, 1e-9);
    expectNear(roll(20, 30, 50).sum.distance, 62.5, 1e-9);
  });

  it('begins where it is told on a profile', () => {
    // rising by 2 m/s2 from 60 m on: 10 m at 4 m/s2 to 480 m2/s2, then 2 m/s2
    const roll = rollAlong({ ...run, profile: { ends: [60, 500], slopes: [0, 2 / 9.80665] } });
    expectNear(roll(20, 30, 50).sum.distance, 10 + (900 - 480) / 4, 1e-6);
    expectNear(roll(20, 30, 60).sum.distance, 125, 1e-9);
  });

  it('has no length where it ends where it begins, and says whether it would go on', () => {
    expect(rollAlong(run)(20, 20, 0)).toMatchObject({ reaches: true, sum: { distance: 0, time: 0 } });
    const still = rollAlong(plainRun({ thrust: quadraticThrust(0) }));
    expect(still(20, 20, 0)).toMatchObject({ reaches: false, sum: { distance: 0, time: 0, least: 0 } });
  });
});
