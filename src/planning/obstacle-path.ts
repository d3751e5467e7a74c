import { type ClimbPath, type ClimbStage, climbOut, pathHeight } from '../performance/climb-out.ts';
import { groundRise } from '../performance/ground-rise.ts';
import { tasFromEas } from '../physics/airspeed.ts';
import { inducedDragFactor } from '../physics/drag.ts';
import { airAloft } from './air-aloft.ts';
import type { Check, ObstaclePath } from './answer.ts';
import type { PreparedTakeoff } from './prepare-takeoff.ts';
import type { TakeoffQuestion } from './question.ts';
import type { ObstacleDemand } from './rules/rule-set.ts';

/** Height above the runway up to which the path is followed [m]: 1 500 ft, where the rules let it end. */
const pathTop = 1500 * 0.3048;

/** Where the path begins at the screen height. */
export interface PathStart {
  /** from brake release [m] */
  readonly distance: number;
  readonly because: string;
}

/**
 * The path past the obstacles of a question: straight ahead, all engines, at the screen speed.
 *
 * The ground line is followed to where the path begins; from there the climb is steady, in air that thins with height by the
 * standard lapse. Drag falls as the configuration says gear and flap come up. A start offset brings the end of TODA nearer by
 * itself.
 *
 * @returns undefined where no obstacles are given
 */
export function obstaclePathOf(
  question: TakeoffQuestion,
  prepared: PreparedTakeoff,
  start: PathStart,
): ObstaclePath | undefined {
  const { runway } = question;
  const { obstacles, lineUp } = runway;
  if (obstacles === undefined) return undefined;
  const rise = groundRise(runway, start.distance);
  const path = pathFrom(question, prepared, {
    distance: start.distance,
    height: question.aeroplane.certification.screenHeight + rise,
  });
  if (path.outcome !== 'climbs') return path;
  const { toda = 0 } = prepared.conditions.declared.published;
  const origin = obstacles.from === 'brake-release' ? 0 : Math.max(0, toda - (lineUp?.tora ?? 0));
  const level = groundRise(runway, origin);
  const cleared = obstacles.list.map(({ distance, height }) => {
    const along = origin + distance;
    const found = (along < start.distance ? groundRise(runway, along) : pathHeight(path, along)) - level;
    return { distance, height, pathHeight: found, clearance: found - height };
  });
  const least = Math.min(...cleared.map(({ clearance }) => clearance));
  return {
    outcome: 'climbs',
    begins: start.distance,
    because: start.because,
    obstacles: cleared,
    critical: cleared.findIndex(({ clearance }) => clearance === least),
  };
}

/** The check of a rule set's clearance over the critical obstacle. */
export function obstacleCheck({ code, clearance, source }: ObstacleDemand, path: ObstaclePath): Check {
  const shared = { code, of: 'obstacleClearance', factors: [], unit: 'altitude' as const, required: clearance, source };
  if (path.outcome === 'outside-stated-data') {
    return { ...shared, result: 'not-assessed', why: 'thrust is not known at the airspeeds of the climb' };
  }
  if (path.outcome === 'does-not-climb') return { ...shared, result: 'fails', why: 'the path does not climb' };
  const available = path.obstacles[path.critical]?.clearance ?? 0;
  const margin = available - clearance;
  return { ...shared, available, margin, marginRatio: margin / clearance, result: margin >= 0 ? 'passes' : 'fails' };
}

function pathFrom(
  question: TakeoffQuestion,
  { conditions, speeds, power, thrustIn, resolved }: PreparedTakeoff,
  from: { readonly distance: number; readonly height: number },
): ClimbPath | Extract<ObstaclePath, { outcome: 'outside-stated-data' }> {
  const { aeroplane, mass } = question;
  const { wing, drag } = aeroplane;
  let outside: Extract<ObstaclePath, { outcome: 'outside-stated-data' }> | undefined;
  const path = climbOut({
    mass,
    wingArea: wing.area,
    inducedDragFactor: inducedDragFactor(wing.span, wing.area, drag.oswaldFactor),
    from,
    rise: pathTop,
    stages: stagesOf(drag.zeroLiftCoefficient, resolved.airDragIncrement, conditions.configuration.climbOut ?? []),
    headwind: conditions.creditedHeadwind,
    stateAt: (height) => {
      const air = airAloft(conditions.air, height);
      const thrust = thrustIn(air, aeroplane.propulsion, power.thrustFactor);
      const airspeed = tasFromEas(speeds.screen.eas, air.density);
      const [lowest, highest] = thrust.domain ?? [0, airspeed];
      if (airspeed < lowest || airspeed > highest) {
        outside ??= { outcome: 'outside-stated-data', airspeed, bound: airspeed < lowest ? lowest : highest };
      }
      return { density: air.density, airspeed, thrust: thrust.at(Math.min(highest, Math.max(lowest, airspeed))) };
    },
  });
  return outside ?? path;
}

function stagesOf(
  zeroLift: number,
  increment: number,
  changes: readonly { readonly from: number; readonly airDragIncrementCoefficient: number }[],
): ClimbStage[] {
  const drags = [increment, ...changes.map((change) => change.airDragIncrementCoefficient)];
  return drags.map((dragIncrement, i) => {
    const upTo = changes[i]?.from;
    const zeroLiftDragCoefficient = zeroLift + dragIncrement;
    return upTo === undefined ? { zeroLiftDragCoefficient } : { upTo, zeroLiftDragCoefficient };
  });
}
