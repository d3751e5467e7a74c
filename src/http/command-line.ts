/** What the service is started for. */
export interface CommandLine {
  /** verify settings and catalogue, say so and end */
  readonly check: boolean;
}

/**
 * Reads the arguments behind the name of the program.
 *
 * @throws RangeError with one line; a slip must not start the service
 */
export function readCommandLine(given: readonly string[]): CommandLine {
  const [unknown] = given.filter((argument) => argument !== '--check');
  if (unknown !== undefined) {
    throw new RangeError(`${JSON.stringify(unknown)} is no argument; there is only --check`);
  }
  return { check: given.length > 0 };
}
