/** Seeded choices: the same seed throws the same dice, on every machine. */
export interface Dice {
  /** from 0 up to but not 1 */
  readonly roll: () => number;
  readonly chance: (probability: number) => boolean;
  readonly pick: <T>(list: readonly T[]) => T;
  /** from low to high, even on a logarithmic scale where the two are far apart */
  readonly between: (low: number, high: number) => number;
  /** as between, but one time in eight low itself, in eight high itself, in eight a round number */
  readonly within: (low: number, high: number) => number;
  /** members to spread: those that make returns, or none */
  readonly maybe: (probability: number, make: () => object) => object;
}

/**
 * Dice from a seed: the 32-bit generator mulberry32 of Tommy Ettinger, public domain, whose period of 2^32 is ample here.
 *
 * @param seed - whole number from 0 to 2^32 - 1
 */
export function dice(seed: number): Dice {
  let state = seed >>> 0;
  const roll = () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
  const between = (low: number, high: number) =>
    low > 0 && high / low > 100 ? low * (high / low) ** roll() : low + (high - low) * roll();
  const within = (low: number, high: number) => {
    const way = Math.floor(8 * roll());
    if (way === 0) return low;
    if (way === 1) return high;
    const value = Math.min(high, Math.max(low, between(low, high)));
    if (way > 2) return value;
    const round = Number(value.toPrecision(2));
    return round < low || round > high ? value : round;
  };
  return {
    roll,
    between,
    within,
    chance: (probability) => roll() < probability,
    pick: (list) => list[Math.floor(roll() * list.length)] as (typeof list)[number],
    maybe: (probability, make) => (roll() < probability ? make() : {}),
  };
}
