import { hasMoreThanNineSeats, isAbove5700, isPiston } from '../named-aeroplanes.ts';
import type { RuleSet } from '../rule-set.ts';
import { seatsTaken } from '../seats-taken.ts';
import { thinMargin } from '../thin-margin.ts';
import { euClassCLanding, euClassCLandingInFlight } from './eu-class-c-landing.ts';
import { euClassCTakeoff } from './eu-class-c-takeoff.ts';

/** Commercial air transport under the rules of the European Union, performance class C. */
export const euClassC: RuleSet = {
  id: 'eu-class-c',
  title: 'European Union, commercial air transport, performance class C',
  phrase: 'under class C factors',
  source: 'EuAirOps400',
  operations: ['commercial'],
  appliesTo: [
    { because: 'class C is for piston engines', holds: isPiston, source: 'EuAirOps100' },
    {
      because: 'class C begins above 5 700 kg or above 9 passenger seats',
      holds: (aeroplane) => isAbove5700(aeroplane) || hasMoreThanNineSeats(aeroplane),
      taken: (aeroplane) => (isAbove5700(aeroplane) ? undefined : seatsTaken(aeroplane)),
      source: 'EuAirOps100',
    },
  ],
  thinMargin,
  takeoff: euClassCTakeoff,
  landing: euClassCLanding,
  landingInFlight: euClassCLandingInFlight,
};
