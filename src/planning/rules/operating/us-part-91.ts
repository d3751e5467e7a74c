import type { Factor } from '../../answer.ts';
import { transportTakeoff } from '../certification/certified-takeoff.ts';
import { transportLandingClimbs, transportTakeoffClimbs } from '../certification/transport-climbs.ts';
import { clearwayShare } from '../clearway-share.ts';
import { isTransport, isTurbine } from '../named-aeroplanes.ts';
import type { Asked, PhaseRules, Reading, RuleSet, TakeoffRules } from '../rule-set.ts';
import { thinMargin } from '../thin-margin.ts';
import { halfAndOneAndAHalf } from '../wind-credits.ts';

const isTransportTurbine = ({ aeroplane }: Asked) => isTransport(aeroplane) && isTurbine(aeroplane);

/** What 91.605 asks where it applies, in the order of the readings of certified takeoffs. */
const transport: readonly Reading[] = transportTakeoff('Cfr91s605').map(({ when, holds, requirements }) => ({
  when: `turbine aeroplane of the ${when}`,
  holds: (asked) => isTransportTurbine(asked) && holds(asked),
  requirements,
}));

const takeoff: TakeoffRules = {
  source: 'Cfr91s103',
  windCredit: halfAndOneAndAHalf('Judgement'),
  surfaces: [],
  readings: [
    ...transport,
    {
      when: 'any other aeroplane',
      holds: () => true,
      requirements: [{ code: 'takeoff-run', of: 'takeoffDistance', against: 'tora', source: 'Cfr91s103' }],
    },
  ],
  demands: transportTakeoffClimbs,
  clearwayShare,
  nothingBeyond: 'it changes nothing but for transport aeroplanes: TORA alone is compared',
};

const fractional: Factor = {
  code: 'overall',
  value: 1 / 0.6,
  because: 'a full stop from 50 ft within 60 % of the effective length, (b)',
  source: 'Cfr91s1037',
  status: 'read',
};

const landing: PhaseRules = {
  source: 'Cfr91s103',
  windCredit: halfAndOneAndAHalf('Judgement'),
  surfaces: [],
  readings: [
    {
      when: 'turbine aeroplane of the transport category',
      holds: isTransportTurbine,
      requirements: [{ code: 'landing-distance', of: 'landingDistance', against: 'lda', source: 'Cfr91s605' }],
    },
    {
      when: 'any other aeroplane',
      holds: () => true,
      requirements: [{ code: 'landing-distance', of: 'landingDistance', against: 'lda', source: 'Cfr91s103' }],
    },
  ],
  demands: transportLandingClimbs,
  notApplied: [{ factor: fractional, why: 'it is for fractional ownership, which no question can state' }],
};

/** Flights under 14 CFR Part 91: the distances themselves, and for turbine aeroplanes of the transport category 91.605. */
export const usPart91: RuleSet = {
  id: 'us-part-91',
  title: 'United States, 14 CFR Part 91',
  phrase: 'under Part 91',
  source: 'Cfr91s103',
  operations: ['private'],
  appliesTo: [],
  thinMargin,
  takeoff,
  landing,
};
