import { figures } from './figures.ts';

const table = {
  source: 'FAA SAFO 19001 / AC 91-79A chg 2, AC 91-79B',
  section: 'LDF table',
  quantity: 'landing distance factor on the unfactored AFM landing distance (15 % margin included)',
  unit: '1',
} as const;

const classes = {
  turbojet_no_reverse: { category: 'twin-jet', reverse: false },
  turbojet_with_reverse: { category: 'twin-jet', reverse: true },
  turboprop: { category: 'twin-turboprop', reverse: false },
  reciprocating: { category: 'twin-piston', reverse: false },
} as const;

type Class = keyof typeof classes;
type Code = 1 | 2 | 3 | 4 | 5 | 6;

const rows = (of: Class, status: 'secondary' | 'memory', factors: Readonly<Record<Code, number>>) =>
  figures(
    { ...table, status },
    ([6, 5, 4, 3, 2, 1] as const).map((code) => ({
      id: `ldf-${of}-${code === 5 ? '5-smooth' : code}`,
      inputs: { ...classes[of], code },
      expected: factors[code],
      tolerance: 0,
    })),
  );

/** By class and runway condition code; code 5 of a smooth runway. */
export const landingDistanceFactors = [
  ...rows('turbojet_no_reverse', 'secondary', { 6: 1.67, 5: 2.6, 4: 2.8, 3: 3.2, 2: 4.0, 1: 5.1 }),
  ...rows('turbojet_with_reverse', 'secondary', { 6: 1.67, 5: 2.2, 4: 2.3, 3: 2.5, 2: 2.9, 1: 3.4 }),
  ...rows('turboprop', 'secondary', { 6: 1.67, 5: 2.0, 4: 2.2, 3: 2.4, 2: 2.7, 1: 2.9 }),
  ...rows('reciprocating', 'memory', { 6: 1.67, 5: 2.6, 4: 2.8, 3: 3.2, 2: 4.0, 1: 5.1 }),
];

/** Code 5 on a grooved or porous runway, which no question can state. */
export const groovedFactors = figures({ ...table, status: 'memory' }, [
  { id: 'ldf-turbojet_no_reverse-5-grooved', inputs: { when: 'turbojet, no reverse' }, expected: 2.3, tolerance: 0 },
  { id: 'ldf-turbojet_with_reverse-5-grooved', inputs: { when: 'turbojet, reverse' }, expected: 1.92, tolerance: 0 },
  { id: 'ldf-turboprop-5-grooved', inputs: { when: 'turboprop' }, expected: 1.92, tolerance: 0 },
  { id: 'ldf-reciprocating-5-grooved', inputs: { when: 'piston' }, expected: 2.3, tolerance: 0 },
]);
