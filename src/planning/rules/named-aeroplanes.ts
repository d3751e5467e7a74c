import type { RuledAeroplane } from './rule-set.ts';

/** Tests of an aeroplane that rule sets name. */
type Test = (aeroplane: RuledAeroplane) => boolean;

export const isJet: Test = ({ category }) => category.endsWith('-jet');
export const isTurboprop: Test = ({ category }) => category.endsWith('-turboprop');
export const isTurbine: Test = (aeroplane) => isJet(aeroplane) || isTurboprop(aeroplane);
export const isPiston: Test = ({ category }) => category.endsWith('-piston');
export const isMultiEngined: Test = ({ engines }) => engines > 1;
export const isTransport: Test = ({ certification }) => certification.basis === 'cs-25';
export const isCommuter: Test = ({ certification }) => certification.basis === 'cs-23-commuter';

/** Heaviest aeroplane of performance class B [kg]. @see references.EuAirOps100 */
const heaviestClassB = 5700;
/** Most passenger seats of performance class B. @see references.EuAirOps100 */
const mostSeatsClassB = 9;

export const isAbove5700: Test = ({ masses }) => masses.maximumTakeoff > heaviestClassB;
/** An aeroplane whose seats are not stated is taken to have no more than nine. */
export const hasMoreThanNineSeats: Test = ({ passengerSeats }) =>
  passengerSeats !== undefined && passengerSeats > mostSeatsClassB;
