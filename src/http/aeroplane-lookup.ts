import { digest } from '../catalogue/digest.ts';
import type { Catalogue } from '../catalogue/read-catalogue.ts';
import type { AeroplaneLookup } from '../contract/aeroplane-lookup.ts';

/** The catalogue as the contract's gate asks it. */
export function aeroplaneLookup(catalogue: Catalogue): AeroplaneLookup {
  return {
    get: catalogue.get,
    ids: catalogue.list().map(({ definition }) => definition.id),
    digestOf: digest,
  };
}
