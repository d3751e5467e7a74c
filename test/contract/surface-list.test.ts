import { describe, expect, it } from 'vitest';
import { surfaceList, toSurfaceList } from '../../src/contract/surface-list.ts';

/**
 * The long-distance end of the published ranges of rolling and braking friction [textbooks; judgement], the matrix of codes, and the
 * poorer of a surface and its code without anti-skid: 0.375 of 0.16 and of 0.05 [AC 25-31, table 2; secondary].
 */
const known = [
  { is: { kind: 'paved', state: 'dry' }, rolling: 0.03, braking: 0.35, code: 6 },
  { is: { kind: 'grass', state: 'dry', grass: 'short' }, rolling: 0.055, braking: 0.25 },
  { is: { kind: 'grass', state: 'wet', grass: 'long' }, rolling: 0.12, braking: 0.12 },
  { is: { kind: 'gravel', state: 'dry' }, rolling: 0.045, braking: 0.3 },
  {
    is: { kind: 'paved', state: 'contaminated', contaminant: 'compacted-snow' },
    rolling: 0.04,
    braking: 0.06,
    code: 3,
  },
  { is: { kind: 'paved', state: 'contaminated', contaminant: 'ice' }, rolling: 0.02, braking: 0.0188, code: 1 },
  { is: { kind: 'paved', state: 'contaminated', contaminant: 'slush' }, rolling: 0.03, braking: 0.0188, code: 2 },
  { is: { kind: 'paved', state: 'contaminated', contaminant: 'wet-ice' }, code: 0 },
];

describe('GET /v1/surfaces', () => {
  const { surfaces } = surfaceList.parse(toSurfaceList());

  it.each(known)('tells of $is: rolling $rolling, braking $braking, code $code', ({ is, rolling, braking, code }) => {
    const found = surfaces.find((one) =>
      Object.entries(is).every(([member, value]) => Reflect.get(one, member) === value),
    );
    expect(found?.rolling?.coefficient).toBe(rolling);
    expect(found?.braking?.coefficient).toBe(braking);
    expect(found?.conditionCode).toBe(code);
  });

  it('tells each surface once', () => {
    const names = surfaces.map(({ kind, state, grass, firmness, contaminant }) =>
      JSON.stringify({ kind, state, grass, firmness, contaminant }),
    );
    expect(new Set(names).size).toBe(names.length);
    expect(names.length).toBeGreaterThan(30);
  });
});
