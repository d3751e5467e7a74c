import type { Fault } from '../../planning/fault.ts';
import { si } from '../quantity.ts';
import type { RunwayOnWire } from '../runway.ts';
import type { WindOnWire } from '../weather.ts';
import { written } from '../written.ts';

/** The mean direction may lie this far outside the extremes, which are given to ten degrees [deg]. */
const directionStep = 10;

/** Members of the wind against each other, and its directions against the runway's. */
export function checkWind(wind: WindOnWire, runway: RunwayOnWire): Fault[] {
  if (wind === 'calm' || 'headwind' in wind) return [];
  const faults: Fault[] = [];
  const { gust, speed } = wind;
  if (gust !== undefined && si('speed', gust) < si('speed', speed) * (1 - 1e-9)) {
    faults.push({
      pointer: '/weather/wind/gust',
      code: 'contradiction',
      message: `Gusts of ${written(gust)} are below the mean speed ${written(speed)}.`,
      received: gust.value,
      allowed: `at least ${written(speed)}`,
      hint: 'gust is the highest speed, not what comes on top of the mean.',
    });
  }
  if (wind.from === 'variable') return faults;
  const { from, variable } = wind;
  if (variable !== undefined) {
    const sector = turn(variable.from.value, variable.to.value);
    const inside = turn(variable.from.value, from.value);
    if (inside > sector + directionStep && inside < 360 - directionStep) {
      faults.push({
        pointer: '/weather/wind/variable',
        code: 'contradiction',
        message: `The mean direction ${written(from)} is not between ${written(variable.from)} and ${written(variable.to)}, going clockwise.`,
        hint: 'Check whether the two were exchanged.',
      });
    }
  }
  if (wind.fromReference !== runway.directionReference && runway.magneticVariation === undefined) {
    faults.push({
      pointer: '/runway/magneticVariation',
      code: 'missing',
      message: `The runway's direction is ${runway.directionReference} and the wind's is ${wind.fromReference}: the variation between them is needed.`,
      hint: 'East positive.',
    });
  }
  return faults;
}

/** Clockwise from one direction to another, 0 to 360 [deg]. */
function turn(from: number, to: number): number {
  return (((to - from) % 360) + 360) % 360;
}
