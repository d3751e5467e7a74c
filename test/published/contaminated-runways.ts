import { figures } from './figures.ts';

const horne = {
  section: 'speed formula 9 sqrt(p)',
  quantity: 'dynamic hydroplaning onset speed',
  unit: 'kt',
} as const;

/** Onset of hydroplaning of a rolling tyre. */
export const hydroplaningSpeeds = [
  ...figures(
    { ...horne, source: 'NASA TN D-2056 (Horne & Dreher, 1963); AC 25-31 Table 2 note 2', status: 'computed' },
    [
      { id: 'hydro-30', inputs: { tyre_psi: 30 }, expected: 49.3, tolerance: 0.01 },
      { id: 'hydro-50', inputs: { tyre_psi: 50 }, expected: 63.64, tolerance: 0.01 },
      { id: 'hydro-100', inputs: { tyre_psi: 100 }, expected: 90.0, tolerance: 0.01 },
      { id: 'hydro-150', inputs: { tyre_psi: 150 }, expected: 110.23, tolerance: 0.01 },
    ],
  ),
  ...figures({ ...horne, source: "Pilot's Handbook of Aeronautical Knowledge, ch. 11", status: 'secondary' }, [
    { id: 'hydro-phak-36', inputs: { tyre_psi: 36 }, expected: 54, tolerance: 0.5 },
  ]),
];

const table2 = {
  source: 'FAA AC 25-31 Table 2 / AC 25-32 Table 2 (22 Dec 2015)',
  section: 'Table 2',
  status: 'secondary',
  quantity: 'wheel braking coefficient, fully modulating anti-skid',
  unit: '1',
} as const;

/** Wheel braking by runway condition code, fully modulating anti-skid. */
export const codeFour = figures(table2, [
  { id: 'mu-rwycc-4', inputs: { rwycc: 4, what: 'compacted snow at or below -15 C' }, expected: 0.2, tolerance: 0 },
]);
export const codeThree = figures(table2, [
  { id: 'mu-rwycc-3', inputs: { rwycc: 3, what: 'slippery wet; over 3 mm of snow' }, expected: 0.16, tolerance: 0 },
]);
export const codeTwoHydroplaning = figures(table2, [
  {
    id: 'mu-rwycc-2-hydro',
    inputs: { rwycc: 2, what: 'over 3 mm of water or slush, ground speed at or above 85 % of hydroplaning' },
    expected: 0.05,
    tolerance: 0,
  },
]);
export const codeTwoCap = figures(table2, [
  {
    id: 'mu-rwycc-2-cap',
    inputs: { rwycc: 2, what: 'the same below 85 %: at most this and 50 % of the wet figure' },
    expected: 0.16,
    tolerance: 0,
  },
]);
export const codeOne = figures(table2, [
  { id: 'mu-rwycc-1', inputs: { rwycc: 1, what: 'ice' }, expected: 0.08, tolerance: 0 },
]);

/** What another anti-skid system makes of these figures. */
export const antiSkidScales = figures(
  {
    source: 'AC 25-31 Table 2 note',
    section: 'note',
    status: 'secondary',
    quantity: 'multiplier of the wheel braking coefficient',
    unit: '1',
  },
  [
    { id: 'mu-antiskid-quasi', inputs: { antiSkid: 'quasi-modulating' } as const, expected: 0.625, tolerance: 0 },
    { id: 'mu-antiskid-onoff', inputs: { antiSkid: 'on-off' } as const, expected: 0.375, tolerance: 0 },
  ],
);

const matrix = {
  source: 'runway condition assessment matrix, AIM',
  section: 'matrix',
  status: 'secondary',
  quantity: 'runway condition code',
  unit: '1',
} as const;

/** Codes of the matrix: what lies on a paved runway, its depth and the temperature of the air. */
export const matrixCodes = figures<{
  readonly state: 'dry' | 'damp' | 'wet' | 'flooded' | 'contaminated';
  readonly on?: 'compacted-snow' | 'ice';
  readonly contaminant?: 'water' | 'slush' | 'wet-snow' | 'dry-snow' | 'compacted-snow' | 'frost' | 'ice' | 'wet-ice';
  readonly depth_mm?: number;
  readonly temperature_C?: number;
}>(matrix, [
  { id: 'dry', inputs: { state: 'dry' }, expected: 6, tolerance: 0 },
  { id: 'frost', inputs: { state: 'contaminated', contaminant: 'frost' }, expected: 5, tolerance: 0 },
  { id: 'damp', inputs: { state: 'damp' }, expected: 5, tolerance: 0 },
  { id: 'wet', inputs: { state: 'wet' }, expected: 5, tolerance: 0 },
  { id: 'water-3', inputs: { state: 'wet', contaminant: 'water', depth_mm: 3 }, expected: 5, tolerance: 0 },
  { id: 'slush-3', inputs: { state: 'contaminated', contaminant: 'slush', depth_mm: 3 }, expected: 5, tolerance: 0 },
  {
    id: 'dry-snow-3',
    inputs: { state: 'contaminated', contaminant: 'dry-snow', depth_mm: 3 },
    expected: 5,
    tolerance: 0,
  },
  {
    id: 'wet-snow-3',
    inputs: { state: 'contaminated', contaminant: 'wet-snow', depth_mm: 3 },
    expected: 5,
    tolerance: 0,
  },
  {
    id: 'compacted-cold',
    inputs: { state: 'contaminated', contaminant: 'compacted-snow', temperature_C: -15 },
    expected: 4,
    tolerance: 0,
  },
  {
    id: 'compacted-warm',
    inputs: { state: 'contaminated', contaminant: 'compacted-snow', temperature_C: -14.9 },
    expected: 3,
    tolerance: 0,
  },
  {
    id: 'dry-snow-4',
    inputs: { state: 'contaminated', contaminant: 'dry-snow', depth_mm: 3.1 },
    expected: 3,
    tolerance: 0,
  },
  {
    id: 'wet-snow-4',
    inputs: { state: 'contaminated', contaminant: 'wet-snow', depth_mm: 3.1 },
    expected: 3,
    tolerance: 0,
  },
  {
    id: 'snow-on-compacted',
    inputs: { state: 'contaminated', on: 'compacted-snow', contaminant: 'dry-snow', depth_mm: 1 },
    expected: 3,
    tolerance: 0,
  },
  { id: 'water-4', inputs: { state: 'flooded', contaminant: 'water', depth_mm: 3.1 }, expected: 2, tolerance: 0 },
  { id: 'slush-4', inputs: { state: 'contaminated', contaminant: 'slush', depth_mm: 3.1 }, expected: 2, tolerance: 0 },
  { id: 'ice', inputs: { state: 'contaminated', contaminant: 'ice' }, expected: 1, tolerance: 0 },
  { id: 'wet-ice', inputs: { state: 'contaminated', contaminant: 'wet-ice' }, expected: 0, tolerance: 0 },
  {
    id: 'water-on-compacted',
    inputs: { state: 'wet', on: 'compacted-snow', contaminant: 'water', depth_mm: 1 },
    expected: 0,
    tolerance: 0,
  },
  {
    id: 'snow-on-ice',
    inputs: { state: 'contaminated', on: 'ice', contaminant: 'dry-snow', depth_mm: 1 },
    expected: 0,
    tolerance: 0,
  },
]);
