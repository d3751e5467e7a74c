import { figures } from './figures.ts';

const bank = {
  source: 'European PPL(A) question bank',
  section: 'performance and navigation',
  status: 'read',
} as const;

/** The bank counts 30 ft/hPa; the standard atmosphere gives 1469 ft. */
export const pressureAltitudes = figures({ ...bank, quantity: 'pressure altitude', unit: 'ft' }, [
  { id: 'EU-PA-1', inputs: { indicated_ft: 1380, qnh_hPa: 1010 }, expected: 1470, tolerance: 2 },
]);

export const densityAltitudes = figures({ ...bank, quantity: 'density altitude, dry air', unit: 'ft' }, [
  { id: 'EU-DA-1', inputs: { elevation_ft: 5250, qnh_hPa: 1010, oat_C: 27 }, expected: 7890, tolerance: 5 },
]);

export const headwinds = figures({ ...bank, quantity: 'headwind', unit: 'kt' }, [
  { id: 'XW-1 headwind', inputs: { runway_deg: 180, from_deg: 220, speed_kt: 30 }, expected: 23, tolerance: 0.5 },
  { id: 'XW-7 headwind', inputs: { runway_deg: 220, from_deg: 280, speed_kt: 15 }, expected: 7.5, tolerance: 0.5 },
]);

export const crosswinds = figures({ ...bank, quantity: 'crosswind', unit: 'kt' }, [
  { id: 'XW-1 crosswind', inputs: { runway_deg: 180, from_deg: 220, speed_kt: 30 }, expected: 19, tolerance: 0.5 },
  { id: 'XW-7 crosswind', inputs: { runway_deg: 220, from_deg: 280, speed_kt: 15 }, expected: 13, tolerance: 0.5 },
]);

/** The wind at which the crosswind reaches the limit. */
export const greatestWinds = figures({ ...bank, quantity: 'wind for a crosswind limit', unit: 'kt' }, [
  { id: 'XW-10', inputs: { angle_deg: 30, crosswind_kt: 10 }, expected: 20, tolerance: 0.5 },
]);
