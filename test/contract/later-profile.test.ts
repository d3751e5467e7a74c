import { describe, expect, it } from 'vitest';
import { laterProfile } from '../../src/contract/later-profile.ts';
import type { ProfileOnWire } from '../../src/contract/slope.ts';

const line: ProfileOnWire = {
  units: ['ft', 'm'],
  points: [
    [0, 10],
    [100, 12],
    [400, 6],
  ],
};

describe('laterProfile', () => {
  it('begins at the height that the line has there, and keeps the rest nearer by as much', () => {
    expect(laterProfile(line, 50)).toEqual({
      units: ['ft', 'm'],
      points: [
        [0, 11],
        [50, 12],
        [350, 6],
      ],
    });
    expect(laterProfile(line, 100).points).toEqual([
      [0, 12],
      [300, 6],
    ]);
    expect(laterProfile(line, 250).points).toEqual([
      [0, 9],
      [150, 6],
    ]);
  });

  it('asks for a place on the line', () => {
    expect(() => laterProfile(line, 400)).toThrow(/from/);
    expect(() => laterProfile(line, -1)).toThrow(/from/);
  });
});
