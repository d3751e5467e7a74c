import { describe, expect, it } from 'vitest';
import { brakingFriction, constantBraking, scaledBraking } from '../../src/physics/braking-friction.ts';
import type { RunwaySurface } from '../../src/physics/runway-surface.ts';

const psi = 6894.757293168361;
const tyre = 50 * psi;

function at(
  surface: RunwaySurface,
  speed = 0,
  antiSkid: Parameters<typeof brakingFriction>[1] = 'none',
): number | 'no-data' {
  const found = brakingFriction(surface, antiSkid, tyre);
  return found === 'no-data' ? found : found.at(speed);
}

const rows: readonly (readonly [RunwaySurface, number])[] = [
  [{ kind: 'paved', state: 'dry' }, 0.35],
  [{ kind: 'gravel', state: 'dry' }, 0.3],
  [{ kind: 'dirt', state: 'dry' }, 0.3],
  [{ kind: 'grass', state: 'dry', grass: 'short' }, 0.25],
  [{ kind: 'grass', state: 'dry', grass: 'long' }, 0.2],
  [{ kind: 'grass', state: 'dry' }, 0.2],
  [{ kind: 'grass', state: 'wet', grass: 'short' }, 0.12],
  [{ kind: 'grass', state: 'dry', grass: 'short', firmness: 'soft' }, 0.1],
  [{ kind: 'snow', state: 'contaminated', contaminant: { kind: 'compacted-snow' } }, 0.1],
  [{ kind: 'snow', state: 'contaminated', contaminant: { kind: 'dry-snow' } }, 0.08],
  [{ kind: 'ice', state: 'dry' }, 0.05],
];

describe('brakingFriction', () => {
  it.each(rows)('%j: %f [long-distance end of the ranges in textbooks; judgement]', (surface, expected) => {
    expect(at(surface)).toBe(expected);
  });

  it('on wet pavement is the lesser of 0.20 and 0.30 of the wet curve without a modulated system, with its corner named', () => {
    const wet = brakingFriction({ kind: 'paved', state: 'wet' }, 'none', tyre);
    if (wet === 'no-data') throw new Error(wet);
    expect(wet.at(0)).toBe(0.2);
    expect(wet.at((80 * 1852) / 3600)).toBeCloseTo(0.3 * 0.38012, 5);
    const [corner = Number.NaN] = wet.kinks;
    expect(wet.at(corner - 0.01)).toBe(0.2);
    expect(wet.at(corner + 0.01)).toBeLessThan(0.2);
    expect(at({ kind: 'paved', state: 'wet' }, 0, 'fully-modulating')).toBeCloseTo(0.8 * 0.883, 9);
  });

  it('has nothing for flooded runways, standing water, slush and wet ice', () => {
    expect(at({ kind: 'paved', state: 'flooded' })).toBe('no-data');
    for (const kind of ['water', 'slush', 'wet-ice'] as const) {
      expect(at({ kind: 'paved', state: 'contaminated', contaminant: { kind } })).toBe('no-data');
    }
    expect(at({ kind: 'paved', state: 'contaminated' })).toBe('no-data');
    expect(at({ kind: 'ice', state: 'wet' })).toBe('no-data');
  });

  it('has nothing for whatever else has code 0: water on ice or on compacted snow, snow on ice', () => {
    const wet = { kind: 'paved', state: 'wet' } as const;
    expect(at({ ...wet, contaminant: { kind: 'ice' } })).toBe('no-data');
    expect(at({ ...wet, contaminant: { kind: 'compacted-snow' } })).toBe('no-data');
    expect(at({ kind: 'snow', state: 'wet' })).toBe('no-data');
    expect(at({ kind: 'ice', state: 'contaminated', contaminant: { kind: 'dry-snow', depth: 0.01 } })).toBe('no-data');
  });

  it('reads up to 3 mm of a loose contaminant as wet', () => {
    for (const kind of ['water', 'slush', 'wet-snow', 'dry-snow'] as const) {
      const film = { state: 'contaminated', contaminant: { kind, depth: 0.003 } } as const;
      expect(at({ kind: 'paved', ...film })).toBe(0.2);
      expect(at({ kind: 'grass', grass: 'short', ...film })).toBe(0.12);
    }
    const deep = { kind: 'paved', state: 'contaminated', contaminant: { kind: 'dry-snow', depth: 0.0031 } } as const;
    expect(at(deep)).toBe(0.08);
  });

  it('is never better wet, long or soft than dry, short or firm', () => {
    for (const kind of ['paved', 'grass', 'dirt', 'gravel'] as const) {
      const dry = at({ kind, state: 'dry', grass: 'short' });
      for (const worse of [{ state: 'wet' }, { state: 'damp' }, { state: 'dry', grass: 'long' }] as const) {
        expect(Number(at({ kind, grass: 'short', ...worse }, 30))).toBeLessThanOrEqual(Number(dry));
      }
    }
  });
});

describe('scaledBraking', () => {
  it('multiplies once and keeps the kinks', () => {
    const scaled = scaledBraking({ at: (speed) => 0.4 - 0.001 * speed, kinks: [12] }, 0.85);
    expect(scaled.at(100)).toBeCloseTo(0.85 * 0.3, 12);
    expect(scaled.kinks).toEqual([12]);
    expect(() => scaledBraking(constantBraking(0.3), -1)).toThrow(/factor/);
    expect(() => constantBraking(Number.NaN)).toThrow(/coefficient/);
  });
});
