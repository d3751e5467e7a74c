/** Long work that yields between its parts, so that whoever runs it may do something else meanwhile. */
export type Work<Result> = Generator<undefined, Result, undefined>;

/** The result of work that nobody needs to interrupt. */
export function completed<Result>(work: Work<Result>): Result {
  for (;;) {
    const step = work.next();
    if (step.done === true) return step.value;
  }
}
