import { spawnSync } from 'node:child_process';
import { existsSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { readCatalogue } from '../src/catalogue/read-catalogue.ts';
import { inFolder } from './support/catalogue-folder.ts';
import { root } from './support/sources.ts';

function seal(...given: string[]) {
  const { status, stdout, stderr } = spawnSync(
    process.execPath,
    ['--import', 'tsx', join(root, 'src', 'seal.ts'), ...given],
    { cwd: root, encoding: 'utf8' },
  );
  return { status, out: stdout, err: stderr };
}

describe('npm run seal', () => {
  it('seals a folder and prints id and digest of each aeroplane', () => {
    inFolder('built-in', (folder) => {
      rmSync(join(folder, 'manifest.json'));
      const { status, out, err } = seal(folder);
      expect({ status, err }).toEqual({ status: 0, err: '' });
      const entries = readCatalogue({ builtIn: false, folder }).list();
      expect(out.trimEnd().split('\n')).toEqual([
        ...entries.map(({ definition, digest }) => `${definition.id} ${digest}`),
        `sealed: 7 in ${folder}`,
      ]);
    });
  });

  it('says what is wrong, a line each, and ends with 1', () => {
    inFolder('empty', (folder) => {
      writeFileSync(join(folder, 'x.json'), '{');
      const { status, out, err } = seal(folder);
      expect({ status, out }).toEqual({ status: 1, out: '' });
      expect(err).toBe(
        `catalogue ${folder}: x.json: The body is not JSON from character 2 on. Allowed: JSON as in RFC 8259: no comments, no trailing commas, no NaN.\n`,
      );
      expect(existsSync(join(folder, 'manifest.json'))).toBe(false);
    });
  });

  it('asks for one folder', () => {
    expect(seal('a', 'b')).toEqual({ status: 2, out: '', err: 'usage: npm run seal -- <folder of aeroplane files>\n' });
  });
});
