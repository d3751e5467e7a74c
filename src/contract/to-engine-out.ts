import type { DecisionSpeed, EngineOut } from '../planning/engine-failure/engine-failure-answer.ts';
import type { DecisionSpeedOnWire, EngineOutOnWire } from './engine-out.ts';
import { present } from './present.ts';
import { type Presentation, shownQuantity } from './shown-quantity.ts';
import { toBandedDistance } from './to-banded-distance.ts';
import { toSpeedSet } from './to-speed-set.ts';

/** What comes of an engine failure: distances up, climbs down. */
export function toEngineOut(how: Presentation, given: EngineOut): EngineOutOnWire {
  const distance = (one: EngineOut['accelerateStopDistance']) => one && toBandedDistance(how, one);
  return present<EngineOutOnWire>({
    outcome: given.outcome,
    why: given.why,
    accelerateStopDistance: distance(given.accelerateStopDistance),
    accelerateGoDistance: distance(given.accelerateGoDistance),
    balancedFieldLength: distance(given.balancedFieldLength),
    screenHeight: shownQuantity(how, 'altitude', given.screenHeight),
    failureSpeed: given.failureSpeed === undefined ? undefined : shownQuantity(how, 'speed', given.failureSpeed),
    brakeEnergy: given.brakeEnergy === undefined ? undefined : shownQuantity(how, 'energy', given.brakeEnergy, 'up'),
    liftOff: toSpeedSet(how, given.liftOff),
    screen: toSpeedSet(how, given.screen),
    climb: given.climb.map(({ phase, height, configuration, speed, gradient, rate, required }) => ({
      phase,
      height: shownQuantity(how, 'altitude', height),
      configuration,
      speed: toSpeedSet(how, speed),
      gradient: shownQuantity(how, 'gradient', gradient, 'down'),
      rate: shownQuantity(how, 'rateOfClimb', rate, 'down'),
      ...(required === undefined ? {} : { required: shownQuantity(how, 'gradient', required, 'up') }),
    })),
    stopRule: given.stopRule,
    timeline: given.timeline.map(({ of, seconds, because, source }) => ({
      of,
      time: shownQuantity(how, 'time', seconds),
      because,
      source,
    })),
    method: given.method,
  });
}

/** The decision speed and its range, each end rounded to the nearest step. */
export function toDecisionSpeed(how: Presentation, { because, range, ...set }: DecisionSpeed): DecisionSpeedOnWire {
  const shown = { ...toSpeedSet(how, set), because };
  if (range === undefined) return shown;
  return {
    ...shown,
    range: {
      lowest: toSpeedSet(how, range.lowest),
      highest: toSpeedSet(how, range.highest),
      lowestBecause: range.lowestBecause,
      highestBecause: range.highestBecause,
    },
  };
}
