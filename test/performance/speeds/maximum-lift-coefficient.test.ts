import { describe, expect, it } from 'vitest';
import { maximumLiftCoefficient } from '../../../src/performance/speeds/maximum-lift-coefficient.ts';
import { expectNear, expectRatio } from '../../support/near.ts';

describe('maximum lift coefficient', () => {
  it('is as stated', () => {
    expect(maximumLiftCoefficient({ kind: 'coefficient', coefficient: 1.6 }, 16.2)).toBe(1.6);
  });

  it('of 1-g 25 m/s at 1000 kg on 16 m2 is 2 x 9806.65/(1.225 x 16 x 625) = 1.601086 [14 CFR 25.103; by hand]', () => {
    const lift = { kind: 'stall-speed', cas: 25, mass: 1000, definition: 'one-g' } as const;
    expectNear(maximumLiftCoefficient(lift, 16), 1.601086, 1e-6);
  });

  it('of a minimum speed is 0.94^2 = 0.8836 of that [Part 25 Amendment 25-108; memory]', () => {
    const lift = { kind: 'stall-speed', cas: 25, mass: 1000, definition: 'minimum' } as const;
    const oneG = maximumLiftCoefficient({ ...lift, definition: 'one-g' }, 16);
    expectRatio(maximumLiftCoefficient(lift, 16) / oneG, 0.8836, 1e-14);
  });
});
