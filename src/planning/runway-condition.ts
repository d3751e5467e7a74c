import type { Aeroplane } from '../performance/aeroplane.ts';
import { type DescribedCode, type RunwayConditionCode, runwayConditionCode } from '../physics/runway-condition-code.ts';
import { deepContaminant } from '../physics/runway-surface.ts';
import type { Shortfall } from './answer.ts';
import type { Question, Surface } from './question.ts';
import { deepestForLight, heaviestLight } from './rules/contaminated-runway.ts';
import { depthText, surfaceText } from './sentences/surface-text.ts';

type Thirds = readonly [RunwayConditionCode, RunwayConditionCode, RunwayConditionCode];

/** Why a takeoff or a landing is not computed on a surface, whatever else speaks of it. */
export interface SurfaceRefusal {
  /** for a sentence, behind the surface in words */
  readonly reason: string;
  /** absent where no number shows it */
  readonly shortfall?: readonly Shortfall[];
}

/** What lies on a runway, by third, and what follows from it. */
export interface RunwayCondition {
  /** codes of the thirds in the direction of movement: the worse of given and derived; undefined where nothing speaks */
  readonly codes: Thirds | undefined;
  readonly given: Thirds | undefined;
  /** what the surface, its contaminant and the temperature come to */
  readonly derived: DescribedCode | undefined;
  /** a runway neither dry nor wet: contaminated, or medium to poor and worse */
  readonly isSlippery: boolean;
  readonly refusal: SurfaceRefusal | undefined;
}

/** What the condition of a runway follows from. */
export interface ConditionAsked {
  readonly aeroplane: Pick<Aeroplane, 'category' | 'masses'>;
  readonly runway: { readonly surface: Surface };
  readonly weather: Pick<Question['weather'], 'temperature'>;
}

/**
 * The condition of the runway: as given, and as it follows from what is reported, the worse of the two.
 *
 * Refused are code 0 on any third, and for a light aeroplane water or slush that is deeper than 13 mm or whose depth nobody states.
 *
 * @see references.Rcam; references.HouseContaminant for the worse of two and the refusal of light aeroplanes
 */
export function runwayCondition(question: ConditionAsked): RunwayCondition {
  const { surface } = question.runway;
  const found = runwayConditionCode(surface, question.weather.temperature);
  const derived = found === 'no-data' ? undefined : found;
  const given = thirdsOf(surface.runwayConditionCode);
  const codes = worse(given, derived?.code);
  const poorest = codes === undefined ? undefined : Math.min(...codes);
  const isCovered = surface.kind === 'snow' || surface.kind === 'ice' || surface.state === 'contaminated';
  const isFilm = derived !== undefined && derived.code >= 5;
  return {
    codes,
    given,
    derived,
    isSlippery: (isCovered && !isFilm) || surface.state === 'flooded' || (poorest !== undefined && poorest <= 2),
    refusal: refusalOf(question, poorest),
  };
}

function thirdsOf(given: Surface['runwayConditionCode']): Thirds | undefined {
  if (given === undefined) return undefined;
  return (typeof given === 'number' ? [given, given, given] : given) as Thirds;
}

function worse(given: Thirds | undefined, derived: RunwayConditionCode | undefined): Thirds | undefined {
  if (given === undefined) return derived === undefined ? undefined : [derived, derived, derived];
  if (derived === undefined) return given;
  return given.map((code) => Math.min(code, derived)) as unknown as Thirds;
}

function refusalOf(
  { aeroplane, runway: { surface } }: ConditionAsked,
  poorest: number | undefined,
): SurfaceRefusal | undefined {
  if (poorest === 0) {
    return {
      reason: 'its condition code is 0, less than poor, on which no braking and no control is counted on',
      shortfall: [{ at: '/runway/surface', axis: 'runwayConditionCode', given: 0, bound: 1, side: 'below' }],
    };
  }
  const deep = deepContaminant(surface);
  if (deep === undefined || (deep.kind !== 'water' && deep.kind !== 'slush') || !isLight(aeroplane)) return undefined;
  if (deep.depth === undefined) {
    return {
      reason: `the depth of the ${deep.kind} is not given, and a light aeroplane has no data beyond 13 mm`,
    };
  }
  if (deep.depth <= deepestForLight + 1e-9) return undefined;
  return {
    reason: `${depthText(deep.depth)} of ${surfaceText(deep.kind)} is more than the ${depthText(deepestForLight)} up to which a light aeroplane is computed`,
    shortfall: [
      {
        at: '/runway/surface/contaminant/depth',
        axis: 'contaminantDepth',
        given: { kind: 'depth', value: deep.depth, direction: 'up' },
        bound: { kind: 'depth', value: deepestForLight, direction: 'down' },
        side: 'above',
      },
    ],
  };
}

/** Piston and electric aeroplanes, and any of no more than 5 700 kg. */
function isLight({ category, masses }: ConditionAsked['aeroplane']): boolean {
  return category.endsWith('-piston') || category.endsWith('-electric') || masses.maximumTakeoff <= heaviestLight;
}
