import type { SlopeProfile } from '../slope-profile.ts';
import type { BrakedRun, BrakedStretch } from './landing-run.ts';

/**
 * The stretches of a run on which everything is steady: those of what lies on the runway, cut again where its profile bends.
 *
 * @param run - of profile and stretches the last figures hold beyond their ends
 * @returns undefined where the runway is the same throughout
 */
export function brakedStretches(run: BrakedRun): readonly BrakedStretch[] | undefined {
  const { profile, stretches } = run;
  if (profile === undefined) return stretches;
  if (stretches === undefined) return sloped(profile, [{ ...run, end: Number.POSITIVE_INFINITY }]);
  return sloped(profile, stretches);
}

function sloped({ ends, slopes }: SlopeProfile, stretches: readonly BrakedStretch[]): BrakedStretch[] {
  const cut: BrakedStretch[] = [];
  const [lastSlope, lastStretch] = [ends.length - 1, stretches.length - 1];
  let onSlope = 0;
  let onStretch = 0;
  for (;;) {
    const slopeEnd = onSlope === lastSlope ? Number.POSITIVE_INFINITY : (ends[onSlope] as number);
    const stretch = stretches[onStretch] as BrakedStretch;
    const stretchEnd = onStretch === lastStretch ? Number.POSITIVE_INFINITY : stretch.end;
    const end = Math.min(slopeEnd, stretchEnd);
    const { braking, contaminantDrag } = stretch;
    cut.push({ end, braking, contaminantDrag, slope: slopes[onSlope] as number });
    if (end === Number.POSITIVE_INFINITY) return cut;
    if (slopeEnd === end) onSlope++;
    if (stretchEnd === end) onStretch++;
  }
}
