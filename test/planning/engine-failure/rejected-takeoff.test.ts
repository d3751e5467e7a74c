import { describe, expect, it } from 'vitest';
import { takeoffDetail } from '../../../src/planning/detail/takeoff-detail.ts';
import type { Rejected } from '../../../src/planning/engine-failure/rejected-takeoff.ts';
import type { TakeoffQuestion } from '../../../src/planning/question.ts';
import { expectNear } from '../../support/near.ts';
import { answered, type Changes, changed, plainQuestion } from '../../support/takeoff-question.ts';

const kt = 1852 / 3600;

function rejected(changes: Changes): Rejected {
  const question: TakeoffQuestion = changed(plainQuestion, changes);
  const found = takeoffDetail(question, answered(question), ['rejected']).rejected;
  if (found === undefined) throw new Error('nothing rejected');
  return found;
}

const within = (asda: number | undefined, tora = 1500): Changes => ({
  runway: { declared: { tora, toda: tora, ...(asda === undefined ? {} : { asda }) } },
});

describe('the rejected takeoff of any aeroplane', () => {
  it('stops at the end of ASDA from the last point, the earlier where power holds', () => {
    const { lossOfPower, powerHolds, within: length } = rejected(within(420));
    expect(length).toEqual({ of: 'asda', available: 420 });
    for (const cue of [lossOfPower, powerHolds]) {
      expect(cue.outcome).toBe('last-point');
      expectNear(cue.stopDistance, 420, 1e-3);
    }
    expect(powerHolds.speed?.tas).toBeLessThan(lossOfPower.speed?.tas ?? 0);
    expect(powerHolds.distance).toBeLessThan(lossOfPower.distance ?? 0);
  });
  it('stops from rotation too on a long runway, and by TORA where no ASDA is declared', () => {
    const found = rejected(within(undefined));
    expect(found.within).toEqual({ of: 'tora', available: 1500 });
    expect([found.lossOfPower.outcome, found.powerHolds.outcome]).toEqual(['rotation-speed', 'rotation-speed']);
    expectNear(found.lossOfPower.speed?.cas, answered(plainQuestion).speeds.rotation.cas, 1e-6);
    const nowhere = rejected({ runway: { declared: {} } });
    expect([nowhere.within, nowhere.lossOfPower.outcome, nowhere.expected]).toEqual([undefined, 'rotation-speed', []]);
  });
  it('rolls three seconds before the first action and one more before it brakes, by hand at a constant deceleration', () => {
    // nothing holds the aeroplane back but brakes of 0.2 g on all its weight, and it is idle from the cue on
    const { lossOfPower, reactionTime, transitionTime } = rejected({
      aeroplane: {
        brakes: { brakingFrictionCoefficient: 0.2, loadFactor: 1, antiSkid: 'none' },
        drag: { zeroLiftCoefficient: 1e-6, oswaldFactor: 1e6 },
      },
      configuration: { groundLiftCoefficient: 0, idleThrust: 0 },
      runway: { surface: { kind: 'paved', state: 'dry', rollingFrictionCoefficient: 0 } },
    });
    expect([reactionTime, transitionTime]).toEqual([3, 1]);
    const { groundSpeed = 0, distance = 0, stopDistance = 0 } = lossOfPower;
    expectNear(stopDistance - distance, 4 * groundSpeed + groundSpeed ** 2 / (2 * 0.2 * 9.80665), 0.05);
  });
  it('expects at each quarter of TORA a speed that grows, and none beyond lift-off', () => {
    const roll = answered(plainQuestion).distances?.groundRoll.value ?? 0;
    const { expected } = rejected(within(undefined, 400));
    expect(expected.map(({ distance }) => distance)).toEqual([100, 200, 300].filter((distance) => distance < roll));
    const finer = rejected(within(undefined, roll * 1.02)).expected;
    expect(finer).toHaveLength(3);
    const speeds = finer.map(({ speed }) => speed.tas);
    expect(speeds).toEqual([...speeds].sort((a, b) => a - b));
    // at half the roll the square of the speed is more than half, for the acceleration falls with speed
    const half = (finer[1]?.speed.tas ?? 0) / answered(plainQuestion).speeds.liftOff.tas;
    expect(half).toBeGreaterThan(Math.SQRT1_2);
    expect(half).toBeLessThan(0.78);
  });
  it('names what it rests on, and says why where the surface has no friction', () => {
    expect(rejected({}).assumed.map(({ at }) => at)).toContain(
      '/aeroplane/definition/brakes/brakingFrictionCoefficient',
    );
    const snow = rejected({ runway: { surface: { kind: 'snow', state: 'dry' } } });
    expect(snow.lossOfPower).toMatchObject({
      outcome: 'no-data-for-this-surface',
      why: expect.stringMatching(/^the stop/),
    });
    const heavy = rejected({
      runway: { surface: { kind: 'grass', state: 'wet', firmness: 'soft', rollingFrictionCoefficient: 0.3 } },
    });
    expect(heavy.powerHolds.outcome).toBe('never-reaches-lift-off-speed');
    const blown = rejected({ weather: { wind: { kind: 'components', headwind: 59 * kt } } });
    expect(blown.lossOfPower.outcome).toBe('ground-speed-not-positive');
  });
});
