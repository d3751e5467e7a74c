import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { manifestName, manifestText, readManifest } from '../../src/catalogue/manifest.ts';
import { builtInFolder } from '../support/catalogue-folder.ts';

const digestA = 'a'.repeat(64);
const digestB = '0'.repeat(63).concat('b');

describe('readManifest', () => {
  it('reads back what manifestText writes, whatever the order of the files', () => {
    const name = fc.stringMatching(/^[a-z0-9][a-z0-9-]{0,10}$/).map((id) => `${id}.json`);
    const hash = fc.stringMatching(/^[0-9a-f]{64}$/);
    fc.assert(
      fc.property(fc.uniqueArray(fc.tuple(name, hash), { selector: ([key]) => key, maxLength: 8 }), (pairs) => {
        const text = manifestText(new Map(pairs));
        expect(readManifest(text)).toEqual(new Map(pairs));
        expect(manifestText(new Map([...pairs].reverse()))).toBe(text);
      }),
    );
  });

  it('gives one file a line, in the order of the names', () => {
    expect(
      manifestText(
        new Map([
          ['b.json', digestB],
          ['a.json', digestA],
        ]),
      ).split('\n'),
    ).toEqual([
      '{',
      '  "algorithm": "SHA-256",',
      '  "files": {',
      `    "a.json": "${digestA}",`,
      `    "b.json": "${digestB}"`,
      '  }',
      '}',
      '',
    ]);
  });

  const good = manifestText(new Map([['a.json', digestA]]));
  it.each([
    ['no JSON', good.slice(1)],
    ['another algorithm', good.replace('SHA-256', 'SHA-1')],
    ['capitals in a digest', good.replace(digestA, digestA.toUpperCase())],
    ['a short digest', good.replace(digestA, digestA.slice(1))],
    ['a path for a name', good.replace('a.json', '../a.json')],
    ['a name of another kind', good.replace('a.json', 'a.yaml')],
    ['a member besides', good.replace('"files"', '"by": "me",\n  "files"')],
    ['a file named twice', good.replace('    "a.json"', `    "a.json": "${digestB}",\n    "a.json"`)],
    ['other spaces', good.replace('  "files"', '\t"files"')],
    ['other line ends', good.replaceAll('\n', '\r\n')],
    ['a byte order mark', `\ufeff${good}`],
    ['no last line end', good.trimEnd()],
    [
      'another order',
      manifestText(
        new Map([
          ['a.json', digestA],
          ['b.json', digestB],
        ]),
      ).replace(/( {4}"a.*),\n(.*)\n/, '$2,\n$1\n'),
    ],
    ['a list', '[]\n'],
    ['nothing', ''],
  ])('refuses %s', (_, text) => {
    expect(readManifest(good)).toEqual(new Map([['a.json', digestA]]));
    expect(readManifest(text)).toBeUndefined();
  });

  it('reads the one that is shipped', () => {
    expect(readManifest(readFileSync(join(builtInFolder, manifestName), 'utf8'))?.size).toBe(7);
  });
});
