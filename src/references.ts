/**
 * The bibliography. A number in the house points here by key, so a wrong key does not compile.
 *
 * status: 'read' = the text was seen; 'secondary' = seen as quoted elsewhere; 'memory' = not confirmed; 'derived' = worked
 * out by us; 'judgement' = our choice.
 */
export type SourceStatus = 'read' | 'secondary' | 'memory' | 'derived' | 'judgement';

export interface Reference {
  readonly title: string;
  readonly status: SourceStatus;
}

function entries<K extends string>(list: Record<K, Reference>): Readonly<Record<K, Reference>> {
  return list;
}

export const references = entries({
  SI9: { title: 'BIPM, The International System of Units, 9th edition, 2019', status: 'memory' },
  Icao5: { title: 'ICAO Annex 5, Units of Measurement to be Used in Air and Ground Operations', status: 'memory' },
  Iso2533: { title: 'ISO 2533:1975, Standard Atmosphere', status: 'read' },
});

export type ReferenceKey = keyof typeof references;
