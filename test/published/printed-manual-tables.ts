import type { FigureStatus } from './figures.ts';
import { figures } from './figures.ts';

type Row = readonly number[];

/**
 * The handbook's sample short-field takeoff table of a four-seat trainer, whole: pressure altitude [ft], temperature [degC], ground
 * roll and distance over 50 ft [ft]. The hottest cells of the highest rows are blank in the source.
 */
export const handbookTakeoffTable = {
  source: "FAA-H-8083-25 (Pilot's Handbook of Aeronautical Knowledge), Fig. 10-20",
  status: 'memory, except the ground rolls at 20 degC of 2000 and 3000 ft, which were read',
  mass_lb: 2400,
  flap_deg: 10,
  rows: [
    [0, 0, 795, 1460],
    [0, 10, 860, 1570],
    [0, 20, 925, 1685],
    [0, 30, 995, 1810],
    [0, 40, 1065, 1945],
    [1000, 0, 875, 1605],
    [1000, 10, 940, 1725],
    [1000, 20, 1015, 1860],
    [1000, 30, 1090, 2000],
    [1000, 40, 1170, 2155],
    [2000, 0, 960, 1770],
    [2000, 10, 1035, 1910],
    [2000, 20, 1115, 2060],
    [2000, 30, 1200, 2220],
    [2000, 40, 1290, 2395],
    [3000, 0, 1055, 1960],
    [3000, 10, 1140, 2120],
    [3000, 20, 1230, 2295],
    [3000, 30, 1325, 2480],
    [3000, 40, 1425, 2685],
    [4000, 0, 1165, 2185],
    [4000, 10, 1260, 2365],
    [4000, 20, 1355, 2570],
    [4000, 30, 1465, 2790],
    [4000, 40, 1575, 3030],
    [5000, 0, 1285, 2445],
    [5000, 10, 1390, 2660],
    [5000, 20, 1500, 2895],
    [5000, 30, 1620, 3160],
    [5000, 40, 1745, 3455],
    [6000, 0, 1425, 2755],
    [6000, 10, 1540, 3015],
    [6000, 20, 1665, 3300],
    [6000, 30, 1800, 3620],
    [6000, 40, 1940, 3990],
    [7000, 0, 1580, 3140],
    [7000, 10, 1710, 3450],
    [7000, 20, 1850, 3805],
    [7000, 30, 2000, 4220],
    [8000, 0, 1755, 3615],
    [8000, 10, 1905, 4015],
    [8000, 20, 2060, 4480],
  ] satisfies readonly Row[],
  /** headwind: 10 % less for each 9 kt; tailwind up to 10 kt: 10 % more for each 2 kt; dry grass: 15 % of the ground roll more */
  notes: { headwind: [-10, 9], tailwind: [10, 2, 10], dryGrass: 15 },
} as const;

/** Ground roll between two printed rows. */
export const handbookInterpolation = figures(
  {
    source: 'FAA-H-8083-25, Fig. 10-20',
    section: 'interpolation in the takeoff table',
    status: 'read' satisfies FigureStatus,
    quantity: 'ground roll',
    unit: 'ft',
  },
  [{ id: 'PHAK-INT', inputs: { PA_ft: 2500, OAT_C: 20 }, expected: 1173, tolerance: 1 }],
);

/**
 * The knowledge test's landing table of a 1600 lb trainer: pressure altitude [ft], printed standard temperature [degF], ground roll
 * and distance over 50 ft [ft].
 */
export const knowledgeTestLandingTable = {
  source: 'FAA knowledge-test supplement, Fig. 38/39',
  status: 'read: rolls at 0, 2500 and 5000 ft, distances at 5000 and 7500 ft; the other three cells from memory',
  mass_lb: 1600,
  rows: [
    [0, 59, 445, 1075],
    [2500, 50, 470, 1135],
    [5000, 41, 495, 1195],
    [7500, 32, 520, 1255],
  ] satisfies readonly Row[],
  /** headwind: 10 % less for each 4 kt; above standard: 10 % more for each 60 degF */
  notes: { headwind: [-10, 4], aboveStandard: [10, 60] },
} as const;

export const knowledgeTestLandings = figures(
  {
    source: 'FAA knowledge-test supplement',
    section: 'Fig 38/39 table',
    status: 'read' satisfies FigureStatus,
    quantity: 'landing distance',
    unit: 'ft',
  },
  [
    { id: 'FAA-LDT-1', inputs: { PA_ft: 7500, OAT_F: 32, headwind_kt: 8 }, expected: 1004, tolerance: 0.5 },
    { id: 'FAA-LDT-2', inputs: { PA_ft: 5000, OAT_F: 41, headwind_kt: 8 }, expected: 956, tolerance: 0.5 },
  ],
);

/**
 * The question bank's landing table of a 2300 lb four-seat trainer: pressure altitude [ft], temperature [degC], ground roll and
 * distance over 50 ft [ft]; the rows that its questions need.
 */
export const questionBankLandingTable = {
  source: 'European PPL(A) question bank, FPP-16e',
  status: 'read: (0, 0), the distance at (1000, 30) and the roll at (3000, 20); the other cells from memory',
  mass_lb: 2300,
  rows: [
    [0, 0, 495, 1205],
    [0, 10, 510, 1235],
    [0, 20, 530, 1265],
    [0, 30, 545, 1295],
    [1000, 0, 510, 1235],
    [1000, 10, 530, 1265],
    [1000, 20, 550, 1300],
    [1000, 30, 565, 1330],
    [2000, 0, 530, 1265],
    [2000, 10, 550, 1300],
    [2000, 20, 570, 1335],
    [2000, 30, 590, 1370],
    [3000, 0, 550, 1300],
    [3000, 10, 570, 1335],
    [3000, 20, 590, 1370],
    [3000, 30, 610, 1405],
  ] satisfies readonly Row[],
  /** headwind: 10 % less for each 9 kt; tailwind up to 10 kt: 10 % more for each 2 kt; dry grass: 45 % of the ground roll more */
  notes: { headwind: [-10, 9], tailwind: [10, 2, 10], dryGrass: 45 },
} as const;

const bank = {
  source: 'European PPL(A) question bank',
  section: 'FPP-16e landing table',
  status: 'read' satisfies FigureStatus,
  unit: 'ft',
} as const;

export const questionBankLandings = figures({ ...bank, quantity: 'landing distance' }, [
  {
    id: 'EU-LD-1',
    inputs: { PA_ft: 1000, OAT_C: 30, mass_lb: 2300, headwind_kt: 9, grass: 'none' },
    expected: 1197,
    tolerance: 0.5,
  },
  {
    id: 'EU-LD-4',
    inputs: { PA_ft: 0, OAT_C: 0, mass_lb: 2300, headwind_kt: 18, grass: 'dry' },
    expected: 1140,
    tolerance: 5,
  },
]);

/** The table is for 2300 lb alone; the bank reads it for a lighter aeroplane as it stands. */
export const questionBankRolls = figures({ ...bank, quantity: 'ground roll' }, [
  {
    id: 'EU-LD-2',
    inputs: { PA_ft: 3000, OAT_C: 20, mass_lb: 2200, headwind_kt: 0, grass: 'dry' },
    expected: 855,
    tolerance: 1,
  },
]);
