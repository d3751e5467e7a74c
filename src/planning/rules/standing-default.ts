import type { ReferenceKey } from '../../references.ts';
import type { Kind } from '../../units/presentation.ts';

/** A figure taken where a definition has none, with the less favourable end of its plausible range. */
export interface StandingDefault {
  readonly value: number;
  readonly otherEnd: number;
  /** what it is, where it has a unit */
  readonly kind?: Extract<Kind, 'time' | 'angle'>;
  readonly because: string;
  readonly source: ReferenceKey;
}
