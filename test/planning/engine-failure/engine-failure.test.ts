import { describe, expect, it } from 'vitest';
import { readCatalogue } from '../../../src/catalogue/read-catalogue.ts';
import { toAeroplane } from '../../../src/contract/to-aeroplane.ts';
import type { Aeroplane } from '../../../src/performance/aeroplane.ts';
import { accelerateGo } from '../../../src/performance/engine-failure/accelerate-go.ts';
import { accelerateStop } from '../../../src/performance/engine-failure/accelerate-stop.ts';
import type { EngineFailureRun } from '../../../src/performance/engine-failure/engine-failure-run.ts';
import { propulsionThrust } from '../../../src/performance/propulsion.ts';
import { constantBraking } from '../../../src/physics/braking-friction.ts';
import { isRefused } from '../../../src/planning/fault.ts';
import { planTakeoff } from '../../../src/planning/plan-takeoff.ts';
import type { TakeoffQuestion } from '../../../src/planning/question.ts';
import { catalogueTakeoff, dryAir } from '../../support/catalogue-takeoff.ts';
import { withFailure } from '../../support/engine-failure-runs.ts';
import { expectNear } from '../../support/near.ts';
import { answered, plainQuestion } from '../../support/takeoff-question.ts';

const kt = 1852 / 3600;
const ft = 0.3048;
const catalogue = readCatalogue({ builtIn: true });

function onFile(id: string): Aeroplane {
  const found = catalogue.list().find(({ definition }) => definition.id === id);
  if (found === undefined) throw new Error(id);
  return toAeroplane(found.definition);
}

const jet = onFile('sythelor-jet');
const standard = { temperature: 288.15, pressure: { kind: 'qnh', value: 101_325 }, wind: { kind: 'calm' } } as const;

/** The jet at sea level on a standard day in still air, but for what is named. */
function jetAsked(
  some: Partial<TakeoffQuestion> = {},
  runway: Partial<TakeoffQuestion['runway']> = {},
): TakeoffQuestion {
  return {
    ...plainQuestion,
    aeroplane: jet,
    configuration: 'takeoff-16',
    mass: 6000,
    weather: standard,
    ...some,
    runway: {
      ...plainQuestion.runway,
      elevation: 0,
      surface: { kind: 'paved', state: 'dry' },
      declared: { tora: 2500, toda: 2500, asda: 2500 },
      ...runway,
    },
  };
}

/** As transport category, with its screen. */
const transport: Aeroplane = { ...jet, certification: { basis: 'cs-25', screenHeight: 35 * ft } };

function refusals(question: TakeoffQuestion) {
  const answer = planTakeoff(question);
  return isRefused(answer) ? answer.refused : [];
}

/** The jet with a failure, built without the planning room: 23.55 times, spoilers out, idle and thrust of one engine. */
function jetRun(changes: Partial<EngineFailureRun> = {}): EngineFailureRun {
  const run = catalogueTakeoff(jet, 'takeoff-16', { mass: 6000 });
  const base = withFailure(run);
  const stall = run.screenSpeed / 1.21;
  return {
    ...base,
    remainingThrust: propulsionThrust(jet.propulsion, 1, dryAir()),
    dragIncrementCoefficient: 0.0045,
    liftOffSpeed: 1.18 * stall,
    stop: {
      ...base.stop,
      groundDragCoefficient: run.groundDragCoefficient + 0.047,
      groundLiftCoefficient: 0.2 * run.groundLiftCoefficient,
      braking: constantBraking(0.41 * 0.88),
      idleThrust: 1350 / 2,
    },
    idleThrustAllEngines: 1350,
    timeline: { recognitionTime: 1, timeAtDecisionSpeed: 0, continuedAccelerationTime: 0, transitionTime: 2 },
    ...changes,
  };
}

describe('an engine failure of the jet on file', () => {
  const answer = answered(jetAsked());
  const { engineOut, speeds } = answer;
  const decision = speeds.decision;
  if (engineOut === undefined || decision === undefined) throw new Error('no engine failure');

  it('stops and goes on as the same run built by hand does [14 CFR 23.55, 1 s and 2 s; 1e-6]', () => {
    const stop = accelerateStop(jetRun(), decision.tas);
    const go = accelerateGo(jetRun(), decision.tas);
    if (stop.outcome !== 'stops' || go.outcome !== 'reaches-screen') throw new Error('no distances');
    expectNear(engineOut.accelerateStopDistance?.value, stop.distance, 1e-6 * stop.distance);
    expectNear(engineOut.accelerateGoDistance?.value, go.distance, 1e-6 * go.distance);
    expect(engineOut.screenHeight).toBeCloseTo(35 * ft, 9);
  });
  it('shows each delay with its source, and what the decision speed lies between', () => {
    expect(engineOut.stopRule).toBe('commuter');
    expect(engineOut.timeline.map(({ of, seconds }) => [of, seconds])).toEqual([
      ['recognitionTime', 1],
      ['timeAtDecisionSpeed', 0],
      ['continuedAccelerationTime', 0],
      ['transitionTime', 2],
    ]);
    expect(decision.range?.lowestBecause).toBe('minimum-control-speed-on-the-ground');
    expectNear(decision.range?.lowest.cas, 77 * kt, 1e-6);
    expectNear(decision.range?.highest.cas, speeds.rotation.cas, 1e-6);
  });
  it('bands each distance about its value, the continued takeoff wider than the stop', () => {
    const { accelerateStopDistance: stop, accelerateGoDistance: go, balancedFieldLength: field } = engineOut;
    for (const one of [stop, go, field])
      expect((one?.low ?? 0) < (one?.value ?? 0) && (one?.high ?? 0) > (one?.value ?? 0)).toBe(true);
    expect((go?.high ?? 0) / (go?.value ?? 1)).toBeGreaterThan((stop?.high ?? 0) / (stop?.value ?? 1));
  });
});

describe('the decision speed', () => {
  const at = (knots: number) => answered(jetAsked({ decisionSpeed: knots * kt }));
  it('asked for is flown: the stop grows and the continued takeoff shrinks with it', () => {
    const [low, high] = [at(80), at(90)];
    expect(low?.speeds.decision?.because).toBe('asked-for');
    expectNear(low?.speeds.decision?.cas, 80 * kt, 1e-9);
    const [slow, fast] = [low?.engineOut, high?.engineOut];
    expect(slow?.accelerateStopDistance?.value).toBeLessThan(fast?.accelerateStopDistance?.value ?? 0);
    expect(slow?.accelerateGoDistance?.value).toBeGreaterThan(fast?.accelerateGoDistance?.value ?? 0);
    expect(slow?.balancedFieldLength?.value).toBe(fast?.balancedFieldLength?.value);
  });
  it('out of order is refused with its numbers', () => {
    const rotation = answered(jetAsked()).speeds.rotation.cas / kt;
    expect(refusals(jetAsked({ decisionSpeed: 76.8 * kt }))).toEqual([
      {
        pointer: '/decisionSpeed',
        code: 'contradiction',
        message: 'A decision speed of 76.8 kt is below the minimum control speed on the ground, 77 kt calibrated here.',
        received: '76.8 kt',
        allowed: expect.stringMatching(/^77 kt to 9\d\.\d kt calibrated$/),
      },
    ]);
    expect(refusals(jetAsked({ decisionSpeed: (rotation + 0.2) * kt }))[0]?.message).toMatch(
      /is above the rotation speed/,
    );
    expect(refusals(jetAsked({ decisionSpeed: rotation * kt }))).toEqual([]);
    expect(refusals(jetAsked({ decisionSpeed: 77 * kt }))).toEqual([]);
  });
  it('of a single is refused by name', () => {
    const [fault] = refusals({ ...plainQuestion, decisionSpeed: 50 * kt });
    expect(fault).toMatchObject({ pointer: '/decisionSpeed', code: 'contradiction', received: '50 kt' });
    expect(fault?.message).toMatch(/^Stated Trainer \(invented\) has one engine/);
    expect(answered(plainQuestion).engineOut).toBeUndefined();
    expect(answered(plainQuestion).speeds.decision).toBeUndefined();
  });
  it('is moved into the range of the declared distances, and both checks pass there', () => {
    const lengths = (asda: number, toda: number) =>
      answered(jetAsked({ mass: 5600, ruleSet: 'eu-class-a' }, { declared: { tora: toda, toda, asda } }));
    const free = lengths(2500, 2500).engineOut;
    const stop = free?.accelerateStopDistance?.value ?? 0;
    const short = lengths(stop - 40, 2500);
    expect(short.speeds.decision?.because).toBe('accelerate-stop-distance-available');
    expect(short.speeds.decision?.range?.highestBecause).toBe('accelerate-stop-distance-available');
    expectNear(short.engineOut?.accelerateStopDistance?.value, stop - 40, 0.01);
    expect(short.assessment?.checks.map(({ result }) => result)).toEqual(Array(5).fill('passes'));
  });
  it('is found in the wind that counts, and the distances are in the wind as given', () => {
    const wind = { ...standard, wind: { kind: 'components', headwind: 20 * kt } } as const;
    const credited = answered(jetAsked({ ruleSet: 'eu-class-a', weather: wind }));
    const half = answered(
      jetAsked({ ruleSet: 'unfactored', weather: { ...wind, wind: { kind: 'components', headwind: 10 * kt } } }),
    );
    const required = credited.assessment?.checks.find(({ code }) => code === 'takeoff-distance-engine-out')?.required;
    expectNear(required, half.engineOut?.accelerateGoDistance?.value ?? Number.NaN, 1e-6);
    expect(credited.engineOut?.accelerateGoDistance?.value).toBeLessThan(required ?? 0);
  });
});

describe('what certified takeoffs ask for', () => {
  const checksOf = (question: TakeoffQuestion) =>
    Object.fromEntries((answered(question).assessment?.checks ?? []).map((check) => [check.code, check]));
  const asTransport = (some: Partial<TakeoffQuestion> = {}, runway: Partial<TakeoffQuestion['runway']> = {}) =>
    jetAsked({ aeroplane: transport, ruleSet: 'us-part-121', ...some }, runway);

  it('is all compared, of class A with the jet on file: nothing is left to be assessed', () => {
    const answer = answered(jetAsked({ ruleSet: 'eu-class-a', mass: 5600 }));
    expect(answer.outcome).toBe('enough');
    expect(answer.assessment?.checks.map(({ result }) => result)).toEqual(Array(5).fill('passes'));
  });
  it('counts two seconds at the decision speed since 1998, and none more in the engine-out stop before it', () => {
    const before = { ...transport, certification: { ...transport.certification, stopRule: 'before-1998' } } as const;
    const [now, then] = [asTransport(), asTransport({ aeroplane: before })].map((one) => answered(one).engineOut);
    expect([now?.stopRule, then?.stopRule]).toEqual(['transport-current', 'transport-before-1998']);
    const seconds = (one: typeof now) => one?.timeline.map((delay) => delay.seconds);
    expect([seconds(now), seconds(then)]).toEqual([
      [1, 2, 0, 2],
      [1, 0, 2, 2],
    ]);
  });
  it('asks on a wet runway no less than on the same runway dry, to 15 ft [25.113(b)]', () => {
    const wet = asTransport({}, { surface: { kind: 'paved', state: 'wet' } });
    expect(answered(wet).engineOut?.screenHeight).toBeCloseTo(15 * ft, 9);
    expect(answered(asTransport()).engineOut?.screenHeight).toBeCloseTo(35 * ft, 9);
    const [onWet, onDry] = [checksOf(wet), checksOf(asTransport())];
    for (const code of ['takeoff-distance-engine-out', 'accelerate-stop-engine-out', 'accelerate-stop-all-engines']) {
      expect(onWet[code]?.required).toBeGreaterThanOrEqual((onDry[code]?.required ?? 0) * (1 - 1e-9));
      expect(onWet[code]?.alternative).toBeDefined();
    }
  });
  it('compares the climbs of 25.121 with the climbs shown', () => {
    const checks = checksOf(asTransport());
    const climbs = answered(asTransport()).engineOut?.climb ?? [];
    expect(
      ['climb-gear-down-engine-out', 'climb-gear-up-engine-out', 'climb-final-engine-out'].map((code) => [
        checks[code]?.available,
        checks[code]?.required,
      ]),
    ).toEqual(climbs.map(({ gradient, required }) => [gradient, required]));
    expect(climbs.map(({ required }) => required)).toEqual([0, 0.024, 0.012]);
  });
  it('leaves a check that rests on what is not stated, and names it', () => {
    const { brakes: _, ...unbraked } = jet;
    const checks = checksOf(jetAsked({ aeroplane: unbraked, ruleSet: 'eu-class-a' }));
    expect(checks['accelerate-stop']).toMatchObject({
      result: 'not-assessed',
      why: 'a distance of the certification rests on what the aeroplane does not state: /aeroplane/definition/brakes/brakingFrictionCoefficient',
    });
    expect(checks['takeoff-distance-all-engines']?.result).toBe('passes');
  });
  it('is the outcome where the aeroplane cannot go on and the rules ask for it; elsewhere a caution says so', () => {
    const hot = { ...standard, temperature: 318, pressure: { kind: 'pressureAltitude', value: 3000 } } as const;
    const heavy = { mass: 6960, weather: hot };
    expect(
      answered(jetAsked({ ...heavy, ruleSet: 'eu-class-a' }, { declared: { tora: 9000, toda: 9000, asda: 9000 } }))
        .outcome,
    ).toBe('single-engine-cannot-continue');
    const elsewhere = answered(
      jetAsked({ ...heavy, ruleSet: 'unfactored' }, { declared: { tora: 9000, toda: 9000, asda: 9000 } }),
    );
    expect(elsewhere.outcome).toBe('enough');
    expect(elsewhere.cautions.map(({ code }) => code)).toContain('engine-out-cannot-continue');
    expect(elsewhere.engineOut?.outcome).toBe('single-engine-cannot-continue');
    expect(elsewhere.engineOut?.why).toMatch(/^with one engine out/);
  });
  it('has no decision speed where control comes after rotation', () => {
    const late = { ...jet, engineOut: { ...jet.engineOut, vmcg: 120 * kt } };
    expect(answered(jetAsked({ aeroplane: late, ruleSet: 'eu-class-a' })).outcome).toBe('no-decision-speed');
    expect(answered(jetAsked({ aeroplane: late, ruleSet: 'unfactored' })).outcome).toBe('enough');
  });
});
