/** What every answer says of itself. */
export const notice =
  'Advisory only: computed, not a page of the flight manual. The approved flight manual, the rules that apply where you fly and the practice of licensed people go before it.';
