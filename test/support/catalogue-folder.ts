import { cpSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { root } from './sources.ts';

/** The folder of the built-in aeroplanes. */
export const builtInFolder = join(root, 'src', 'catalogue', 'aeroplanes');

/** The folder of the built-in aerodromes. */
export const builtInAerodromes = join(root, 'src', 'catalogue', 'aerodromes');

/** Runs a test on a folder of its own, empty or with the built-in aeroplanes in it, and takes it away afterwards. */
export function inFolder<T>(content: 'empty' | 'built-in', run: (folder: string) => T): T {
  const folder = mkdtempSync(join(tmpdir(), 'catalogue-'));
  const takeAway = () => rmSync(folder, { recursive: true, force: true });
  let result: T | undefined;
  try {
    if (content === 'built-in') cpSync(builtInFolder, folder, { recursive: true });
    result = run(folder);
    return result instanceof Promise ? (result.finally(takeAway) as T) : result;
  } finally {
    if (!(result instanceof Promise)) takeAway();
  }
}
