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
  Rfc6901: { title: 'RFC 6901, JavaScript Object Notation (JSON) Pointer, 2013', status: 'memory' },
  Rfc8259: { title: 'RFC 8259, The JavaScript Object Notation (JSON) Data Interchange Format, 2017', status: 'memory' },
  Rfc9110: { title: 'RFC 9110, HTTP Semantics, 2022', status: 'memory' },
  Rfc9457: { title: 'RFC 9457, Problem Details for HTTP APIs, 2023', status: 'memory' },
  Iso2533: { title: 'ISO 2533:1975, Standard Atmosphere', status: 'read' },
  Iso2533Add2: {
    title: 'ISO 2533:1975/Add 2:1997, extension of the standard atmosphere to -5000 m',
    status: 'memory',
  },
  Wmo8: { title: 'WMO-No. 8, Guide to Instruments and Methods of Observation, Annex 4.B', status: 'secondary' },
  Cipm2007: {
    title: 'Picard et al., CIPM-2007 formula for the density of moist air, Metrologia 45 (2008)',
    status: 'secondary',
  },
  Cfr25s101: { title: '14 CFR 25.101(b), standard humidity and its table', status: 'read' },
  Amendment25n108: { title: '14 CFR Part 25, Amendment 25-108, 1-g stall speed as the basis (2002)', status: 'memory' },
  Cfr25s103: { title: '14 CFR 25.103, stall speed', status: 'secondary' },
  Cfr1s1: { title: '14 CFR 1.1, definitions (calibrated, equivalent, true airspeed)', status: 'memory' },
  GraceyRp1046: { title: 'Gracey, Measurement of Aircraft Speed and Altitude, NASA RP-1046, 1980', status: 'memory' },
  Phak: { title: "FAA-H-8083-25, Pilot's Handbook of Aeronautical Knowledge", status: 'read' },
  AndersonIntroduction: { title: 'Anderson, Introduction to Flight, 6th edition', status: 'secondary' },
});

export type ReferenceKey = keyof typeof references;
