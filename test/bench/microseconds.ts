/** Least time of one call [us] over many short batches, by turns over the arguments. */
export function microseconds<T>(
  work: (argument: T) => unknown,
  given: readonly T[],
  calls: number,
  batches = 200,
): number {
  let least = Number.POSITIVE_INFINITY;
  for (let batch = 0; batch < batches; batch++) {
    const start = performance.now();
    for (let i = 0; i < calls; i++) work(given[i % given.length] as T);
    least = Math.min(least, (1000 * (performance.now() - start)) / calls);
  }
  return least;
}
