import type { Aeroplane, Configuration, ScheduledSpeed } from '../../performance/aeroplane.ts';
import { configuredStallSpeed } from '../../performance/speeds/configured-stall-speed.ts';

/**
 * A speed of the procedure over the 1-g stall speed of its configuration, at sea level, where calibrated and equivalent are one.
 *
 * @see references.Cfr25s103
 */
export function overStall(
  speed: ScheduledSpeed,
  { wing }: Pick<Aeroplane, 'wing'>,
  { maximumLift }: Pick<Configuration, 'maximumLift'>,
): number {
  if (speed.kind === 'stall-ratio') return speed.ratio;
  return speed.cas / configuredStallSpeed(maximumLift, wing.area, speed.mass);
}

/** Stall speed of a configuration at a mass [kg], CAS [m/s]. */
export function stallAt(
  { wing }: Pick<Aeroplane, 'wing'>,
  { maximumLift }: Pick<Configuration, 'maximumLift'>,
  mass: number,
): number {
  return configuredStallSpeed(maximumLift, wing.area, mass);
}
