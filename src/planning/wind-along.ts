import { type WindResolved, windComponents } from '../physics/wind.ts';
import type { WindComponents } from './answer.ts';
import type { Fault } from './fault.ts';
import type { Runway, Wind } from './question.ts';

/** The wind on this runway as given [m/s], before any credit. */
export interface WindAlong extends Omit<WindComponents, 'creditedHeadwind'> {
  /** the components of the gust, which no distance counts; absent without a gust */
  readonly gust?: {
    readonly speed: number;
    readonly mean: number;
    readonly headwind: number;
    readonly crosswind: number;
  };
  /** true where the direction varies and the components are the least headwind and the greatest crosswind in the sector */
  readonly variable?: boolean;
}

type ReportedWind = Extract<Wind, { kind: 'from' }>;
type Components = WindResolved & { readonly variable?: boolean };

/**
 * Components of the reported wind along and across the direction of movement.
 *
 * Directions are brought to one north first: magnetic = true - variation, east positive. Of a variable direction the least
 * headwind and the greatest crosswind in the sector are taken; of a wind from any direction the full speed as either.
 *
 * @param runway - direction [rad] and its reference
 * @param wind - as reported
 * @returns the components [m/s], or a fault where the norths differ and no variation is given
 * @see references.Phak, crosswind component chart
 */
export function windAlong(
  runway: Pick<Runway, 'direction' | 'directionReference' | 'magneticVariation'>,
  wind: Wind,
): WindAlong | Fault {
  if (wind.kind === 'calm') return { headwind: 0, crosswind: 0 };
  if (wind.kind === 'components') {
    return { headwind: wind.headwind, ...(wind.crosswind === undefined ? {} : { crosswind: wind.crosswind }) };
  }
  if (wind.kind === 'variable') return allRound(wind);
  const turn = turnTo(runway, wind.fromReference);
  if (turn === undefined) {
    return {
      pointer: '/runway/magneticVariation',
      code: 'missing',
      message: `The runway's direction is ${runway.directionReference} and the wind's is ${wind.fromReference}: without the magnetic variation they cannot be compared.`,
      allowed: 'the magnetic variation, east positive',
    };
  }
  const components = resolved(wind, turn, wind.speed, runway.direction);
  if (wind.gust === undefined) return components;
  const { headwind, crosswind } = resolved(wind, turn, wind.gust, runway.direction);
  return { ...components, gust: { speed: wind.gust, mean: wind.speed, headwind, crosswind } };
}

function allRound({ speed, gust }: Extract<Wind, { kind: 'variable' }>): WindAlong {
  const components = { headwind: 0 - speed, crosswind: speed, variable: true };
  if (gust === undefined) return components;
  return { ...components, gust: { speed: gust, mean: speed, headwind: 0 - gust, crosswind: gust } };
}

function resolved(wind: ReportedWind, turn: number, speed: number, direction: number): Components {
  if (wind.variable === undefined) return windComponents(wind.from + turn, speed, direction);
  return worstOf(wind.variable.from + turn, wind.variable.to + turn, wind.from + turn, speed, direction);
}

/** What to add to the wind's direction to have it from the runway's north; undefined where that is not known. */
function turnTo(
  { directionReference, magneticVariation }: Pick<Runway, 'directionReference' | 'magneticVariation'>,
  fromReference: 'true' | 'magnetic',
): number | undefined {
  if (directionReference === fromReference) return 0;
  if (magneticVariation === undefined) return undefined;
  return fromReference === 'true' ? -magneticVariation : magneticVariation;
}

const turnAround = 2 * Math.PI;

/** Least headwind and greatest crosswind over the sector clockwise from one direction to another, and over the mean direction. */
function worstOf(from: number, to: number, mean: number, speed: number, direction: number): Components {
  const width = positive(to - from);
  const candidates = [from, to, mean];
  for (const quarter of [Math.PI, Math.PI / 2, -Math.PI / 2]) {
    if (positive(direction + quarter - from) <= width) candidates.push(direction + quarter);
  }
  const all = candidates.map((candidate) => windComponents(candidate, speed, direction));
  const headwind = Math.min(...all.map((one) => one.headwind));
  const widest = all.reduce((worst, one) => (one.crosswind > worst.crosswind ? one : worst));
  return { ...widest, headwind, variable: true };
}

/** The same angle in [0, 2 pi). */
function positive(angle: number): number {
  const rest = angle % turnAround;
  return rest < 0 ? rest + turnAround : rest;
}

/** The wind as an answer shows it. */
export function windAnswer(
  { headwind, crosswind, crosswindFrom }: WindAlong,
  creditedHeadwind: number,
): WindComponents {
  return {
    headwind,
    ...(crosswind === undefined ? {} : { crosswind }),
    ...(crosswindFrom === undefined ? {} : { crosswindFrom }),
    creditedHeadwind,
  };
}
