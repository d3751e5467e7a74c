import type { TakeoffResponse } from '../../src/contract/takeoff-response.ts';
import { evaluate } from './formula.ts';

export type Line = NonNullable<TakeoffResponse['working']>[number];

/** What is wrong with lines that should each follow from those they name, and from no other. */
export function slipsIn(lines: readonly Line[]): string[] {
  const slips: string[] = [];
  const values = new Map<string, number>();
  for (const { symbol, origin, formula, from, value } of lines) {
    if (values.has(symbol)) slips.push(`${symbol} is there twice`);
    const known = new Map<string, number>();
    for (const used of from) {
      const earlier = values.get(used);
      if (earlier === undefined) slips.push(`${symbol} uses ${used}, which is not above it`);
      else known.set(used, earlier);
    }
    const derived = origin === 'formula' || origin === 'equation';
    if (derived !== (formula !== undefined) || (!derived && from.length > 0)) slips.push(`${symbol} is ${origin}`);
    if (formula !== undefined) {
      const [left, right] = origin === 'equation' ? (formula.split('=') as [string, string]) : [formula, symbol];
      const found = evaluate(left, new Map([...known, [symbol, value]]));
      const expected = evaluate(right, new Map([...known, [symbol, value]]));
      if (!isSame(found, expected)) slips.push(`${symbol} is ${value}, and ${formula} gives ${found}`);
      if (origin === 'formula' && new RegExp(`\\b${symbol}\\b`).test(formula)) slips.push(`${symbol} uses itself`);
    }
    values.set(symbol, value);
  }
  return slips;
}

/** Near to 1e-9, as a share of the larger, or of 1e-6 where both are next to nothing. */
function isSame(found: number, value: number): boolean {
  return Math.abs(found - value) <= 1e-9 * Math.max(Math.abs(found), Math.abs(value), 1e-6);
}

/** Lines that do not say where their figure comes from, or say it other than the answer's basis does. */
export function unsaidIn(
  lines: readonly Line[],
  { assumed, sources }: Pick<TakeoffResponse['basis'], 'assumed' | 'sources'>,
): Line[] {
  const said = new Set(assumed.map(({ at }) => at));
  const listed = new Set(sources.map(({ key }) => key));
  return lines.filter(({ origin, at, source }) => {
    const nowhere = (origin === 'given' || origin === 'assumed' ? at : source) === undefined;
    const otherwise = at !== undefined && said.has(at) !== (origin === 'assumed');
    return nowhere || otherwise || (source !== undefined && !listed.has(source));
  });
}
