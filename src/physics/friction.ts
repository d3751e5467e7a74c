import type { ReferenceKey } from '../references.ts';

/** A runway surface in plain words. */
export interface RunwaySurface {
  readonly kind: 'paved' | 'grass' | 'gravel' | 'dirt' | 'snow' | 'ice';
  readonly state: 'dry' | 'damp' | 'wet' | 'flooded' | 'contaminated';
  readonly grass?: 'short' | 'long';
  readonly firmness?: 'firm' | 'soft';
  readonly contaminant?: {
    readonly kind: 'water' | 'slush' | 'wet-snow' | 'dry-snow' | 'compacted-snow' | 'frost' | 'ice' | 'wet-ice';
  };
}

/** A friction coefficient with the reason for it. */
export interface Friction {
  readonly coefficient: number;
  /** the surface as it was read, for a sentence: 'short wet grass' */
  readonly because: string;
  readonly source: ReferenceKey;
}

/** Free-rolling friction of a surface, or 'no-data'. */
export function rollingFriction(surface: RunwaySurface, jet: boolean): Friction | 'no-data' {
  return surface.kind === 'paved' && surface.state === 'dry'
    ? { coefficient: jet ? 0.02 : 0.03, because: 'dry pavement', source: 'Iso2533' }
    : 'no-data';
}
