import type { BandContribution, BandedDistance, Shortfall, TakeoffAnswer, WindComponents } from '../planning/answer.ts';
import type { Question } from '../planning/question.ts';
import type { ReferenceKey } from '../references.ts';
import { shown, unitFor } from '../units/presentation.ts';
import { asChosen } from './aeroplane-choice.ts';
import { defaultRounding, defaultUnits } from './question-frame.ts';
import { type Presentation, shownPercent, shownQuantity } from './shown-quantity.ts';
import type { TakeoffRequest } from './takeoff-request.ts';
import type { TakeoffQuestion, TakeoffResponse } from './takeoff-response.ts';
import { toAdvisory, toMeasure } from './to-advisory.ts';
import { toAir } from './to-air.ts';
import { toAssessment } from './to-assessment.ts';
import { type Stamp, toAssumed, toSources } from './to-basis.ts';
import { toSpeedSet } from './to-speed-set.ts';

/**
 * The gate out: planning's answer in the units asked for, rounded the safe way, in the order of the contract.
 *
 * Distances go up, the lower end of a band down, what is available and spare down, all else to the nearest step.
 *
 * @param request - as read
 * @param question - what the gate in made of it
 */
export function toResponse(
  answer: TakeoffAnswer,
  request: TakeoffRequest,
  question: Question,
  stamp: Stamp,
): TakeoffResponse {
  const how = { units: question.units, rounding: request.rounding ?? defaultRounding };
  const { speeds, distances, assessment, shortfall, basis } = answer;
  return {
    outcome: answer.outcome,
    advisory: toAdvisory(how, answer.sentence, answer.cautions),
    air: toAir(how, answer.air),
    wind: toWind(how, answer.wind),
    speeds: {
      stall: toSpeedSet(how, speeds.stall),
      rotation: toSpeedSet(how, speeds.rotation),
      liftOff: toSpeedSet(how, speeds.liftOff),
      screen: toSpeedSet(how, speeds.screen),
    },
    ...(distances === undefined ? {} : { distances: toDistances(how, distances) }),
    ...(assessment === undefined ? {} : { assessment: toAssessment(how, assessment) }),
    ...(shortfall === undefined ? {} : { shortfall: shortfall.map((one) => toShortfall(how, one)) }),
    basis: {
      method: basis.method,
      ...(basis.band === undefined ? {} : { band: basis.band.map((one) => toBandContribution(how, one)) }),
      assumed: toAssumed(how, basis.assumed),
      notGiven: [...basis.notGiven],
      sources: toSources(basis.sources, citedBy(answer)),
      modelVersion: stamp.modelVersion,
      digests: { aeroplane: question.aeroplaneDigest, rules: stamp.rulesDigest },
    },
    question: asUnderstood(request, question.aeroplane.revision),
  };
}

function toWind(how: Presentation, { headwind, crosswind, crosswindFrom, creditedHeadwind }: WindComponents) {
  return {
    headwind: shownQuantity(how, 'speed', headwind),
    ...(crosswind === undefined ? {} : { crosswind: shownQuantity(how, 'speed', crosswind) }),
    ...(crosswindFrom === undefined ? {} : { crosswindFrom }),
    creditedHeadwind: shownQuantity(how, 'speed', creditedHeadwind),
  };
}

function toDistances(how: Presentation, given: NonNullable<TakeoffAnswer['distances']>) {
  return {
    screenHeight: shownQuantity(how, 'altitude', given.screenHeight),
    groundRoll: toBandedDistance(how, given.groundRoll),
    airDistance: toBandedDistance(how, given.airDistance),
    takeoffDistance: toBandedDistance(how, given.takeoffDistance),
    groundRollTime: shownQuantity(how, 'time', given.groundRollTime),
    airTime: shownQuantity(how, 'time', given.airTime),
  };
}

function toBandedDistance({ units, rounding }: Presentation, { value, low, high, method }: BandedDistance) {
  return {
    value: shown(units, 'distance', value, 'up', rounding),
    unit: unitFor(units, 'distance') as 'm' | 'ft',
    low: shown(units, 'distance', low, 'down', rounding),
    high: shown(units, 'distance', high, 'up', rounding),
    method,
  };
}

function toBandContribution(how: Presentation, { of, groundRoll, airDistance, takeoffDistance }: BandContribution) {
  return {
    of,
    groundRollPercent: shownPercent(how, groundRoll, 'nearest'),
    airDistancePercent: shownPercent(how, airDistance, 'nearest'),
    takeoffDistancePercent: shownPercent(how, takeoffDistance, 'nearest'),
  };
}

function toShortfall(how: Presentation, { at, axis, table, given, bound, side }: Shortfall) {
  return {
    at,
    ...(axis === undefined ? {} : { axis }),
    ...(table === undefined ? {} : { table }),
    given: toMeasure(how, given),
    bound: toMeasure(how, bound),
    side,
  };
}

/** Sources that checks, factors, cautions and assumptions name: an answer names no key that it does not list. */
function citedBy({ assessment, cautions, basis }: TakeoffAnswer): ReferenceKey[] {
  const keys: ReferenceKey[] = [];
  for (const check of assessment?.checks ?? []) {
    keys.push(check.source);
    for (const factor of check.factors) keys.push(factor.source);
    for (const factor of check.alternative?.factors ?? []) keys.push(factor.source);
  }
  for (const { source } of cautions) if (source !== undefined) keys.push(source);
  for (const { source } of basis.assumed) if (source !== undefined) keys.push(source);
  return keys;
}

/** The request with what was filled in, in the order of its schema; it can be sent again as it stands. */
function asUnderstood(request: TakeoffRequest, revision: string): TakeoffQuestion {
  const { reference, asOf, aeroplane, stage } = request;
  return {
    ...(reference === undefined ? {} : { reference }),
    ...(asOf === undefined ? {} : { asOf }),
    aeroplane: asChosen(aeroplane, revision),
    mass: request.mass,
    configuration: request.configuration,
    runway: request.runway,
    weather: request.weather,
    ruleSet: request.ruleSet,
    ...(stage === undefined ? {} : { stage }),
    units: request.units ?? defaultUnits,
    rounding: request.rounding ?? defaultRounding,
  };
}
