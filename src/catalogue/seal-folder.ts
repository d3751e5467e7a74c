import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { isRefused } from '../planning/fault.ts';
import { aeroplaneFile, type CatalogueEntry } from './aeroplane-file.ts';
import { CatalogueFault } from './catalogue-fault.ts';
import { faultText } from './fault-line.ts';
import { folderFiles } from './folder-files.ts';
import { aeroplaneFileName, manifestName, manifestText } from './manifest.ts';
import { sha256 } from './sha-256.ts';

/** What came of sealing: the aeroplanes, or every fault found, a line each; with a fault nothing is written. */
export type Sealing = { readonly sealed: readonly CatalogueEntry[] } | { readonly faults: readonly string[] };

/**
 * Checks every aeroplane file of a folder and writes the manifest that the service will hold them to.
 *
 * @throws CatalogueFault where the folder cannot be read or written
 */
export function sealFolder(folder: string): Sealing {
  const files = new Map(folderFiles(folder));
  files.delete(manifestName);
  const sealed: CatalogueEntry[] = [];
  const faults: string[] = [];
  for (const [name, bytes] of files) {
    if (!aeroplaneFileName.test(name)) {
      faults.push(new CatalogueFault(folder, `${name} is not named <id>.json; take it out of the folder`).message);
      continue;
    }
    const entry = aeroplaneFile(name, bytes);
    if (!isRefused(entry)) sealed.push(entry);
    else
      faults.push(...entry.refused.map((fault) => new CatalogueFault(folder, `${name}: ${faultText(fault)}`).message));
  }
  if (files.size === 0) faults.push(new CatalogueFault(folder, 'there is no aeroplane in it').message);
  if (faults.length > 0) return { faults };
  writeManifest(folder, manifestText(new Map([...files].map(([name, bytes]) => [name, sha256(bytes)]))));
  return { sealed };
}

function writeManifest(folder: string, text: string): void {
  try {
    writeFileSync(join(folder, manifestName), text);
  } catch (error) {
    const code = error instanceof Error && 'code' in error ? String(error.code) : 'unknown error';
    throw new CatalogueFault(folder, `${manifestName} cannot be written (${code})`);
  }
}
