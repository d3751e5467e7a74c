import type { Aeroplane, CertificationBasis } from '../../../performance/aeroplane.ts';
import type { ReferenceKey } from '../../../references.ts';

/** The least that a certification basis lets a takeoff speed be. */
export interface LeastSpeed {
  /** over the stall speed of the takeoff configuration; absent: the basis asks for none */
  readonly stallRatio?: number;
  /** over the minimum control speed */
  readonly controlRatio: number;
  /** how a sentence names it: '1.05 times the minimum control speed' */
  readonly phrase: string;
}

/** The least takeoff speeds of a certification basis for an aeroplane with more than one engine. */
export interface TakeoffSpeedRule {
  readonly rotation: LeastSpeed;
  /** at the screen: V2, or the speed at 50 ft */
  readonly screen: LeastSpeed;
  /** whether the stall speed is the older minimum speed of the manoeuvre, where the definition states it as such */
  readonly ofMinimumSpeed: boolean;
  readonly source: ReferenceKey;
}

const part23: TakeoffSpeedRule = {
  rotation: {
    stallRatio: 1.1,
    controlRatio: 1.05,
    phrase: '1.05 times the minimum control speed and 1.10 times the stall speed',
  },
  screen: {
    stallRatio: 1.2,
    controlRatio: 1.1,
    phrase: '1.10 times the minimum control speed and 1.20 times the stall speed',
  },
  ofMinimumSpeed: true,
  source: 'Cfr23s51',
};

const part25: TakeoffSpeedRule = {
  rotation: { controlRatio: 1.05, phrase: '1.05 times the minimum control speed' },
  screen: {
    stallRatio: 1.13,
    controlRatio: 1.1,
    phrase: '1.10 times the minimum control speed and 1.13 times the 1-g stall speed',
  },
  ofMinimumSpeed: false,
  source: 'Cfr25s107',
};

const rules: Readonly<Record<CertificationBasis, TakeoffSpeedRule | undefined>> = {
  'cs-23-amendment-4': part23,
  'cs-23-commuter': part23,
  'cs-25': part25,
  none: undefined,
};

/**
 * VR >= max(1.05 VMC, 1.10 VS1) and V50 or V2 >= max(1.10 VMC, 1.20 VS1); transport VR >= 1.05 VMC, V2 >= max(1.10 VMC, 1.13 VSR).
 *
 * @returns undefined for a single, which has no minimum control speed, and where there is no basis
 * @see references.Cfr23s51; references.Cfr25s107
 */
export function takeoffSpeedRule({
  engines,
  certification,
}: Pick<Aeroplane, 'engines' | 'certification'>): TakeoffSpeedRule | undefined {
  return engines > 1 ? rules[certification.basis] : undefined;
}
