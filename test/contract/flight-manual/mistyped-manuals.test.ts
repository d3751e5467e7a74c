import { describe, expect, it } from 'vitest';
import { checkAeroplane } from '../../../src/contract/check-aeroplane.ts';
import { readDefinition } from '../../../src/contract/read-definition.ts';
import { toAeroplane } from '../../../src/contract/to-aeroplane.ts';
import type { FlightManual } from '../../../src/performance/flight-manual/flight-manual.ts';
import { manualClimb } from '../../../src/performance/flight-manual/manual-climb.ts';
import { manualDistances } from '../../../src/performance/flight-manual/manual-distances.ts';
import { manualSpeeds } from '../../../src/performance/flight-manual/manual-speeds.ts';
import { standardTemperature } from '../../../src/physics/atmosphere.ts';
import type { RunwaySurface } from '../../../src/physics/runway-surface.ts';
import { type Dice, dice } from '../../support/dice.ts';
import { fullManual } from '../../support/printed-manuals.ts';
import { sampleDefinition } from '../../support/sample-questions.ts';

type Node = Record<string, unknown>;

const words = [
  'groundRoll',
  'wholeDistance',
  'both',
  'groundRollAddedToBoth',
  'climb',
  'takeoff',
  'landing',
  'headwind',
  'tailwind',
  'uphill',
  'aboveStandard',
  'belowMass',
  'mass',
  'flap',
  'temperature',
  'temperatureDeviation',
  'pressureAltitude',
  'takeoffDistance',
  'previous',
  'ft',
  'm',
  'kt',
  'grass',
  'wet',
  'ias',
];

const surfaces: readonly RunwaySurface[] = [
  { kind: 'grass', state: 'dry', grass: 'short' },
  { kind: 'grass', state: 'wet', firmness: 'soft' },
  { kind: 'paved', state: 'damp' },
  { kind: 'paved', state: 'contaminated', contaminant: { kind: 'water', depth: 0.001 } },
];

/** One slip anywhere: a number changed, a word put in another's place, a member or an item taken out or given twice. */
function slip(node: Node, { pick, roll, chance, between }: Dice): void {
  const names = Object.keys(node);
  if (names.length === 0) return;
  const name = pick(names);
  const child = node[name];
  if (typeof child === 'object' && child !== null && !chance(0.12)) {
    slip(child as Node, { pick, roll, chance, between } as Dice);
  } else if (typeof child === 'number')
    node[name] = pick([0, -child, child * 10, child * between(0.5, 1.5), child + 1]);
  else if (typeof child === 'string') node[name] = pick(words);
  else if (Array.isArray(node)) pick([() => node.splice(Number(name), 1), () => node.push(child)])();
  else delete node[name];
}

function* numbersIn(value: unknown): Generator<number> {
  if (typeof value === 'number') yield value;
  else if (typeof value === 'object' && value !== null)
    for (const child of Object.values(value)) yield* numbersIn(child);
}

/** Asks a manual for everything, at a point on or about its sheets. */
function answersOf(manual: FlightManual, { between, pick, chance }: Dice): unknown[] {
  const pressureAltitude = chance(0.3) ? 0 : between(-500, 2600);
  const headwind = chance(0.3) ? 0 : between(-12, 15);
  const asked = {
    flap: pick([10, 30, 12]) * (Math.PI / 180),
    mass: between(700, 1100),
    pressureAltitude,
    temperature: between(250, 320),
    standardTemperature: standardTemperature(pressureAltitude),
    headwind,
    creditedHeadwind: headwind * pick([1, 0.5, 1.5, 0]),
    slope: chance(0.5) ? 0 : between(-0.03, 0.03),
    surface: chance(0.5) ? ({ kind: 'paved', state: 'dry' } as const) : pick(surfaces),
    edges: pick(['use', 'refuse'] as const),
  };
  return [
    manualDistances(manual, { ...asked, phase: 'takeoff', configuration: 'takeoff-10' }),
    manualDistances(manual, { ...asked, phase: 'landing', configuration: 'landing-full' }),
    manualClimb(manual, { ...asked, configuration: 'takeoff-10' }),
    manualSpeeds(manual, 'takeoff-10', asked.mass, asked.edges),
  ];
}

describe('a mistyped manual', () => {
  it('is refused with its faults, or answers every question with finite figures: 400 of them', () => {
    const tally = { read: 0, refused: 0, figures: 0, outside: 0 };
    for (let seed = 1; seed <= 400; seed++) {
      const dies = dice(seed);
      const flightManual = JSON.parse(JSON.stringify(fullManual())) as Node;
      for (let i = 0; i < 1 + (seed % 3); i++) slip(flightManual, dies);
      const read = readDefinition({ ...sampleDefinition(), flightManual });
      const faults = 'value' in read ? checkAeroplane(read.value, '') : read.refused;
      if (!('value' in read) || faults.length > 0) {
        expect(faults.every(({ pointer, message }) => pointer.startsWith('/') && !/undefined|NaN/.test(message))).toBe(
          true,
        );
        tally.refused++;
        continue;
      }
      tally.read++;
      const manual = toAeroplane(read.value).flightManual as FlightManual;
      for (let k = 0; k < 4; k++) {
        for (const answer of answersOf(manual, dies) as ({ outcome?: string } | undefined)[]) {
          expect([...numbersIn(answer)].every(Number.isFinite), `seed ${seed}`).toBe(true);
          tally[answer?.outcome === 'outside-flight-manual' ? 'outside' : 'figures']++;
        }
      }
    }
    expect(Math.min(...Object.values(tally)), JSON.stringify(tally)).toBeGreaterThan(60);
  });
});
