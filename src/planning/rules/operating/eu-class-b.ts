import { hasMoreThanNineSeats, isAbove5700, isJet } from '../named-aeroplanes.ts';
import type { RuleSet } from '../rule-set.ts';
import { seatsTaken } from '../seats-taken.ts';
import { thinMargin } from '../thin-margin.ts';
import { euClassBLanding, euClassBLandingInFlight } from './eu-class-b-landing.ts';
import { euClassBTakeoff } from './eu-class-b-takeoff.ts';

/** Commercial air transport under the rules of the European Union, performance class B. */
export const euClassB: RuleSet = {
  id: 'eu-class-b',
  title: 'European Union, commercial air transport, performance class B',
  phrase: 'under class B factors',
  source: 'EuAirOps305',
  operations: ['commercial'],
  appliesTo: [
    {
      because: 'class B is for propeller-driven aeroplanes',
      holds: (aeroplane) => !isJet(aeroplane),
      source: 'EuAirOps100',
    },
    {
      because: 'class B ends at a maximum takeoff mass of 5 700 kg',
      holds: (aeroplane) => !isAbove5700(aeroplane),
      source: 'EuAirOps100',
    },
    {
      because: 'class B ends at 9 passenger seats',
      holds: (aeroplane) => !hasMoreThanNineSeats(aeroplane),
      taken: seatsTaken,
      source: 'EuAirOps100',
    },
  ],
  thinMargin,
  takeoff: euClassBTakeoff,
  landing: euClassBLanding,
  landingInFlight: euClassBLandingInFlight,
};
