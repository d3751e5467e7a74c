import { describe, expect, it } from 'vitest';
import { hydroplaningDragRatio } from '../../src/physics/hydroplaning-drag-ratio.ts';
import { expectNear } from '../support/near.ts';

describe('hydroplaningDragRatio', () => {
  it('is 1 up to the hydroplaning speed and 0.3 from 1.6 of it on [AMC 25.1591; memory]', () => {
    expect([0, 20, 25].map((speed) => hydroplaningDragRatio(speed, 25))).toEqual([1, 1, 1]);
    expectNear(hydroplaningDragRatio(32.5, 25), 0.65, 1e-12);
    expectNear(hydroplaningDragRatio(40, 25), 0.3, 1e-12);
    expectNear(hydroplaningDragRatio(80, 25), 0.3, 1e-12);
    expect(() => hydroplaningDragRatio(10, 0)).toThrow(/hydroplaningSpeed/);
  });
});
