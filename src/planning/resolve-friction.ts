import { rollingFriction } from '../physics/friction.ts';
import type { Assumed } from './assumed.ts';
import type { Surface } from './question.ts';
import { frictionUncertainty } from './rules/input-uncertainties.ts';
import { numberText } from './sentences/measure-text.ts';
import { unstatedGround } from './unstated-ground.ts';

/** Rolling friction of the runway, and of the one that factors are meant to multiply. */
export interface ResolvedFriction {
  /** absent where physics does not speak of the surface */
  readonly actual: number | undefined;
  /** dry pavement */
  readonly reference: number;
  /** the surface in words: 'short wet grass' */
  readonly surface: string;
  readonly assumed: readonly Assumed[];
}

const dryPavement: Surface = { kind: 'paved', state: 'dry' };

/**
 * Rolling friction as the question gives it, else that of the surface, said.
 *
 * Where wheels are also held back by what they displace, no coefficient stands for it, a given one neither.
 *
 * @param surface - of the runway
 * @param jet - a jet's high-pressure tyres
 */
export function resolveFriction(surface: Surface, jet: boolean): ResolvedFriction {
  const reference = rollingFriction(dryPavement, jet);
  if (reference === 'no-data') throw new Error('dry pavement has no rolling friction');
  const known = rollingFriction(surface, jet);
  if (known === 'no-data') {
    return {
      actual: undefined,
      reference: reference.coefficient,
      surface: `${surface.kind}, ${surface.state}`,
      assumed: [],
    };
  }
  const assumed: Assumed[] = unstatedGround(surface, 'takeoff');
  const given = surface.rollingFrictionCoefficient;
  if (given !== undefined) {
    return { actual: given, reference: reference.coefficient, surface: known.because, assumed };
  }
  const other = known.coefficient + 2 * frictionUncertainty(surface);
  assumed.unshift({
    name: 'rolling friction',
    assumption: {
      at: '/runway/surface/rollingFrictionCoefficient',
      value: known.coefficient,
      because: `${known.because}: the end of the published range that gives the longer takeoff`,
      source: known.source,
    },
    otherEnd: {
      kind: 'run',
      member: 'rollingFriction',
      value: other,
      text: numberText(Math.round(other * 1000) / 1000),
    },
  });
  return { actual: known.coefficient, reference: reference.coefficient, surface: known.because, assumed };
}
