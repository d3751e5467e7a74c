import type { Propulsion } from '../../src/performance/aeroplane.ts';
import { balancedField } from '../../src/performance/engine-failure/balanced-field.ts';
import { decisionBounds } from '../../src/performance/engine-failure/decision-bounds.ts';
import type { DecisionBounds, EngineFailureRun } from '../../src/performance/engine-failure/engine-failure-run.ts';
import { landing } from '../../src/performance/landing/landing.ts';
import { propulsionThrust } from '../../src/performance/propulsion.ts';
import { airDistance } from '../../src/performance/takeoff/air-distance.ts';
import { groundRoll } from '../../src/performance/takeoff/ground-roll.ts';
import { rollAcceleration, rollForces } from '../../src/performance/takeoff/roll-forces.ts';
import { takeoff } from '../../src/performance/takeoff/takeoff.ts';
import { takeoffEstimate } from '../../src/performance/takeoff/takeoff-estimate.ts';
import type { TakeoffRun } from '../../src/performance/takeoff/takeoff-run.ts';
import { landingVectors } from '../published/landing-vectors.ts';
import { takeoffVectors } from '../published/takeoff-vectors.ts';
import { shareOfThrust, withFailure } from '../support/engine-failure-runs.ts';
import { landingVectorRun } from '../support/landing-runs.ts';
import { odex } from '../support/odex.ts';
import { standardAir } from '../support/standard-air.ts';
import { vectorRun } from '../support/vector-run.ts';
import { microseconds } from './microseconds.ts';
import { pathOf, steppedAir, steppedRoll } from './small-steps.ts';

type Print = (line: string) => void;

/** Time of a fixed chain of square roots and divisions [ns each]: what this machine does at this moment. */
function calibration(): number {
  let x = 1;
  const chain = () => {
    for (let i = 0; i < 10_000; i++) x = Math.sqrt(x + 1.5) / 1.1;
    return x;
  };
  return microseconds(chain, [0], 1) / 10;
}

/** The published takeoff of a kind at sea level in still air: its run and its distances to ten digits. */
function published(kind: 'fixed-pitch' | 'constant-speed' | 'jet') {
  const vector = takeoffVectors.find(({ aeroplane, headwind }) => aeroplane === kind && headwind === 0);
  if (vector === undefined) throw new Error(`no vector of ${kind}`);
  const { roll, air } = vector.expected;
  return { run: vectorRun(vector), truth: { 'ground roll': roll, 'air path': air, 'roll and air path': roll + air } };
}

const others: readonly Propulsion[] = [
  { kind: 'turboprop', power: 212_000, propellerDiameter: 2.08, thrustFactor: 1 },
  { kind: 'electric', power: 212_000, propellerDiameter: 2.08, thrustFactor: 1 },
  {
    kind: 'measured',
    airspeeds: [0, 10, 20, 30, 40, 60],
    thrusts: [5500, 5100, 4600, 4100, 3700, 3000],
    density: 1.225,
    densityExponent: 1,
  },
];

function runs(): Record<string, TakeoffRun> {
  const disc = published('constant-speed').run;
  const more = others.map((propulsion) => [
    propulsion.kind,
    { ...disc, thrust: propulsionThrust(propulsion, 1, standardAir(0)) },
  ]);
  return {
    'fixed-pitch': published('fixed-pitch').run,
    'constant-speed': disc,
    ...Object.fromEntries(more),
    jet: published('jet').run,
  };
}

/** Slightly different runs, so that nothing is learnt by heart. */
const around = (run: TakeoffRun): TakeoffRun[] =>
  Array.from({ length: 8 }, (_, i) => ({ ...run, mass: run.mass * (1 + i * 1e-3) }));

/** 25.109 as it stands, a failure seen in a second and two of transition. */
const currentRule = { recognitionTime: 1, timeAtDecisionSpeed: 2, continuedAccelerationTime: 0, transitionTime: 2 };

/** The same aeroplane with thrust enough to climb on half of it. */
function strongTwin(run: TakeoffRun): TakeoffRun {
  return { ...run, thrust: shareOfThrust(run.thrust, 1.5) };
}

function libraryRoll(run: TakeoffRun, tolerance: number): number {
  const forces = rollForces(run);
  const derivative = (airspeed: number): [number, number] => {
    const a = rollAcceleration(forces, airspeed);
    return [(airspeed - run.headwind) / a, 1 / a];
  };
  return odex(derivative, run.headwind, run.liftOffSpeed, tolerance)[0];
}

function libraryAir(run: TakeoffRun, tolerance: number): number {
  const path = pathOf(run);
  const derivative = (u: number): [number, number] => {
    const { sine, airspeed } = path(Math.max(1e-12, u * u));
    return [(2 * u * (Math.sqrt(1 - sine * sine) - run.headwind / airspeed)) / sine, (2 * u) / (airspeed * sine)];
  };
  return odex(derivative, 1e-6, Math.sqrt(run.screenHeight), tolerance)[0];
}

const distanceOf = (result: object): number => (result as { distance?: number }).distance ?? Number.NaN;

interface Contest {
  readonly name: 'ground roll' | 'air path' | 'roll and air path';
  readonly ours: (run: TakeoffRun) => number;
  readonly library: (run: TakeoffRun, tolerance: number) => number;
  readonly steps: (run: TakeoffRun, step: number) => number;
}

const contests: readonly Contest[] = [
  { name: 'ground roll', ours: (run) => distanceOf(groundRoll(run)), library: libraryRoll, steps: steppedRoll },
  { name: 'air path', ours: (run) => distanceOf(airDistance(run)), library: libraryAir, steps: steppedAir },
  {
    name: 'roll and air path',
    ours: (run) => {
      const result = takeoff(run);
      return result.outcome === 'reaches-screen' ? result.takeoffDistance : Number.NaN;
    },
    library: (run, tolerance) => libraryRoll(run, tolerance) + libraryAir(run, tolerance),
    steps: (run, step) => steppedRoll(run, step) + steppedAir(run, step),
  },
];

/** Prints the cost of an evaluation by propulsion kind, and of the same integrals by other means, with their errors. */
export function physicsBench(print: Print): void {
  const all = runs();
  print(`calibration: ${calibration().toFixed(2)} ns a square root and division in a chain`);
  print('');
  print('one evaluation, roll and air path [us]; aims: below 2 fixed pitch, below 8 solved thrust');
  for (const [kind, run] of Object.entries(all)) {
    const cost = microseconds(takeoff, around(run), 400).toFixed(2);
    const estimate = microseconds(takeoffEstimate, around(run), 1000).toFixed(2);
    print(`  ${kind.padEnd(15)} ${cost.padStart(6)}   estimate for the bands ${estimate}`);
  }
  print('');
  print('one landing, air distance to standstill [us]');
  for (const vector of landingVectors) {
    const { stallSpeed: _, ...run } = landingVectorRun(vector);
    const runs = Array.from({ length: 8 }, (__, i) => ({ ...run, mass: run.mass * (1 + i * 1e-3) }));
    print(`  ${vector.id.padEnd(15)} ${microseconds(landing, runs, 400).toFixed(2).padStart(6)}`);
  }
  print('');
  print('one balanced field of a twin, V1 and both distances [us]; aim: below 300');
  for (const kind of ['constant-speed', 'jet'] as const) {
    const twins = around(published(kind).run).map((run) => withFailure(strongTwin(run), { timeline: currentRule }));
    const bounds = twins.map((run) => decisionBounds(run, {}) as DecisionBounds);
    const outcomes = new Set(twins.map((run, i) => balancedField(run, bounds[i] as DecisionBounds).outcome));
    const cost = microseconds(
      (i: number) => balancedField(twins[i] as EngineFailureRun, bounds[i] as DecisionBounds),
      [0, 1, 2, 3, 4, 5, 6, 7],
      80,
    );
    print(`  ${kind.padEnd(15)} ${cost.toFixed(0).padStart(6)}   ${[...outcomes].join(', ')}`);
  }
  for (const kind of ['fixed-pitch', 'constant-speed'] as const) {
    const { run, truth } = published(kind);
    print('');
    print(
      `${kind}, against odex at 1e-6 (in airspeed and height) and against steps of 1 ms in time; errors against the published distances`,
    );
    for (const { name, ours, library, steps } of contests) {
      const error = (found: number) => `${Math.abs(found / truth[name] - 1).toExponential(0)}`;
      const own = microseconds(ours, around(run), 400);
      const other = microseconds((one: TakeoffRun) => library(one, 1e-6), around(run), 16, 60);
      const stepped = microseconds((one: TakeoffRun) => steps(one, 1e-3), [run], 1, 8);
      print(
        `  ${name.padEnd(18)} ${own.toFixed(2).padStart(6)} us (error ${error(ours(run))})` +
          `   odex ${other.toFixed(0).padStart(4)} us, ${(other / own).toFixed(0).padStart(3)} times (${error(library(run, 1e-6))})` +
          `   1 ms steps ${stepped.toFixed(0).padStart(5)} us, ${(stepped / own).toFixed(0)} times (${error(steps(run, 1e-3))})`,
      );
    }
  }
  print('');
  print(`calibration: ${calibration().toFixed(2)} ns again`);
}
