import type { Configuration, ScheduledSpeed } from '../../performance/aeroplane.ts';
import { manualSpeeds } from '../../performance/flight-manual/manual-speeds.ts';
import type { Question } from '../question.ts';

const scheduled = ['rotation', 'liftOff', 'screen', 'landingReference', 'touchdown'] as const;

/**
 * A configuration flown at the speeds that the flight manual prints for it at this mass; what no table of the manual prints is as
 * stated.
 */
export function atManualSpeeds(
  configuration: Configuration,
  {
    aeroplane,
    configuration: id,
    mass,
    edges = 'use',
  }: Pick<Question, 'aeroplane' | 'configuration' | 'mass' | 'edges'>,
): Configuration {
  const manual = aeroplane.flightManual;
  const found = manual && manualSpeeds(manual, id, mass, edges);
  if (found === undefined || found.outcome !== 'speeds') return configuration;
  const speeds: { [K in (typeof scheduled)[number]]?: ScheduledSpeed } = { ...configuration.speeds };
  // a rotation speed of another schedule may come after the printed lift-off
  if (found.speeds.liftOff !== undefined) delete speeds.rotation;
  for (const name of scheduled) {
    const cas = found.speeds[name];
    if (cas !== undefined) speeds[name] = { kind: 'cas', cas, mass };
  }
  return { ...configuration, speeds };
}
