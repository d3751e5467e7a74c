import type { CertificationBasis } from '../../../performance/aeroplane.ts';
import type { ReferenceKey } from '../../../references.ts';

/** The landing reference speed of a certification basis. */
export interface ReferenceSpeedRule {
  /** over the stall speed of the landing configuration */
  readonly stallRatio: number;
  /** whether that stall speed is the older minimum speed of the manoeuvre, where the definition states it as such */
  readonly ofMinimumSpeed: boolean;
  /** over the minimum control speed; absent where the basis names another one */
  readonly controlRatio?: number;
  /** whether a stated speed may not be below it */
  readonly binds: boolean;
  /** how a sentence names it: '1.3 VS0 of 14 CFR 23.73' */
  readonly phrase: string;
  readonly source: ReferenceKey;
}

/**
 * VREF = max(VMC, 1.3 VS0), commuter max(1.05 VMC, 1.3 VS0), transport 1.23 VSR0; 1.3 VS0 where there is no basis, which binds
 * nobody.
 *
 * @see references.Cfr23s73; references.Cfr25s125; references.Raymer
 */
export const referenceSpeedRules: Readonly<Record<CertificationBasis, ReferenceSpeedRule>> = {
  'cs-23-amendment-4': {
    stallRatio: 1.3,
    ofMinimumSpeed: true,
    controlRatio: 1,
    binds: true,
    phrase: '1.3 times the stall speed, and the minimum control speed',
    source: 'Cfr23s73',
  },
  'cs-23-commuter': {
    stallRatio: 1.3,
    ofMinimumSpeed: true,
    controlRatio: 1.05,
    binds: true,
    phrase: '1.3 times the stall speed, and 1.05 times the minimum control speed',
    source: 'Cfr23s73',
  },
  'cs-25': {
    stallRatio: 1.23,
    ofMinimumSpeed: false,
    binds: true,
    phrase: '1.23 times the 1-g stall speed',
    source: 'Cfr25s125',
  },
  none: {
    stallRatio: 1.3,
    ofMinimumSpeed: false,
    binds: false,
    phrase: '1.3 times the stall speed',
    source: 'Raymer',
  },
};
