import { hasMoreThanNineSeats, isAbove5700, isJet, isMultiEngined, isTurbine } from '../named-aeroplanes.ts';
import type { RuledAeroplane, RuleSet } from '../rule-set.ts';
import { seatsTaken } from '../seats-taken.ts';
import { thinMargin } from '../thin-margin.ts';
import { euClassALanding, euClassALandingInFlight } from './eu-class-a-landing.ts';
import { euClassATakeoff } from './eu-class-a-takeoff.ts';

const isLargeWhateverItsSeats = (aeroplane: RuledAeroplane) => isJet(aeroplane) || isAbove5700(aeroplane);

/** Commercial air transport under the rules of the European Union, performance class A. */
export const euClassA: RuleSet = {
  id: 'eu-class-a',
  title: 'European Union, commercial air transport, performance class A',
  phrase: 'under class A factors',
  source: 'EuAirOps205',
  operations: ['commercial'],
  appliesTo: [
    { because: 'class A is for aeroplanes with more than one engine', holds: isMultiEngined, source: 'EuAirOps100' },
    { because: 'class A is for jets and turboprops', holds: isTurbine, source: 'EuAirOps100' },
    {
      because: 'class A begins above 5 700 kg or above 9 passenger seats for turboprops',
      holds: (aeroplane) => isLargeWhateverItsSeats(aeroplane) || hasMoreThanNineSeats(aeroplane),
      taken: (aeroplane) => (isLargeWhateverItsSeats(aeroplane) ? undefined : seatsTaken(aeroplane)),
      source: 'EuAirOps100',
    },
  ],
  thinMargin,
  takeoff: euClassATakeoff,
  landing: euClassALanding,
  landingInFlight: euClassALandingInFlight,
};
