import { CatalogueFault } from './catalogue-fault.ts';
import { folderFiles } from './folder-files.ts';
import { manifestName, readManifest } from './manifest.ts';
import { sha256 } from './sha-256.ts';

/**
 * The files of a sealed folder, each as the manifest says it is: none missing, none besides, no byte changed.
 *
 * @param noun - what each file holds
 * @param besides - a folder within that is sealed by itself
 * @returns bytes by file name, without the manifest
 * @throws CatalogueFault at the first difference
 */
export function sealedFiles(folder: string, noun: string, besides?: string): ReadonlyMap<string, Uint8Array> {
  const files = new Map(folderFiles(folder, besides));
  const seal = files.get(manifestName);
  if (seal === undefined) throw new CatalogueFault(folder, `there is no ${manifestName}; seal the folder first`);
  files.delete(manifestName);
  const digests = readManifest(Buffer.from(seal).toString('latin1'));
  if (digests === undefined) throw new CatalogueFault(folder, `${manifestName} is not as sealing wrote it`);
  for (const name of digests.keys()) {
    if (!files.has(name)) throw new CatalogueFault(folder, `${name} is missing`);
  }
  for (const [name, bytes] of files) {
    const digest = digests.get(name);
    if (digest === undefined) throw new CatalogueFault(folder, `${name} is not in ${manifestName}`);
    const found = sha256(bytes);
    if (found !== digest) {
      throw new CatalogueFault(
        folder,
        `${name} is not the file that was sealed: SHA-256 ${found}, sealed as ${digest}`,
      );
    }
  }
  if (files.size === 0) throw new CatalogueFault(folder, `there is no ${noun} in it`);
  return files;
}
