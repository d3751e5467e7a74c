import { describe, expect, it } from 'vitest';
import { defaulted } from '../../src/planning/defaulted.ts';

describe('what the gate filled in', () => {
  it('is said with the value that was taken, each by its pointer', () => {
    const kind = '/aeroplane#/configurations/takeoff/maximumLift/kind';
    const pointers = ['/units', '/rounding', kind, '/procedure/power', '/procedure/start'];
    const said = defaulted({ defaulted: pointers, units: 'ft-kt-lb' });
    expect(said.map(({ at, value }) => [at, value])).toEqual([
      ['/units', 'ft-kt-lb'],
      ['/rounding', 'safe'],
      [kind, 'one-g'],
      ['/procedure/power', 'full'],
      ['/procedure/start', 'standing'],
    ]);
    expect(said.every(({ because }) => because.startsWith('not given'))).toBe(true);
  });
});
