import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { aeroplaneFile } from '../../src/catalogue/aeroplane-file.ts';
import { isRefused } from '../../src/planning/fault.ts';
import { builtInFolder } from '../support/catalogue-folder.ts';

const name = 'pellibrin-trainer.json';
const good = readFileSync(join(builtInFolder, name), 'utf8');
const revision = '"revision": "2",';

function faults(text: string, file = name) {
  const read = aeroplaneFile(file, Buffer.from(text));
  return isRefused(read) ? read.refused.map(({ pointer, code }) => `${code} ${pointer}`) : [];
}

describe('aeroplaneFile', () => {
  it('gives the definition, the same in SI, and the digest', () => {
    const read = aeroplaneFile(name, Buffer.from(good));
    if (isRefused(read)) throw new Error(JSON.stringify(read.refused));
    expect(read.definition).toEqual(JSON.parse(good));
    expect(read.aeroplane).toMatchObject({ id: 'pellibrin-trainer', engines: 1, masses: { maximumTakeoff: 735 } });
    expect(read.aeroplane.certification.screenHeight).toBeCloseTo(15.24, 12);
    expect(read.digest).toMatch(/^[0-9a-f]{64}$/);
  });

  it.each([
    ['a file under another name', good, 'trainer.json', ['contradiction /id']],
    ['no JSON', good.slice(0, -3), name, ['unreadable ']],
    [
      'a member twice',
      good.replace(revision, '"revision": "1", "revision": "2",'),
      name,
      ['duplicate-member /revision'],
    ],
    [
      'an unknown member',
      good.replace(revision, '"revision": "1", "colour": "red",'),
      name,
      ['unknown-member /colour'],
    ],
    [
      'a number as text',
      good.replace('"value": 735', '"value": "735"'),
      name,
      ['wrong-type /masses/maximumTakeoff/value'],
    ],
    ['a wrong unit', good.replace('12.9, "unit": "m2"', '12.9, "unit": "m"'), name, ['unknown-unit /wing/area/unit']],
    [
      'a contradiction',
      good.replace('"value": 486', '"value": 786'),
      name,
      expect.arrayContaining(['contradiction /masses/empty']),
    ],
    ['a control character', good.replace('(invented)', '(inv\\u0007)'), name, ['wrong-type /name']],
  ])('refuses %s', (_, text, file, expected) => {
    expect(text === good && file === name).toBe(false);
    expect(faults(text, file)).toEqual(expected);
  });

  it('names every fault of a file, not the first alone', () => {
    const text = good.replace(revision, '"colour": "red",').replace('"unit": "m2"', '"unit": "ha"');
    expect(faults(text).sort()).toEqual([
      'missing /revision',
      'unknown-member /colour',
      'unknown-unit /wing/area/unit',
    ]);
  });
});
