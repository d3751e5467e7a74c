import type { RuleSet } from '../rule-set.ts';
import { thinMargin } from '../thin-margin.ts';
import { usPart135Landing } from './us-part-135-landing.ts';
import { usPart135Takeoff } from './us-part-135-takeoff.ts';

/** Commuter and on-demand flights under 14 CFR Part 135, destinations. */
export const usPart135: RuleSet = {
  id: 'us-part-135',
  title: 'United States, 14 CFR Part 135',
  phrase: 'under Part 135',
  source: 'Cfr135s385',
  operations: ['commercial'],
  appliesTo: [],
  thinMargin,
  takeoff: usPart135Takeoff,
  landing: usPart135Landing,
};
