import type { TakeoffRun } from '../../src/performance/takeoff/takeoff-run.ts';
import type { MadeTable } from '../published/made-tables.ts';
import { dice } from './dice.ts';
import { odeAir, odeRoll } from './ode-takeoff.ts';

const foot = 0.3048;

/** The standard atmosphere's temperature [K] and pressure [Pa] below 11 km, written out again. */
function standard(altitude: number): { temperature: number; pressure: number } {
  const temperature = 288.15 - 0.0065 * altitude;
  return { temperature, pressure: 101325 * (temperature / 288.15) ** (9.80665 / (0.0065 * 287.05287)) };
}

/** Thrust factor, drag shift in the air, altitude lapse, temperature exponent. */
export type Truth = readonly [kT: number, dCD: number, c: number, nT: number];

/** Thrust of a fixed-pitch propeller or an actuator disc [N], from the formulas, by bisection where they are implicit. */
function thrustAt(
  power: NonNullable<MadeTable['aeroplane']['power']>,
  truth: Truth,
  altitude: number,
  temperature: number,
  density: number,
) {
  const [kT, , c, nT] = truth;
  const air = standard(altitude);
  const sigma = air.pressure / (287.05287 * air.temperature) / 1.225;
  const fall = ((sigma - c) / (1 - c)) * (air.temperature / temperature) ** nT;
  if (power.kind === 'fixed-pitch') {
    return (v: number) => kT * (power.staticThrust * fall - power.slope * density * power.diameter ** 2 * v * v);
  }
  const area = (Math.PI / 4) * power.diameter ** 2;
  return (v: number) => {
    let low = 0;
    let high = 20_000;
    for (let i = 0; i < 60; i++) {
      const t = (low + high) / 2;
      const induced = -v / 2 + Math.sqrt((v * v) / 4 + t / (2 * density * area));
      if (t * (v + 1.15 * induced) < 0.88 * power.power * fall) low = t;
      else high = t;
    }
    return kT * low;
  };
}

/** Ground roll and distance to 50 ft [m] of a made aeroplane, by a general ODE library. */
export function odeDistances(
  a: MadeTable['aeroplane'],
  truth: Truth,
  mass: number,
  altitudeFeet: number,
  celsius: number,
): [number, number] {
  const altitude = altitudeFeet * foot;
  const temperature = celsius + 273.15;
  const density = standard(altitude).pressure / (287.05287 * temperature);
  const stall = Math.sqrt((2 * mass * 9.80665) / (1.225 * a.area * a.maximumLift)) / Math.sqrt(density / 1.225);
  const span = Math.sqrt(a.aspectRatio * a.area);
  if (a.power === undefined) throw new Error('no power');
  const at = thrustAt(a.power, truth, altitude, temperature, density);
  const run: TakeoffRun = {
    mass,
    wingArea: a.area,
    span,
    wingHeight: a.heightOverSpan * span,
    inducedDragFactor: 1 / (Math.PI * a.aspectRatio * a.oswaldFactor),
    groundDragCoefficient: a.groundDrag,
    airDragCoefficient: a.airDrag + truth[1],
    groundLiftCoefficient: a.groundLift,
    rollingFriction: a.friction,
    thrust: { at, fill: () => undefined, kinks: [] },
    density,
    headwind: 0,
    slope: 0,
    rotationSpeed: a.speedRatios[0] * stall,
    liftOffSpeed: a.speedRatios[0] * stall,
    screenSpeed: a.speedRatios[1] * stall,
    rotationTime: 0,
    pullUpLoadFactor: 1.15,
    screenHeight: 15.24,
  };
  const roll = odeRoll(run, 1e-7)[0];
  return [roll, roll + odeAir(run, 1e-7)[0]];
}

export interface TableOf {
  readonly masses: readonly number[];
  readonly altitudes: readonly number[];
  readonly temperatures: readonly number[];
}

export type Row = readonly [mass: number, altitude: number, temperature: number, roll: number, whole: number];

/** A table of exact distances: mass [kg], pressure altitude [ft], temperature [degC], ground roll and distance to 50 ft [m]. */
export function odeTable(a: MadeTable['aeroplane'], truth: Truth, { masses, altitudes, temperatures }: TableOf): Row[] {
  return masses.flatMap((mass) =>
    altitudes.flatMap((altitude) =>
      temperatures.map((celsius): Row => [mass, altitude, celsius, ...odeDistances(a, truth, mass, altitude, celsius)]),
    ),
  );
}

/** The same with normal scatter of so much of each distance, rounded to a step [m]. */
export function printed(rows: readonly Row[], scatter: number, step: number, seed: number): Row[] {
  const { roll } = dice(seed);
  const normal = () => Math.sqrt(-2 * Math.log(1 - roll())) * Math.cos(2 * Math.PI * roll());
  const print = (distance: number) => Math.round((distance * Math.exp(scatter * normal())) / step) * step;
  return rows.map(([mass, altitude, temperature, ground, whole]) => [
    mass,
    altitude,
    temperature,
    print(ground),
    print(whole),
  ]);
}
