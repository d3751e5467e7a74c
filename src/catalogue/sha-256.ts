import { createHash } from 'node:crypto';

/**
 * SHA-256 of bytes, or of a text's UTF-8, in 64 lower-case hexadecimal digits.
 *
 * @see references.Fips180
 */
export function sha256(content: Uint8Array | string): string {
  return createHash('sha256').update(content).digest('hex');
}
