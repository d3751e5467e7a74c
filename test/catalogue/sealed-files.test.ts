import { mkdirSync, readdirSync, readFileSync, renameSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { CatalogueFault } from '../../src/catalogue/catalogue-fault.ts';
import { manifestName } from '../../src/catalogue/manifest.ts';
import { sealedFiles } from '../../src/catalogue/sealed-files.ts';
import { inFolder } from '../support/catalogue-folder.ts';

/** The fault's one line; the test fails where there is none, or more than one line. */
function refusal(folder: string): string {
  let found: unknown;
  try {
    sealedFiles(folder, 'aeroplane');
  } catch (error) {
    found = error;
  }
  expect(found).toBeInstanceOf(CatalogueFault);
  const { message } = found as CatalogueFault;
  expect(message).not.toMatch(/[\r\n]/);
  expect(message.startsWith(`catalogue ${folder}: `)).toBe(true);
  return message.slice(`catalogue ${folder}: `.length);
}

describe('sealedFiles', () => {
  it('gives every file but the manifest, byte for byte', () => {
    inFolder('built-in', (folder) => {
      const files = sealedFiles(folder, 'aeroplane');
      expect([...files.keys()]).toEqual(
        readdirSync(folder)
          .filter((name) => name !== manifestName)
          .sort(),
      );
      for (const [name, bytes] of files) expect(Buffer.from(bytes)).toEqual(readFileSync(join(folder, name)));
    });
  });

  it('refuses any one byte changed to any other, in an aeroplane or in the manifest', () => {
    inFolder('built-in', (folder) => {
      const names = readdirSync(folder);
      fc.assert(
        fc.property(fc.constantFrom(...names), fc.nat(), fc.integer({ min: 1, max: 255 }), (name, at, flip) => {
          const path = join(folder, name);
          const whole = readFileSync(path);
          const changed = Buffer.from(whole);
          const place = at % changed.length;
          changed[place] = (changed[place] as number) ^ flip;
          writeFileSync(path, changed);
          try {
            refusal(folder);
          } finally {
            writeFileSync(path, whole);
          }
        }),
        { numRuns: 500 },
      );
      sealedFiles(folder, 'aeroplane');
    });
  });

  it('refuses a file cut short anywhere, emptied or lengthened, and names it', () => {
    inFolder('built-in', (folder) => {
      for (const name of readdirSync(folder)) {
        const path = join(folder, name);
        const whole = readFileSync(path);
        for (const length of [0, 1, whole.length >> 1, whole.length - 1]) {
          writeFileSync(path, whole.subarray(0, length));
          expect(refusal(folder)).toContain(name);
        }
        writeFileSync(path, `${whole}\n`);
        expect(refusal(folder)).toContain(name);
        writeFileSync(path, whole);
      }
    });
  });

  it('refuses two files that changed places, and two digests that did', () => {
    inFolder('built-in', (folder) => {
      const [a, b] = ['pellibrin-trainer.json', 'vandrelle-tourer.json'].map((name) => join(folder, name)) as [
        string,
        string,
      ];
      renameSync(a, `${a}.kept`);
      renameSync(b, a);
      renameSync(`${a}.kept`, b);
      expect(refusal(folder)).toMatch(
        /^pellibrin-trainer\.json is not the file that was sealed: SHA-256 [0-9a-f]{64}, /,
      );
    });
    inFolder('built-in', (folder) => {
      const path = join(folder, manifestName);
      const { algorithm, files } = JSON.parse(readFileSync(path, 'utf8')) as {
        algorithm: string;
        files: Record<string, string>;
      };
      const [a, b] = Object.keys(files) as [string, string];
      const swapped = { ...files, [a]: files[b], [b]: files[a] };
      writeFileSync(path, `${JSON.stringify({ algorithm, files: swapped }, undefined, 2)}\n`);
      expect(refusal(folder)).toContain(`${a} is not the file that was sealed`);
    });
  });

  it.each(['another.json', 'notes.txt', '.hidden', 'pellibrin-trainer.json.bak', 'Thumbs.db'])(
    'refuses a file besides: %s',
    (name) => {
      inFolder('built-in', (folder) => {
        writeFileSync(join(folder, name), '{}');
        expect(refusal(folder)).toBe(`${name} is not in manifest.json`);
      });
    },
  );

  it('refuses a folder within, and a link that leads nowhere', () => {
    inFolder('built-in', (folder) => {
      mkdirSync(join(folder, 'more'));
      expect(refusal(folder)).toBe('more is not a file');
    });
    inFolder('built-in', (folder) => {
      symlinkSync(join(folder, 'nowhere'), join(folder, 'lost.json'));
      expect(refusal(folder)).toBe('lost.json cannot be read (ENOENT)');
    });
  });

  it('refuses a missing file, a missing manifest, a missing folder and a file in its place', () => {
    inFolder('built-in', (folder) => {
      rmSync(join(folder, 'sythelor-jet.json'));
      expect(refusal(folder)).toBe('sythelor-jet.json is missing');
    });
    inFolder('built-in', (folder) => {
      rmSync(join(folder, manifestName));
      expect(refusal(folder)).toBe('there is no manifest.json; seal the folder first');
      expect(refusal(join(folder, 'absent'))).toBe('the folder cannot be read (ENOENT)');
      expect(refusal(join(folder, 'sythelor-jet.json'))).toBe('the folder cannot be read (ENOTDIR)');
    });
  });

  it('refuses a manifest of no files: an empty catalogue is a mistaken mount', () => {
    inFolder('empty', (folder) => {
      writeFileSync(join(folder, manifestName), '{\n  "algorithm": "SHA-256",\n  "files": {}\n}\n');
      expect(refusal(folder)).toBe('there is no aeroplane in it');
    });
  });

  it('refuses a file that is far too large without reading it', () => {
    inFolder('built-in', (folder) => {
      writeFileSync(join(folder, 'large.json'), Buffer.alloc(2 * 1024 * 1024 + 1));
      expect(refusal(folder)).toBe('large.json is larger than 2097152 bytes');
    });
  });

  it('takes the links and version folders of a mounted volume', () => {
    inFolder('built-in', (folder) => {
      inFolder('empty', (mount) => {
        const version = join(mount, '..2031_01_01');
        mkdirSync(version);
        for (const name of readdirSync(folder)) {
          writeFileSync(join(version, name), readFileSync(join(folder, name)));
          symlinkSync(join('..data', name), join(mount, name));
        }
        symlinkSync('..2031_01_01', join(mount, '..data'));
        expect([...sealedFiles(mount, 'aeroplane').keys()]).toEqual([...sealedFiles(folder, 'aeroplane').keys()]);
      });
    });
  });

  it('shows a file name that would break the line as one line', () => {
    inFolder('built-in', (folder) => {
      writeFileSync(join(folder, 'two\nlines.json'), '{}');
      expect(refusal(folder)).toBe('two\ufffdlines.json is not in manifest.json');
    });
  });
});
