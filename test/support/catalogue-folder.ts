import { cpSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { root } from './sources.ts';

/** The folder of the built-in aeroplanes. */
export const builtInFolder = join(root, 'src', 'catalogue', 'aeroplanes');

/** Runs a test on a folder of its own, empty or with the built-in aeroplanes in it, and takes it away afterwards. */
export function inFolder<T>(content: 'empty' | 'built-in', run: (folder: string) => T): T {
  const folder = mkdtempSync(join(tmpdir(), 'catalogue-'));
  try {
    if (content === 'built-in') cpSync(builtInFolder, folder, { recursive: true });
    return run(folder);
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
