import { balancedFieldAeroplane as jet } from '../published/balanced-field.ts';
import { balancedFieldSpeeds } from './engine-failure-runs.ts';
import { odexState } from './odex.ts';

const g = 9.80665;
const tolerance = 1e-8;
const thrust = jet.thrustOfBoth / 2;
const greatestIncidence = (jet.greatestIncidenceDegrees * Math.PI) / 180;
/** The published flight ends climbing at 5 degrees. */
const endAngle = (5 * Math.PI) / 180;

type State = readonly number[];

/** Induced drag factor by the problem's own law of ground effect. */
function induced(height: number): number {
  const x = 33 * ((Math.max(0, height) + jet.wingHeight) / (jet.span / 2)) ** 1.5;
  return x / (1 + x) / (Math.PI * jet.aspectRatio * jet.oswaldFactor);
}

function forces(airspeed: number, incidence: number, height: number) {
  const pressure = 0.5 * jet.density * airspeed * airspeed * jet.wingArea;
  const lift = jet.groundLift + (incidence / greatestIncidence) * (jet.maximumLift - jet.groundLift);
  return { lift: pressure * lift, drag: pressure * (jet.zeroLiftDrag + induced(height) * lift * lift) };
}

/** Whole steps until a sign changes, the last one halved down: the state there. */
function until(
  step: (state: State, from: number, to: number) => State,
  begin: State,
  done: (state: State, t: number) => boolean,
) {
  let state = begin;
  for (let t = 0; t < 20; t += 0.25) {
    const next = step(state, t, t + 0.25);
    if (done(next, t + 0.25)) {
      let [low, high] = [0, 0.25];
      for (let i = 0; i < 26; i++) {
        const middle = (low + high) / 2;
        if (done(step(state, t, t + middle), t + middle)) high = middle;
        else low = middle;
      }
      return { state: step(state, t, t + high), time: t + high };
    }
    state = next;
  }
  return { state, time: 20 };
}

/** From V_R on one engine, incidence growing at a rate [rad/s], until the wheels carry nothing: distance, speed, incidence. */
function rotation(rate: number) {
  const onWheels = (t: number, airspeed: number) =>
    jet.mass * g - forces(airspeed, rate * t, 0).lift - thrust * Math.sin(rate * t);
  const law = (t: number, [, airspeed]: State) => {
    const { drag } = forces(airspeed as number, rate * t, 0);
    const held = jet.rollingFriction * onWheels(t, airspeed as number);
    return [airspeed as number, (thrust * Math.cos(rate * t) - drag - held) / jet.mass];
  };
  const { state, time } = until(
    (from, t, to) => odexState(law, from, t, to, tolerance),
    [0, balancedFieldSpeeds.rotation],
    ([, airspeed], t) => onWheels(t, airspeed as number) <= 0,
  );
  return { distance: state[0] as number, airspeed: state[1] as number, incidence: rate * time };
}

/** From lift-off to the screen, incidence even in time: distance, speed and angle there, and the greatest incidence. */
function climb(airspeed: number, first: number, rate: number) {
  const law = (t: number, [, v, height, angle]: State) => {
    const speed = v as number;
    const incidence = first + rate * t;
    const { lift, drag } = forces(speed, incidence, height as number);
    const [sine, cosine] = [Math.sin(angle as number), Math.cos(angle as number)];
    return [
      speed * cosine,
      (thrust * Math.cos(incidence) - drag) / jet.mass - g * sine,
      speed * sine,
      (thrust * Math.sin(incidence) + lift) / (jet.mass * speed) - (g * cosine) / speed,
    ];
  };
  const { state, time } = until(
    (from, t, to) => odexState(law, from, t, to, tolerance),
    [0, airspeed, 0, 0],
    ([, , height]) => (height as number) >= jet.screenHeight,
  );
  const [distance, speed, , angle] = state as [number, number, number, number];
  return { distance, speed, angle, greatest: Math.max(first, first + rate * time) };
}

/** The climb that ends at 1.25 V_S and 5 degrees, by Newton's rule in its two free figures; undefined where it asks for too much. */
function climbToEnd(airspeed: number, begin: number): number | undefined {
  const miss = (first: number, rate: number) => {
    const { speed, angle } = climb(airspeed, first, rate);
    return [speed / balancedFieldSpeeds.screen - 1, angle - endAngle] as const;
  };
  let [first, rate] = [begin + 0.01, 0.02];
  for (let i = 0; i < 25; i++) {
    const [v, a] = miss(first, rate);
    if (Math.abs(v) + Math.abs(a) < 1e-6) {
      const { distance, greatest } = climb(airspeed, first, rate);
      return greatest <= greatestIncidence ? distance : undefined;
    }
    const [v1, a1] = miss(first + 1e-4, rate).map((value, k) => (value - ([v, a][k] as number)) / 1e-4) as [
      number,
      number,
    ];
    const [v2, a2] = miss(first, rate + 1e-4).map((value, k) => (value - ([v, a][k] as number)) / 1e-4) as [
      number,
      number,
    ];
    const determinant = v1 * a2 - v2 * a1;
    const [by, more] = [(v * a2 - v2 * a) / determinant, (v1 * a - v * a1) / determinant];
    const share = Math.min(1, 0.03 / Math.max(Math.abs(by), Math.abs(more)));
    first -= share * by;
    rate -= share * more;
  }
  return undefined;
}

/**
 * The shortest way of the published problem from V_R to the screen among rotations of even rate followed by incidences even in time,
 * ending as published: every one a flight that the problem allows, so not shorter than its optimum.
 */
export function shortestFromRotation(): number {
  let shortest = Number.POSITIVE_INFINITY;
  for (let degrees = 1.7; degrees < 3.6; degrees += 0.2) {
    const { distance, airspeed, incidence } = rotation((degrees * Math.PI) / 180);
    const air = climbToEnd(airspeed, incidence);
    if (air !== undefined) shortest = Math.min(shortest, distance + air);
  }
  return shortest;
}
