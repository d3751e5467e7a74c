import { isAbove5700, isJet } from '../named-aeroplanes.ts';
import type { RuleSet } from '../rule-set.ts';
import { thinMargin } from '../thin-margin.ts';
import { ukPrivateFactorsLanding } from './uk-private-factors-landing.ts';
import { ukPrivateFactorsTakeoff } from './uk-private-factors-takeoff.ts';

/** The factors that the UK authority recommends for private flights in light aeroplanes. */
export const ukPrivateFactors: RuleSet = {
  id: 'uk-private-factors',
  title: 'United Kingdom, factors recommended for private flights',
  phrase: 'under the private factors',
  source: 'UkSafetySense',
  operations: ['private'],
  appliesTo: [
    {
      because: 'the private factors are for propeller-driven aeroplanes',
      holds: (aeroplane) => !isJet(aeroplane),
      source: 'Judgement',
    },
    {
      because: 'the private factors are for light aeroplanes, up to 5 700 kg',
      holds: (aeroplane) => !isAbove5700(aeroplane),
      source: 'Judgement',
    },
  ],
  thinMargin,
  takeoff: ukPrivateFactorsTakeoff,
  landing: ukPrivateFactorsLanding,
};
