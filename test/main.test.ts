import { spawn } from 'node:child_process';
import { cpSync, mkdtempSync, readFileSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { root } from './support/sources.ts';

interface Ended {
  readonly code: number | null;
  readonly stdout: string;
  readonly stderr: string;
  readonly milliseconds: number;
}

/** Runs the service from its sources until it ends, or until a line of its log has been seen and a signal sent. */
function run(variables: Record<string, string>, stopAt?: RegExp, home = root): Promise<Ended> {
  return new Promise((resolve) => {
    const start = performance.now();
    const child = spawn(process.execPath, ['--import', 'tsx', join(home, 'src/main.ts')], {
      cwd: home,
      env: { PATH: process.env['PATH'], ...variables },
    });
    let stdout = '';
    let stderr = '';
    child.stdout.on('data', (piece) => {
      stdout += piece;
      if (stopAt?.test(stdout)) child.kill('SIGTERM');
    });
    child.stderr.on('data', (piece) => (stderr += piece));
    child.on('close', (code) => resolve({ code, stdout, stderr, milliseconds: performance.now() - start }));
  });
}

describe('the start', () => {
  it.each([
    ['PORT', 'abc', 'PORT is "abc"; it must be a whole number from 0 to 65535'],
    ['LOG_LEVEL', 'loud', 'LOG_LEVEL is "loud"; it must be one of fatal, error, warn, info, debug, trace, silent'],
  ])('refuses %s=%s with one line and without having been ready', async (name, value, line) => {
    const { code, stdout, stderr, milliseconds } = await run({ [name]: value });
    expect(code).toBe(1);
    expect(stdout).toBe('');
    expect(stderr).toBe(`field-length service does not start: ${line}\n`);
    // two seconds are the goal for the built service; the sources are compiled on the way here, beside other tests
    expect(milliseconds).toBeLessThan(8000);
  });

  it('refuses a host that is not ours with one line', async () => {
    const { code, stdout, stderr } = await run({ PORT: '0', HOST: '203.0.113.7', LOG_LEVEL: 'silent' });
    expect(code).toBe(1);
    expect(stdout).toBe('');
    expect(stderr).toMatch(/^field-length service does not start: .*203\.0\.113\.7.*\n$/);
  });

  it('refuses an aeroplane file of which one byte has changed, with one line that names it', async () => {
    const home = mkdtempSync(join(tmpdir(), 'start-'));
    cpSync(join(root, 'src'), join(home, 'src'), { recursive: true });
    cpSync(join(root, 'package.json'), join(home, 'package.json'));
    symlinkSync(join(root, 'node_modules'), join(home, 'node_modules'));
    const file = join(home, 'src/catalogue/aeroplanes/pellibrin-trainer.json');
    writeFileSync(file, readFileSync(file, 'utf8').replace('"revision": "1"', '"revision": "2"'));
    const { code, stdout, stderr } = await run({ PORT: '0' }, undefined, home);
    rmSync(home, { recursive: true });
    expect([code, stdout]).toEqual([1, '']);
    expect(stderr).toMatch(/^field-length service does not start: catalogue .*pellibrin-trainer\.json.*\n$/);
  });

  it('listens, logs where, and ends in peace on SIGTERM', async () => {
    const { code, stdout, stderr } = await run({ PORT: '0' }, /listening/i);
    expect(stderr).toBe('');
    expect(stdout).toMatch(/127\.0\.0\.1:\d+/);
    expect(code).toBe(0);
  });
});
