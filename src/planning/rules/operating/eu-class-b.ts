import type { Aeroplane } from '../../../performance/aeroplane.ts';
import type { RuleSet } from '../rule-set.ts';
import { thinMargin } from '../thin-margin.ts';
import { euClassBLanding } from './eu-class-b-landing.ts';
import { euClassBTakeoff } from './eu-class-b-takeoff.ts';

/** Heaviest aeroplane of performance class B [kg]. */
const heaviest = 5700;

function doesNotApply({ category, masses }: Aeroplane): string | undefined {
  if (category.endsWith('-jet')) return 'class B is for propeller-driven aeroplanes';
  if (masses.maximumTakeoff > heaviest) return 'class B ends at a maximum takeoff mass of 5 700 kg';
  return undefined;
}

/** Commercial air transport under the rules of the European Union, performance class B. */
export const euClassB: RuleSet = {
  id: 'eu-class-b',
  title: 'European Union, commercial air transport, performance class B',
  phrase: 'under class B factors',
  source: 'EuAirOps305',
  doesNotApply,
  windCredit: {
    headwind: 0.5,
    tailwind: 1.5,
    because: 'not more than 50 % of a headwind, not less than 150 % of a tailwind, (c)(6)',
    source: 'EuAirOps305',
  },
  thinMargin,
  takeoff: euClassBTakeoff,
  landing: euClassBLanding,
};
