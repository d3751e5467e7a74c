import type { Reader } from '../contract/reading/reader.ts';
import { readStrictJson } from '../contract/reading/strict-json.ts';
import { type Fault, isRefused, type Refused } from '../planning/fault.ts';

/** One definition on file and what the catalogue keeps of it. */
export interface FiledEntry<Definition extends { readonly id: string } = { readonly id: string }> {
  readonly definition: Definition;
  /** SHA-256 of the definition, hex */
  readonly digest: string;
}

/** What a folder of the catalogue holds, and how its files are read. */
export interface FileKind<Definition extends { readonly id: string }, Entry extends FiledEntry<Definition>> {
  /** one of them in a sentence */
  readonly noun: string;
  readonly read: Reader<Definition>;
  /** faults of its members against each other */
  readonly check: (definition: Definition) => Fault[];
  readonly entry: (definition: Definition) => Entry;
}

/**
 * A file of the catalogue, read as strictly as a definition that comes in a question.
 *
 * @param name - of the file, without the folder
 * @param bytes - of the file
 * @returns what the catalogue keeps of it, or every fault in the file
 */
export function definitionFile<Definition extends { readonly id: string }, Entry extends FiledEntry<Definition>>(
  { noun, read, check, entry }: FileKind<Definition, Entry>,
  name: string,
  bytes: Uint8Array,
): Entry | Refused {
  const json = readStrictJson(bytes);
  if (isRefused(json)) return json;
  const found = read(json.value);
  if (isRefused(found)) {
    const told = new Set(json.slips.map(({ pointer }) => pointer));
    return { refused: [...json.slips, ...found.refused.filter(({ pointer }) => !told.has(pointer))] };
  }
  const faults = [...json.slips, ...checkName(noun, found.value.id, name), ...check(found.value)];
  return faults.length > 0 ? { refused: faults } : entry(found.value);
}

function checkName(noun: string, id: string, name: string): Fault[] {
  if (name === `${id}.json`) return [];
  return [
    {
      pointer: '/id',
      code: 'contradiction',
      message: `The ${noun} ${id} is in a file named ${name}.`,
      received: id,
      hint: `Name the file ${id}.json.`,
    },
  ];
}
