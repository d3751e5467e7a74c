import { contaminantDrag } from '../physics/contaminant-drag.ts';
import { deepContaminant } from '../physics/runway-surface.ts';
import { aeroplanePointer } from './aeroplane-pointer.ts';
import type { Assumption } from './answer.ts';
import type { Question, Surface } from './question.ts';
import { assumedSprayLength } from './rules/contaminated-runway.ts';

/** What a loose contaminant does to wheels that roll through it. */
export type ContaminantRoll =
  | { readonly outcome: 'nothing-in-the-way' }
  | {
      readonly outcome: 'held-back';
      /** over the square of the ground speed [kg/m] */
      readonly perSquare: number;
      readonly assumed: readonly { readonly name: string; readonly assumption: Assumption }[];
    }
  | {
      readonly outcome: 'missing';
      /** pointers of what would be needed */
      readonly pointers: readonly string[];
    };

/**
 * Drag of what the wheels push aside, where the question and the definition hold what it takes.
 *
 * The longer way round: in a takeoff a tyre of unstated deflection pushes with its whole width, and spray of unstated length counts
 * as much as displacement; in a stop neither helps.
 *
 * @param surface - of the runway
 * @see references.Amc25s1591; references.HouseContaminant
 */
export function contaminantRoll(
  { aeroplane: { wheels = {} }, aeroplaneAt }: Pick<Question, 'aeroplane' | 'aeroplaneAt'>,
  surface: Surface,
  phase: 'takeoff' | 'landing',
): ContaminantRoll {
  const deep = deepContaminant(surface);
  if (deep === undefined) return { outcome: 'nothing-in-the-way' };
  const at = (member: string) => aeroplanePointer(aeroplaneAt, `/wheels/${member}`);
  const { tyres, maximumTyreWidth: tyreWidth } = wheels;
  const { kind, depth } = deep;
  if (depth === undefined || tyres === undefined || tyreWidth === undefined) {
    const pointers: string[] = [];
    if (depth === undefined) pointers.push('/runway/surface/contaminant/depth');
    if (tyres === undefined) pointers.push(at('tyres'));
    if (tyreWidth === undefined) pointers.push(at('maximumTyreWidth'));
    return { outcome: 'missing', pointers };
  }
  const isTakeoff = phase === 'takeoff';
  const assumed: { name: string; assumption: Assumption }[] = [];
  if (wheels.tyreDeflection === undefined) {
    const value = isTakeoff ? 'half the width of the tyre' : 'none';
    const because = `not stated; the longer ${phase}`;
    const assumption = { at: at('tyreDeflection'), value, because, source: 'HouseContaminant' } as const;
    assumed.push({ name: 'the deflection of the tyres', assumption });
  }
  if (wheels.sprayLength === undefined) {
    const value = isTakeoff ? 'spray that drags as much as the tyres' : 'no drag of spray';
    const because = `not stated; the longer ${phase}`;
    const assumption = { at: at('sprayLength'), value, because, source: 'HouseContaminant' } as const;
    assumed.push({ name: 'the length that spray wets', assumption });
  }
  const perSquare = contaminantDrag(kind, depth, {
    tyres,
    tyreWidth,
    tyreDeflection: wheels.tyreDeflection ?? (isTakeoff ? tyreWidth / 2 : 0),
    sprayLength: wheels.sprayLength ?? (isTakeoff ? assumedSprayLength : 0),
  });
  return { outcome: 'held-back', perSquare, assumed };
}
