import { accelerationMarginal } from './acceleration-marginal.ts';
import { aeroplaneChanged } from './aeroplane-changed.ts';
import { assumptionMatters } from './assumption-matters.ts';
import type { CautionTest } from './caution-test.ts';
import { clearwayCapped } from './clearway-capped.ts';
import { climbGradientMarginal } from './climb-gradient-marginal.ts';
import { conditionCodeTooGood } from './condition-code-too-good.ts';
import { contaminantHoldsBack } from './contaminant-holds-back.ts';
import { crosswindBeyondDemonstrated } from './crosswind-beyond-demonstrated.ts';
import { decisionLimitedByControl } from './decision-limited-by-control.ts';
import { decisionRangeEmpty } from './decision-range-empty.ts';
import { decisionSpeedOutOfRange } from './decision-speed-out-of-range.ts';
import { decisionSpeedUnbalanced } from './decision-speed-unbalanced.ts';
import { densityAltitudeHigh } from './density-altitude-high.ts';
import { engineOutByPhysics } from './engine-out-by-physics.ts';
import { engineOutCannotContinue } from './engine-out-cannot-continue.ts';
import { engineOutClimbNotPositive } from './engine-out-climb-not-positive.ts';
import { engineOutDataMissing } from './engine-out-data-missing.ts';
import { filmCountsAsWet } from './film-counts-as-wet.ts';
import { fitOutsideRange } from './fit-outside-range.ts';
import { flightManualAndPhysicsDiffer } from './flight-manual-and-physics-differ.ts';
import { flightManualBeside } from './flight-manual-beside.ts';
import { flightManualEdge } from './flight-manual-edge.ts';
import { flightManualNotUsed } from './flight-manual-not-used.ts';
import { flightManualSilent } from './flight-manual-silent.ts';
import { gustNotCredited } from './gust-not-credited.ts';
import { hydroplaning } from './hydroplaning.ts';
import { marginNegative } from './margin-negative.ts';
import { marginThin } from './margin-thin.ts';
import { massAboveMaximum } from './mass-above-maximum.ts';
import { methodIsEstimate } from './method-is-estimate.ts';
import { noDecisionSpeed } from './no-decision-speed.ts';
import { pointAtFullLength } from './point-at-full-length.ts';
import { pressureAltitudeAboveLimit } from './pressure-altitude-above-limit.ts';
import { pressureExtreme } from './pressure-extreme.ts';
import { reducedPower } from './reduced-power.ts';
import { reportNotUnderstood } from './report-not-understood.ts';
import { reportOld } from './report-old.ts';
import { reportReplaced } from './report-replaced.ts';
import { reportRunwayState } from './report-runway-state.ts';
import { rollingStart } from './rolling-start.ts';
import { runwayChanged } from './runway-changed.ts';
import { screenSpeedBelowLiftOff } from './screen-speed-below-lift-off.ts';
import { slopeSteep } from './slope-steep.ts';
import { stageNotKnown } from './stage-not-known.ts';
import { stopNotComputed } from './stop-not-computed.ts';
import { tailwind } from './tailwind.ts';
import { tailwindBeyondLimit } from './tailwind-beyond-limit.ts';
import type { TakeoffContext } from './takeoff-context.ts';
import { takeoffSpeedsRaised } from './takeoff-speeds-raised.ts';
import { temperatureAboveLimit } from './temperature-above-limit.ts';
import { temperatureFarFromStandard } from './temperature-far-from-standard.ts';
import { windVariable } from './wind-variable.ts';

/** Every caution a takeoff can raise, in the order in which it is shown. */
export const takeoffCautions: readonly CautionTest<TakeoffContext>[] = [
  marginNegative,
  marginThin,
  stageNotKnown,
  flightManualNotUsed,
  flightManualEdge,
  flightManualBeside,
  flightManualSilent,
  flightManualAndPhysicsDiffer,
  fitOutsideRange,
  massAboveMaximum,
  temperatureAboveLimit,
  pressureAltitudeAboveLimit,
  tailwindBeyondLimit,
  tailwind,
  crosswindBeyondDemonstrated,
  windVariable,
  reportReplaced,
  reportOld,
  reportNotUnderstood,
  reportRunwayState,
  gustNotCredited,
  stopNotComputed,
  conditionCodeTooGood,
  hydroplaning,
  contaminantHoldsBack,
  filmCountsAsWet,
  accelerationMarginal,
  climbGradientMarginal,
  densityAltitudeHigh,
  temperatureFarFromStandard,
  pressureExtreme,
  slopeSteep,
  pointAtFullLength,
  runwayChanged,
  clearwayCapped,
  takeoffSpeedsRaised,
  engineOutCannotContinue,
  noDecisionSpeed,
  decisionRangeEmpty,
  decisionSpeedOutOfRange,
  engineOutClimbNotPositive,
  engineOutDataMissing,
  decisionLimitedByControl,
  decisionSpeedUnbalanced,
  engineOutByPhysics,
  screenSpeedBelowLiftOff,
  reducedPower,
  rollingStart,
  aeroplaneChanged,
  assumptionMatters,
  methodIsEstimate,
];
