import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { declaredDistances } from '../../src/planning/declared-distances.ts';
import { expectNear } from '../support/near.ts';

const threshold = { kind: 'threshold' } as const;
const length = fc.double({ min: 500, max: 4000, noNaN: true });

describe('declared distances', () => {
  test.prop([length, length, length, fc.double({ min: 0, max: 499, noNaN: true })])(
    'a start offset shortens every declared distance by itself, a named point none',
    (tora, toda, asda, offset) => {
      const declared = { tora, toda, asda };
      const from = declaredDistances({ declared, start: { kind: 'offset', offset } }, 0.5);
      expect(from.published).toEqual({ tora: tora - offset, toda: toda - offset, asda: asda - offset });
      const point = declaredDistances({ declared, start: { kind: 'point', name: 'B' } }, 0.5);
      expect(point.published).toEqual(declared);
    },
  );
  it('takes line-up loss of the main wheels off TORA and TODA, of the forward wheel off ASDA', () => {
    const lineUp = { tora: 20, asda: 32 };
    const found = declaredDistances({ declared: { tora: 900, toda: 1000, asda: 950 }, lineUp, start: threshold }, 0.5);
    expect(found.credited).toEqual({ tora: 880, toda: 980, asda: 918 });
    expect(found.published).toEqual({ tora: 900, toda: 1000, asda: 950 });
  });
  it('credits a clearway to half the run and says what is left out, on both sides of the bound', () => {
    const at = (toda: number) => declaredDistances({ declared: { tora: 1000, toda }, start: threshold }, 0.5);
    expect(at(1500).credited.toda).toBe(1500);
    expect(at(1500).clearwayNotCredited).toBeUndefined();
    expect(at(1501).credited.toda).toBe(1500);
    expectNear(at(1501).clearwayNotCredited, 1, 1e-9);
  });
  it('takes the half from the run that is available from the start', () => {
    const declared = { tora: 1000, toda: 1500 };
    const found = declaredDistances({ declared, start: { kind: 'offset', offset: 400 } }, 0.5);
    expect(found.credited).toEqual({ tora: 600, toda: 900, asda: undefined });
    expect(found.clearwayNotCredited).toBe(200);
  });
  it('leaves absent what is absent, and never makes a length negative', () => {
    expect(declaredDistances({ start: threshold }, 0.5).credited).toEqual({
      tora: undefined,
      toda: undefined,
      asda: undefined,
    });
    const beyond = declaredDistances({ declared: { tora: 300 }, start: { kind: 'offset', offset: 400 } }, 0.5);
    expect(beyond.credited.tora).toBe(0);
  });
});
