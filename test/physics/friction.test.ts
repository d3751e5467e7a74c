import { describe, expect, it } from 'vitest';
import { type RunwaySurface, rollingFriction } from '../../src/physics/friction.ts';

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
