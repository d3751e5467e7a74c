import type { RuledAeroplane } from './rule-set.ts';

/** What is taken of the passenger seats where the aeroplane does not state them, for a rule that ends or begins at nine. */
export function seatsTaken({ passengerSeats }: RuledAeroplane): string | undefined {
  return passengerSeats === undefined ? 'at most 9' : undefined;
}
