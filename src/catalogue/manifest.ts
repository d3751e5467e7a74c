import { z } from 'zod';

/** The list of a folder's files with the digest of each; it lies in the folder itself. */
export const manifestName = 'manifest.json';

/** A file is named for what is in it. */
export const definitionFileName = /^[a-z0-9][a-z0-9-]{0,63}\.json$/;

const manifest = z.strictObject({
  algorithm: z.literal('SHA-256'),
  files: z.record(
    z.string().max(69).regex(definitionFileName),
    z
      .string()
      .max(64)
      .regex(/^[0-9a-f]{64}$/),
  ),
});

/** Digests by file name. */
export type Digests = ReadonlyMap<string, string>;

/** The manifest's text: one file a line in the order of the names, so that a change of one file is a change of one line. */
export function manifestText(digests: Digests): string {
  const files = Object.fromEntries([...digests].sort(([a], [b]) => (a < b ? -1 : 1)));
  return `${JSON.stringify({ algorithm: 'SHA-256', files }, undefined, 2)}\n`;
}

/**
 * Reads a manifest as manifestText writes it, to the byte: a looser reading would let a changed byte pass.
 *
 * @returns the digests by file name, or undefined for any other text
 */
export function readManifest(text: string): Digests | undefined {
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    return undefined;
  }
  const read = manifest.safeParse(value);
  if (!read.success) return undefined;
  const digests = new Map(Object.entries(read.data.files));
  return manifestText(digests) === text ? digests : undefined;
}
