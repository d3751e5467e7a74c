import type { FigureStatus } from './figures.ts';

/** A true value, the group it is written as, and the groups beside it. */
export interface RoundedReport {
  readonly id: string;
  readonly truth: number;
  readonly unit: string;
  readonly group: string;
  readonly beside: readonly string[];
  readonly source: string;
  readonly status: FigureStatus;
  readonly title: string;
}

const wmo = 'WMO-No. 306 FM 15 reg. 15.11, 15.12';
const annex3 = 'ICAO Annex 3 Attachment C';
const afman = 'AFMAN 15-111 3.10.2';

function rows(
  unit: string,
  list: readonly (readonly [
    id: string,
    truth: number,
    group: string,
    beside: string[],
    source: string,
    FigureStatus,
  ])[],
): readonly RoundedReport[] {
  return list.map(([id, truth, group, beside, source, status]) => {
    const title = `${id}: ${truth} ${unit} is written ${group}, exactly [${source}; ${status}]`;
    return { id, truth, unit, group, beside, source, status, title };
  });
}

export const roundedTemperatures = rows('degC', [
  ['metar-t-9.0', 9, '09/', ['08/', '10/'], wmo, 'read'],
  ['metar-t--9.0', -9, 'M09/', ['M08/', 'M10/'], wmo, 'read'],
  ['metar-t--0.5', -0.5, 'M00/', ['M01/'], wmo, 'read'],
  ['metar-t-2.5', 2.5, '03/', ['02/', '04/'], wmo, 'computed'],
  ['metar-t--1.5', -1.5, 'M01/', ['M02/', 'M00/'], wmo, 'computed'],
]);

export const roundedSettings = rows('hPa', [
  ['metar-qnh-995.6', 995.6, 'Q0995', ['Q0994', 'Q0996'], wmo, 'read'],
  ['metar-qnh-1009.9', 1009.9, 'Q1009', ['Q1008', 'Q1010'], wmo, 'read'],
  ['metar-qnh-1009.1', 1009.1, 'Q1009', ['Q1008', 'Q1010'], wmo, 'read'],
  ['metar-qnh-1013.25', 1013.25, 'Q1013', ['Q1012', 'Q1014'], wmo, 'read'],
]);

export const cutSettings = rows('inHg', [['usa-altim-trunc', 29.249, 'A2924', ['A2923', 'A2925'], afman, 'read']]);

export const roundedDirections = rows('deg', [
  ['metar-dir-234', 234, '23010KT', ['22010KT', '24010KT'], annex3, 'computed'],
  ['metar-dir-235', 235, '24010KT', ['23010KT', '25010KT'], annex3, 'computed'],
  ['metar-dir-355', 355, '36010KT', ['35010KT'], annex3, 'computed'],
  ['metar-dir-4', 364, '36010KT', ['35010KT'], annex3, 'computed'],
]);

export const calmSpeeds = rows('kt', [['metar-calm', 0.9, '00000KT', ['36001KT'], annex3, 'read']]);
