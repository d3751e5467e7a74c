import { takeoff } from '../../performance/takeoff/takeoff.ts';
import type { TakeoffResult, TakeoffRun } from '../../performance/takeoff/takeoff-run.ts';
import type { PreparedTakeoff } from '../prepare-takeoff.ts';
import { reached, takeoffOf } from '../takeoff-runs.ts';
import type { ManualReading } from './manual-reading.ts';
import { type ManualRuns, manualRuns } from './manual-runs.ts';
import type { Silence } from './silence.ts';

/**
 * A takeoff by the flight manual's figures, carried by physics to what the manual does not speak of.
 *
 * @param prepared - as asked
 * @param asManual - of the aeroplane that the manual is of, from standing at full power; as asked where that is the same
 * @param silences - of the reading, with the procedure and the changes
 * @param needsReference - whether the rule set's factors speak of what the manual does not
 */
export function takeoffByManual(
  prepared: PreparedTakeoff,
  asManual: PreparedTakeoff,
  reading: Pick<ManualReading, 'stated' | 'credited'>,
  silences: readonly Silence[],
  needsReference: boolean,
): ManualRuns<TakeoffResult> {
  const { run, runConditions } = prepared;
  const { actualFriction, referenceFriction, rollingStartAllowance, creditedHeadwind, slopeEarnsNothing } =
    runConditions;
  const onManualRunway = (one: TakeoffRun): TakeoffRun => ({
    ...one,
    ...(silences.includes('slope') ? { slope: 0, profile: undefined } : {}),
    ...(silences.includes('surface') ? { rollingFriction: referenceFriction, contaminantDrag: undefined } : {}),
  });
  const asked = actualFriction === undefined && silences.includes('surface') ? undefined : run;
  const slopeMayHelp = slopeEarnsNothing && silences.includes('slope') && (run.profile !== undefined || run.slope < 0);
  return manualRuns({
    reading,
    silences,
    asked,
    level: asked && slopeMayHelp ? { ...asked, slope: 0, profile: undefined } : undefined,
    asManual: asManual.run,
    creditedHeadwind,
    onManualRunway,
    reference: needsReference ? onManualRunway(run) : undefined,
    compute: (one) => takeoffOf(one, rollingStartAllowance),
    computeAsManual: takeoff,
    partsOf: reached,
  });
}
