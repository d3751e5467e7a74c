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

/** Rolling friction beyond which an aeroplane on wheels is not computed. @see references.HouseFriction */
export const greatestRollingFriction = 0.25;

const friction = (coefficient: number, because: string): Friction => ({
  coefficient,
  because,
  source: 'HouseFriction',
});

const paved = friction(0.03, 'pavement');
const pavedJet = friction(0.02, 'pavement, jet tyres');
const gravel = friction(0.045, 'firm gravel');
const firmDirt = friction(0.04, 'firm dirt');
const mud = friction(0.2, 'soft sand or mud');
const softTurf = friction(0.15, 'soft turf');
const grass = {
  dry: { short: friction(0.055, 'short dry grass'), long: friction(0.1, 'long dry grass') },
  wet: { short: friction(0.08, 'short wet grass'), long: friction(0.12, 'long wet grass') },
};
const compactedSnow = friction(0.04, 'compacted snow');
const ice = friction(0.02, 'ice');

/**
 * Free-rolling friction of a surface: the end of the published range that gives the longer takeoff.
 *
 * Paved 0.03 (jets 0.02), gravel 0.045, firm dirt 0.04, grass dry 0.055 short, 0.10 long, wet 0.08 short, 0.12 long, soft turf
 * 0.15, sand or mud 0.20, compacted snow 0.04, ice 0.02. Damp counts as wet, grass of unstated length as long, wet dirt as mud.
 *
 * @param surface - in plain words
 * @param jet - a jet's high-pressure tyres
 * @returns the coefficient, or 'no-data': flooded surfaces, standing water, slush and loose snow also hold the wheels back by
 * displacement, which no coefficient stands for
 * @see references.PerkinsHage1949; references.McCormick1995, ch. 7; references.GudmundssonGa, table 17-3; references.HouseFriction
 */
export function rollingFriction(surface: RunwaySurface, jet: boolean): Friction | 'no-data' {
  const { kind, state, firmness } = surface;
  if (state === 'flooded') return 'no-data';
  const contaminant = surface.contaminant?.kind;
  if (contaminant !== undefined && contaminant !== 'frost') {
    if (contaminant === 'compacted-snow') return compactedSnow;
    return contaminant === 'ice' || contaminant === 'wet-ice' ? ice : 'no-data';
  }
  if (kind === 'ice') return ice;
  if (kind === 'snow' || (state === 'contaminated' && contaminant === undefined)) return 'no-data';
  const soft = firmness === 'soft';
  const dry = state === 'dry';
  if (kind === 'paved') return jet ? pavedJet : paved;
  if (kind === 'gravel') return soft ? mud : gravel;
  if (kind === 'dirt') return soft || !dry ? mud : firmDirt;
  return soft ? softTurf : grass[dry ? 'dry' : 'wet'][surface.grass ?? 'long'];
}
