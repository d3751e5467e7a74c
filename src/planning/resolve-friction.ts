import { rollingFriction } from '../physics/friction.ts';
import { deepContaminant } from '../physics/runway-surface.ts';
import type { Assumed } from './assumed.ts';
import { contaminantRoll } from './contaminant-roll.ts';
import type { Question, Surface } from './question.ts';
import { frictionUncertainty } from './rules/input-uncertainties.ts';
import type { SurfaceRefusal } from './runway-condition.ts';
import { numberText } from './sentences/measure-text.ts';
import { depthText, surfaceText } from './sentences/surface-text.ts';
import { unstatedGround } from './unstated-ground.ts';

/** Rolling friction of the runway, and of the one that factors are meant to multiply. */
export interface ResolvedFriction {
  /** absent where physics does not speak of the surface */
  readonly actual: number | undefined;
  /** dry pavement */
  readonly reference: number;
  /** drag of a loose contaminant over the square of the ground speed [kg/m]; absent: none */
  readonly contaminantDrag?: number;
  /** the surface in words: 'short wet grass' */
  readonly surface: string;
  /** why physics does not speak of it, where more can be said than that */
  readonly noData?: string;
  readonly assumed: readonly Assumed[];
}

const dryPavement: Surface = { kind: 'paved', state: 'dry' };

/**
 * Rolling friction as the question gives it, else that of the surface, said; and the drag of what the wheels push aside.
 *
 * Without that drag no coefficient stands for a loose contaminant, a given one neither.
 *
 * @param surface - of the runway
 * @param refusal - where nothing is computed on it
 */
export function resolveFriction(
  question: Pick<Question, 'aeroplane' | 'aeroplaneAt'>,
  surface: Surface,
  refusal?: SurfaceRefusal,
): ResolvedFriction {
  const jet = question.aeroplane.propulsion.kind === 'jet';
  const found = rollingFriction(dryPavement, jet);
  if (found === 'no-data') throw new Error('dry pavement has no rolling friction');
  const reference = found.coefficient;
  const none = { actual: undefined, reference, surface: groundText(surface), assumed: [] };
  if (refusal !== undefined) return { ...none, noData: refusal.reason };
  const inTheWay = contaminantRoll(question, surface, 'takeoff');
  if (inTheWay.outcome === 'missing') {
    return { ...none, noData: `its drag on the wheels needs ${inTheWay.pointers.join(' and ')}` };
  }
  const known = rollingFriction(surface, jet, 'added');
  if (known === 'no-data') return none;
  const assumed: Assumed[] = unstatedGround(surface, 'takeoff');
  const contaminant = inTheWay.outcome === 'held-back' ? { contaminantDrag: inTheWay.perSquare } : {};
  if (inTheWay.outcome === 'held-back') assumed.push(...inTheWay.assumed);
  const deep = deepContaminant(surface);
  const over = deep?.depth === undefined ? '' : ` under ${depthText(deep.depth)} of ${surfaceText(deep.kind)}`;
  const resolved = { reference, ...contaminant, surface: `${known.because}${over}`, assumed };
  const given = surface.rollingFrictionCoefficient;
  if (given !== undefined) return { actual: given, ...resolved };
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
  return { actual: known.coefficient, ...resolved };
}

/** A surface that nothing speaks of, in words. */
export function groundText({ kind, state, contaminant }: Surface): string {
  if (contaminant === undefined) return `${kind}, ${state}`;
  const { kind: on, depth } = contaminant;
  return `${kind}, ${depth === undefined ? '' : `${depthText(depth)} of `}${surfaceText(on)}`;
}
