/** A runway surface in plain words. */
export interface RunwaySurface {
  readonly kind: 'paved' | 'grass' | 'gravel' | 'dirt' | 'snow' | 'ice';
  readonly state: 'dry' | 'damp' | 'wet' | 'flooded' | 'contaminated';
  readonly grass?: 'short' | 'long';
  readonly firmness?: 'firm' | 'soft';
  readonly contaminant?: {
    readonly kind: LooseContaminant | 'compacted-snow' | 'frost' | 'ice' | 'wet-ice';
    /** [m]; absent: not known */
    readonly depth?: number;
  };
}

/** Contaminants which wheels have to push aside. */
export type LooseContaminant = 'water' | 'slush' | 'wet-snow' | 'dry-snow';

/** Depth up to which a loose contaminant counts as a wet runway and holds no wheel back [m]. @see references.Rcam */
export const deepestWet = 0.003;

/** The contaminant as a loose one; undefined for none and for what does not yield to a wheel. */
export function looseContaminant({ contaminant }: RunwaySurface): LooseContaminant | undefined {
  const kind = contaminant?.kind;
  return kind === 'water' || kind === 'slush' || kind === 'wet-snow' || kind === 'dry-snow' ? kind : undefined;
}

/**
 * A surface with a film of a loose contaminant read as a wet one; any other as it is.
 *
 * A film is no deeper than 3 mm; of a depth that nobody stated only water on a runway said to be damp or wet is one.
 *
 * @see references.Rcam; references.Amc25s1591 for the 3 mm
 */
export function filmAsWet(surface: RunwaySurface): RunwaySurface {
  const kind = looseContaminant(surface);
  if (kind === undefined || surface.state === 'flooded') return surface;
  const { contaminant, ...rest } = surface;
  const depth = contaminant?.depth;
  const isSaidWet = kind === 'water' && (rest.state === 'damp' || rest.state === 'wet');
  const isFilm = depth === undefined ? isSaidWet : depth <= deepestWet;
  return isFilm ? { ...rest, state: 'wet' } : surface;
}

/** What wheels push aside on a surface, and how deep it lies [m], undefined where not known. */
export interface DeepContaminant {
  readonly kind: LooseContaminant;
  readonly depth: number | undefined;
}

/**
 * The loose contaminant that lies deeper on a surface than a film: water where it is flooded and nothing else is said.
 *
 * @returns undefined where there is none
 */
export function deepContaminant(surface: RunwaySurface): DeepContaminant | undefined {
  const read = filmAsWet(surface);
  const kind = looseContaminant(read);
  if (kind !== undefined) return { kind, depth: read.contaminant?.depth };
  return read.state === 'flooded' ? { kind: 'water', depth: undefined } : undefined;
}
