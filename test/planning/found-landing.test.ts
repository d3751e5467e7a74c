import { describe, expect, it } from 'vitest';
import type { ManualNote } from '../../src/performance/flight-manual/flight-manual.ts';
import type { LandingQuestion } from '../../src/planning/question.ts';
import { manualOf, withManual } from '../support/flown-by-manual.ts';
import { type LandingChanges, landed, plainLanding, wetPavement } from '../support/landing-question.ts';
import { expectRatio } from '../support/near.ts';
import { changed } from '../support/takeoff-question.ts';

const ft = 0.3048;
const kt = 1852 / 3600;
const wetGrass: LandingChanges = {
  runway: { surface: { kind: 'grass', state: 'wet', grass: 'long', firmness: 'firm' } },
};
const underClassB: LandingChanges = { question: { ruleSet: 'eu-class-b', stage: 'dispatch' } };

/** At the node of 620 ft roll and 1 390 ft from the screen. */
function byManual(notes: readonly ManualNote[] = [], ...changes: readonly LandingChanges[]): LandingQuestion {
  const base = changed<LandingQuestion>(plainLanding, withManual(manualOf({}, { notes })));
  return changes.reduce((question, change) => changed(question, change), base);
}
const distances = (question: LandingQuestion) => {
  const { distances: found } = landed(question);
  if (found === undefined) throw new Error('there must be distances');
  return found;
};
const physics = (question: LandingQuestion) => distances({ ...question, method: 'stated' });
const required = (question: LandingQuestion) => {
  const found = landed(question).assessment?.checks.find(({ code }) => code === 'landing-distance');
  if (found === undefined) throw new Error('there must be a check');
  return found;
};

describe('a landing by its flight manual', () => {
  it('is the printed cell at a node', () => {
    const { groundRoll, landingDistance } = distances(byManual());
    expectRatio(groundRoll.value, 620 * ft, 1e-12);
    expectRatio(landingDistance.value, 1390 * ft, 1e-12);
    expect(landingDistance.method).toBe('flight-manual');
  });

  it('is divided by what the rules leave of LDA [A.330: 70 %, read], and by the wet factor where its notes are silent [A.335: 1.15, read]', () => {
    const dry = required(byManual([], underClassB));
    expect(dry.startsFrom).toBe('flight-manual');
    expectRatio(dry.required ?? 0, (1390 * ft) / 0.7, 1e-9);
    const wet = byManual([], underClassB, { runway: { surface: wetPavement } });
    const byFactor = [required(wet), required(wet).alternative].find((one) => one?.startsFrom === 'flight-manual');
    expectRatio(byFactor?.required ?? 0, (1.15 * 1390 * ft) / 0.7, 1e-9);
  });

  it('carries the roll by physics where it is silent on the surface', () => {
    const grass = byManual([], wetGrass);
    const ratio = physics(grass).groundRoll.value / physics(byManual()).groundRoll.value;
    expect(ratio).toBeGreaterThan(1.3);
    expectRatio(distances(grass).groundRoll.value, 620 * ft * ratio, 1e-12);
    expect(distances(grass).landingDistance.method).toBe('stated');
  });

  it('takes its own note of a share of the roll added to both [the trade’s form: 45 % of the ground roll]', () => {
    const note: ManualNote = {
      about: 'surface',
      surface: { kind: 'grass', state: 'wet' },
      change: 0.45,
      multiplies: 'groundRollAddedToBoth',
    };
    const { groundRoll, landingDistance, airDistance } = distances(byManual([note], wetGrass));
    expectRatio(groundRoll.value, 1.45 * 620 * ft, 1e-12);
    expectRatio(landingDistance.value, (1390 + 0.45 * 620) * ft, 1e-12);
    expectRatio(airDistance.value, 770 * ft, 1e-12);
  });

  it('carries a procedure the manual does not have: more speed on the approach', () => {
    const fast = byManual([], { question: { procedure: { approachSpeedIncrement: 5 * kt } } });
    const ratio = physics(fast).airDistance.value / physics(byManual()).airDistance.value;
    expectRatio(distances(fast).airDistance.value, 770 * ft * ratio, 1e-12);
    expect(landed(fast).basis.flightManual?.silences).toEqual(['procedure']);
  });
});
