import type { Runs } from '../runs.ts';

/** Which of the runs a result is of, in words; nothing where it is the one as stated or none of them. */
export function whichRun(runs: Runs<unknown>, result: unknown): string {
  if (result === runs.stated) return '';
  if (result === runs.credited) return ' in the wind that the rules credit';
  if (result === runs.level) return ' on a level runway, since the rules give no credit for a slope that helps';
  return result === runs.reference ? ' on the paved, dry, level runway that the rules start from' : '';
}
