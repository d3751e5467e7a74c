import { expect, it } from 'vitest';
import { aeroplanePointer } from '../../src/planning/aeroplane-pointer.ts';

it('points into an inline definition, and behind the mark into one on file', () => {
  expect(aeroplanePointer('/aeroplane/definition', '/propulsion')).toBe('/aeroplane/definition/propulsion');
  expect(aeroplanePointer('/aeroplane', '/propulsion')).toBe('/aeroplane#/propulsion');
});
