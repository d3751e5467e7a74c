import { figures } from './figures.ts';

/** The correction the handbook prints for an altimeter setting. */
export const altimeterCorrection = figures(
  {
    source: "FAA-H-8083-25A Pilot's Handbook",
    section: 'Ch.10 p.10-19 Sample Problem 1 (Ch.11 in 25B/25C)',
    status: 'read',
    quantity: 'pressure-altitude correction for altimeter setting 30.10 inHg',
    unit: 'ft',
    note: 'exact formula gives -164.9',
  },
  [{ id: 'phak-pa-30.10', inputs: { altimeter_inHg: 30.1 }, expected: -165, tolerance: 0.5 }],
);

/** Sample problem 1, first half. */
export const pressureAltitudeProblem = figures(
  {
    source: "FAA-H-8083-25A Pilot's Handbook",
    section: 'Ch.10 Sample Problem 1',
    status: 'read',
    quantity: 'pressure altitude',
    unit: 'ft',
  },
  [{ id: 'phak-pa-sp1', inputs: { elevation_ft: 5883, altimeter_inHg: 30.1 }, expected: 5718, tolerance: 1 }],
);

/** Sample problem 1, read off the chart. */
export const densityAltitudeProblem = figures(
  {
    source: "FAA-H-8083-25A Pilot's Handbook",
    section: 'Ch.10 Sample Problem 1 (chart reading)',
    status: 'read',
    quantity: 'density altitude (dry chart)',
    unit: 'ft',
    note: 'exact dry ISA gives 7709',
  },
  [{ id: 'phak-da-sp1', inputs: { pressure_altitude_ft: 5718, oat_F: 70 }, expected: 7700, tolerance: 50 }],
);

const handbook = { source: "FAA-H-8083-25 Pilot's Handbook", status: 'read' } as const;

/** The same problem as worked examples quote it. */
export const pressureAltitudeExample = figures(
  { ...handbook, section: 'density-altitude chart problem', quantity: 'pressure altitude', unit: 'ft' },
  [{ id: 'PHAK-PA', inputs: { elevation_ft: 5883, altimeter_inHg: 30.1 }, expected: 5718, tolerance: 1 }],
);

/** Read off the chart; the exact dry value is 7710 ft. */
export const densityAltitudeExample = figures(
  { ...handbook, section: 'density-altitude chart problem', quantity: 'density altitude', unit: 'ft' },
  [{ id: 'PHAK-DA', inputs: { elevation_ft: 5883, altimeter_inHg: 30.1, oat_F: 70 }, expected: 7700, tolerance: 50 }],
);

/** Sample problem 10, read off the wind chart; the exact values are 21.65 and 12.50 kt. */
export const windHeadwind = figures({ ...handbook, section: 'sample problem 10', quantity: 'headwind', unit: 'kt' }, [
  { id: 'XW-2 headwind', inputs: { runway_deg: 170, from_deg: 140, speed_kt: 25 }, expected: 22, tolerance: 0.5 },
]);
export const windCrosswind = figures({ ...handbook, section: 'sample problem 10', quantity: 'crosswind', unit: 'kt' }, [
  { id: 'XW-2 crosswind', inputs: { runway_deg: 170, from_deg: 140, speed_kt: 25 }, expected: 13, tolerance: 0.5 },
]);

/**
 * Load factor in a level turn as the chart prints it. At 80 degrees the chart's 5.747 is a misprint of 1/cos = 5.759, and
 * at 70 and 85 degrees its last digit is cut off, not rounded (2.924, 11.474).
 */
export const chartLoadFactors = figures(
  { ...handbook, section: 'load-factor chart, as quoted', quantity: 'load factor in a level turn', unit: '1' },
  [
    { id: 'STALL-n 10', inputs: { bank_deg: 10 }, expected: 1.015, tolerance: 0.001 },
    { id: 'STALL-n 30', inputs: { bank_deg: 30 }, expected: 1.154, tolerance: 0.001 },
    // biome-ignore lint/suspicious/noApproximativeNumericConstant: the figure as the chart prints it
    { id: 'STALL-n 45', inputs: { bank_deg: 45 }, expected: 1.414, tolerance: 0.001 },
    { id: 'STALL-n 60', inputs: { bank_deg: 60 }, expected: 2, tolerance: 0.001 },
    { id: 'STALL-n 70', inputs: { bank_deg: 70 }, expected: 2.923, tolerance: 0.002 },
    { id: 'STALL-n 80', inputs: { bank_deg: 80 }, expected: 5.747, tolerance: 0.013 },
    { id: 'STALL-n 85', inputs: { bank_deg: 85 }, expected: 11.473, tolerance: 0.002 },
  ],
);
