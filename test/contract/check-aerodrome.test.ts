import { describe, expect, it } from 'vitest';
import { type AerodromeDefinition, aerodromeDefinition } from '../../src/contract/aerodrome-definition.ts';
import { checkAerodrome } from '../../src/contract/check-aerodrome.ts';
import { named, withMember } from '../support/sample-questions.ts';

const metres = (value: number) => ({ value, unit: 'm' as const });
const good: AerodromeDefinition = {
  id: 'some-field',
  revision: '1',
  name: 'Some field (invented)',
  elevation: metres(100),
  magneticVariation: { value: 2, unit: 'deg' },
  ends: [
    {
      designator: '04',
      direction: { value: 41, unit: 'deg' },
      slope: {
        profile: {
          units: ['m', 'm'],
          points: [
            [0, 100],
            [900, 103],
          ],
        },
      },
      surface: { kind: 'grass', grass: 'short', firmness: 'firm' },
      width: metres(20),
      displacedThreshold: metres(100),
      declared: { tora: metres(800), toda: metres(900), asda: metres(800), lda: metres(700) },
      points: [
        { name: 'A', distance: metres(200), declared: { tora: metres(600), toda: metres(700), asda: metres(600) } },
      ],
      obstacles: { from: 'end-of-toda', list: [{ distance: metres(300), height: metres(9) }] },
    },
  ],
};

function faults(pointer: string, value: unknown): string[] {
  const changed = withMember(good, pointer, value);
  expect(aerodromeDefinition.safeParse(changed).error).toBeUndefined();
  return named(checkAerodrome(changed));
}

describe('checkAerodrome', () => {
  it('passes a whole aerodrome', () => {
    expect(named(checkAerodrome(good))).toEqual([]);
    expect(aerodromeDefinition.safeParse(good).error).toBeUndefined();
  });

  it.each<[string, string, unknown, string]>([
    ['TODA below TORA', '/ends/0/declared/toda', metres(799), 'contradiction /ends/0/declared/toda'],
    [
      'ASDA of a point below its TORA',
      '/ends/0/points/0/declared/asda',
      metres(599),
      'contradiction /ends/0/points/0/declared/asda',
    ],
    [
      'more from a point than from the beginning',
      '/ends/0/points/0/declared/toda',
      metres(901),
      'contradiction /ends/0/points/0/declared/toda',
    ],
    ['grass on pavement', '/ends/0/surface', { kind: 'paved', grass: 'short' }, 'contradiction /ends/0/surface/grass'],
    [
      'an end with nothing declared',
      '/ends/0',
      { ...good.ends[0], declared: {}, obstacles: undefined },
      'missing /ends/0/declared',
    ],
    [
      'a line that ends before TODA',
      '/ends/0/declared/toda',
      metres(901),
      'contradiction /ends/0/slope/profile/points/1/0',
    ],
    [
      'a line that ends before LDA behind the threshold',
      '/ends/0/declared/lda',
      metres(801),
      'contradiction /ends/0/slope/profile/points/1/0',
    ],
    [
      'a line that begins late',
      '/ends/0/slope',
      {
        profile: {
          units: ['m', 'm'],
          points: [
            [1, 100],
            [900, 103],
          ],
        },
      },
      'contradiction /ends/0/slope/profile/points/0/0',
    ],
    [
      'a line steeper than 10 %',
      '/ends/0/slope',
      {
        profile: {
          units: ['m', 'm'],
          points: [
            [0, 100],
            [900, 191],
          ],
        },
      },
      'implausible /ends/0/slope/profile/points/1/1',
    ],
    ['an end twice', '/ends', [good.ends[0], good.ends[0]], 'contradiction /ends/1/designator'],
    [
      'a point twice',
      '/ends/0/points',
      [good.ends[0]?.points?.[0], good.ends[0]?.points?.[0]],
      'contradiction /ends/0/points/1/name',
    ],
    ['obstacles from brake release', '/ends/0/obstacles/from', 'brake-release', 'contradiction /ends/0/obstacles/from'],
    ['obstacles without TODA', '/ends/0/declared/toda', undefined, 'missing /ends/0/declared/toda'],
  ])('refuses %s', (_, pointer, value, fault) => {
    const clean = JSON.parse(JSON.stringify(value ?? null)) ?? undefined;
    expect(faults(pointer, clean)).toEqual([fault]);
  });
});
