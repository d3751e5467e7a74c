import { clearwayShare } from '../clearway-share.ts';
import type { PhaseRules, Requirement, RuleSet, TakeoffRules } from '../rule-set.ts';
import { thinMargin } from '../thin-margin.ts';
import { windAsGiven } from '../wind-credits.ts';

const takeoffChecks: readonly Requirement[] = [
  { code: 'takeoff-run', of: 'groundRoll', against: 'tora', source: 'Annex14' },
  { code: 'takeoff-distance', of: 'takeoffDistance', against: 'toda', source: 'Annex14' },
];

const landingChecks: readonly Requirement[] = [
  { code: 'landing-distance', of: 'landingDistance', against: 'lda', source: 'Annex14' },
];

const takeoff: TakeoffRules = {
  source: 'Judgement',
  windCredit: windAsGiven,
  surfaces: [],
  readings: [{ when: 'always', holds: () => true, requirements: takeoffChecks }],
  clearwayShare,
  nothingBeyond: 'the check of a length that is not declared is not assessed',
};

const landing: PhaseRules = {
  source: 'Judgement',
  windCredit: windAsGiven,
  surfaces: [],
  readings: [{ when: 'always', holds: () => true, requirements: landingChecks }],
};

/** No rule at all: the computed distances against the declared ones, wind as given. */
export const unfactored: RuleSet = {
  id: 'unfactored',
  title: 'Distances without factors',
  phrase: 'without factors',
  source: 'Judgement',
  operations: ['commercial', 'private'],
  appliesTo: [],
  thinMargin,
  takeoff,
  landing,
};
