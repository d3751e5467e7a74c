import type { Air } from '../../performance/air.ts';
import { manualClimb } from '../../performance/flight-manual/manual-climb.ts';
import type { ManualBound } from '../../performance/flight-manual/manual-figures.ts';
import { manualSpeeds } from '../../performance/flight-manual/manual-speeds.ts';
import type { Question } from '../question.ts';
import { manualAsked } from './manual-asked.ts';

/** Where the speeds and the climb of the flight manual end: an edge that stands for what lies beyond, or no figure at all. */
export interface BoundsBeside {
  readonly of: 'speeds' | 'climb';
  /** whether the edge is taken; else the figures are not the manual's */
  readonly isEdge: boolean;
  readonly bounds: readonly ManualBound[];
}

/** Where what the manual prints beside its distances does not reach the question. */
export function boundsBeside(question: Question, air: Air): readonly BoundsBeside[] {
  const { aeroplane, configuration: id, mass, edges } = question;
  const manual = aeroplane.flightManual;
  const configuration = aeroplane.configurations[id];
  if (manual === undefined || configuration === undefined) return [];
  const speeds = manualSpeeds(manual, id, mass, edges);
  // a changed aeroplane climbs by physics, whatever the manual of the one on file prints
  const climb =
    question.changes?.flewAs === undefined ? manualClimb(manual, manualAsked(question, configuration, air)) : undefined;
  const found: BoundsBeside[] = [];
  for (const [of, one] of [
    ['speeds', speeds],
    ['climb', climb],
  ] as const) {
    if (one === undefined) continue;
    const isEdge = one.outcome !== 'outside-flight-manual';
    const bounds = isEdge ? one.edges : one.bounds;
    if (bounds.length > 0) found.push({ of, isEdge, bounds });
  }
  return found;
}
