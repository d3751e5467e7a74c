import { type SlopeProfile, slopeProfile } from '../performance/slope-profile.ts';
import { toSi } from '../units/units.ts';
import { si } from './quantity.ts';
import type { RunwayOnWire } from './runway.ts';
import type { ProfileOnWire } from './slope.ts';

/** A ground line as surveyed, in SI. */
export interface GroundLine {
  /** [m], rising */
  readonly distances: readonly number[];
  /** [m] */
  readonly heights: readonly number[];
}

/** The ground line in SI, as it is given. */
export function toGroundLine({ units: [along, up], points }: ProfileOnWire): GroundLine {
  return {
    distances: points.map(([distance]) => toSi('length', distance, along)),
    heights: points.map(([, height]) => toSi('length', height, up)),
  };
}

/** How far along the declared distances the start point is [m]: a named point is where its own begin. */
export function startAlong({ start }: Pick<RunwayOnWire, 'start'>): number {
  return typeof start === 'object' && 'offset' in start ? si('length', start.offset) : 0;
}

/** The stretches of a ground line from the start point on. */
export function toSlopeProfile(given: ProfileOnWire, start: number): SlopeProfile {
  const { distances, heights } = toGroundLine(given);
  return slopeProfile(distances, heights, start);
}
