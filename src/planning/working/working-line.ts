import type { ReferenceKey } from '../../references.ts';
import type { Direction, Kind } from '../../units/presentation.ts';

/** Units of the working: SI throughout, so that each formula holds as it stands. */
export const workingUnits = [
  'm',
  'm2',
  'm/s',
  'm/s2',
  'kg',
  'kg/m',
  'kg/m3',
  'K',
  'K/m',
  'Pa',
  'J/(kg K)',
  'N',
  'W',
  's',
  'rad',
] as const;
export type WorkingUnit = (typeof workingUnits)[number];

/** The parts of a working, in the order of the work. */
export const workingParts = [
  'constants',
  'air',
  'wind',
  'speeds',
  'thrust',
  'ground',
  'flight',
  'flight-manual',
  'checks',
] as const;
export type WorkingPart = (typeof workingParts)[number];

/**
 * Where the value of a line comes from: 'given' by the question or the aeroplane, 'assumed' because it is not, 'constant' of
 * nature or of a standard, 'decided' by a rule, 'formula' from other lines, 'equation' that the value solves, 'table' or 'integral'
 * that no formula replaces.
 */
export const workingOrigins = [
  'given',
  'assumed',
  'constant',
  'decided',
  'formula',
  'equation',
  'table',
  'integral',
] as const;
export type WorkingOrigin = (typeof workingOrigins)[number];

/** How the answer writes the number of a line. */
export interface ShownAs {
  readonly kind: Kind;
  readonly direction: Direction;
}

/** One line of the working, in SI, unrounded. */
export interface WorkingLine {
  readonly part: WorkingPart;
  /** letters, digits and underscores */
  readonly symbol: string;
  readonly name: string;
  readonly value: number;
  /** absent where the number has none */
  readonly unit?: WorkingUnit | undefined;
  readonly origin: WorkingOrigin;
  /** in the symbols of earlier lines; of an equation both sides, with the line's own symbol */
  readonly formula?: string | undefined;
  /** the symbols it uses, in the order of their first use */
  readonly from: readonly string[];
  /** pointer to where the question states it, or could */
  readonly at?: string | undefined;
  readonly source?: ReferenceKey | undefined;
  /** where it is a number of the answer */
  readonly shownAs?: ShownAs | undefined;
}
