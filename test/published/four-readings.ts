import { figures } from './figures.ts';

const provenance = {
  source: 'worked case of the factor law, computed outside this code',
  section: 'one uphill takeoff on short wet grass with a tailwind of 11.9 kt, 1010 kg, 1250 ft, 31 degC',
  status: 'computed',
  unit: 'm',
} as const;

/** The three distances behind the answer, and the four lengths that different readings of the rule make of them. */
export const distancesBehind = figures({ ...provenance, quantity: 'takeoff distance' }, [
  { id: 'stated', inputs: { wind: 'as given', runway: 'as it is' }, expected: 831.5, tolerance: 0.05 },
  { id: 'credited', inputs: { wind: '150 %', runway: 'as it is' }, expected: 949.5, tolerance: 0.05 },
  { id: 'reference', inputs: { wind: '150 %', runway: 'paved, dry, level' }, expected: 742.5, tolerance: 0.05 },
]);

export const readings = figures({ ...provenance, quantity: 'required length, overall factor 1.25' }, [
  { id: 'stated alone', inputs: { factors: '1.25' }, expected: 1039.4, tolerance: 0.05 },
  { id: 'credited alone', inputs: { factors: '1.25' }, expected: 1186.9, tolerance: 0.05 },
  { id: 'reference with factors', inputs: { factors: '1.25 x 1.30 x 1.04' }, expected: 1254.8, tolerance: 0.05 },
  { id: 'credited with factors', inputs: { factors: '1.25 x 1.30 x 1.04' }, expected: 1604.7, tolerance: 0.05 },
]);
