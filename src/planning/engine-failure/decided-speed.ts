import { balancedField } from '../../performance/engine-failure/balanced-field.ts';
import { type DecisionLimits, decisionBounds } from '../../performance/engine-failure/decision-bounds.ts';
import type {
  BalancedField,
  DecisionBounds,
  EngineFailureRun,
} from '../../performance/engine-failure/engine-failure-run.ts';
import { type DecisionLengths, type V1Range, v1Range } from '../../performance/engine-failure/v1-range.ts';
import type { DecisionBecause } from './engine-failure-answer.ts';

/** Stop and go as long as each other, or one of them longer throughout. */
export type Field = Extract<BalancedField, { outcome: 'balanced' | 'go-longer-throughout' | 'stop-longer-throughout' }>;

/** A decision speed and how it came about, or the name of why there is none. */
export type Decided =
  | {
      readonly outcome: 'decided';
      /** V1, true [m/s] */
      readonly speed: number;
      readonly because: DecisionBecause;
      readonly bounds: DecisionBounds;
      readonly field: BalancedField;
      readonly range: V1Range;
    }
  | {
      readonly outcome: 'undecided';
      /** what the aeroplane allows; absent where the thrust is not known there */
      readonly bounds?: DecisionBounds;
      readonly field: Exclude<BalancedField, Field>;
    };

/** The ends of the range are roots found to a millionth [m/s]: so far inside them the distance fits, and not only about so. */
const rootTolerance = 4e-6;

/**
 * The decision speed: the one asked for, else that of the balanced field, moved into the range of those from which the aeroplane
 * both stops and goes on in the lengths that there are.
 *
 * @param run - in the wind that counts
 * @param limits - of the aeroplane
 * @param lengths - that count [m], Infinity where one is not declared
 * @param askedFor - true [m/s], within the bounds; beyond them by rounding it is held there
 * @see references.EuAirOps205 for one speed for stopping and going on
 */
export function decidedSpeed(
  run: EngineFailureRun,
  limits: DecisionLimits,
  lengths: DecisionLengths,
  askedFor?: number,
): Decided {
  const bounds = decisionBounds(run, limits);
  if ('outcome' in bounds) return { outcome: 'undecided', field: bounds };
  const field = balancedField(run, bounds);
  if (field.outcome === 'no-decision-speed') return { outcome: 'undecided', bounds, field };
  const range = v1Range(run, bounds, lengths);
  const found = { outcome: 'decided', bounds, field, range } as const;
  if (askedFor !== undefined) {
    const speed = Math.min(bounds.highest.speed, Math.max(bounds.lowest.speed, askedFor));
    return { ...found, speed, because: 'asked-for' };
  }
  if (!isField(field)) {
    if (field.outcome !== 'single-engine-cannot-continue') return { outcome: 'undecided', bounds, field };
    return { ...found, speed: bounds.highest.speed, because: field.outcome };
  }
  if (range.outcome !== 'decision-speeds') return { ...found, speed: field.speed, because: field.outcome };
  if (field.speed < range.lowest.speed) {
    const speed = Math.min(range.lowest.speed + rootTolerance, range.highest.speed);
    return { ...found, speed, because: 'takeoff-distance-available' };
  }
  if (field.speed > range.highest.speed) {
    const speed = Math.max(range.highest.speed - rootTolerance, range.lowest.speed);
    return { ...found, speed, because: 'accelerate-stop-distance-available' };
  }
  return { ...found, speed: field.speed, because: field.outcome };
}

/** Whether stop and go could be compared. */
export function isField(field: BalancedField): field is Field {
  return (
    field.outcome === 'balanced' ||
    field.outcome === 'go-longer-throughout' ||
    field.outcome === 'stop-longer-throughout'
  );
}
