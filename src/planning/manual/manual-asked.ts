import type { Configuration } from '../../performance/aeroplane.ts';
import type { Air } from '../../performance/air.ts';
import type { ManualAsked } from '../../performance/flight-manual/manual-figures.ts';
import type { Question } from '../question.ts';
import { dryPavement } from './spoken-ground.ts';

/** What the flight manual is asked of an aeroplane in still air on a level, dry pavement; wind and runway come from who has them. */
export function manualAsked(
  { configuration: id, mass, edges = 'use' }: Pick<Question, 'configuration' | 'mass' | 'edges'>,
  { flap }: Pick<Configuration, 'flap'>,
  { pressureAltitude, temperature, temperatureDeviation }: Air,
): Omit<ManualAsked, 'phase'> {
  return {
    configuration: id,
    flap,
    mass,
    pressureAltitude,
    temperature,
    standardTemperature: temperature - temperatureDeviation,
    headwind: 0,
    creditedHeadwind: 0,
    slope: 0,
    surface: dryPavement,
    edges,
  };
}
