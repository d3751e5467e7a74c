import type { Aeroplane, Configuration } from '../performance/aeroplane.ts';
import type { Air } from '../performance/air.ts';
import { minimumToOneG } from '../performance/speeds/maximum-lift-coefficient.ts';
import { easFromCas } from '../physics/airspeed.ts';
import { aeroplanePointer } from './aeroplane-pointer.ts';
import type { LandingAnswer, SpeedSet } from './answer.ts';
import { isFault } from './chosen.ts';
import { ConfiguredSpeeds, ratioText } from './configured-speeds.ts';
import type { Fault } from './fault.ts';
import type { Question } from './question.ts';
import type { ResolvedLanding } from './resolve-landing.ts';
import { referenceSpeedRules } from './rules/certification/reference-speed.ts';

/** The speeds of a landing, and how the reference speed came about. */
export interface LandingSpeeds {
  readonly speeds: LandingAnswer['speeds'];
  /** the landing reference speed without the increment of the procedure */
  readonly reference: SpeedSet;
  /** the stated landing reference speed and what decides, where the certification basis asks for more */
  readonly raised: { readonly from: SpeedSet; readonly by: 'stall' | 'control' } | undefined;
}

/**
 * Stall, landing reference and touchdown speed at this mass in this air, each in its kinds [m/s].
 *
 * A stated landing reference speed below the least of the certification basis is raised to it.
 *
 * @param question - mass [kg], and where the speeds stand in the request
 * @param configuration - its greatest lift
 * @param resolved - the speed schedule, complete
 * @returns the speeds, or a fault where touchdown comes below the stall speed, above the reference speed, or at no subsonic speed
 * @see references.Cfr23s73; references.Cfr25s125
 */
export function landingSpeeds(
  question: Pick<Question, 'aeroplane' | 'aeroplaneAt' | 'configuration' | 'mass'>,
  configuration: Configuration,
  resolved: Pick<ResolvedLanding, 'landingReference' | 'touchdown' | 'approachSpeedIncrement'>,
  air: Air,
): LandingSpeeds | Fault {
  const { aeroplane, aeroplaneAt } = question;
  const configured = new ConfiguredSpeeds(question, configuration, air);
  const referenceAt = configured.at('speeds/landingReference');
  const stall = configured.stall();
  if (isFault(stall)) return stall;
  const touchdown = configured.scheduled(resolved.touchdown, 'touchdown');
  if (isFault(touchdown)) return touchdown;
  const stated = resolved.landingReference && configured.scheduled(resolved.landingReference, 'landingReference');
  if (stated !== undefined && isFault(stated)) return stated;
  const least = leastReference(aeroplane, configuration, configured.stallEas, air.pressure);
  const leastAt = least.by === 'stall' ? referenceAt : aeroplanePointer(aeroplaneAt, '/engineOut/vmc');
  const leastSet = configured.inKinds(least.eas, leastAt);
  if (isFault(leastSet)) return leastSet;

  const isRaised = stated !== undefined && least.binds && stated.eas < leastSet.eas * (1 - 1e-9);
  const reference = stated === undefined || isRaised ? leastSet : stated;
  const increment = resolved.approachSpeedIncrement;
  const flown =
    increment === 0
      ? reference
      : configured.inKinds(easFromCas(reference.cas + increment, air.pressure), '/procedure/approachSpeedIncrement');
  if (isFault(flown)) return flown;
  if (touchdown.stallRatio < 1) {
    return {
      pointer: configured.at('speeds/touchdown'),
      code: 'contradiction',
      message: `The touchdown speed is ${ratioText(touchdown.stallRatio)} of the stall speed: there is not enough lift to fly down to it.`,
      allowed: 'a touchdown speed at or above the stall speed',
    };
  }
  if (touchdown.tas > reference.tas * (1 + 1e-9)) {
    return {
      pointer: configured.at('speeds/touchdown'),
      code: 'contradiction',
      message: `The touchdown speed is ${ratioText(touchdown.tas / reference.tas)} of the landing reference speed: no speed is left to lose in the flare.`,
      allowed: 'a touchdown speed at or below the landing reference speed',
    };
  }
  return {
    speeds: { stall, landingReference: flown, touchdown },
    reference,
    raised: isRaised ? { from: stated, by: least.by } : undefined,
  };
}

/** The least landing reference speed of the certification basis, EAS [m/s], and what decides it. */
function leastReference(
  { certification, engineOut }: Aeroplane,
  { maximumLift }: Configuration,
  stallEas: number,
  pressure: number,
): { readonly eas: number | 'not-subsonic'; readonly by: 'stall' | 'control'; readonly binds: boolean } {
  const { stallRatio, ofMinimumSpeed, controlRatio, binds } = referenceSpeedRules[certification.basis];
  const isMinimum = ofMinimumSpeed && maximumLift.kind === 'stall-speed' && maximumLift.definition === 'minimum';
  const byStall = stallRatio * stallEas * (isMinimum ? minimumToOneG : 1);
  const vmc = engineOut?.vmc;
  if (vmc === undefined || controlRatio === undefined) return { eas: byStall, by: 'stall', binds };
  const byControl = easFromCas(controlRatio * vmc, pressure);
  return byControl === 'not-subsonic' || byControl > byStall
    ? { eas: byControl, by: 'control', binds }
    : { eas: byStall, by: 'stall', binds };
}
