import { clearwayShare } from '../clearway-share.ts';
import type { Requirement, RuleSet } from '../rule-set.ts';
import { thinMargin } from '../thin-margin.ts';

const takeoff: readonly Requirement[] = [
  { code: 'takeoff-run', of: 'groundRoll', against: 'tora', source: 'Annex14' },
  { code: 'takeoff-distance', of: 'takeoffDistance', against: 'toda', source: 'Annex14' },
];

const landing: readonly Requirement[] = [
  { code: 'landing-distance', of: 'landingDistance', against: 'lda', source: 'Annex14' },
];

/** No rule at all: the computed distances against the declared ones, wind as given. */
export const unfactored: RuleSet = {
  id: 'unfactored',
  title: 'Distances without factors',
  phrase: 'without factors',
  source: 'Judgement',
  doesNotApply: () => undefined,
  windCredit: { headwind: 1, tailwind: 1, because: 'the wind is taken as given', source: 'Judgement' },
  thinMargin,
  takeoff: {
    source: 'Judgement',
    startsFrom: 'credited',
    clearwayShare,
    runwayFactors: () => undefined,
    requirements: () => takeoff,
  },
  landing: { source: 'Judgement', startsFrom: 'credited', runwayFactors: () => undefined, requirements: () => landing },
};
