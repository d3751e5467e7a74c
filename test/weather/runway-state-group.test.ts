import { describe, expect, it } from 'vitest';
import { readRunwayState } from '../../src/weather/runway-state-group.ts';

const read = (text: string) => readRunwayState({ text, at: 0 });

describe('the state of a runway', () => {
  it.each([
    ['R27/123456', { runway: '27', deposit: 'damp', extent: 0.25, depth: 0.034, braking: { coefficient: 0.56 } }],
    [
      'R31L/450294',
      { runway: '31L', deposit: 'dry snow', extent: 0.5, depth: 0.002, braking: { action: 'medium to good' } },
    ],
    ['R06/590230', { runway: '06', deposit: 'wet snow', extent: 1, depth: 0.002, braking: { coefficient: 0.3 } }],
    ['R15/699291', { runway: '15', deposit: 'slush', extent: 1, depth: 0.1, braking: { action: 'poor' } }],
    [
      'R15/899899',
      { runway: '15', deposit: 'compacted or rolled snow', extent: 1, depth: 0.4, braking: { unreliable: true } },
    ],
    ['R15/499999', { runway: '15', deposit: 'dry snow', extent: 1, notInUse: true, braking: { unreliable: true } }],
    ['R33///////', { runway: '33' }],
    ['R27/CLRD70', { runway: '27', cleared: true }],
    ['R88/CLRD//', { runway: 'all', cleared: true }],
    [
      'R99/421595',
      { runway: 'repeated', deposit: 'dry snow', extent: 0.25, depth: 0.015, braking: { action: 'good' } },
    ],
    ['88491092', { runway: 'all', deposit: 'dry snow', extent: 1, depth: 0.01, braking: { action: 'medium to poor' } }],
    ['09690595', { runway: '09', deposit: 'slush', extent: 1, depth: 0.005, braking: { action: 'good' } }],
    [
      '59421594',
      { runway: '09R', deposit: 'dry snow', extent: 0.25, depth: 0.015, braking: { action: 'medium to good' } },
    ],
    ['R/SNOCLO', { runway: 'all', closedBySnow: true }],
    ['R15/SNOCLO', { runway: '15', closedBySnow: true }],
    ['R27/5/5/3', { runway: '27', conditionCodes: [5, 5, 3] }],
  ])('%s', (group, expected) => {
    const state = read(group) as { depth?: number };
    const { depth, ...rest } = expected as { depth?: number };
    const { depth: found, ...others } = state;
    expect(others).toEqual(rest);
    if (depth === undefined) expect(found).toBeUndefined();
    else expect(found).toBeCloseTo(depth, 12);
  });

  it('knows the runways there are', () => {
    for (const group of ['R37/123456', 'R00/CLRD70', 'R45/5/5/5', 'R38/SNOCLO']) {
      expect(read(group), group).toMatchObject({ code: 'out-of-range', token: group });
    }
  });

  it('leaves a visual range, a condition code of 7 and seven figures alone', () => {
    for (const group of ['R27/1200', 'R27/P2000U', 'R27/5/7/5', '8849109', 'R27/12345']) {
      expect(read(group), group).toBeUndefined();
    }
  });
});
