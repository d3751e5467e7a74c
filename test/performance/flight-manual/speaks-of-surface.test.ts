import { describe, expect, it } from 'vitest';
import { speaksOfSurface } from '../../../src/performance/flight-manual/speaks-of-surface.ts';
import type { RunwaySurface } from '../../../src/physics/runway-surface.ts';

const dryGrass: RunwaySurface = { kind: 'grass', state: 'dry' };
const film: RunwaySurface = { kind: 'paved', state: 'contaminated', contaminant: { kind: 'water', depth: 0.002 } };
const slush = (depth?: number): RunwaySurface => ({
  kind: 'paved',
  state: 'contaminated',
  contaminant: depth === undefined ? { kind: 'slush' } : { kind: 'slush', depth },
});

describe('a sheet or a note for one surface', () => {
  it.each<[string, RunwaySurface, RunwaySurface, boolean]>([
    ['speaks of the same', dryGrass, dryGrass, true],
    ['without a length of grass speaks of short', dryGrass, { ...dryGrass, grass: 'short' }, true],
    ['without a length of grass speaks of long', dryGrass, { ...dryGrass, grass: 'long' }, true],
    ['for short grass says nothing of long', { ...dryGrass, grass: 'short' }, { ...dryGrass, grass: 'long' }, false],
    ['for short grass says nothing of grass of unstated length', { ...dryGrass, grass: 'short' }, dryGrass, false],
    ['for long grass speaks of grass of unstated length', { ...dryGrass, grass: 'long' }, dryGrass, true],
    ['dry says nothing of wet', dryGrass, { kind: 'grass', state: 'wet' }, false],
    ['dry says nothing of damp', dryGrass, { kind: 'grass', state: 'damp' }, false],
    ['wet says nothing of dry', { kind: 'paved', state: 'wet' }, { kind: 'paved', state: 'dry' }, false],
    ['wet speaks of damp', { kind: 'paved', state: 'wet' }, { kind: 'paved', state: 'damp' }, true],
    ['wet speaks of a film of water', { kind: 'paved', state: 'wet' }, film, true],
    ['dry says nothing of a film of water', { kind: 'paved', state: 'dry' }, film, false],
    ['of another kind says nothing', { kind: 'gravel', state: 'dry' }, dryGrass, false],
    ['without firmness is firm', dryGrass, { ...dryGrass, firmness: 'firm' }, true],
    ['without firmness says nothing of soft', dryGrass, { ...dryGrass, firmness: 'soft' }, false],
    ['for soft ground speaks of it', { ...dryGrass, firmness: 'soft' }, { ...dryGrass, firmness: 'soft' }, true],
    ['for slush of a depth speaks of less', slush(0.013), slush(0.006), true],
    ['for slush of a depth says nothing of more', slush(0.006), slush(0.013), false],
    ['for slush of a depth says nothing of an unknown one', slush(0.006), slush(), false],
    ['for slush says nothing of a clean runway', slush(), { kind: 'paved', state: 'contaminated' }, false],
  ])('%s', (_, stated, asked, speaks) => {
    expect(speaksOfSurface(stated, asked)).toBe(speaks);
  });
});
