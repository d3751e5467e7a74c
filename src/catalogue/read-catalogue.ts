import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { type AerodromeEntry, aerodromeFiles, aerodromesFolder } from './aerodrome-file.ts';
import { aeroplaneFiles, type CatalogueEntry } from './aeroplane-file.ts';
import { folderFiles, isFolder } from './folder-files.ts';
import { sha256 } from './sha-256.ts';
import { type SealedFolder, type Shelf, shelf } from './shelf.ts';

/** The aeroplanes and aerodromes the service knows by id. Nothing in it touches the disk. */
export interface Catalogue {
  readonly get: (id: string) => CatalogueEntry | undefined;
  /** every aeroplane in the order of the ids */
  readonly list: () => readonly CatalogueEntry[];
  readonly aerodromes: Shelf<AerodromeEntry>;
  /** SHA-256 over the ids and digests of all aeroplanes and aerodromes, hex: one figure for the state of the catalogue */
  readonly digest: string;
  /** how many aeroplanes came with the service, and how many from the operator's folder */
  readonly aeroplanes: Shelf<CatalogueEntry>['count'];
}

/** Where aeroplanes and aerodromes come from. With neither, only what is in the question itself is answered. */
export interface CatalogueSource {
  /** the invented ones that come with the service */
  readonly builtIn: boolean;
  /** the operator's own sealed folder of aeroplanes, which may hold a sealed folder of aerodromes */
  readonly folder?: string;
}

const builtInAeroplanes = { folder: fileURLToPath(new URL('./aeroplanes/', import.meta.url)) };
const builtInAerodromes = { folder: fileURLToPath(new URL('./aerodromes/', import.meta.url)) };

/**
 * Reads every aeroplane and aerodrome once, at start, and believes none that is not as it was sealed.
 *
 * @throws CatalogueFault with one line: what is wrong, in which file, in which folder
 */
export function readCatalogue({ builtIn, folder }: CatalogueSource): Catalogue {
  const own = folder === undefined ? {} : ownFolders(folder);
  const aeroplanes = shelf(aeroplaneFiles, builtIn ? builtInAeroplanes : undefined, own.aeroplanes);
  const aerodromes = shelf(aerodromeFiles, builtIn ? builtInAerodromes : undefined, own.aerodromes);
  const digests = (list: readonly { readonly definition: { readonly id: string }; readonly digest: string }[]) =>
    list.map(({ definition, digest }) => [definition.id, digest]);
  return {
    get: aeroplanes.get,
    list: aeroplanes.list,
    aerodromes,
    digest: sha256(JSON.stringify([digests(aeroplanes.list()), digests(aerodromes.list())])),
    aeroplanes: aeroplanes.count,
  };
}

function ownFolders(folder: string): { readonly aeroplanes?: SealedFolder; readonly aerodromes?: SealedFolder } {
  const within = join(folder, aerodromesFolder);
  if (!isFolder(within)) return { aeroplanes: { folder } };
  const aerodromes = { folder: within };
  if (folderFiles(folder, aerodromesFolder).size === 0) return { aerodromes };
  return { aeroplanes: { folder, besides: aerodromesFolder }, aerodromes };
}
