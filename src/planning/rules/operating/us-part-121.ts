import type { Factor } from '../../answer.ts';
import { certifiedTakeoff } from '../certification/certified-takeoff.ts';
import { transportLandingClimbs, transportTakeoffClimbs } from '../certification/transport-climbs.ts';
import { clearwayShare } from '../clearway-share.ts';
import { isCommuter, isJet, isMultiEngined, isTransport, isTurbine } from '../named-aeroplanes.ts';
import type { PhaseRules, Requirement, RuleSet, TakeoffRules } from '../rule-set.ts';
import { thinMargin } from '../thin-margin.ts';
import { halfAndOneAndAHalf } from '../wind-credits.ts';
import { jetWetSurfaces } from './jet-wet-surfaces.ts';

const windCredit = halfAndOneAndAHalf('Cfr121s177');

const takeoff: TakeoffRules = {
  source: 'Cfr121s189',
  stage: 'dispatch',
  windCredit,
  surfaces: [],
  readings: certifiedTakeoff('Cfr121s189'),
  demands: transportTakeoffClimbs,
  clearwayShare,
  nothingBeyond: 'the check of a length that is not declared is not assessed',
};

const destination: Factor = {
  code: 'overall',
  value: 1 / 0.6,
  because: 'a full stop from 50 ft within 60 % of the effective length, taken as LDA, (b)',
  source: 'Cfr121s195',
  status: 'read',
};
const alternate: Factor = {
  code: 'overall',
  value: 1 / 0.7,
  because: 'a full stop from 50 ft within 70 % of the effective length, taken as LDA',
  source: 'Cfr121s197',
  status: 'memory',
};

const requirement: Requirement = {
  code: 'landing-distance',
  of: 'landingDistance',
  against: 'lda',
  factor: destination,
  source: 'Cfr121s195',
};

const landing: PhaseRules = {
  source: 'Cfr121s195',
  stage: 'dispatch',
  windCredit,
  surfaces: jetWetSurfaces({
    value: 1.15,
    because: 'wet or slippery runway: 115 % of the length under (b)',
    source: 'Cfr121s195d',
    status: 'secondary',
  }),
  readings: [
    { when: 'turbojet', holds: ({ aeroplane }) => isJet(aeroplane), requirements: [requirement] },
    {
      when: 'turboprop',
      holds: () => true,
      requirements: [
        {
          ...requirement,
          alternatives: [{ factor: alternate, because: 'at an alternate, or at a destination that has one' }],
        },
      ],
    },
  ],
  demands: transportLandingClimbs,
};

/** Airlines under 14 CFR Part 121: turbine aeroplanes, destinations. */
export const usPart121: RuleSet = {
  id: 'us-part-121',
  title: 'United States, 14 CFR Part 121, turbine aeroplanes',
  phrase: 'under Part 121',
  source: 'Cfr121s195',
  operations: ['commercial'],
  appliesTo: [
    { because: 'Part 121 is for aeroplanes with more than one engine', holds: isMultiEngined, source: 'Cfr121s189' },
    { because: 'of Part 121 only the rules for turbine engines are held', holds: isTurbine, source: 'Cfr121s189' },
    {
      because: 'Part 121 is for the transport and commuter categories',
      holds: (aeroplane) => isTransport(aeroplane) || isCommuter(aeroplane),
      source: 'Cfr121s189',
    },
  ],
  thinMargin,
  takeoff,
  landing,
};
