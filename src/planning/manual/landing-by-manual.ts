import { landing } from '../../performance/landing/landing.ts';
import type { LandingResult, LandingRun } from '../../performance/landing/landing-run.ts';
import { stopped } from '../landing-runs.ts';
import type { PreparedLanding } from '../prepare-landing.ts';
import type { ManualReading } from './manual-reading.ts';
import { type ManualRuns, manualRuns } from './manual-runs.ts';
import type { Silence } from './silence.ts';

/**
 * A landing by the flight manual's figures, carried by physics to what the manual does not speak of.
 *
 * @param prepared - as asked
 * @param asManual - of the aeroplane that the manual is of, without reverse thrust or any other procedure; as asked where that is
 * the same
 * @param silences - of the reading, with the procedure and the changes
 * @param needsReference - whether the rule set's factors speak of what the manual does not
 */
export function landingByManual(
  prepared: PreparedLanding,
  asManual: PreparedLanding,
  reading: Pick<ManualReading, 'stated' | 'credited'>,
  silences: readonly Silence[],
  needsReference: boolean,
): ManualRuns<LandingResult> {
  const { run, runConditions } = prepared;
  const { actualBraking, referenceBraking, creditedHeadwind, slopeEarnsNothing } = runConditions;
  const onManualRunway = (one: LandingRun): LandingRun => ({
    ...one,
    ...(silences.includes('slope') ? { slope: 0, profile: undefined } : {}),
    ...(silences.includes('surface')
      ? { braking: referenceBraking, stretches: undefined, contaminantDrag: undefined }
      : {}),
  });
  const asked = actualBraking === undefined && silences.includes('surface') ? undefined : run;
  const slopeMayHelp = slopeEarnsNothing && silences.includes('slope') && (run.profile !== undefined || run.slope > 0);
  return manualRuns({
    reading,
    silences,
    asked,
    level: asked && slopeMayHelp ? { ...asked, slope: 0, profile: undefined } : undefined,
    asManual: asManual.run,
    creditedHeadwind,
    onManualRunway,
    // no reverse thrust shortens the distance that factors multiply: the flight manual counts none
    reference: needsReference ? { ...onManualRunway(run), reverseThrust: undefined } : undefined,
    compute: landing,
    computeAsManual: landing,
    partsOf: stopped,
  });
}
