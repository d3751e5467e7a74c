/** What is wrong with a question that cannot be answered: one entry a fault, in the form of the contract's problems. */
export const faultCodes = [
  'unreadable',
  'duplicate-member',
  'too-deep',
  'too-many-tokens',
  'unknown-member',
  'wrong-type',
  'not-finite',
  'out-of-range',
  'unknown-unit',
  'unknown-id',
  'missing',
  'exactly-one-of',
  'contradiction',
  'implausible',
] as const;
export type FaultCode = (typeof faultCodes)[number];

export interface Fault {
  /** RFC 6901 pointer into the request body, '' for the whole */
  readonly pointer: string;
  readonly code: FaultCode;
  readonly message: string;
  readonly received?: string | number | boolean;
  readonly allowed?: string;
  readonly hint?: string;
}

/** A refusal is a value: a planning story returns it instead of an answer. */
export interface Refused {
  readonly refused: readonly Fault[];
}

export function isRefused(result: object): result is Refused {
  return 'refused' in result;
}
