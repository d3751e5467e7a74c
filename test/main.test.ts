import { spawn } from 'node:child_process';
import { readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { sealFolder } from '../src/catalogue/seal-folder.ts';
import { type BuiltService, builtService } from './support/built-service.ts';
import { inFolder } from './support/catalogue-folder.ts';
import { root } from './support/sources.ts';

/** A bad start ends within 2 s [ms]; four times that, for the tests beside it share the machine's cores. */
const deadline = 8000;

interface Ended {
  readonly code: number | null;
  readonly stdout: string;
  readonly stderr: string;
  readonly milliseconds: number;
}

let service: BuiltService;
beforeAll(() => {
  service = builtService();
});
afterAll(() => service.takeAway());

/** Leaves a process of Node.js what a read-only container leaves it. The flag's first name is that of Node.js 20. */
const readingOnly = [
  process.allowedNodeEnvironmentFlags.has('--permission') ? '--permission' : '--experimental-permission',
  '--allow-fs-read=*',
  '--disable-warning=ExperimentalWarning',
];

/** Runs the service until it ends; a service that listens is sent a signal. */
function run(variables: Record<string, string>, ...given: readonly string[]): Promise<Ended> {
  return runNode([service.main, ...given], variables);
}

function runNode(given: readonly string[], variables: Record<string, string>): Promise<Ended> {
  return new Promise((resolve) => {
    const start = performance.now();
    const child = spawn(process.execPath, given, {
      cwd: root,
      env: { PATH: process.env['PATH'], ...variables },
    });
    let stdout = '';
    let stderr = '';
    child.stdout.on('data', (piece) => {
      stdout += piece;
      if (/listening/i.test(stdout)) child.kill('SIGTERM');
    });
    child.stderr.on('data', (piece) => (stderr += piece));
    child.on('close', (code) => resolve({ code, stdout, stderr, milliseconds: performance.now() - start }));
  });
}

/** A refusal within two seconds: one line, nothing before it. Other work on the machine may slow one try, not three. */
async function expectRefused(line: string | RegExp, variables: Record<string, string>, ...given: readonly string[]) {
  let least = Number.POSITIVE_INFINITY;
  for (let tries = 0; tries < 3 && least > deadline; tries++) {
    const { code, stdout, stderr, milliseconds } = await run(variables, ...given);
    expect([code, stdout]).toEqual([1, '']);
    expect(stderr).toMatch(/^field-length service does not start: [^\n]+\n$/);
    expect(stderr.slice('field-length service does not start: '.length, -1)).toMatch(line);
    least = Math.min(least, milliseconds);
  }
  expect(least).toBeLessThan(deadline);
}

function changeOneByte(file: string): void {
  const before = readFileSync(file, 'utf8');
  writeFileSync(file, before.replace(/"revision": "[^"]*"/, '"revision": "changed"'));
  expect(readFileSync(file, 'utf8')).not.toBe(before);
}

describe('the start', () => {
  it.each([
    ['PORT', 'abc', 'PORT is "abc"; it must be a whole number from 0 to 65535'],
    ['LOG_LEVEL', 'loud', 'LOG_LEVEL is "loud"; it must be one of fatal, error, warn, info, debug, trace, silent'],
    ['CATALOGUE', '/no/such/folder', 'catalogue /no/such/folder: the folder cannot be read (ENOENT)'],
    ['CATALOGUE_BUILT_IN', 'no', 'CATALOGUE_BUILT_IN is "no"; it must be on or off'],
  ])('refuses %s=%s with one line, by itself and under --check', async (name, value, line) => {
    await expectRefused(line, { [name]: value });
    await expectRefused(line, { [name]: value }, '--check');
  });

  it('refuses an argument it does not know with one line', async () => {
    await expectRefused('"--chekc" is no argument; there is only --check', { PORT: '0' }, '--chekc');
  });

  it('refuses a host that is not ours with one line', async () => {
    const { code, stdout, stderr } = await run({ PORT: '0', HOST: '203.0.113.7', LOG_LEVEL: 'silent' });
    expect([code, stdout]).toEqual([1, '']);
    expect(stderr).toMatch(/^field-length service does not start: .*203\.0\.113\.7.*\n$/);
  });

  it('listens, logs where, and ends in peace on SIGTERM, writing no file and starting no process', async () => {
    const { code, stdout, stderr } = await runNode([...readingOnly, service.main], { PORT: '0' });
    expect(stderr).toBe('');
    expect(stdout).toMatch(/127\.0\.0\.1:\d+/);
    expect(code).toBe(0);
  });

  it('would be found out if it wrote a file', async () => {
    const writing = `fs.writeFileSync(${JSON.stringify(join(service.aeroplanes, 'written.json'))}, '')`;
    const { code, stderr } = await runNode([...readingOnly, '-e', writing], {});
    expect(code).toBe(1);
    expect(stderr).toContain('ERR_ACCESS_DENIED');
  });

  it('says under --check in one line that all is in order, and does not listen', async () => {
    const { code, stdout, stderr } = await run({ PORT: '1' }, '--check');
    expect([code, stderr]).toEqual([0, '']);
    expect(stdout).toMatch(
      /^settings and catalogue are in order: 7 built-in aeroplanes and 0 of the operator's own, 4 built-in aerodromes and 0 own, SHA-256 [0-9a-f]{64}; would listen on 127\.0\.0\.1 port 1\n$/,
    );
  });
});

describe("the operator's own folder", () => {
  it('stands in place of the built-in aeroplanes, none of whose ids the start needs', async () => {
    await inFolder('built-in', async (folder) => {
      for (const name of readdirSync(folder)) rmSync(join(folder, name));
      const text = readFileSync(join(service.aeroplanes, 'pellibrin-trainer.json'), 'utf8');
      writeFileSync(join(folder, 'own-one.json'), text.replace('"pellibrin-trainer"', '"own-one"'));
      sealFolder(folder);
      const own = { PORT: '0', CATALOGUE: folder, CATALOGUE_BUILT_IN: 'off' };
      const checked = await run(own, '--check');
      expect(checked).toMatchObject({ code: 0, stderr: '' });
      expect(checked.stdout).toMatch(/: 0 built-in aeroplanes and 1 of the operator's own, /);
      expect(await run(own)).toMatchObject({ code: 0, stderr: '', stdout: expect.stringMatching(/listening/i) });
    });
  });

  it('is refused where one byte of a sealed file has changed, and so is the built-in one', async () => {
    const line = /^catalogue .*: sythelor-jet\.json is not the file that was sealed: SHA-256 \w+, sealed as \w+$/;
    await inFolder('built-in', async (folder) => {
      changeOneByte(join(folder, 'sythelor-jet.json'));
      const own = { PORT: '0', CATALOGUE: folder, CATALOGUE_BUILT_IN: 'off' };
      await expectRefused(line, own);
      await expectRefused(line, own, '--check');
    });
    changeOneByte(join(service.aeroplanes, 'sythelor-jet.json'));
    await expectRefused(line, { PORT: '0' });
    expect(await run({ CATALOGUE_BUILT_IN: 'off' }, '--check')).toMatchObject({ code: 0, stderr: '' });
  });
});
