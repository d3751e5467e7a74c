import type { ReferenceKey } from '../../../references.ts';
import type { Factor } from '../../answer.ts';
import { transportLandingClimbs } from '../certification/transport-climbs.ts';
import { isCommuter, isJet, isTransport, isTurbine } from '../named-aeroplanes.ts';
import type { Asked, PhaseRules, Requirement } from '../rule-set.ts';
import { halfAndOneAndAHalf } from '../wind-credits.ts';
import { jetWetSurfaces } from './jet-wet-surfaces.ts';
import { isLargeNontransport } from './large-nontransport.ts';

function part(share: number, source: ReferenceKey, status: string, paragraph = ''): Factor {
  const because = `a full stop from 50 ft within ${Math.round(100 * share)} % of the effective length, taken as LDA${paragraph}`;
  return { code: 'overall', value: 1 / share, because, source, status };
}

const turbineDestination = part(0.6, 'Cfr135s385', 'read', ', (b)');
const turbopropAlternate = part(0.7, 'Cfr135s387', 'read', ', (a)');
const pistonDestination = part(0.6, 'Cfr135s375', 'memory');
const pistonAlternate = part(0.7, 'Cfr135s377', 'read');
const largeDestination = part(0.6, 'Cfr135s393', 'memory');
const largeAlternate = part(0.7, 'Cfr135s395', 'read');
const onDemand = part(0.8, 'Cfr135s387', 'read', ', (b)');

function requirement(factor: Factor, alternate?: Factor): readonly Requirement[] {
  return [
    {
      code: 'landing-distance',
      of: 'landingDistance',
      against: 'lda',
      factor,
      ...(alternate === undefined ? {} : { alternatives: [{ factor: alternate, because: 'at an alternate' }] }),
      source: factor.source,
    },
  ];
}

const isTurbineWithFactor = ({ aeroplane }: Asked) =>
  isTurbine(aeroplane) && (isTransport(aeroplane) || isCommuter(aeroplane));

/** 135.375 to 135.399: landing at a destination, by category, size and engines. */
export const usPart135Landing: PhaseRules = {
  source: 'Cfr135s385',
  stage: 'dispatch',
  windCredit: halfAndOneAndAHalf('Cfr135s389', ', (b)(2), taken for landings too'),
  surfaces: jetWetSurfaces({
    value: 1.15,
    because: 'wet or slippery runway: 115 % of the length under (b), (d)',
    source: 'Cfr135s385',
    status: 'secondary',
  }),
  readings: [
    {
      when: 'turbojet of the transport or commuter category',
      holds: (asked) => isTurbineWithFactor(asked) && isJet(asked.aeroplane),
      requirements: requirement(turbineDestination),
    },
    {
      when: 'turboprop of the transport or commuter category',
      holds: isTurbineWithFactor,
      requirements: requirement(turbineDestination, turbopropAlternate),
    },
    {
      when: 'any other engine, transport or commuter category',
      holds: ({ aeroplane }) => isTransport(aeroplane) || isCommuter(aeroplane),
      requirements: requirement(pistonDestination, pistonAlternate),
    },
    {
      when: 'large aeroplane outside the transport and commuter categories',
      holds: isLargeNontransport,
      requirements: requirement(largeDestination, largeAlternate),
    },
    {
      when: 'small aeroplane outside the transport and commuter categories',
      holds: () => true,
      requirements: [{ code: 'landing-distance', of: 'landingDistance', against: 'lda', source: 'Cfr135s399' }],
    },
  ],
  demands: transportLandingClimbs,
  notApplied: [{ factor: onDemand, why: 'it is for eligible on-demand operators, which no question can state' }],
};
