import type { Configuration } from '../../performance/aeroplane.ts';
import type { Air } from '../../performance/air.ts';
import type { FlightManual } from '../../performance/flight-manual/flight-manual.ts';
import { manualDistances } from '../../performance/flight-manual/manual-distances.ts';
import type { ManualFigures, OutsideManual } from '../../performance/flight-manual/manual-figures.ts';
import type { Question } from '../question.ts';
import type { RunwayCondition } from '../runway-condition.ts';
import { manualAsked } from './manual-asked.ts';
import type { Silence } from './silence.ts';
import { dryPavement, spokenGround } from './spoken-ground.ts';

/** The manual's figures for a question. */
export interface ManualReading {
  readonly outcome: 'read';
  readonly manual: FlightManual;
  /** in the wind as given */
  readonly stated: ManualFigures;
  /** in the wind as the rule set credits it, but where the manual's own figures hold that allowance */
  readonly credited: ManualFigures;
  /** of the weather and the runway */
  readonly silences: readonly Silence[];
}

/** What a reading needs beside its question. */
export interface ReadingConditions {
  readonly configuration: Configuration;
  readonly air: Air;
  readonly wind: { readonly headwind: number };
  /** [m/s] */
  readonly creditedHeadwind: number;
  readonly condition: RunwayCondition;
}

/**
 * What the flight manual says of a question.
 *
 * @returns its figures, where it ends, or undefined where it has no sheet for the configuration
 */
export function manualReading(
  manual: FlightManual,
  phase: 'takeoff' | 'landing',
  question: Question,
  { configuration, air, wind, creditedHeadwind, condition }: ReadingConditions,
): ManualReading | OutsideManual | undefined {
  const { runway } = question;
  const ground = spokenGround(runway.surface, condition);
  const asked = {
    ...manualAsked(question, configuration, air),
    phase,
    headwind: wind.headwind,
    creditedHeadwind: wind.headwind,
    slope: runway.slope,
    surface: ground ?? dryPavement,
  };
  const stated = manualDistances(manual, asked);
  if (stated === undefined || stated.outcome === 'outside-flight-manual') return stated;
  const silences: readonly Silence[] = ground === undefined ? [...stated.silent, 'surface'] : stated.silent;
  if (creditedHeadwind === wind.headwind) return { outcome: 'read', manual, stated, credited: stated, silences };
  const credited = manualDistances(manual, { ...asked, creditedHeadwind });
  if (credited === undefined) throw new Error(`${manual.document} has a sheet in one wind and none in another`);
  return credited.outcome === 'outside-flight-manual'
    ? { ...credited, bounds: credited.bounds.map((bound) => ({ ...bound, isCredited: true })) }
    : { outcome: 'read', manual, stated, credited, silences };
}
