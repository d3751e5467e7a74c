import { interpolate } from '../numerics/interpolate.ts';
import { steadyClimb } from './steady-climb.ts';

/** Drag of a stage of the climb, up to a height above the runway; the last stage has no end. */
export interface ClimbStage {
  /** [m]; absent: for the rest of the path */
  readonly upTo?: number;
  /** zero-lift drag coefficient, flap and gear as they are on this stage */
  readonly zeroLiftDragCoefficient: number;
}

/** The aeroplane at a height on the path. */
export interface ClimbState {
  /** [kg/m3] */
  readonly density: number;
  /** true [m/s] */
  readonly airspeed: number;
  /** of all running engines at that airspeed [N] */
  readonly thrust: number;
}

/** All that a climb away from the runway needs, in SI. */
export interface ClimbOut {
  readonly mass: number;
  readonly wingArea: number;
  readonly inducedDragFactor: number;
  /** where the path starts: distance from brake release and height above it [m] */
  readonly from: { readonly distance: number; readonly height: number };
  /** height above the start of the path up to which it is followed [m] */
  readonly rise: number;
  readonly stages: readonly ClimbStage[];
  /** the aeroplane at a height above brake release [m] */
  readonly stateAt: (height: number) => ClimbState;
  /** counted against the path over the ground [m/s] */
  readonly headwind: number;
}

/** A path in the vertical, or the name of why there is none. */
export type ClimbPath =
  | {
      readonly outcome: 'climbs';
      /** corners of the path from its start: distance from brake release and height above it [m], both rising */
      readonly distances: readonly number[];
      readonly heights: readonly number[];
      readonly leastGradient: number;
    }
  | { readonly outcome: 'does-not-climb'; readonly atHeight: number; readonly gradient: number };

/** Layers the path is cut into: the gradient changes by less than a hundredth of itself over one. */
const layers = 16;

/**
 * The path after the screen at a steady calibrated airspeed, straight ahead.
 *
 * In each of 16 layers, and in the parts a stage ends in, the distance is dh/tan(gamma) less the wind's share dh/(V sin gamma) w, with
 * the gradient at the middle of the layer: the error falls with the square of the layer's depth.
 *
 * @returns the corners of the path; 'does-not-climb' at the first height where the gradient or the way over the ground is not
 * positive
 * @remarks Wings level, out of ground effect, no acceleration; gear and flap change at once at the height of their stage.
 * @see references.AndersonPerformance, ch. 5
 */
export function climbOut({ from, rise, stages, stateAt, headwind, ...aeroplane }: ClimbOut): ClimbPath {
  const top = from.height + rise;
  const ends = layerEnds(from.height, top, stages);
  const distances = [from.distance];
  const heights = [from.height];
  let leastGradient = Number.POSITIVE_INFINITY;
  for (let i = 1; i < ends.length; i++) {
    const low = ends[i - 1] as number;
    const high = ends[i] as number;
    const middle = (low + high) / 2;
    const { zeroLiftDragCoefficient } = stageAt(stages, middle);
    const state = stateAt(middle);
    const { gradient, rate } = steadyClimb({ ...aeroplane, ...state, zeroLiftDragCoefficient });
    const way = (high - low) * (1 / gradient - headwind / rate);
    if (!(gradient > 0 && way > 0)) return { outcome: 'does-not-climb', atHeight: middle, gradient };
    leastGradient = Math.min(leastGradient, gradient);
    distances.push((distances[i - 1] as number) + way);
    heights.push(high);
  }
  return { outcome: 'climbs', distances, heights, leastGradient };
}

/**
 * Height of the path above brake release at a distance from it [m].
 *
 * @param distance - [m], not before the path begins
 * @returns the last height beyond its end
 */
export function pathHeight(
  { distances, heights }: Extract<ClimbPath, { outcome: 'climbs' }>,
  distance: number,
): number {
  if (distance < (distances[0] as number)) throw new RangeError('distance must not lie before the path begins');
  const height = interpolate(distances, heights, distance);
  return height === 'outside' ? (heights[heights.length - 1] as number) : height;
}

function layerEnds(low: number, high: number, stages: readonly ClimbStage[]): number[] {
  const ends = Array.from({ length: layers + 1 }, (_, i) => low + ((high - low) * i) / layers);
  for (const { upTo } of stages) if (upTo !== undefined && upTo > low && upTo < high) ends.push(upTo);
  return ends.sort((a, b) => a - b).filter((end, i) => i === 0 || end > (ends[i - 1] as number));
}

function stageAt(stages: readonly ClimbStage[], height: number): ClimbStage {
  const stage = stages.find(({ upTo }) => upTo === undefined || height < upTo);
  if (stage === undefined) throw new RangeError('the last stage of a climb must have no end');
  return stage;
}
