import { writeFileSync } from 'node:fs';
import { basename, join, resolve } from 'node:path';
import { isRefused } from '../planning/fault.ts';
import { aerodromeFiles, aerodromesFolder } from './aerodrome-file.ts';
import { aeroplaneFiles } from './aeroplane-file.ts';
import { CatalogueFault } from './catalogue-fault.ts';
import { definitionFile, type FiledEntry, type FileKind } from './definition-file.ts';
import { faultText } from './fault-line.ts';
import { folderFiles, isFolder } from './folder-files.ts';
import { definitionFileName, manifestName, manifestText } from './manifest.ts';
import { sha256 } from './sha-256.ts';

/** What came of sealing: what is on file now, or every fault found, a line each; with a fault nothing is written. */
export type Sealing = { readonly sealed: readonly FiledEntry[] } | { readonly faults: readonly string[] };

/** A folder that was checked, and the manifest that seals it. */
interface Checked {
  readonly folder: string;
  readonly entries: FiledEntry[];
  readonly faults: string[];
  readonly manifest: string;
}

/**
 * Checks every file of a folder of aeroplanes, and of the folder of aerodromes within it, and writes the manifests that the
 * service will hold them to. A folder named aerodromes is taken by itself.
 *
 * @throws CatalogueFault where a folder cannot be read or written
 */
export function sealFolder(folder: string): Sealing {
  const checked = foldersWithin(folder);
  const faults = checked.flatMap((one) => one.faults);
  if (faults.length > 0) return { faults };
  for (const one of checked) writeManifest(one.folder, one.manifest);
  return { sealed: checked.flatMap(({ entries }) => entries) };
}

function foldersWithin(folder: string): Checked[] {
  if (basename(resolve(folder)) === aerodromesFolder) return [checkedFolder(aerodromeFiles, folder)];
  const within = join(folder, aerodromesFolder);
  if (!isFolder(within)) return [checkedFolder(aeroplaneFiles, folder)];
  const aerodromes = checkedFolder(aerodromeFiles, within);
  if (folderFiles(folder, aerodromesFolder).size === 0) return [aerodromes];
  return [checkedFolder(aeroplaneFiles, folder, aerodromesFolder), aerodromes];
}

function checkedFolder<Definition extends { readonly id: string }, Entry extends FiledEntry<Definition>>(
  kind: FileKind<Definition, Entry>,
  folder: string,
  besides?: string,
): Checked {
  const files = new Map(folderFiles(folder, besides));
  files.delete(manifestName);
  const entries: FiledEntry[] = [];
  const faults: string[] = [];
  for (const [name, bytes] of files) {
    if (!definitionFileName.test(name)) {
      faults.push(new CatalogueFault(folder, `${name} is not named <id>.json; take it out of the folder`).message);
      continue;
    }
    const entry = definitionFile(kind, name, bytes);
    if (!isRefused(entry)) entries.push(entry);
    else
      faults.push(...entry.refused.map((fault) => new CatalogueFault(folder, `${name}: ${faultText(fault)}`).message));
  }
  if (files.size === 0) faults.push(new CatalogueFault(folder, `there is no ${kind.noun} in it`).message);
  const manifest = manifestText(new Map([...files].map(([name, bytes]) => [name, sha256(bytes)])));
  return { folder, entries, faults, manifest };
}

function writeManifest(folder: string, text: string): void {
  try {
    writeFileSync(join(folder, manifestName), text);
  } catch (error) {
    const code = error instanceof Error && 'code' in error ? String(error.code) : 'unknown error';
    throw new CatalogueFault(folder, `${manifestName} cannot be written (${code})`);
  }
}
