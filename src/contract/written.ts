import type { Q } from './quantity.ts';

/** A quantity as a sentence names it: the value as given, a space, the unit. */
export function written({ value, unit }: Q): string {
  return `${value} ${unit === 'percent' ? '%' : unit}`;
}

/** A number in a sentence: at most four significant figures, no exponent. */
export function figure(value: number): string {
  return String(Number(value.toPrecision(4)));
}
