import type { AntiSkid } from '../performance/aeroplane.ts';
import { type BrakingFriction, brakingFriction, constantBraking, scaledBraking } from '../physics/braking-friction.ts';
import { limitedBraking } from '../physics/limited-braking.ts';
import { aeroplanePointer } from './aeroplane-pointer.ts';
import type { Assumption } from './answer.ts';
import type { LandingQuestion, Surface } from './question.ts';
import type { LandingAssumed } from './resolve-landing.ts';
import { brakingUncertainty } from './rules/input-uncertainties.ts';
import { assumedTyrePressure, brakedLoad } from './rules/landing-defaults.ts';
import { unstatedGround } from './unstated-ground.ts';

/** Braking on the runway, and on the one that factors are meant to multiply; share of the braked wheels included. */
export interface ResolvedBraking {
  /** absent where physics does not speak of the surface */
  readonly actual: BrakingFriction | undefined;
  /** dry pavement */
  readonly reference: BrakingFriction;
  /** the surface in words: 'wet grass' */
  readonly surface: string;
  readonly assumed: readonly LandingAssumed[];
}

type Asked = Pick<LandingQuestion, 'aeroplane' | 'aeroplaneAt' | 'procedure'>;

const dryPavement: Surface = { kind: 'paved', state: 'dry' };

/**
 * Braking friction as the question gives it, else that of the surface and the aeroplane's brakes, said.
 *
 * A coefficient in the question is the effective one and stands as it is. The aeroplane's own, found on dry pavement, stands
 * there and is the most anywhere else; with the anti-skid system inoperative it is not above what a pilot does without.
 *
 * @param surface - of the runway
 */
export function resolveBraking(question: Asked, surface: Surface): ResolvedBraking {
  const { aeroplane, aeroplaneAt, procedure } = question;
  const { brakes, wheels } = aeroplane;
  const assumed: LandingAssumed[] = [];
  const say = (member: string, name: string, said: Omit<Assumption, 'at'>, factor?: number, text = '') => {
    const assumption = { at: aeroplanePointer(aeroplaneAt, member), ...said };
    assumed.push({
      name,
      assumption,
      ...(factor === undefined ? {} : { otherEnd: { kind: 'braking-friction' as const, factor, text } }),
    });
  };

  const antiSkid = antiSkidOf(question);
  const load = brakedLoad[wheels?.arrangement ?? 'unknown'];
  const share = brakes?.loadFactor ?? load.value;
  const pressure = wheels?.tyrePressure ?? assumedTyrePressure(aeroplane.propulsion.kind === 'jet').value;
  const own = brakes?.brakingFrictionCoefficient;
  const onDryPavement = brakingFriction(dryPavement, antiSkid, pressure);
  const found = brakingFriction(surface, antiSkid, pressure);
  if (onDryPavement === 'no-data') throw new Error('dry pavement has no braking friction');
  const withoutSystem = procedure?.antiSkid === 'inoperative' ? onDryPavement.at(0) : Number.POSITIVE_INFINITY;
  const ownBest = own === undefined ? onDryPavement.at(0) : Math.min(own, withoutSystem);
  const reference = scaledBraking(constantBraking(ownBest), share);
  if (found === 'no-data') {
    return { actual: undefined, reference, surface: `${surface.kind}, ${surface.state}`, assumed };
  }
  assumed.push(...unstatedGround(surface, 'landing'));
  const given = surface.brakingFrictionCoefficient;
  if (given !== undefined) {
    return { actual: constantBraking(given), reference, surface: found.because, assumed };
  }

  const isDryPavement = surface.kind === 'paved' && surface.state === 'dry' && surface.contaminant === undefined;
  const less = 1 - brakingUncertainty(surface);
  if (!isDryPavement || own === undefined) {
    const at = isDryPavement ? aeroplanePointer(aeroplaneAt, '/brakes/brakingFrictionCoefficient') : surfaceAt;
    assumed.push({
      name: 'braking friction',
      assumption: {
        at,
        value: frictionValue(found),
        because: `${found.because}: the end of the published range that gives the longer landing`,
        source: found.source,
      },
      otherEnd: { kind: 'braking-friction', factor: less, text: `${Math.round(100 * less)} % of that` },
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
  const grip = isDryPavement ? constantBraking(ownBest) : own === undefined ? found : limitedBraking(found, ownBest);
  return { actual: scaledBraking(grip, share), reference, surface: found.because, assumed };
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
