import { createRequire } from 'node:module';

/** The part of the ODE library that is used; its own types are source under other compiler settings. */
interface OdexSolver {
  absoluteTolerance: number;
  relativeTolerance: number;
  maxSteps: number;
  solve(f: (x: number, y: number[]) => number[], x: number, y: number[], end: number): { readonly y: number[] };
}

const { Solver } = createRequire(import.meta.url)('odex') as { readonly Solver: new (n: number) => OdexSolver };

/** Two integrals from x to the end by Hairer's extrapolation method at an absolute and relative tolerance. */
export function odex(
  f: (x: number) => [number, number],
  from: number,
  to: number,
  tolerance: number,
): [number, number] {
  const solver = new Solver(2);
  solver.absoluteTolerance = tolerance;
  solver.relativeTolerance = tolerance;
  solver.maxSteps = 20_000;
  const { y } = solver.solve(f, from, [0, 0], to);
  return [y[0] as number, y[1] as number];
}

/** The state of a system y' = f(x, y) at the end, by the same method. */
export function odexState(
  f: (x: number, y: readonly number[]) => number[],
  state: readonly number[],
  from: number,
  to: number,
  tolerance: number,
): number[] {
  if (from === to) return [...state];
  const solver = new Solver(state.length);
  solver.absoluteTolerance = tolerance;
  solver.relativeTolerance = tolerance;
  solver.maxSteps = 20_000;
  return solver.solve(f, from, [...state], to).y;
}
