import { digest } from '../catalogue/digest.ts';
import type { Catalogue } from '../catalogue/read-catalogue.ts';
import { sha256 } from '../catalogue/sha-256.ts';
import type { CatalogueLookup } from '../contract/catalogue-lookup.ts';

/** The catalogue as the contract's gate asks it. */
export function catalogueLookup({ get, list, aerodromes }: Catalogue): CatalogueLookup {
  return {
    get,
    ids: list().map(({ definition }) => definition.id),
    digestOf: digest,
    digestOfJson: (value) => sha256(JSON.stringify(value)),
    aerodromes: { get: aerodromes.get, ids: aerodromes.list().map(({ definition }) => definition.id) },
  };
}
