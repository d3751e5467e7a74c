import { describe, expect, it } from 'vitest';
import { accelerateStop } from '../../../src/performance/engine-failure/accelerate-stop.ts';
import { type DecisionLimits, decisionBounds } from '../../../src/performance/engine-failure/decision-bounds.ts';
import type { DecisionBounds, EngineFailureRun } from '../../../src/performance/engine-failure/engine-failure-run.ts';
import { constantBraking } from '../../../src/physics/braking-friction.ts';
import { block, inWind } from '../../support/engine-failure-block.ts';
import { expectNear } from '../../support/near.ts';

const seen = block(5, { recognitionTime: 1 });

function boundsOf(run: EngineFailureRun, limits: DecisionLimits): DecisionBounds {
  const found = decisionBounds(run, limits);
  if ('outcome' in found) throw new Error(found.outcome);
  return found;
}

describe('decisionBounds', () => {
  it('lie between a failure at standstill and the rotation speed where the aeroplane states nothing', () => {
    const { lowest, highest } = boundsOf(seen, {});
    expect(lowest.because).toBe('failure-at-standstill');
    expectNear(lowest.speed, 2, 1e-8);
    expect(highest).toEqual({ speed: 30, because: 'rotation-speed' });
  });

  it('begin at the minimum control speed on the ground where that is the higher', () => {
    expect(boundsOf(seen, { minimumControlSpeedOnGround: 12 }).lowest).toEqual({
      speed: 12,
      because: 'minimum-control-speed-on-the-ground',
    });
    expect(boundsOf(seen, { minimumControlSpeedOnGround: 1 }).lowest.because).toBe('failure-at-standstill');
  });

  it('end where the brakes take no more: without air m Vg^2/2 is the limit, whatever the wind', () => {
    for (const wind of [-4, 0, 6]) {
      const { highest } = boundsOf(inWind(seen, wind), { brakeEnergy: 200 });
      expect(highest.because).toBe('brake-energy');
      expectNear(highest.speed, 20 + wind, 1e-5);
    }
    expect(boundsOf(seen, { brakeEnergy: 451 }).highest.because).toBe('rotation-speed');
  });

  it('end where the stop of the two that heats the brakes more reaches the limit', () => {
    const idle = { ...seen, stop: { ...seen.stop, idleThrust: 1 }, idleThrustAllEngines: 2 };
    const { highest } = boundsOf(idle, { brakeEnergy: 250 });
    // heat = m V^2/2 times 5/(5 - 2)
    expectNear(highest.speed, Math.sqrt((2 * 250 * 3) / 5), 1e-5);
    const stop = accelerateStop(idle, highest.speed);
    expectNear((stop as { brakeEnergy: number }).brakeEnergy, 250, 1e-3);
  });

  it('end below a speed from which the brakes would not hold at all', () => {
    const braking = { at: (speed: number) => (speed < 25 ? 5 / 9.80665 : 0), kinks: [25] };
    const { highest } = boundsOf({ ...seen, stop: { ...seen.stop, braking } }, { brakeEnergy: 1000 });
    expect(highest.because).toBe('brake-energy');
    expectNear(highest.speed, 25, 1e-4);
  });

  it('end where the tyres do, by ground speed', () => {
    expect(boundsOf(inWind(seen, 3), { tyreSpeed: 22 }).highest).toEqual({ speed: 25, because: 'tyre-speed' });
    expect(boundsOf(inWind(seen, 3), { tyreSpeed: 40 }).highest.because).toBe('rotation-speed');
    expect(boundsOf(seen, { tyreSpeed: 22, brakeEnergy: 200 }).highest.because).toBe('brake-energy');
    expect(boundsOf(seen, { tyreSpeed: 18, brakeEnergy: 200 }).highest.because).toBe('tyre-speed');
  });

  it('may cross, and do in a headwind from the rotation speed on', () => {
    const { lowest, highest } = boundsOf(seen, { minimumControlSpeedOnGround: 28, tyreSpeed: 25 });
    expect(lowest.speed).toBeGreaterThan(highest.speed);
    expect(boundsOf(inWind(seen, 31), { brakeEnergy: 100 })).toMatchObject({
      lowest: { speed: 31 },
      highest: { speed: 30 },
    });
  });

  it('leave a roll that all engines cannot finish, and thrust that is not known, to be named', () => {
    const dragged = { ...seen, allEngines: { ...seen.allEngines, groundDragCoefficient: 0.02 } };
    expect(boundsOf(dragged, { brakeEnergy: 100 }).highest.because).toBe('rotation-speed');
    const known = { ...seen, remainingThrust: { ...seen.remainingThrust, domain: [0, 25] as const } };
    expect(decisionBounds(known, {})).toEqual({ outcome: 'outside-stated-data', airspeed: 30, bound: 25 });
  });

  it('do not ask for brakes that hold where no heat limits them', () => {
    const loose = { ...seen, stop: { ...seen.stop, braking: constantBraking(0) } };
    expect(boundsOf(loose, {}).highest.because).toBe('rotation-speed');
  });
});
