import type { BandContribution, BandedDistance } from './answer.ts';

/** Standard deviations from the middle to either end of a 90 % band of a normal distribution. */
export const ninetyPerCent = 1.6448536269514722;

/** A linear band says nothing beyond this standard deviation of ln s; it is held there. @see references.Judgement */
export const widest = 1;

/** Standard deviations of ln s, and what they are made of. */
export interface Band {
  readonly groundRoll: number;
  readonly airDistance: number;
  readonly wholeDistance: number;
  readonly contributions: readonly BandContribution[];
}

/** A distance with its 90 % band. */
export function banded(
  value: number,
  deviation: number,
  { method, edge }: Pick<BandedDistance, 'method' | 'edge'>,
): BandedDistance {
  const over = highOver(deviation);
  return { value, low: value / over, high: value * over, method, edge };
}

/** The high end of the band over its middle. */
export function highOver(deviation: number): number {
  return Math.exp(ninetyPerCent * deviation);
}

/** The high end over the middle of what a check is of; 1 where there is no band. */
export function highOverOf(band: Band | undefined, of: string): number {
  if (of === 'obstacleClearance' || of === 'climbGradient') return 1;
  return highOver((of === 'groundRoll' ? band?.groundRoll : band?.wholeDistance) ?? 0);
}
