import type { ReferenceKey } from '../references.ts';
import type { Propulsion } from './aeroplane.ts';

/** A figure the definition left out and the thrust needs. */
export interface PropulsionDefault {
  /** the member of the definition's propulsion that would state it */
  readonly member: string;
  /** in SI as in the definition */
  readonly value: number;
  /** the other end of the plausible range: put it in the member to see what the default is worth */
  readonly otherEnd: number;
  readonly because: string;
  readonly source: ReferenceKey;
}

/** What is taken for the figures that a definition leaves out, in the order of its members. */
export function propulsionDefaults(propulsion: Propulsion): readonly PropulsionDefault[] {
  return propulsion.kind === 'measured' ? [] : [];
}
