import type { ReferenceKey } from '../references.ts';
import { deepContaminant, filmAsWet, type RunwaySurface } from './runway-surface.ts';

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
const looseSnow = friction(0.15, 'loose snow');
const ice = friction(0.02, 'ice');
/** Depth of loose snow up to which the published friction goes [m]. @see references.HouseFriction */
const deepestSnow = 0.1;

/**
 * Free-rolling friction of a surface: the end of the published range that gives the longer takeoff.
 *
 * Paved 0.03 (jets 0.02), gravel 0.045, firm dirt 0.04, grass dry 0.055 short, 0.10 long, wet 0.08 short, 0.12 long, soft turf
 * 0.15, sand or mud 0.20, compacted snow 0.04, ice 0.02. Damp counts as wet, grass of unstated length as long, wet dirt as mud, no
 * more than 3 mm of a loose contaminant as wet. Under a deeper one, for whoever adds its drag: loose snow 0.15 up to 10 cm, water and
 * slush the wet ground beneath.
 *
 * @param surface - in plain words
 * @param jet - a jet's high-pressure tyres
 * @param displacement - 'added' where the caller adds the drag of what the wheels push aside
 * @returns the coefficient, or 'no-data': unless that drag is added flooded surfaces, standing water, slush and loose snow, since no
 * coefficient stands for it; loose snow deeper than 10 cm or of unknown depth; contaminated by nobody says what
 * @see references.PerkinsHage1949; references.McCormick1995, ch. 7; references.GudmundssonGa, table 17-3; references.HouseFriction
 */
export function rollingFriction(
  surface: RunwaySurface,
  jet: boolean,
  displacement: 'added' | 'not-added' = 'not-added',
): Friction | 'no-data' {
  const read = filmAsWet(surface);
  const deep = deepContaminant(read);
  if (deep === undefined) return restingFriction(read, jet);
  if (displacement === 'not-added') return 'no-data';
  if (deep.kind === 'wet-snow' || deep.kind === 'dry-snow') {
    return deep.depth !== undefined && deep.depth <= deepestSnow ? looseSnow : 'no-data';
  }
  const { contaminant: _, ...beneath } = read;
  return restingFriction({ ...beneath, state: 'wet' }, jet);
}

/** Friction of a surface on which nothing lies that yields to a wheel. */
function restingFriction({ kind, state, firmness, contaminant, grass: length }: RunwaySurface, jet: boolean) {
  if (contaminant?.kind === 'compacted-snow') return compactedSnow;
  if (kind === 'ice' || contaminant?.kind === 'ice' || contaminant?.kind === 'wet-ice') return ice;
  if (kind === 'snow' || (state === 'contaminated' && contaminant === undefined)) return 'no-data';
  const soft = firmness === 'soft';
  const dry = state === 'dry';
  if (kind === 'paved') return jet ? pavedJet : paved;
  if (kind === 'gravel') return soft ? mud : gravel;
  if (kind === 'dirt') return soft || !dry ? mud : firmDirt;
  return soft ? softTurf : grass[dry ? 'dry' : 'wet'][length ?? 'long'];
}
