import { createHash } from 'node:crypto';
import { cpSync, existsSync, mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { CatalogueFault } from '../../src/catalogue/catalogue-fault.ts';
import { manifestName } from '../../src/catalogue/manifest.ts';
import { readCatalogue } from '../../src/catalogue/read-catalogue.ts';
import { sealFolder } from '../../src/catalogue/seal-folder.ts';
import { builtInAerodromes, builtInFolder, inFolder } from '../support/catalogue-folder.ts';

describe('sealFolder', () => {
  it('writes the digest of every file, and the catalogue then takes the folder', () => {
    inFolder('built-in', (folder) => {
      rmSync(join(folder, manifestName));
      const sealing = sealFolder(folder);
      expect('sealed' in sealing && sealing.sealed.map(({ definition }) => definition.id)).toHaveLength(7);
      const { files } = JSON.parse(readFileSync(join(folder, manifestName), 'utf8')) as { files: object };
      const expected = readdirSync(folder)
        .filter((name) => name !== manifestName)
        .map((name) => [
          name,
          createHash('sha256')
            .update(readFileSync(join(folder, name)))
            .digest('hex'),
        ]);
      expect(files).toEqual(Object.fromEntries(expected));
      expect(readCatalogue({ builtIn: false, folder }).list()).toHaveLength(7);
    });
  });

  it('finds the shipped manifest fresh', () => {
    inFolder('built-in', (folder) => {
      sealFolder(folder);
      expect(readFileSync(join(folder, manifestName), 'utf8')).toBe(
        readFileSync(join(builtInFolder, manifestName), 'utf8'),
      );
    });
  });

  it('seals again after a change, and not before the change is right', () => {
    inFolder('built-in', (folder) => {
      const path = join(folder, 'sythelor-jet.json');
      const before = readFileSync(join(folder, manifestName), 'utf8');
      const text = readFileSync(path, 'utf8');
      writeFileSync(path, text.replace('"engines": 2', '"engines": 1'));
      const refused = sealFolder(folder);
      expect('faults' in refused && refused.faults.join('\n')).toContain(
        `catalogue ${folder}: sythelor-jet.json: /engines: `,
      );
      expect(readFileSync(join(folder, manifestName), 'utf8')).toBe(before);
      writeFileSync(path, text.replace(/"revision": "[^"]*"/, '"revision": "next"'));
      expect(() => readCatalogue({ builtIn: false, folder })).toThrow(CatalogueFault);
      expect('sealed' in sealFolder(folder)).toBe(true);
      expect(readCatalogue({ builtIn: false, folder }).get('sythelor-jet')?.definition.revision).toBe('next');
    });
  });

  it('names every fault of every file, a line each, and writes nothing', () => {
    inFolder('built-in', (folder) => {
      rmSync(join(folder, manifestName));
      writeFileSync(join(folder, 'notes.txt'), 'not an aeroplane');
      writeFileSync(join(folder, 'empty.json'), '');
      const path = join(folder, 'duvassel-twin.json');
      writeFileSync(
        path,
        readFileSync(path, 'utf8')
          .replace(/"revision": "\d+",/, '')
          .replace('"unit": "m2"', '"unit": "ha"'),
      );
      const sealing = sealFolder(folder);
      const faults = 'faults' in sealing ? sealing.faults : [];
      const about = (name: string) => faults.filter((line) => line.startsWith(`catalogue ${folder}: ${name}`));
      expect(about('duvassel-twin.json: /')).toHaveLength(2);
      expect(about('empty.json: The body is empty.')).toHaveLength(1);
      expect(about('notes.txt is not named <id>.json')).toHaveLength(1);
      expect(faults).toHaveLength(4);
      expect(existsSync(join(folder, manifestName))).toBe(false);
    });
  });

  it('refuses an empty folder, a missing one and a folder within', () => {
    inFolder('empty', (folder) => {
      expect(sealFolder(folder)).toEqual({ faults: [`catalogue ${folder}: there is no aeroplane in it`] });
      expect(() => sealFolder(join(folder, 'absent'))).toThrow('the folder cannot be read (ENOENT)');
      mkdirSync(join(folder, 'within'));
      expect(() => sealFolder(folder)).toThrow('within is not a file');
    });
  });

  it('seals the aerodromes within as well, and the catalogue takes both or either', () => {
    inFolder('built-in', (folder) => {
      const within = join(folder, 'aerodromes');
      cpSync(builtInAerodromes, within, { recursive: true });
      rmSync(join(within, manifestName));
      expect(() => readCatalogue({ builtIn: false, folder })).toThrow(/aerodromes: there is no manifest.json/);
      const sealing = sealFolder(folder);
      expect('sealed' in sealing && sealing.sealed).toHaveLength(11);
      expect(readFileSync(join(within, manifestName), 'utf8')).toBe(
        readFileSync(join(builtInAerodromes, manifestName), 'utf8'),
      );
      const both = readCatalogue({ builtIn: false, folder });
      expect([both.aeroplanes.own, both.aerodromes.count.own]).toEqual([7, 4]);
      expect(() => readCatalogue({ builtIn: true, folder })).toThrow(/is one of the built-in aeroplanes/);
      for (const name of readdirSync(folder)) if (name !== 'aerodromes') rmSync(join(folder, name));
      const alone = sealFolder(folder);
      expect('sealed' in alone && alone.sealed).toHaveLength(4);
      expect(readCatalogue({ builtIn: false, folder }).aerodromes.get('karvendal-club')?.definition.revision).toBe('1');
      expect(() => readCatalogue({ builtIn: true, folder })).toThrow(/is one of the built-in aerodromes/);
      const path = join(within, 'karvendal-club.json');
      writeFileSync(path, readFileSync(path, 'utf8').replace('"value": 815', '"value": 816'));
      expect(() => readCatalogue({ builtIn: false, folder })).toThrow(
        /karvendal-club.json is not the file that was sealed/,
      );
      writeFileSync(path, readFileSync(path, 'utf8').replace('"tora"', '"torra"'));
      const refused = sealFolder(folder);
      expect('faults' in refused && refused.faults[0]).toContain(`catalogue ${within}: karvendal-club.json: /ends/0/`);
    });
  });

  it('says where the manifest cannot be written', () => {
    inFolder('built-in', (folder) => {
      rmSync(join(folder, manifestName));
      mkdirSync(join(folder, manifestName));
      expect(() => sealFolder(folder)).toThrow(CatalogueFault);
    });
  });
});
