import { fileURLToPath } from 'node:url';
import { isRefused } from '../planning/fault.ts';
import { aeroplaneFile, type CatalogueEntry } from './aeroplane-file.ts';
import { CatalogueFault } from './catalogue-fault.ts';
import { faultLine } from './fault-line.ts';
import { sealedFiles } from './sealed-files.ts';
import { sha256 } from './sha-256.ts';

/** The aeroplanes the service knows by id. Nothing in it touches the disk. */
export interface Catalogue {
  readonly get: (id: string) => CatalogueEntry | undefined;
  /** every aeroplane in the order of the ids */
  readonly list: () => readonly CatalogueEntry[];
  /** SHA-256 over the ids and digests of all aeroplanes, hex: one figure for the state of the catalogue */
  readonly digest: string;
  /** how many of them came with the service, and how many from the operator's folder */
  readonly aeroplanes: { readonly builtIn: number; readonly own: number };
}

/** Where aeroplanes come from. With neither, only definitions in the question itself are answered. */
export interface CatalogueSource {
  /** the invented aeroplanes that come with the service */
  readonly builtIn: boolean;
  /** the operator's own sealed folder */
  readonly folder?: string;
}

const builtInFolder = fileURLToPath(new URL('./aeroplanes/', import.meta.url));

/**
 * Reads every aeroplane once, at start, and believes none that is not as it was sealed.
 *
 * @throws CatalogueFault with one line: what is wrong, in which file, in which folder
 */
export function readCatalogue({ builtIn, folder }: CatalogueSource): Catalogue {
  const entries = new Map<string, CatalogueEntry>();
  if (builtIn) addAeroplanes(builtInFolder, entries);
  const fromService = entries.size;
  if (folder !== undefined) addAeroplanes(folder, entries);
  const list = [...entries.keys()].sort().map((id) => entries.get(id) as CatalogueEntry);
  return {
    get: (id) => entries.get(id),
    list: () => list,
    digest: sha256(JSON.stringify(list.map(({ definition, digest }) => [definition.id, digest]))),
    aeroplanes: { builtIn: fromService, own: entries.size - fromService },
  };
}

function addAeroplanes(folder: string, entries: Map<string, CatalogueEntry>): void {
  for (const [name, bytes] of sealedFiles(folder)) {
    const entry = aeroplaneFile(name, bytes);
    if (isRefused(entry)) throw new CatalogueFault(folder, `${name}: ${faultLine(entry.refused)}`);
    const { id } = entry.definition;
    if (entries.has(id)) throw new CatalogueFault(folder, `${name}: the id ${id} is one of the built-in aeroplanes`);
    entries.set(id, entry);
  }
}
