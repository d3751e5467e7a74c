import { cpSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { CatalogueFault } from '../../src/catalogue/catalogue-fault.ts';
import { manifestText } from '../../src/catalogue/manifest.ts';
import { readCatalogue } from '../../src/catalogue/read-catalogue.ts';
import { sealFolder } from '../../src/catalogue/seal-folder.ts';
import { sha256 } from '../../src/catalogue/sha-256.ts';
import { builtInAerodromes, builtInFolder, inFolder } from '../support/catalogue-folder.ts';

const builtInIds = [
  'duvassel-twin',
  'gorrendal-utility',
  'hobbrick-bush',
  'lummivar-electric',
  'pellibrin-trainer',
  'sythelor-jet',
  'vandrelle-tourer',
];

/** A folder of one sealed aeroplane of the operator's own, made from a built-in one. */
function withOwn<T>(id: string, change: (text: string) => string, run: (folder: string) => T): T {
  return inFolder('empty', (folder) => {
    const text = readFileSync(join(builtInFolder, 'pellibrin-trainer.json'), 'utf8').replace('pellibrin-trainer', id);
    writeFileSync(join(folder, `${id}.json`), change(text));
    writeFileSync(
      join(folder, 'manifest.json'),
      manifestText(new Map([[`${id}.json`, sha256(readFileSync(join(folder, `${id}.json`)))]])),
    );
    return run(folder);
  });
}

function message(read: () => unknown): string {
  try {
    read();
  } catch (error) {
    expect(error).toBeInstanceOf(CatalogueFault);
    expect((error as Error).message).not.toMatch(/[\r\n]/);
    return (error as Error).message;
  }
  throw new Error('it was not refused');
}

describe('readCatalogue', () => {
  const catalogue = readCatalogue({ builtIn: true });

  it('lists the built-in aeroplanes in the order of their ids and finds each by id', () => {
    expect(catalogue.list().map(({ definition }) => definition.id)).toEqual(builtInIds);
    for (const id of builtInIds) {
      const entry = catalogue.get(id);
      expect(entry?.definition.id).toBe(id);
      expect(entry?.aeroplane.id).toBe(id);
      expect(catalogue.list()).toContain(entry);
    }
  });

  it.each([
    '',
    'no-such',
    '__proto__',
    'constructor',
    'toString',
    '../aeroplanes/pellibrin-trainer',
    'PELLIBRIN-TRAINER',
  ])('knows no aeroplane by the id "%s"', (id) => {
    expect(catalogue.get(id)).toBeUndefined();
  });

  it('reads the disk at start only', () => {
    withOwn(
      'own-one',
      (text) => text,
      (folder) => {
        const own = readCatalogue({ builtIn: false, folder });
        rmSync(folder, { recursive: true });
        expect(own.get('own-one')?.aeroplane.masses.maximumTakeoff).toBe(735);
        expect(own.list()).toHaveLength(1);
      },
    );
  });

  it('puts the operator\u2019s own beside the built-in ones, or in their place, or has none', () => {
    withOwn(
      'own-one',
      (text) => text,
      (folder) => {
        const both = readCatalogue({ builtIn: true, folder });
        expect(both.list().map(({ definition }) => definition.id)).toEqual([...builtInIds, 'own-one'].sort());
        const own = readCatalogue({ builtIn: false, folder });
        expect(own.list().map(({ definition }) => definition.id)).toEqual(['own-one']);
        expect(own.get('pellibrin-trainer')).toBeUndefined();
      },
    );
    expect(readCatalogue({ builtIn: false }).list()).toEqual([]);
  });

  it('refuses an id that is built in already', () => {
    withOwn(
      'pellibrin-trainer',
      (text) => text,
      (folder) => {
        expect(message(() => readCatalogue({ builtIn: true, folder }))).toBe(
          `catalogue ${folder}: pellibrin-trainer.json: the id pellibrin-trainer is one of the built-in aeroplanes`,
        );
        expect(readCatalogue({ builtIn: false, folder }).list()).toHaveLength(1);
      },
    );
  });

  it('refuses a file that was sealed with a fault in it, in one line', () => {
    withOwn(
      'own-one',
      (text) => text.replace('"value": 735', '"value": 73500'),
      (folder) => {
        expect(message(() => readCatalogue({ builtIn: true, folder }))).toMatch(
          /^catalogue .*: own-one\.json: \/masses\/.*\(and \d+ more\)$/,
        );
      },
    );
  });

  it('refuses a folder that was never sealed', () => {
    inFolder('empty', (folder) => {
      expect(message(() => readCatalogue({ builtIn: true, folder }))).toBe(
        `catalogue ${folder}: there is no manifest.json; seal the folder first`,
      );
    });
  });

  it('has one digest for its state: the same on every start, another with any other aeroplane or aerodrome', () => {
    expect(readCatalogue({ builtIn: true }).digest).toBe(catalogue.digest);
    inFolder('built-in', (folder) => {
      cpSync(builtInAerodromes, join(folder, 'aerodromes'), { recursive: true });
      expect(readCatalogue({ builtIn: false, folder }).digest).toBe(catalogue.digest);
      const path = join(folder, 'pellibrin-trainer.json');
      writeFileSync(path, readFileSync(path, 'utf8').replace('"value": 735', '"value": 736'));
      sealFolder(folder);
      expect(readCatalogue({ builtIn: false, folder }).digest).not.toBe(catalogue.digest);
      rmSync(path);
      sealFolder(folder);
      expect(readCatalogue({ builtIn: false, folder }).digest).not.toBe(catalogue.digest);
    });
    inFolder('built-in', (folder) => {
      expect(readCatalogue({ builtIn: false, folder }).digest).not.toBe(catalogue.digest);
    });
    expect(catalogue.digest).toMatch(/^[0-9a-f]{64}$/);
  });
});
