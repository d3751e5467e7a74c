import { spawnSync } from 'node:child_process';
import { cpSync, mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { builtInAerodromes, builtInFolder } from './catalogue-folder.ts';
import { root } from './sources.ts';

/** The service compiled as `npm run build` compiles it, in a folder of its own; types are checked elsewhere. */
export interface BuiltService {
  readonly main: string;
  /** where the built-in aeroplanes lie */
  readonly aeroplanes: string;
  readonly takeAway: () => void;
}

/** Builds the service below the root, so that it finds its packages. */
export function builtService(): BuiltService {
  mkdirSync(join(root, '.tmp'), { recursive: true });
  const folder = mkdtempSync(join(root, '.tmp', 'built-'));
  const compiler = join(root, 'node_modules', 'typescript', 'bin', 'tsc');
  const project = join(root, 'tsconfig.json');
  const { status, stdout } = spawnSync(process.execPath, [compiler, '-p', project, '--noCheck', '--outDir', folder], {
    encoding: 'utf8',
  });
  if (status !== 0) throw new Error(stdout);
  const aeroplanes = join(folder, 'catalogue', 'aeroplanes');
  cpSync(builtInFolder, aeroplanes, { recursive: true });
  cpSync(builtInAerodromes, join(folder, 'catalogue', 'aerodromes'), { recursive: true });
  return { main: join(folder, 'main.js'), aeroplanes, takeAway: () => rmSync(folder, { recursive: true }) };
}
