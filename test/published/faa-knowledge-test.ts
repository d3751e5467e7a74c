import { figures } from './figures.ts';

const supplement = { source: 'FAA knowledge-test supplement', section: 'Fig. 8', status: 'read' } as const;

export const pressureAltitudes = figures({ ...supplement, quantity: 'pressure altitude', unit: 'ft' }, [
  { id: 'FAA-PA-2', inputs: { elevation_ft: 1386, altimeter_inHg: 29.97 }, expected: 1341, tolerance: 1 },
]);

export const densityAltitudeRises = figures(
  { ...supplement, quantity: 'rise of density altitude with temperature', unit: 'ft' },
  [{ id: 'FAA-DA-3', inputs: { pressure_altitude_ft: 3000, from_F: 35, to_F: 50 }, expected: 1000, tolerance: 50 }],
);
