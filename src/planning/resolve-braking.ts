import type { AntiSkid } from '../performance/aeroplane.ts';
import type { BrakedStretch } from '../performance/landing/landing-run.ts';
import { type BrakingFriction, brakingFriction, constantBraking, scaledBraking } from '../physics/braking-friction.ts';
import type { CodeBrakes } from '../physics/code-braking.ts';
import { hydroplaningSpeed, type RollPhase } from '../physics/hydroplaning-speed.ts';
import { limitedBraking } from '../physics/limited-braking.ts';
import type { RunwayConditionCode } from '../physics/runway-condition-code.ts';
import { type StoppingDrag, stoppingDrag } from '../physics/stopping-drag.ts';
import { aeroplanePointer } from './aeroplane-pointer.ts';
import type { Assumption } from './answer.ts';
import { type ContaminantRoll, contaminantRoll } from './contaminant-roll.ts';
import { gripOn } from './grip-on.ts';
import type { LandingQuestion, Runway, Surface } from './question.ts';
import { groundText } from './resolve-friction.ts';
import type { LandingAssumed } from './resolve-landing.ts';
import { assumedHydroplaningPressure } from './rules/contaminated-runway.ts';
import { brakingUncertainty } from './rules/input-uncertainties.ts';
import { assumedTyrePressure, brakedLoad } from './rules/landing-defaults.ts';
import type { RunwayCondition } from './runway-condition.ts';
import { runwayThirds } from './runway-thirds.ts';
import { unstatedGround } from './unstated-ground.ts';

/** Braking on the runway, and on the one that factors are meant to multiply; share of the braked wheels included. */
export interface ResolvedBraking {
  /** of the poorest third; absent where physics does not speak of the surface */
  readonly actual: BrakingFriction | undefined;
  /** the thirds, where their codes differ */
  readonly stretches?: readonly BrakedStretch[];
  /** what a loose contaminant helps; absent: nothing */
  readonly contaminantDrag?: StoppingDrag;
  /** dry pavement */
  readonly reference: BrakingFriction;
  /** the surface in words: 'wet grass' */
  readonly surface: string;
  /** why physics does not speak of it, where more can be said than that */
  readonly noData?: string;
  readonly assumed: readonly LandingAssumed[];
}

type Asked = Pick<LandingQuestion, 'aeroplane' | 'aeroplaneAt' | 'procedure'>;

const dryPavement: Surface = { kind: 'paved', state: 'dry' };

/**
 * Braking friction as the question gives it, else the poorer of what the surface and what its condition code give, said.
 *
 * A coefficient in the question is the effective one and stands as it is. The aeroplane's own, found on dry pavement, stands
 * there and is the most anywhere else; with the anti-skid system inoperative it is not above what a pilot does without. Each third
 * of the runway has the code it is given; where no length is declared, and in a rejected takeoff, the poorest holds throughout.
 *
 * @param runway - its surface, and the lengths whose thirds the codes are of
 * @param condition - codes as they count
 * @param phase - of a landing, or of a rejected takeoff
 */
export function resolveBraking(
  question: Asked,
  runway: Pick<Runway, 'surface' | 'declared' | 'start'>,
  condition: RunwayCondition,
  phase: RollPhase = 'landing',
): ResolvedBraking {
  const { aeroplane, aeroplaneAt, procedure } = question;
  const { surface } = runway;
  const { brakes, wheels } = aeroplane;
  const assumed: LandingAssumed[] = [];
  const say = (member: string, name: string, said: Omit<Assumption, 'at'>) => {
    assumed.push({ name, assumption: { at: aeroplanePointer(aeroplaneAt, member), ...said } });
  };

  const antiSkid = antiSkidOf(question);
  const load = brakedLoad[wheels?.arrangement ?? 'unknown'];
  const share = brakes?.loadFactor ?? load.value;
  const pressure = wheels?.tyrePressure ?? assumedTyrePressure(aeroplane.propulsion.kind === 'jet').value;
  const own = brakes?.brakingFrictionCoefficient;
  const onDryPavement = brakingFriction(dryPavement, antiSkid, pressure);
  if (onDryPavement === 'no-data') throw new Error('dry pavement has no braking friction');
  const withoutSystem = procedure?.antiSkid === 'inoperative' ? onDryPavement.at(0) : Number.POSITIVE_INFINITY;
  const ownBest = own === undefined ? onDryPavement.at(0) : Math.min(own, withoutSystem);
  const reference = scaledBraking(constantBraking(ownBest), share);
  const none = { actual: undefined, reference, surface: groundText(surface), assumed };
  if (condition.refusal !== undefined) return { ...none, noData: condition.refusal.reason };

  const found = brakingFriction(surface, antiSkid, pressure);
  const words = found === 'no-data' ? groundText(surface) : found.because;
  const ground = unstatedGround(surface, phase);
  const helped = stoppingHelp(contaminantRoll(question, surface, phase), wheels?.tyrePressure, phase);
  const given = surface.brakingFrictionCoefficient;
  if (given !== undefined) {
    return {
      actual: constantBraking(given),
      ...helped.drag,
      reference,
      surface: words,
      assumed: [...ground, ...helped.assumed],
    };
  }

  const vp = wheels?.tyrePressure === undefined ? undefined : hydroplaningSpeed(wheels.tyrePressure, phase);
  const codeBrakes: CodeBrakes = { dry: ownBest, antiSkid, tyrePressure: pressure, hydroplaningSpeed: vp };
  const grips = new Map<RunwayConditionCode | undefined, BrakingFriction | 'no-data'>();
  const codes = condition.codes ?? [undefined];
  for (const code of codes) grips.set(code, gripOn(found, code, codeBrakes));
  const poorest = codes.reduce((worst, code) => ((code ?? 6) < (worst ?? 6) ? code : worst));
  const grip = grips.get(poorest);
  if (grip === undefined || grip === 'no-data') return none;
  assumed.push(...ground);

  const isDryPavement = surface.kind === 'paved' && surface.state === 'dry' && (poorest ?? 6) === 6;
  if (!isDryPavement || own === undefined) {
    const less = 1 - brakingUncertainty(surface);
    const at = isDryPavement ? aeroplanePointer(aeroplaneAt, '/brakes/brakingFrictionCoefficient') : surfaceAt;
    assumed.push({
      name: 'braking friction',
      assumption: { at, ...saidOf(found, grip, poorest, phase) },
      otherEnd: lessOf(less),
    });
  }
  if (brakes?.loadFactor === undefined) {
    const { value, because } = load;
    say('/brakes/loadFactor', 'the weight on the braked wheels', { value, because, source: 'HouseFriction' });
  }
  if (brakes?.antiSkid === undefined) {
    say('/brakes/antiSkid', 'the anti-skid system', { value: 'none', because: 'not stated', source: 'Judgement' });
  }
  const isWetPavement = surface.kind === 'paved' && !isDryPavement;
  if (isWetPavement && wheels?.tyrePressure === undefined) {
    const value = assumedTyrePressure(aeroplane.propulsion.kind === 'jet').text;
    const because = 'not stated; a lower one brakes better on a wet runway';
    say('/wheels/tyrePressure', 'the tyre pressure', { value, because, source: 'Judgement' });
  }
  assumed.push(...helped.assumed);

  const effective = (friction: BrakingFriction) => {
    const limited = isDryPavement
      ? constantBraking(ownBest)
      : own === undefined
        ? friction
        : limitedBraking(friction, ownBest);
    return scaledBraking(limited, share);
  };
  const resolved = { actual: effective(grip), ...helped.drag, reference, surface: words, assumed };
  if (phase === 'takeoff' || codes.every((code) => code === poorest)) return resolved;
  const ends = runwayThirds(runway);
  if (ends === undefined) {
    const because = 'no length is declared whose thirds the codes are of; the poorest holds throughout';
    assumed.push({ name: 'the thirds', assumption: { at: '/runway/declared/lda', value: 'not known', because } });
    return resolved;
  }
  const stretches = codes.map((code, third) => {
    const braking = effective(grips.get(code) as BrakingFriction);
    return { end: ends[third] as number, braking, contaminantDrag: helped.drag.contaminantDrag };
  });
  return { ...resolved, stretches };
}

/** What is counted of a contaminant's drag in a stop. */
function stoppingHelp(
  roll: ContaminantRoll,
  tyrePressure: number | undefined,
  phase: RollPhase,
): { readonly drag: { readonly contaminantDrag?: StoppingDrag }; readonly assumed: readonly LandingAssumed[] } {
  if (roll.outcome !== 'held-back') return { drag: {}, assumed: [] };
  const speed = hydroplaningSpeed(tyrePressure ?? assumedHydroplaningPressure, phase);
  return { drag: { contaminantDrag: stoppingDrag(roll.perSquare, speed) }, assumed: roll.assumed };
}

function saidOf(
  found: ReturnType<typeof brakingFriction>,
  grip: BrakingFriction,
  code: RunwayConditionCode | undefined,
  phase: RollPhase,
): Omit<Assumption, 'at'> {
  const value = frictionValue(grip);
  if (found !== 'no-data' && (code === undefined || code >= 5 || frictionValue(found) === value)) {
    const because = `${found.because}: the end of the published range that gives the longer ${phase === 'landing' ? 'landing' : 'stop'}`;
    return { value, because, source: found.source };
  }
  const because = `condition code ${code}: the poorer of its figure and the surface's own`;
  return { value, because, source: 'Ac25s31' };
}

function lessOf(factor: number) {
  return { kind: 'braking-friction' as const, factor, text: `${Math.round(100 * factor)} % of that` };
}

const surfaceAt = '/runway/surface/brakingFrictionCoefficient';
const fiftyKnots = (50 * 1852) / 3600;

function antiSkidOf({ aeroplane, procedure }: Asked): AntiSkid {
  return procedure?.antiSkid === 'inoperative' ? 'none' : (aeroplane.brakes?.antiSkid ?? 'none');
}

/** A coefficient as it is, or at two speeds where it changes. */
function frictionValue({ at }: BrakingFriction): number | string {
  const rest = rounded(at(0));
  const moving = rounded(at(fiftyKnots));
  return rest === moving ? rest : `${rest} at rest, ${moving} at 50 kt over the ground`;
}

function rounded(value: number): number {
  return Math.round(value * 1000) / 1000;
}
