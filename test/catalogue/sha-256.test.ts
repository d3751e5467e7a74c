import { describe, expect, it } from 'vitest';
import { sha256 } from '../../src/catalogue/sha-256.ts';
import { hashExamples } from '../published/fips-180.ts';

describe('sha256', () => {
  it.each(hashExamples)('of "$text" [FIPS 180 example values, $status, exact]', ({ text, digest }) => {
    expect(sha256(text)).toBe(digest);
    expect(sha256(Buffer.from(text))).toBe(digest);
  });
});
