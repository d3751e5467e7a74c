import type { Factor } from '../../answer.ts';
import { transportLandingClimbs } from '../certification/transport-climbs.ts';
import { isJet, isTransport } from '../named-aeroplanes.ts';
import { contaminated, dryPavement, wetPavement } from '../named-surfaces.ts';
import type { Asked, PhaseRules, Reading, Requirement, SurfaceRule } from '../rule-set.ts';
import { halfAndOneAndAHalf } from '../wind-credits.ts';
import { timeOfArrival } from './time-of-arrival.ts';

const wet: Factor = {
  code: 'surface',
  value: 1.15,
  because: '115 % of the landing distance required on a dry runway, (a)',
  source: 'EuAirOps235',
  status: 'read',
};

const surfaces: readonly SurfaceRule[] = [
  {
    when: 'contaminated pavement',
    holds: (asked) => asked.surface.kind === 'paved' && contaminated(asked),
    factors: [{ ...wet, because: 'contaminated: not less than on a wet runway', atLeast: true }],
  },
  { when: 'dry pavement', holds: dryPavement, factors: [] },
  { when: 'wet or damp pavement', holds: wetPavement, factors: [wet] },
];

function part(share: number, because: string): Factor {
  return { code: 'overall', value: 1 / share, because, source: 'EuAirOps230', status: 'read' };
}
const jet = part(0.6, 'a full stop from 50 ft within 60 % of LDA, turbojets');
const turboprop = part(0.7, 'a full stop from 50 ft within 70 % of LDA, turboprops');
const reduced = part(0.8, 'a full stop from 50 ft within 80 % of LDA, A.255');

const onContaminated: Factor = {
  code: 'overall',
  value: 1.15,
  because: '115 % of the landing distance on the contaminated runway',
  source: 'EuOps1s520',
  status: 'secondary',
};

function requirement(factor: Factor, more: Partial<Requirement> = {}): readonly Requirement[] {
  return [{ code: 'landing-distance', of: 'landingDistance', against: 'lda', factor, source: 'EuAirOps230', ...more }];
}

const isJetAsked = ({ aeroplane }: Asked) => isJet(aeroplane);

const readings: readonly Reading[] = [
  {
    when: 'turbojet, contaminated runway',
    holds: (asked) => isJetAsked(asked) && contaminated(asked),
    requirements: requirement(jet, { onRunway: onContaminated }),
  },
  { when: 'turbojet', holds: isJetAsked, requirements: requirement(jet) },
  {
    when: 'turboprop, contaminated runway',
    holds: contaminated,
    requirements: requirement(turboprop, { onRunway: onContaminated }),
  },
  { when: 'turboprop', holds: () => true, requirements: requirement(turboprop) },
];

/** CAT.POL.A.230 and A.235: landing of class A aeroplanes before departure. */
export const euClassALanding: PhaseRules = {
  source: 'EuAirOps230',
  stage: 'dispatch',
  windCredit: halfAndOneAndAHalf('EuAirOps230', ', (d)(2)'),
  surfaces,
  readings,
  demands: transportLandingClimbs,
  notApplied: [{ factor: reduced, why: 'it needs an approval of the authority that no question can state' }],
};

const inFlight = {
  onRunway: timeOfArrival,
  runwayDecides:
    'the length required before departure, in place of 115 % where an aeroplane not certified to CS-25 has no data for the time of arrival, (b)',
  source: 'EuAirOps303',
} as const;

/**
 * CAT.OP.MPA.303: the same in flight. Only an aeroplane outside CS-25 may use the length required before departure instead, so
 * for one within it the factors on the reference distance are not spoken of.
 */
export const euClassALandingInFlight: PhaseRules = {
  ...euClassALanding,
  source: 'EuAirOps303',
  stage: 'in-flight',
  surfaces: surfaces.map(({ holds, ...rest }) => ({
    ...rest,
    holds: (asked) => !isTransport(asked.aeroplane) && holds(asked),
  })),
  readings: [
    { when: 'turbojet', holds: isJetAsked, requirements: requirement(jet, inFlight) },
    { when: 'turboprop', holds: () => true, requirements: requirement(turboprop, inFlight) },
  ],
  notApplied: [],
};
