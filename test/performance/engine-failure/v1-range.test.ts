import { describe, expect, it } from 'vitest';
import { accelerateGo } from '../../../src/performance/engine-failure/accelerate-go.ts';
import { accelerateStop } from '../../../src/performance/engine-failure/accelerate-stop.ts';
import { balancedField } from '../../../src/performance/engine-failure/balanced-field.ts';
import type { DecisionBounds } from '../../../src/performance/engine-failure/engine-failure-run.ts';
import { type V1Range, v1Range } from '../../../src/performance/engine-failure/v1-range.ts';
import { constantBraking } from '../../../src/physics/braking-friction.ts';
import { block, inWind } from '../../support/engine-failure-block.ts';
import { expectNear } from '../../support/near.ts';

const plain = block(2);
const between = (lowest: number, highest: number): DecisionBounds => ({
  lowest: { speed: lowest, because: 'minimum-control-speed-on-the-ground' },
  highest: { speed: highest, because: 'rotation-speed' },
});
const lengths = (toStop: number, toGo: number) => ({
  accelerateStopDistanceAvailable: toStop,
  takeoffDistanceAvailable: toGo,
});
const go = accelerateGo(plain, 20);
const air = go.outcome === 'reaches-screen' ? go.airDistance : Number.NaN;
/** V^2/8 + (900 - V^2)/4 + air, and V^2/8 + V^2/4, turned round. */
const goes = (length: number) => Math.sqrt(8 * (225 + air - length));
const stops = (length: number) => Math.sqrt((8 / 3) * length);

function rangeOf(found: V1Range) {
  if (found.outcome !== 'decision-speeds') throw new Error(found.outcome);
  return found;
}

describe('v1Range', () => {
  it('reaches from the V1 whose go fits to that whose stop fits, by hand', () => {
    const { lowest, highest } = rangeOf(v1Range(plain, between(5, 30), lengths(320, 340)));
    expect([lowest.because, highest.because]).toEqual([
      'takeoff-distance-available',
      'accelerate-stop-distance-available',
    ]);
    expectNear(lowest.speed, goes(340), 2e-6);
    expectNear(highest.speed, stops(320), 2e-6);
  });

  it('ends at a bound where there is length to spare, and says which', () => {
    const bounds = between(5, 28);
    expect(v1Range(plain, bounds, lengths(1000, 1000))).toEqual({ outcome: 'decision-speeds', ...bounds });
    expect(v1Range(plain, bounds, lengths(Number.POSITIVE_INFINITY, Number.POSITIVE_INFINITY))).toMatchObject(bounds);
    expect(rangeOf(v1Range(plain, bounds, lengths(250, 1000)))).toMatchObject({ lowest: bounds.lowest });
    expect(rangeOf(v1Range(plain, bounds, lengths(1000, 300)))).toMatchObject({ highest: bounds.highest });
  });

  it('ends below a speed from which the brakes would not hold where no length ends it', () => {
    const braking = { at: (speed: number) => (speed < 25 ? 2 / 9.80665 : 0), kinks: [25] };
    const run = { ...plain, stop: { ...plain.stop, braking } };
    const endless = lengths(Number.POSITIVE_INFINITY, Number.POSITIVE_INFINITY);
    const { highest } = rangeOf(v1Range(run, between(5, 30), endless));
    expect(highest.because).toBe('accelerate-stop-distance-available');
    expectNear(highest.speed, 25, 1e-5);
    expect(accelerateStop(run, highest.speed).outcome).toBe('stops');
  });

  it('is one speed at the balanced field length', () => {
    const field = balancedField(plain, between(5, 30));
    if (field.outcome !== 'balanced') throw new Error(field.outcome);
    const { lowest, highest } = rangeOf(
      v1Range(plain, between(5, 30), lengths(field.length + 0.001, field.length + 0.001)),
    );
    expectNear(lowest.speed, field.speed, 1e-3);
    expectNear(highest.speed, field.speed, 1e-3);
  });

  it('has none on less than the balanced field length, with both speeds', () => {
    const found = v1Range(plain, between(5, 30), lengths(280, 290));
    if (found.outcome !== 'no-decision-speed') throw new Error(found.outcome);
    expectNear(found.lowest?.speed ?? Number.NaN, goes(290), 2e-6);
    expectNear(found.highest?.speed ?? Number.NaN, stops(280), 2e-6);
    expect(found.lowest?.speed ?? 0).toBeGreaterThan(found.highest?.speed ?? 0);
  });

  it('leaves out the speed that there is at no V1, with the shortest there are', () => {
    const short = v1Range(plain, between(5, 30), lengths(320, 200));
    expect(short).not.toHaveProperty('lowest');
    expect(short).toMatchObject({
      outcome: 'no-decision-speed',
      highest: { because: 'accelerate-stop-distance-available' },
    });
    expectNear((short as { shortest: { go: number } }).shortest.go, 900 / 8 + air, 1e-6);
    const tight = v1Range(plain, between(20, 30), lengths(100, 340));
    expect(tight).not.toHaveProperty('highest');
    expectNear((tight as { shortest: { stop: number } }).shortest.stop, 150, 1e-6);
  });

  it('names bounds that cross, no climb, no stop and wind', () => {
    const crossed = between(20, 18);
    expect(v1Range(plain, crossed, lengths(1000, 1000))).toEqual({ outcome: 'no-decision-speed', ...crossed });
    const heavy = { ...plain, dragIncrementCoefficient: 0.006 };
    expect(v1Range(heavy, between(5, 30), lengths(1000, 1000)).outcome).toBe('single-engine-cannot-continue');
    const loose = { ...plain, stop: { ...plain.stop, braking: constantBraking(0) } };
    expect(v1Range(loose, between(5, 30), lengths(1000, 1000)).outcome).toBe('never-stops');
    expect(v1Range(inWind(plain, 30), between(30, 30), lengths(1000, 1000)).outcome).toBe('ground-speed-not-positive');
  });
});
