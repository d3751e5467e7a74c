import type { AirspeedCalibration } from '../../performance/aeroplane.ts';
import { configuredStallSpeed } from '../../performance/speeds/configured-stall-speed.ts';
import type { Fault } from '../../planning/fault.ts';
import type { AeroplaneDefinition } from '../aeroplane-definition.ts';
import type { ConfigurationOnWire } from '../configuration.ts';
import type { ScheduledSpeedOnWire } from '../lift.ts';
import { si } from '../quantity.ts';
import { figure } from '../written.ts';
import { checkLift } from './check-lift.ts';

/** Speeds that follow one another: the second is not below the first in flight, nor above it on landing. */
const orders = [
  ['rotation', 'liftOff'],
  ['liftOff', 'screen'],
  ['rotation', 'engineOutLiftOff'],
  ['engineOutLiftOff', 'engineOutScreen'],
  ['touchdown', 'landingReference'],
] as const;

/** A speed of the procedure further above the stall than this is a slip; our choice. */
const greatestStallRatio = 2.5;

/**
 * One configuration: its lift, its drag and the order of its speeds.
 *
 * @param wingArea - [m2]; undefined where it is at fault itself, so that nothing can be said of lift
 * @param calibration - 'at-fault' likewise
 */
export function checkConfiguration(
  id: string,
  definition: AeroplaneDefinition,
  wingArea: number | undefined,
  calibration: AirspeedCalibration | 'at-fault' | undefined,
  at: string,
): Fault[] {
  const given = definition.configurations[id] as ConfigurationOnWire;
  const here = `${at}/configurations/${id}`;
  const faults: Fault[] = [];
  if (given.for.length === 2 && given.for[0] === given.for[1]) {
    faults.push({
      pointer: `${here}/for/1`,
      code: 'contradiction',
      message: `${given.for[1]} is named twice.`,
      received: given.for[1] as string,
    });
  }
  for (const member of ['groundDragIncrementCoefficient', 'airDragIncrementCoefficient'] as const) {
    const increment = given[member] ?? 0;
    if (definition.drag.zeroLiftCoefficient + increment <= 0) {
      faults.push({
        pointer: `${here}/${member}`,
        code: 'contradiction',
        message: `With ${increment} the drag coefficient at zero lift is not above 0.`,
        received: increment,
        allowed: `above ${-definition.drag.zeroLiftCoefficient}`,
      });
    }
  }
  const indicated = 'stallSpeed' in given.maximumLift && given.maximumLift.type === 'ias';
  if (wingArea === undefined || (calibration === 'at-fault' && indicated)) return faults;
  const lift = checkLift(
    given.maximumLift,
    wingArea,
    `${here}/maximumLift`,
    calibration === 'at-fault' ? undefined : calibration,
    `${at}/airspeedCalibration`,
  );
  if ('faults' in lift) return [...faults, ...lift.faults];
  if (given.groundLiftCoefficient !== undefined && given.groundLiftCoefficient >= lift.coefficient) {
    faults.push({
      pointer: `${here}/groundLiftCoefficient`,
      code: 'contradiction',
      message: `A lift coefficient of ${given.groundLiftCoefficient} in the roll is not below the maximum of ${figure(lift.coefficient)}.`,
      received: given.groundLiftCoefficient,
      allowed: `below ${figure(lift.coefficient)}`,
    });
  }
  return [...faults, ...checkSpeeds(given.speeds ?? {}, lift.coefficient, wingArea, `${here}/speeds`)];
}

function checkSpeeds(
  speeds: NonNullable<ConfigurationOnWire['speeds']>,
  coefficient: number,
  wingArea: number,
  at: string,
): Fault[] {
  const faults: Fault[] = [];
  const ratios: Partial<Record<keyof typeof speeds, number>> = {};
  for (const name of Object.keys(speeds) as (keyof typeof speeds)[]) {
    const speed = speeds[name];
    if (speed === undefined) continue;
    const ratio = stallRatio(speed, coefficient, wingArea);
    if ('stallRatio' in speed || (ratio >= 1 && ratio <= greatestStallRatio)) ratios[name] = ratio;
    else {
      faults.push({
        pointer: `${at}/${name}/cas`,
        code: 'implausible',
        message: `${name} is ${figure(ratio)} times the stall speed at that mass.`,
        received: speed.cas.value,
        allowed: `1 to ${greatestStallRatio} times the stall speed`,
        hint: 'Check the unit of the speed and the mass it belongs to.',
      });
    }
  }
  for (const [lower, higher] of orders) {
    const low = ratios[lower];
    const high = ratios[higher];
    if (low === undefined || high === undefined || high >= low * (1 - 1e-9)) continue;
    faults.push({
      pointer: `${at}/${higher}`,
      code: 'contradiction',
      message: `${higher} at ${figure(high)} times the stall speed is below ${lower} at ${figure(low)}.`,
      allowed: `at least ${figure(low)} times the stall speed`,
    });
  }
  return faults;
}

/** Over the 1-g stall speed at the same mass, at low speed and sea level where calibrated and equivalent are one. */
function stallRatio(speed: ScheduledSpeedOnWire, coefficient: number, wingArea: number): number {
  if ('stallRatio' in speed) return speed.stallRatio;
  return (
    si('speed', speed.cas) /
    configuredStallSpeed({ kind: 'coefficient', coefficient }, wingArea, si('mass', speed.mass))
  );
}
