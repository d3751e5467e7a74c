import type { Factor } from '../../answer.ts';
import { isJet } from '../named-aeroplanes.ts';
import { dryPavement, wetPavement } from '../named-surfaces.ts';
import type { SurfaceRule } from '../rule-set.ts';

/** Surfaces of rules that have a factor on wet runways for turbojets and none for other aeroplanes; damp counts as wet. */
export function jetWetSurfaces(wet: Omit<Factor, 'code'>): readonly SurfaceRule[] {
  return [
    { when: 'dry pavement', holds: dryPavement, factors: [] },
    {
      when: 'wet or damp pavement, turbojet',
      holds: (asked) => isJet(asked.aeroplane) && wetPavement(asked),
      factors: [{ code: 'surface', ...wet }],
    },
    { when: 'wet or damp pavement, any other aeroplane: no factor', holds: wetPavement, factors: [] },
  ];
}
