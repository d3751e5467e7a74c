import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { deepContaminant, filmAsWet, looseContaminant } from '../../src/physics/runway-surface.ts';
import { anySurface } from '../support/surfaces.ts';

describe('filmAsWet', () => {
  it('reads up to 3 mm of a loose contaminant as wet [RCAM; secondary], and keeps the rest of the surface', () => {
    const film = { kind: 'grass', grass: 'short', state: 'contaminated', contaminant: { kind: 'slush', depth: 0.003 } };
    expect(filmAsWet(film as never)).toEqual({ kind: 'grass', grass: 'short', state: 'wet' });
  });

  it('leaves deeper ones, those of unknown depth, firm ones and flooded runways as they are', () => {
    const paved = { kind: 'paved', state: 'contaminated' } as const;
    for (const surface of [
      { ...paved, contaminant: { kind: 'slush', depth: 0.0031 } },
      { ...paved, contaminant: { kind: 'dry-snow' } },
      { ...paved, contaminant: { kind: 'ice', depth: 0.001 } },
      { ...paved, state: 'flooded', contaminant: { kind: 'water', depth: 0.001 } },
    ] as const) {
      expect(filmAsWet(surface)).toBe(surface);
    }
  });
});

describe('deepContaminant', () => {
  it('is what wheels push aside: water on a flooded runway', () => {
    expect(deepContaminant({ kind: 'paved', state: 'flooded' })).toEqual({ kind: 'water', depth: undefined });
    const slush = { kind: 'slush', depth: 0.01 } as const;
    expect(deepContaminant({ kind: 'paved', state: 'contaminated', contaminant: slush })).toEqual(slush);
    expect(deepContaminant({ kind: 'paved', state: 'wet', contaminant: { kind: 'water' } })).toBeUndefined();
  });

  it('is never a film and never firm, whatever the surface', () => {
    fc.assert(
      fc.property(anySurface, (surface) => {
        const deep = deepContaminant(surface);
        if (deep === undefined) return;
        if (surface.state !== 'flooded' && deep.depth !== undefined) expect(deep.depth).toBeGreaterThan(0.003);
        expect(surface.state === 'flooded' || looseContaminant(surface) === deep.kind).toBe(true);
      }),
    );
  });
});
