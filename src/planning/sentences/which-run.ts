import type { Runs } from '../runs.ts';

/** Which of the runs a result is of, in words; nothing where it is the one as stated. */
export function whichRun(runs: Runs<unknown>, result: unknown): string {
  if (result === runs.stated) return '';
  return result === runs.credited
    ? ' in the wind that the rules credit'
    : ' on the paved, dry, level runway that the rules start from';
}
