import { posix } from 'node:path';
import { describe, expect, it } from 'vitest';
import { importsOf, sourceFiles } from '../support/sources.ts';

/** Rooms from top to bottom; a room imports its own files, what stands in its row, and nothing else. */
const table: Record<string, readonly string[]> = {
  main: ['http', 'catalogue'],
  seal: ['catalogue'],
  'health-check': ['http'],
  http: ['catalogue', 'contract', 'planning', 'numerics'],
  catalogue: ['contract', 'planning', 'performance'],
  contract: ['weather', 'planning', 'performance', 'physics', 'numerics', 'units', 'references'],
  weather: ['planning', 'performance', 'units'],
  planning: ['performance', 'physics', 'numerics', 'units', 'references'],
  performance: ['physics', 'numerics', 'references'],
  physics: ['numerics', 'units', 'references'],
  numerics: [],
  units: [],
  references: [],
};
const levels = Object.keys(table);

/** Packages and built-in modules a room may name; every permission must be in use. */
const packages: Record<string, readonly string[]> = {
  main: ['close-with-grace'],
  seal: ['node:'],
  'health-check': ['node:'],
  http: [
    'fastify',
    'fastify-zod-openapi',
    '@fastify/swagger',
    '@fastify/swagger-ui',
    '@fastify/helmet',
    'zod',
    'node:',
  ],
  catalogue: ['zod', 'node:'],
  contract: ['zod'],
};

const files = sourceFiles('src');

function roomOf(path: string): string {
  return (path.replace(/^src\//, '').split('/')[0] as string).replace(/\.ts$/, '');
}

function packageOf(specifier: string): string {
  if (specifier.startsWith('node:')) return 'node:';
  return specifier.startsWith('@') ? specifier.split('/').slice(0, 2).join('/') : (specifier.split('/')[0] as string);
}

const used = files.flatMap(({ path, text }) =>
  importsOf(text).map((specifier) => {
    const relative = specifier.startsWith('.');
    return {
      path,
      room: roomOf(path),
      to: relative ? roomOf(posix.join(posix.dirname(path), specifier)) : packageOf(specifier),
      relative,
    };
  }),
);

describe('the import table', () => {
  it('names every room that exists', () => {
    expect([...new Set(files.map(({ path }) => roomOf(path)))].sort()).toEqual(
      levels.filter((room) => files.some(({ path }) => roomOf(path) === room)).sort(),
    );
    expect(files.length).toBeGreaterThan(50);
  });

  it('only points downward', () => {
    for (const [room, below] of Object.entries(table)) {
      for (const other of below)
        expect(levels.indexOf(other), `${room} -> ${other}`).toBeGreaterThan(levels.indexOf(room));
    }
  });

  it('is kept by every file', () => {
    const forbidden = used
      .filter(({ room, to, relative }) =>
        relative ? to !== room && !table[room]?.includes(to) : !packages[room]?.includes(to),
      )
      .map(({ path, to }) => `${path} -> ${to}`);
    expect(forbidden).toEqual([]);
  });

  it('holds no idle permission', () => {
    const idle = [...Object.entries(table), ...Object.entries(packages)].flatMap(([room, permitted]) =>
      permitted.filter((to) => !used.some((one) => one.room === room && one.to === to)).map((to) => `${room} -> ${to}`),
    );
    expect(idle).toEqual([]);
  });

  it('has no barrel: no file only re-exports', () => {
    const barrels = files.filter(({ text }) => {
      const lines = text.split('\n').filter((line) => line.trim() !== '' && !/^\s*(\/\/|\/?\*)/.test(line));
      return lines.length > 0 && lines.every((line) => /^export .* from /.test(line));
    });
    expect(barrels.map(({ path }) => path)).toEqual([]);
  });
});
