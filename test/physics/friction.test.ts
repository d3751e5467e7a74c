import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { greatestRollingFriction, rollingFriction } from '../../src/physics/friction.ts';
import type { RunwaySurface } from '../../src/physics/runway-surface.ts';
import { anySurface } from '../support/surfaces.ts';

const rows: readonly (readonly [RunwaySurface, number])[] = [
  [{ kind: 'paved', state: 'dry' }, 0.03],
  [{ kind: 'paved', state: 'wet' }, 0.03],
  [{ kind: 'gravel', state: 'dry' }, 0.045],
  [{ kind: 'dirt', state: 'dry', firmness: 'firm' }, 0.04],
  [{ kind: 'dirt', state: 'wet' }, 0.2],
  [{ kind: 'grass', state: 'dry', grass: 'short' }, 0.055],
  [{ kind: 'grass', state: 'dry', grass: 'long' }, 0.1],
  [{ kind: 'grass', state: 'dry' }, 0.1],
  [{ kind: 'grass', state: 'wet', grass: 'short' }, 0.08],
  [{ kind: 'grass', state: 'damp', grass: 'short' }, 0.08],
  [{ kind: 'grass', state: 'wet', grass: 'long' }, 0.12],
  [{ kind: 'grass', state: 'wet', grass: 'short', firmness: 'soft' }, 0.15],
  [{ kind: 'snow', state: 'contaminated', contaminant: { kind: 'compacted-snow' } }, 0.04],
  [{ kind: 'ice', state: 'dry' }, 0.02],
];

describe('rollingFriction', () => {
  it.each(rows)('%j: %f [long-distance end of the ranges in textbooks; judgement]', (surface, expected) => {
    const found = rollingFriction(surface, false);
    expect(found === 'no-data' ? found : found.coefficient).toBe(expected);
  });

  it('gives a jet 0.02 on pavement and the same as others elsewhere', () => {
    expect(rollingFriction({ kind: 'paved', state: 'dry' }, true)).toMatchObject({ coefficient: 0.02 });
    expect(rollingFriction({ kind: 'gravel', state: 'dry' }, true)).toMatchObject({ coefficient: 0.045 });
  });

  it('has nothing for surfaces that hold the wheels back by displacement', () => {
    for (const kind of ['water', 'slush', 'wet-snow', 'dry-snow'] as const) {
      expect(rollingFriction({ kind: 'paved', state: 'contaminated', contaminant: { kind } }, false)).toBe('no-data');
    }
    expect(rollingFriction({ kind: 'paved', state: 'flooded' }, false)).toBe('no-data');
    expect(rollingFriction({ kind: 'snow', state: 'dry' }, false)).toBe('no-data');
    expect(rollingFriction({ kind: 'paved', state: 'contaminated' }, false)).toBe('no-data');
  });

  it('under what wheels push aside, for whoever adds its drag: loose snow 0.15 up to 10 cm, else the wet ground beneath', () => {
    const under = (kind: 'water' | 'slush' | 'wet-snow' | 'dry-snow', depth?: number, jet = false) => {
      const contaminant = depth === undefined ? { kind } : { kind, depth };
      const found = rollingFriction({ kind: 'paved', state: 'contaminated', contaminant }, jet, 'added');
      return found === 'no-data' ? found : found.coefficient;
    };
    expect([under('water'), under('slush', 0.01), under('slush', 0.01, true)]).toEqual([0.03, 0.03, 0.02]);
    expect([under('wet-snow', 0.1), under('dry-snow', 0.02)]).toEqual([0.15, 0.15]);
    expect([under('dry-snow', 0.101), under('wet-snow')]).toEqual(['no-data', 'no-data']);
    const grass = { kind: 'grass', grass: 'short', state: 'flooded' } as const;
    expect(rollingFriction(grass, false, 'added')).toMatchObject({ coefficient: 0.08 });
  });

  it('reads up to 3 mm of a loose contaminant as wet', () => {
    for (const kind of ['water', 'slush', 'wet-snow', 'dry-snow'] as const) {
      const film = {
        kind: 'grass',
        grass: 'short',
        state: 'contaminated',
        contaminant: { kind, depth: 0.003 },
      } as const;
      expect(rollingFriction(film, false)).toMatchObject({ coefficient: 0.08 });
      expect(rollingFriction({ ...film, contaminant: { kind, depth: 0.0031 } }, false)).toBe('no-data');
    }
  });

  it('is 0 to 0.25 or no data on whatever can be written, and no less with the drag added than without', () => {
    fc.assert(
      fc.property(anySurface, fc.boolean(), (surface, jet) => {
        const plain = rollingFriction(surface, jet);
        const added = rollingFriction(surface, jet, 'added');
        for (const found of [plain, added]) {
          if (found === 'no-data') continue;
          expect(found.coefficient).toBeGreaterThan(0);
          expect(found.coefficient).toBeLessThanOrEqual(greatestRollingFriction);
        }
        if (plain !== 'no-data') expect(added).toEqual(plain);
      }),
    );
  });

  it('never makes grass easier by length, moisture or softness', () => {
    const of = (surface: Omit<RunwaySurface, 'kind'>) => {
      const found = rollingFriction({ kind: 'grass', ...surface }, false);
      return found === 'no-data' ? Number.NaN : found.coefficient;
    };
    for (const state of ['dry', 'wet'] as const) {
      expect(of({ state, grass: 'long' })).toBeGreaterThan(of({ state, grass: 'short' }));
      expect(of({ state, grass: 'long', firmness: 'soft' })).toBeGreaterThanOrEqual(of({ state, grass: 'long' }));
    }
    expect(of({ state: 'wet', grass: 'short' })).toBeGreaterThan(of({ state: 'dry', grass: 'short' }));
  });
});
