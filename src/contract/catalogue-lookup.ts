import type { AerodromeLookup } from './aerodrome-lookup.ts';
import type { AeroplaneLookup } from './aeroplane-lookup.ts';

/** What the gate in needs of a catalogue of aeroplanes and aerodromes. */
export interface CatalogueLookup extends AeroplaneLookup {
  readonly aerodromes: AerodromeLookup;
}
