import { isRefused } from '../planning/fault.ts';
import { CatalogueFault } from './catalogue-fault.ts';
import { definitionFile, type FiledEntry, type FileKind } from './definition-file.ts';
import { faultLine } from './fault-line.ts';
import { sealedFiles } from './sealed-files.ts';

/** What the service knows by id of one kind. Nothing in it touches the disk. */
export interface Shelf<Entry> {
  readonly get: (id: string) => Entry | undefined;
  /** all of them in the order of the ids */
  readonly list: () => readonly Entry[];
  /** how many came with the service, and how many from the operator's folder */
  readonly count: { readonly builtIn: number; readonly own: number };
}

/** A sealed folder of one kind. */
export interface SealedFolder {
  readonly folder: string;
  /** a folder within that is read by itself */
  readonly besides?: string;
}

/**
 * Reads sealed folders of one kind, the service's own first; no id may be on file twice.
 *
 * @throws CatalogueFault with one line: what is wrong, in which file, in which folder
 */
export function shelf<Definition extends { readonly id: string }, Entry extends FiledEntry<Definition>>(
  kind: FileKind<Definition, Entry>,
  builtIn: SealedFolder | undefined,
  own: SealedFolder | undefined,
): Shelf<Entry> {
  const entries = new Map<string, Entry>();
  if (builtIn !== undefined) addFiles(kind, builtIn, entries);
  const fromService = entries.size;
  if (own !== undefined) addFiles(kind, own, entries);
  const list = [...entries.keys()].sort().map((id) => entries.get(id) as Entry);
  return {
    get: (id) => entries.get(id),
    list: () => list,
    count: { builtIn: fromService, own: entries.size - fromService },
  };
}

function addFiles<Definition extends { readonly id: string }, Entry extends FiledEntry<Definition>>(
  kind: FileKind<Definition, Entry>,
  { folder, besides }: SealedFolder,
  entries: Map<string, Entry>,
): void {
  for (const [name, bytes] of sealedFiles(folder, kind.noun, besides)) {
    const entry = definitionFile(kind, name, bytes);
    if (isRefused(entry)) throw new CatalogueFault(folder, `${name}: ${faultLine(entry.refused)}`);
    const { id } = entry.definition;
    if (entries.has(id)) {
      throw new CatalogueFault(folder, `${name}: the id ${id} is one of the built-in ${kind.noun}s`);
    }
    entries.set(id, entry);
  }
}
