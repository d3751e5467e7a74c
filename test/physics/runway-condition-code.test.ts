import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { runwayConditionCode } from '../../src/physics/runway-condition-code.ts';
import type { RunwaySurface } from '../../src/physics/runway-surface.ts';
import { matrixCodes } from '../published/contaminated-runways.ts';
import { anySurface } from '../support/surfaces.ts';

function code(surface: RunwaySurface, temperature?: number): number | 'no-data' {
  const found = runwayConditionCode(surface, temperature);
  return found === 'no-data' ? found : found.code;
}

describe('runwayConditionCode', () => {
  it.each(matrixCodes.map((figure) => [figure.title, figure] as const))('%s', (_, { inputs, expected }) => {
    const { state, on, contaminant, depth_mm, temperature_C } = inputs;
    const depth = depth_mm === undefined ? {} : { depth: depth_mm / 1000 };
    const surface: RunwaySurface = {
      kind: on === 'ice' ? 'ice' : on === 'compacted-snow' ? 'snow' : 'paved',
      state,
      ...(contaminant === undefined ? {} : { contaminant: { kind: contaminant, ...depth } }),
    };
    expect(code(surface, temperature_C === undefined ? undefined : temperature_C + 273.15)).toBe(expected);
  });

  it('takes the poorer of what is not known: depth, temperature, whether snow is compacted', () => {
    const under = (kind: 'water' | 'slush' | 'wet-snow' | 'compacted-snow') =>
      code({ kind: 'paved', state: 'contaminated', contaminant: { kind } });
    expect([under('water'), under('slush'), under('wet-snow'), under('compacted-snow')]).toEqual([2, 2, 3, 3]);
    expect(code({ kind: 'snow', state: 'dry' }, 250)).toBe(3);
    expect(code({ kind: 'paved', state: 'flooded' })).toBe(2);
  });

  it('is 5 with frost on a runway that is said to be dry', () => {
    expect(code({ kind: 'paved', state: 'dry', contaminant: { kind: 'frost' } })).toBe(5);
  });

  it('reads water on a runway that is said to be wet as no deeper than that', () => {
    expect(code({ kind: 'paved', state: 'wet', contaminant: { kind: 'water' } })).toBe(5);
    expect(code({ kind: 'paved', state: 'wet', contaminant: { kind: 'water', depth: 0.004 } })).toBe(2);
  });

  it('is 0 wherever water stands on ice or on compacted snow, and where snow lies on ice', () => {
    for (const state of ['damp', 'wet', 'flooded'] as const) {
      expect(code({ kind: 'ice', state })).toBe(0);
      expect(code({ kind: 'snow', state })).toBe(0);
      for (const kind of ['ice', 'compacted-snow'] as const) {
        expect(code({ kind: 'paved', state, contaminant: { kind } }, 250)).toBe(0);
      }
    }
    expect(code({ kind: 'ice', state: 'contaminated', contaminant: { kind: 'compacted-snow' } }, 250)).toBe(0);
    expect(code({ kind: 'ice', state: 'dry' })).toBe(1);
    expect(code({ kind: 'ice', state: 'contaminated', contaminant: { kind: 'frost' } })).toBe(1);
  });

  it('does not speak of bare ground that is not paved, nor of a contaminant without a name', () => {
    for (const kind of ['grass', 'gravel', 'dirt'] as const) {
      for (const state of ['dry', 'damp', 'wet'] as const) expect(code({ kind, state })).toBe('no-data');
      expect(code({ kind, state: 'wet', contaminant: { kind: 'slush', depth: 0.002 } })).toBe('no-data');
      expect(code({ kind, state: 'contaminated', contaminant: { kind: 'slush', depth: 0.02 } })).toBe(2);
    }
    expect(code({ kind: 'paved', state: 'contaminated' })).toBe('no-data');
    expect(code({ kind: 'ice', state: 'contaminated' })).toBe('no-data');
  });

  it('is never better deeper or warmer', () => {
    const rank = (found: number | 'no-data') => (found === 'no-data' ? 7 : found);
    fc.assert(
      fc.property(anySurface, fc.double({ min: 230, max: 290, noNaN: true }), (surface, temperature) => {
        const now = rank(code(surface, temperature));
        expect(rank(code(surface, temperature + 5))).toBeLessThanOrEqual(now);
        expect(rank(code(surface))).toBeLessThanOrEqual(now);
        const { contaminant } = surface;
        if (contaminant?.depth !== undefined) {
          const deeper = { ...surface, contaminant: { ...contaminant, depth: contaminant.depth + 0.002 } };
          expect(rank(code(deeper, temperature))).toBeLessThanOrEqual(now);
        }
      }),
    );
  });

  it('says in words what the code stands for', () => {
    const said = runwayConditionCode({ kind: 'paved', state: 'contaminated', contaminant: { kind: 'slush' } });
    expect(said).toEqual({ code: 2, because: 'more than 3 mm of water or slush' });
  });
});
