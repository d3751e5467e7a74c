import { deepContaminant, filmAsWet, looseContaminant, type RunwaySurface } from './runway-surface.ts';

/** 6 dry, 5 good, 4 good to medium, 3 medium, 2 medium to poor, 1 poor, 0 less than poor. */
export type RunwayConditionCode = 0 | 1 | 2 | 3 | 4 | 5 | 6;

/** A code with the line of the matrix that it stands in. */
export interface DescribedCode {
  readonly code: RunwayConditionCode;
  readonly because: string;
}

/** Temperature of the air up to which compacted snow holds better [K]. */
const coldSnow = 273.15 - 15;

const described = (code: RunwayConditionCode, because: string): DescribedCode => ({ code, because });
const dry = described(6, 'dry pavement');
const wet = described(5, 'wet pavement, or frost or no more than 3 mm of water, slush or snow on it');
const coldCompacted = described(4, 'compacted snow at -15 °C or colder');
const warmCompacted = described(3, 'compacted snow warmer than -15 °C');
const snow = described(3, 'more than 3 mm of snow, or snow on compacted snow');
const water = described(2, 'more than 3 mm of water or slush');
const ice = described(1, 'ice');
const wetIce = described(0, 'wet ice, water on compacted snow, or snow on ice');

/**
 * Runway condition code of what lies on a surface.
 *
 * Dry 6; frost, wet and films 5; compacted snow at -15 °C or colder 4, warmer 3; more than 3 mm of snow, or snow on compacted snow,
 * 3; more than 3 mm of water or slush 2; ice 1; wet ice, water on compacted snow and snow on ice 0. A depth or temperature that is
 * not known counts as the poorer.
 *
 * @param surface - in plain words; of ground that is not paved the matrix speaks only once snow, ice or water covers it
 * @param temperature - of the air [K], where known
 * @returns the code, or 'no-data': bare ground that is not paved, and contaminated by nobody says what
 * @remarks Slippery when wet, which a report may name, is no state of a surface here: its code 3 has to be given.
 * @see references.Rcam
 */
export function runwayConditionCode(surface: RunwaySurface, temperature?: number): DescribedCode | 'no-data' {
  const { kind, state } = surface;
  const contaminant = surface.contaminant?.kind;
  const isUnderWater = state === 'damp' || state === 'wet' || state === 'flooded';
  const isUnnamed = state === 'contaminated' && contaminant === undefined;
  if (isUnnamed) return 'no-data';
  if (contaminant === 'wet-ice') return wetIce;
  if (kind === 'ice' && contaminant !== undefined && contaminant !== 'ice' && contaminant !== 'frost') return wetIce;
  if (kind === 'ice' || contaminant === 'ice') return isUnderWater ? wetIce : ice;
  if (kind === 'snow' || contaminant === 'compacted-snow') return snowCode(surface, isUnderWater, temperature);
  const deep = deepContaminant(surface)?.kind;
  if (deep !== undefined) return deep === 'water' || deep === 'slush' ? water : snow;
  if (kind !== 'paved') return 'no-data';
  return filmAsWet(surface).state === 'dry' && contaminant === undefined ? dry : wet;
}

function snowCode(surface: RunwaySurface, isUnderWater: boolean, temperature: number | undefined): DescribedCode {
  const loose = looseContaminant(surface);
  if (isUnderWater || loose === 'water' || loose === 'slush') return wetIce;
  if (surface.contaminant?.kind !== 'compacted-snow') return snow;
  return temperature !== undefined && temperature <= coldSnow ? coldCompacted : warmCompacted;
}
