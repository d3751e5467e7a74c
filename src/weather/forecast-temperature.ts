import type { ForecastExtreme } from './forecast.ts';
import type { HourTemperature } from './hours.ts';
import type { Instant } from './instant.ts';

/** An extreme of temperature at its moment. */
export interface MomentOfExtreme extends Omit<ForecastExtreme, 'at'> {
  readonly at: Instant;
}

/**
 * Temperature at a moment between a highest and a lowest that follow each other.
 *
 * T = (T1 + T2)/2 + (T1 - T2)/2 cos(pi x), x = the share of the time between them that is past: level at both, as extremes are.
 * Its bounds are the two extremes with what they round, since between them the temperature stays between them.
 *
 * @param extremes - temperatures [K] at their moments, in any order
 * @param at - moment [s]
 * @returns [K]; undefined before the first, after the last, and between two of a kind, where an extreme is not told
 * @see references.Judgement
 */
export function forecastTemperature(extremes: readonly MomentOfExtreme[], at: Instant): HourTemperature | undefined {
  const ordered = [...extremes].sort((one, other) => one.at - other.at);
  const same = ordered.find((one) => one.at === at);
  if (same !== undefined) return { ...same.temperature, because: 'between-extremes' };
  const after = ordered.findIndex((one) => one.at > at);
  const [before, next] = [ordered[after - 1], ordered[after]];
  if (before === undefined || next === undefined || before.kind === next.kind) return undefined;
  const [first, second] = [before.temperature, next.temperature];
  const share = (at - before.at) / (next.at - before.at);
  return {
    value: (first.value + second.value) / 2 + ((first.value - second.value) / 2) * Math.cos(Math.PI * share),
    low: Math.min(first.low, second.low),
    high: Math.max(first.high, second.high),
    because: 'between-extremes',
  };
}
