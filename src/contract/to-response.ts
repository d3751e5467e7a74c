import type { BandContribution, BandedDistance, Shortfall, TakeoffAnswer, WindComponents } from '../planning/answer.ts';
import type { Question } from '../planning/question.ts';
import type { ReferenceKey } from '../references.ts';
import { shown, unitFor } from '../units/presentation.ts';
import { asChosen } from './aeroplane-choice.ts';
import type { Draft } from './present.ts';
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
  const response = {
    outcome: answer.outcome,
    advisory: toAdvisory(how, answer.sentence, answer.cautions),
    air: toAir(how, answer.air),
    wind: toWind(how, answer.wind),
    speeds: toSpeeds(how, answer.speeds),
  } as Draft<TakeoffResponse>;
  if (answer.distances !== undefined) response.distances = toDistances(how, answer.distances);
  if (answer.assessment !== undefined) response.assessment = toAssessment(how, answer.assessment);
  if (answer.shortfall !== undefined) response.shortfall = answer.shortfall.map((one) => toShortfall(how, one));
  response.basis = toBasis(how, answer, question.aeroplaneDigest, stamp);
  response.question = asUnderstood(request, question.aeroplane.revision);
  return response;
}

function toWind(how: Presentation, { headwind, crosswind, crosswindFrom, creditedHeadwind }: WindComponents) {
  const wind = { headwind: shownQuantity(how, 'speed', headwind) } as Draft<TakeoffResponse['wind']>;
  if (crosswind !== undefined) wind.crosswind = shownQuantity(how, 'speed', crosswind);
  if (crosswindFrom !== undefined) wind.crosswindFrom = crosswindFrom;
  wind.creditedHeadwind = shownQuantity(how, 'speed', creditedHeadwind);
  return wind;
}

function toSpeeds(how: Presentation, { stall, rotation, liftOff, screen }: TakeoffAnswer['speeds']) {
  return {
    stall: toSpeedSet(how, stall),
    rotation: toSpeedSet(how, rotation),
    liftOff: toSpeedSet(how, liftOff),
    screen: toSpeedSet(how, screen),
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

function toBandContribution(how: Presentation, { of, groundRoll, airDistance, wholeDistance }: BandContribution) {
  return {
    of,
    groundRollPercent: shownPercent(how, groundRoll, 'nearest'),
    airDistancePercent: shownPercent(how, airDistance, 'nearest'),
    takeoffDistancePercent: shownPercent(how, wholeDistance, 'nearest'),
  };
}

function toShortfall(how: Presentation, { at, axis, table, given, bound, side }: Shortfall) {
  const shortfall = { at } as Draft<NonNullable<TakeoffResponse['shortfall']>[number]>;
  if (axis !== undefined) shortfall.axis = axis;
  if (table !== undefined) shortfall.table = table;
  shortfall.given = toMeasure(how, given);
  shortfall.bound = toMeasure(how, bound);
  shortfall.side = side;
  return shortfall;
}

function toBasis(how: Presentation, answer: TakeoffAnswer, aeroplaneDigest: string, stamp: Stamp) {
  const { method, band, assumed, notGiven, sources } = answer.basis;
  const basis = { method } as Draft<TakeoffResponse['basis']>;
  if (band !== undefined) basis.band = band.map((one) => toBandContribution(how, one));
  basis.assumed = toAssumed(how, assumed);
  basis.notGiven = [...notGiven];
  basis.sources = toSources(sources, citedBy(answer));
  basis.modelVersion = stamp.modelVersion;
  basis.digests = { aeroplane: aeroplaneDigest, rules: stamp.rulesDigest };
  return basis;
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
  const { reference, asOf, stage, units = defaultUnits, rounding = defaultRounding } = request;
  const question = {} as Draft<TakeoffQuestion>;
  if (reference !== undefined) question.reference = reference;
  if (asOf !== undefined) question.asOf = asOf;
  question.aeroplane = asChosen(request.aeroplane, revision);
  question.mass = request.mass;
  question.configuration = request.configuration;
  question.runway = request.runway;
  question.weather = request.weather;
  question.ruleSet = request.ruleSet;
  if (stage !== undefined) question.stage = stage;
  question.units = units;
  question.rounding = rounding;
  return question;
}
