import type { z } from 'zod';
import type { BandedDistance } from '../planning/answer.ts';
import { shown, unitFor } from '../units/presentation.ts';
import type { bandedDistance } from './distances.ts';
import type { Draft } from './present.ts';
import type { Presentation } from './shown-quantity.ts';

/** A distance rounded up, the lower end of its band down. */
export function toBandedDistance(
  { units, rounding }: Presentation,
  { value, low, high, method, edge }: BandedDistance,
) {
  const distance: Draft<z.infer<typeof bandedDistance>> = {
    value: shown(units, 'distance', value, 'up', rounding),
    unit: unitFor(units, 'distance') as 'm' | 'ft',
    low: shown(units, 'distance', low, 'down', rounding),
    high: shown(units, 'distance', high, 'up', rounding),
    method,
  };
  if (edge !== undefined) distance.edge = edge;
  return distance;
}
