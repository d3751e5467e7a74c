import { describe, expect, it } from 'vitest';
import type { Configuration } from '../../src/performance/aeroplane.ts';
import type { LandingQuestion } from '../../src/planning/question.ts';
import { type LandingChanges, landed, plainLanding, statedLander } from '../support/landing-question.ts';
import { changed } from '../support/takeoff-question.ts';

const stated = statedLander.configurations['landing'] as Configuration;
const degree = Math.PI / 180;
const distance = (changes: LandingChanges) =>
  landed(changed(plainLanding, changes)).distances?.landingDistance.value ?? Number.NaN;

/** The configuration without a member: what is assumed, and the same with the other end stated. */
function without(member: keyof Configuration): LandingQuestion {
  const { [member]: _, ...rest } = stated;
  return { ...plainLanding, aeroplane: { ...statedLander, configurations: { landing: rest as Configuration } } };
}
const effects = (question: LandingQuestion) =>
  Object.fromEntries(landed(question).basis.assumed.map(({ at, effectRatio }) => [at.split('/').at(-1), effectRatio]));

describe('what an assumption of a landing is worth', () => {
  it.each([
    ['approachAngle', 2.5 * degree],
    ['flareLoadFactor', 1.1],
    ['floatDecelerationRatio', 0.1],
    ['freeRollTime', 3],
    ['groundLiftCoefficient', 0.8],
    ['groundDragIncrementCoefficient', 0.05],
  ] as const)('is the change of the distance with the other end of %s stated, by the estimate', (member, otherEnd) => {
    const silent = without(member);
    const base = landed(silent).distances?.landingDistance.value ?? Number.NaN;
    const change = distance({ configuration: { [member]: otherEnd } }) / base - 1;
    expect(Math.abs((effects(silent)[member] ?? 9) - change)).toBeLessThan(0.1 * Math.abs(change) + 2e-4);
  });
  it('of idle thrust is that of 8 % of the static thrust in place of 6 %', () => {
    const silent = without('idleThrust');
    const assumed = landed(silent).basis.assumed.find(({ at }) => at.endsWith('idleThrust'))?.value;
    const six = (assumed as { readonly value: number }).value;
    const change =
      distance({ configuration: { idleThrust: (six * 8) / 6 } }) / distance({ configuration: { idleThrust: six } }) - 1;
    expect(change).toBeGreaterThan(0.001);
    expect(Math.abs((effects(silent)['idleThrust'] ?? 9) / change - 1)).toBeLessThan(0.1);
  });
  it('of braking friction is longer, and its text says which friction that is', () => {
    const { brakes: _, ...unbraked } = statedLander;
    const silent = { ...plainLanding, aeroplane: { ...unbraked, brakes: { loadFactor: 0.85 } } };
    const base = landed(silent).distances?.landingDistance.value ?? Number.NaN;
    const weak = distance({ aeroplane: { brakes: { brakingFrictionCoefficient: 0.35 * 0.85, loadFactor: 0.85 } } });
    expect(Math.abs((effects(silent)['brakingFrictionCoefficient'] ?? 9) / (weak / base - 1) - 1)).toBeLessThan(0.1);
  });
});
