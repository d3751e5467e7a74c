import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { root } from '../support/sources.ts';

const read = (path: string) => readFileSync(join(root, path), 'utf8');
const withoutComments = (text: string) => text.replace(/^\s*#.*\n/gm, '').replace(/\s+#.*$/gm, '');

interface Instruction {
  readonly name: string;
  readonly rest: string;
}

/** The instructions of a Dockerfile, continued lines joined. */
function instructions(text: string): Instruction[] {
  return withoutComments(text)
    .replace(/\\\n/g, ' ')
    .split('\n')
    .filter((line) => line.trim() !== '')
    .map((line) => {
      const [, name, rest] = line.match(/^([A-Z]+)\s+(.*)$/) ?? [];
      if (name === undefined || rest === undefined) throw new Error(`no instruction: ${line}`);
      return { name, rest };
    });
}

const dockerfile = instructions(read('Dockerfile'));
const stages = dockerfile.flatMap(({ name }, at) => (name === 'FROM' ? [at] : []));
const build = dockerfile.slice(stages[0], stages[1]);
const final = dockerfile.slice(stages[1]);
const all = (list: readonly Instruction[], wanted: string) =>
  list.filter(({ name }) => name === wanted).map(({ rest }) => rest);

const healthCheck = ['node', 'dist/health-check.js'];

describe('Dockerfile', () => {
  it('names its base once, a long-term support version in its slim form by exact tag', () => {
    const [base, ...others] = all(dockerfile, 'ARG');
    expect(others).toEqual([]);
    expect(dockerfile[0]).toEqual({ name: 'ARG', rest: base });
    // even versions are the ones with long-term support, 24 the oldest in it when this was written
    const [, version] = base?.match(/^NODE_IMAGE=node:(\d+)\.\d+\.\d+-[a-z]+-slim(?:@sha256:[0-9a-f]{64})?$/) ?? [];
    expect(Number(version) % 2).toBe(0);
    expect(Number(version)).toBeGreaterThanOrEqual(24);
    expect(all(dockerfile, 'FROM').join()).toMatch(/^\$\{NODE_IMAGE\} AS build,\$\{NODE_IMAGE\}$/);
  });

  it('installs what the lock file says, runs no package script and drops development packages', () => {
    const commands = all(build, 'RUN').flatMap((command) => command.split(/\s*&&\s*/));
    expect(commands.filter((command) => command.startsWith('npm'))).toEqual([
      'npm ci --ignore-scripts',
      'npm run build',
      'npm prune --omit=dev --ignore-scripts',
    ]);
  });

  it('takes from outside only what .dockerignore lets in, and fetches nothing itself', () => {
    const [first, ...letIn] = withoutComments(read('.dockerignore')).trim().split('\n');
    expect(first).toBe('*');
    const allowed = ['package.json', 'package-lock.json', 'tsconfig.json', 'src'];
    expect(letIn).toEqual(allowed.map((name) => `!${name}`));
    const copied = all(build, 'COPY').flatMap((copy) => copy.split(/\s+/).slice(0, -1));
    expect(copied).toEqual(allowed);
    expect(all(dockerfile, 'ADD')).toEqual([]);
    expect(read('Dockerfile')).not.toMatch(/\b(?:curl|wget|apt|apt-get|npx|git)\b|https?:/);
  });

  it('hands no source and no development package to the final stage, and runs nothing there', () => {
    expect(all(final, 'COPY')).toEqual([
      '--from=build /service/package.json ./',
      '--from=build /service/node_modules ./node_modules',
      '--from=build /service/dist ./dist',
    ]);
    expect(all(final, 'RUN')).toEqual([]);
  });

  it('holds no secret', () => {
    expect(read('Dockerfile') + read('docker/compose.yaml')).not.toMatch(
      /\b\w*(?:secret|token|password|passwd|credential|api[-_]?key|authorization)\w*\s*[:=]/i,
    );
    expect(all(dockerfile, 'ENV')).toEqual(['HOST=0.0.0.0 PORT=3000']);
  });

  it('runs as a user without a name, each command without a shell', () => {
    expect(all(final, 'USER')).toEqual(['10001:10001']);
    expect(final.findIndex(({ name }) => name === 'USER')).toBeGreaterThan(
      final.findLastIndex(({ name }) => name === 'COPY'),
    );
    expect(all(final, 'ENTRYPOINT')).toEqual([]);
    expect(all(final, 'CMD').map((command) => JSON.parse(command))).toEqual([['node', 'dist/main.js']]);
    const [check, ...others] = all(final, 'HEALTHCHECK');
    expect(others).toEqual([]);
    const [, options, command] = check?.match(/^((?:--[a-z-]+=\w+ )+)CMD (.*)$/) ?? [];
    expect(options).toBe('--interval=30s --timeout=5s --start-period=20s --retries=3 ');
    expect(JSON.parse(command ?? '')).toEqual(healthCheck);
  });
});

describe('docker/compose.yaml', () => {
  const text = withoutComments(read('docker/compose.yaml'));

  /** What the service says under a name: the rest of its line, or the lines of its block. */
  function setting(name: string): string | string[] | undefined {
    const [, value, block = ''] = text.match(new RegExp(`^ {4}${name}:(.*)\n((?: {6,}.*\n)*)`, 'm')) ?? [];
    return value === ''
      ? block
          .trimEnd()
          .split('\n')
          .map((line) => line.trim())
      : value?.trim();
  }

  it('has one service, built from the Dockerfile', () => {
    expect(text.match(/^ {2}\S.*$/gm)).toEqual(['  field-length:']);
    expect(setting('build')).toBe('..');
  });

  it.each([
    ['user', '"10001:10001"'],
    ['read_only', 'true'],
    ['tmpfs', ['- /tmp:size=16m,mode=1777,noexec,nosuid,nodev']],
    ['cap_drop', ['- ALL']],
    ['security_opt', ['- no-new-privileges:true']],
    ['pids_limit', '64'],
    ['mem_limit', '512m'],
    ['cpus', '1.0'],
    ['init', 'true'],
    ['stop_grace_period', '15s'],
  ])('says %s', (name, value) => {
    expect(setting(name)).toEqual(value);
  });

  it('gives back no privilege, and mounts nothing unless asked', () => {
    expect(text).not.toMatch(
      /^\s*(?:privileged|cap_add|network_mode|pid|ipc|devices|volumes|user_?ns_mode|env_file):/m,
    );
  });

  it('is reached from its own machine alone', () => {
    expect(setting('ports')).toEqual(['- "127.0.0.1:3000:3000"']);
  });

  it('asks for its health as the image does', () => {
    const [test, ...times] = setting('healthcheck') as string[];
    expect(JSON.parse(test?.replace('test: ', '') ?? '')).toEqual(['CMD', ...healthCheck]);
    const image = all(final, 'HEALTHCHECK')[0]?.match(/--[a-z-]+=\w+/g);
    expect(times.map((time) => `--${time.replace(': ', '=').replace('_', '-')}`)).toEqual(image);
  });

  it('shows how to mount a folder of aeroplanes that the service cannot write', () => {
    const shown = read('docker/compose.yaml').match(/^ {4}# volumes:\n(?: {4}# {3,}.*\n)+/m)?.[0];
    expect(shown?.replace(/^ {4}# /gm, '')).toBe(`volumes:
  - type: bind
    source: ./aeroplanes
    target: /catalogue
    read_only: true
`);
    expect(read('docker/compose.yaml')).toContain('# CATALOGUE: /catalogue\n');
  });
});
