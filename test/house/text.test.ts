import { execFileSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { root } from '../support/sources.ts';

const tracked = execFileSync('git', ['ls-files'], { cwd: root, encoding: 'utf8' }).split('\n').filter(Boolean);

describe('the repository', () => {
  it('keeps its top level', () => {
    const allowed = [
      'src',
      'test',
      'openapi',
      'docker',
      'package.json',
      'package-lock.json',
      'tsconfig.json',
      'Dockerfile',
      'README.md',
      'DEVELOPERS.md',
    ];
    const top = [...new Set(tracked.map((path) => path.split('/')[0] as string))];
    expect(top.filter((name) => !name.startsWith('.') && !allowed.includes(name))).toEqual([]);
  });

  it('has a lock file without download addresses and exact versions', () => {
    expect(readFileSync(join(root, 'package-lock.json'), 'utf8')).not.toMatch(/"resolved"/);
    const { dependencies, devDependencies } = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8')) as Record<
      string,
      Record<string, string>
    >;
    for (const [name, version] of Object.entries({ ...dependencies, ...devDependencies })) {
      expect(version, name).toMatch(/^(npm:.*@)?\d+\.\d+\.\d+$/);
    }
    expect(Object.keys(dependencies ?? {}).length).toBeLessThanOrEqual(14);
  });

  it('speaks of the product alone', () => {
    const machinePath = /(^|[^a-z.])\/(work|farm|root)\//;
    const registry = /https?:\/\/(registry|deb|mirror|packages?)\./i;
    const odd = tracked
      .filter((path) => !path.startsWith('test/house/') && path !== 'package-lock.json')
      .filter((path) => {
        const text = readFileSync(join(root, path), 'utf8');
        return machinePath.test(text) || registry.test(text);
      });
    expect(odd).toEqual([]);
  });
});
