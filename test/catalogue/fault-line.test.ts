import { describe, expect, it } from 'vitest';
import { faultLine, faultText } from '../../src/catalogue/fault-line.ts';
import type { Fault } from '../../src/planning/fault.ts';

const fault: Fault = {
  pointer: '/masses/empty',
  code: 'contradiction',
  message: 'The empty mass is above the maximum takeoff mass.',
  allowed: 'below 735 kg',
  hint: 'Check the unit.',
};
const text = '/masses/empty: The empty mass is above the maximum takeoff mass. Allowed: below 735 kg. Check the unit.';

describe('faultText and faultLine', () => {
  it('say where, what and what would do', () => {
    expect(faultText(fault)).toBe(text);
    expect(faultText({ pointer: '', code: 'unreadable', message: 'The body is not JSON.' })).toBe(
      'The body is not JSON.',
    );
  });

  it('show the first fault and count the others', () => {
    expect(faultLine([fault])).toBe(text);
    expect(faultLine([fault, fault, fault])).toBe(`${text} (and 2 more)`);
  });
});
