import { createHash } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { digest } from '../../src/catalogue/digest.ts';
import { readCatalogue } from '../../src/catalogue/read-catalogue.ts';
import { type AeroplaneDefinition, aeroplaneDefinition } from '../../src/contract/aeroplane-definition.ts';
import { reader } from '../../src/contract/reading/reader.ts';
import { builtInFolder } from '../support/catalogue-folder.ts';

const readDefinition = reader(aeroplaneDefinition);
const catalogue = readCatalogue({ builtIn: true });
const ids = readdirSync(builtInFolder)
  .filter((name) => name !== 'manifest.json')
  .map((name) => name.replace(/\.json$/, ''));

/** The same tree with the members of every object in another order. */
function reordered(value: unknown, compare: (a: string, b: string) => number): unknown {
  if (Array.isArray(value)) return value.map((one) => reordered(one, compare));
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(
    Object.entries(value)
      .sort(([a], [b]) => compare(a, b))
      .map(([name, inner]) => [name, reordered(inner, compare)]),
  );
}

function inline(value: unknown): AeroplaneDefinition {
  const read = readDefinition(value);
  if (!('value' in read)) throw new Error(JSON.stringify(read.refused));
  return read.value;
}

describe('digest', () => {
  it.each(ids)('is the same for %s by id, inline, and inline with its members in any order', (id) => {
    const file = JSON.parse(readFileSync(join(builtInFolder, `${id}.json`), 'utf8')) as unknown;
    const byId = catalogue.get(id)?.digest;
    expect(byId).toMatch(/^[0-9a-f]{64}$/);
    expect(digest(inline(file))).toBe(byId);
    expect(digest(inline(reordered(file, (a, b) => (a < b ? -1 : 1))))).toBe(byId);
    expect(digest(inline(reordered(file, (a, b) => (a < b ? 1 : -1))))).toBe(byId);
  });

  it('is the SHA-256 of the JSON without spaces, configurations by id: anyone can compute it from a file', () => {
    const file = JSON.parse(readFileSync(join(builtInFolder, 'hobbrick-bush.json'), 'utf8')) as AeroplaneDefinition;
    const text = JSON.stringify({
      ...file,
      configurations: configurationsById(file.configurations),
    });
    expect(catalogue.get('hobbrick-bush')?.digest).toBe(createHash('sha256').update(text, 'utf8').digest('hex'));
  });

  it('differs wherever a definition differs', () => {
    const file = JSON.parse(readFileSync(join(builtInFolder, 'vandrelle-tourer.json'), 'utf8')) as AeroplaneDefinition;
    const seen = new Set([digest(inline(file))]);
    const others: Partial<AeroplaneDefinition>[] = [
      { revision: 'another' },
      { drag: { ...file.drag, oswaldFactor: 0.7600000000000001 } },
      { masses: { ...file.masses, maximumTakeoff: { value: 1.31, unit: 't' } } },
      { configurations: { ...file.configurations, 'takeoff-0b': file.configurations['takeoff-0'] as never } },
    ];
    for (const other of others) seen.add(digest(inline({ ...file, ...other })));
    expect(seen.size).toBe(others.length + 1);
  });

  it('differs between all the aeroplanes', () => {
    expect(new Set(catalogue.list().map((entry) => entry.digest)).size).toBe(ids.length);
  });
});

function configurationsById<T extends object>(configurations: T): T {
  return Object.fromEntries(Object.entries(configurations).sort(([a], [b]) => (a < b ? -1 : 1))) as T;
}
