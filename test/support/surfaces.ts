import fc from 'fast-check';
import type { RunwaySurface } from '../../src/physics/runway-surface.ts';

const kinds = ['paved', 'grass', 'gravel', 'dirt', 'snow', 'ice'] as const;
const states = ['dry', 'damp', 'wet', 'flooded', 'contaminated'] as const;
const contaminants = ['water', 'slush', 'wet-snow', 'dry-snow', 'compacted-snow', 'frost', 'ice', 'wet-ice'] as const;

/** Any surface that can be written, sense or not. */
export const anySurface: fc.Arbitrary<RunwaySurface> = fc.record(
  {
    kind: fc.constantFrom(...kinds),
    state: fc.constantFrom(...states),
    grass: fc.constantFrom('short', 'long'),
    firmness: fc.constantFrom('firm', 'soft'),
    contaminant: fc.record(
      { kind: fc.constantFrom(...contaminants), depth: fc.double({ min: 0, max: 0.2, noNaN: true }) },
      { requiredKeys: ['kind'] },
    ),
  },
  { requiredKeys: ['kind', 'state'] },
) as fc.Arbitrary<RunwaySurface>;
