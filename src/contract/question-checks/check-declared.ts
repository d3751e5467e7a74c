import type { Fault } from '../../planning/fault.ts';
import { si } from '../quantity.ts';
import type { RunwayOnWire } from '../runway.ts';
import { written } from '../written.ts';

export type DeclaredOnWire = NonNullable<RunwayOnWire['declared']>;

/**
 * Declared distances against each other.
 *
 * @param at - pointer to them
 */
export function checkDeclared({ tora, toda, asda }: DeclaredOnWire, at: string): Fault[] {
  if (tora === undefined) return [];
  const faults: Fault[] = [];
  for (const [name, length] of [
    ['toda', toda],
    ['asda', asda],
  ] as const) {
    if (length === undefined || si('length', length) >= si('length', tora) * (1 - 1e-9)) continue;
    faults.push({
      pointer: `${at}/${name}`,
      code: 'contradiction',
      message: `${name.toUpperCase()} ${written(length)} is shorter than TORA ${written(tora)}, of which it is a part.`,
      received: length.value,
      allowed: `at least ${written(tora)}`,
      hint: 'Check the unit and whether the two were exchanged.',
    });
  }
  return faults;
}
