import type { AeroplaneDefinition } from '../contract/aeroplane-definition.ts';
import { checkAeroplane } from '../contract/check-aeroplane.ts';
import { readDefinition } from '../contract/read-definition.ts';
import { readStrictJson } from '../contract/reading/strict-json.ts';
import { toAeroplane } from '../contract/to-aeroplane.ts';
import type { Aeroplane } from '../performance/aeroplane.ts';
import { type Fault, isRefused, type Refused } from '../planning/fault.ts';
import { digest } from './digest.ts';

/** One aeroplane of the catalogue. */
export interface CatalogueEntry {
  readonly definition: AeroplaneDefinition;
  /** the same in SI */
  readonly aeroplane: Aeroplane;
  /** SHA-256 of the definition, hex */
  readonly digest: string;
}

/**
 * An aeroplane file, read as strictly as a definition that comes in a question.
 *
 * @param name - of the file, without the folder
 * @param bytes - of the file
 * @returns the aeroplane, or every fault in the file
 */
export function aeroplaneFile(name: string, bytes: Uint8Array): CatalogueEntry | Refused {
  const json = readStrictJson(bytes);
  if (isRefused(json)) return json;
  const read = readDefinition(json.value);
  if (isRefused(read)) {
    const told = new Set(json.slips.map(({ pointer }) => pointer));
    return { refused: [...json.slips, ...read.refused.filter(({ pointer }) => !told.has(pointer))] };
  }
  const definition = read.value;
  const faults = [...json.slips, ...checkName(definition, name), ...checkAeroplane(definition, '')];
  if (faults.length > 0) return { refused: faults };
  return { definition, aeroplane: toAeroplane(definition), digest: digest(definition) };
}

function checkName({ id }: AeroplaneDefinition, name: string): Fault[] {
  if (name === `${id}.json`) return [];
  return [
    {
      pointer: '/id',
      code: 'contradiction',
      message: `The aeroplane ${id} is in a file named ${name}.`,
      received: id,
      hint: `Name the file ${id}.json.`,
    },
  ];
}
