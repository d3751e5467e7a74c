import { readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { CatalogueFault } from './catalogue-fault.ts';

/** A definition takes a few kilobytes; this stops a mistaken mount from being read whole. Our choice. */
const largestFile = 2 * 1024 * 1024;

/**
 * Every file of a folder with its bytes, read once, in the order of the names.
 *
 * Names that begin with two dots are left alone: orchestrators keep the versions of a mounted folder under them.
 *
 * @param besides - a folder within that is read by itself
 * @throws CatalogueFault where the folder or a file cannot be read, or holds anything but files
 */
export function folderFiles(folder: string, besides?: string): ReadonlyMap<string, Uint8Array> {
  const names = reading(folder, '', () => readdirSync(folder))
    .filter((name) => !name.startsWith('..') && !(name === besides && isFolder(join(folder, name))))
    .sort();
  return new Map(names.map((name) => [name, fileBytes(folder, name)]));
}

/** Whether there is a folder of this name; a link to one counts. */
export function isFolder(path: string): boolean {
  return statSync(path, { throwIfNoEntry: false })?.isDirectory() === true;
}

function fileBytes(folder: string, name: string): Uint8Array {
  const path = join(folder, name);
  const { size, file } = reading(folder, name, () => {
    const stat = statSync(path);
    return { size: stat.size, file: stat.isFile() };
  });
  if (!file) throw new CatalogueFault(folder, `${name} is not a file`);
  if (size > largestFile) throw new CatalogueFault(folder, `${name} is larger than ${largestFile} bytes`);
  return reading(folder, name, () => readFileSync(path));
}

function reading<T>(folder: string, name: string, read: () => T): T {
  try {
    return read();
  } catch (error) {
    const code = error instanceof Error && 'code' in error ? String(error.code) : 'unknown error';
    throw new CatalogueFault(folder, `${name === '' ? 'the folder' : name} cannot be read (${code})`);
  }
}
