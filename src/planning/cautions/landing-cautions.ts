import { aeroplaneChanged } from './aeroplane-changed.ts';
import { antiSkidInoperative } from './anti-skid-inoperative.ts';
import { approachSpeedIncrement } from './approach-speed-increment.ts';
import { approachSteep } from './approach-steep.ts';
import { assumptionMatters } from './assumption-matters.ts';
import { balkedLandingClimbLow } from './balked-landing-climb-low.ts';
import { balkedLandingUnknown } from './balked-landing-unknown.ts';
import type { CautionTest } from './caution-test.ts';
import { conditionCodeTooGood } from './condition-code-too-good.ts';
import { crosswindBeyondDemonstrated } from './crosswind-beyond-demonstrated.ts';
import { decelerationMarginal } from './deceleration-marginal.ts';
import { densityAltitudeHigh } from './density-altitude-high.ts';
import { downslope } from './downslope.ts';
import { filmCountsAsWet } from './film-counts-as-wet.ts';
import { fitOutsideRange } from './fit-outside-range.ts';
import { flareAboveScreen } from './flare-above-screen.ts';
import { flightManualAndPhysicsDiffer } from './flight-manual-and-physics-differ.ts';
import { flightManualBeside } from './flight-manual-beside.ts';
import { flightManualEdge } from './flight-manual-edge.ts';
import { flightManualNotUsed } from './flight-manual-not-used.ts';
import { flightManualSilent } from './flight-manual-silent.ts';
import { gustNotCredited } from './gust-not-credited.ts';
import { hydroplaning } from './hydroplaning.ts';
import type { LandingContext } from './landing-context.ts';
import { marginNegative } from './margin-negative.ts';
import { marginThin } from './margin-thin.ts';
import { massAboveMaximumLanding } from './mass-above-maximum-landing.ts';
import { methodIsEstimate } from './method-is-estimate.ts';
import { pointAtFullLength } from './point-at-full-length.ts';
import { pressureAltitudeAboveLimit } from './pressure-altitude-above-limit.ts';
import { pressureExtreme } from './pressure-extreme.ts';
import { referenceSpeedRaised } from './reference-speed-raised.ts';
import { reportNotUnderstood } from './report-not-understood.ts';
import { reportOld } from './report-old.ts';
import { reportReplaced } from './report-replaced.ts';
import { reportRunwayState } from './report-runway-state.ts';
import { reverseCounted } from './reverse-counted.ts';
import { runwayChanged } from './runway-changed.ts';
import { slopeSteep } from './slope-steep.ts';
import { stageNotKnown } from './stage-not-known.ts';
import { tailwind } from './tailwind.ts';
import { tailwindBeyondLimit } from './tailwind-beyond-limit.ts';
import { temperatureAboveLimit } from './temperature-above-limit.ts';
import { temperatureFarFromStandard } from './temperature-far-from-standard.ts';
import { veryShortWetGrassCaution } from './very-short-wet-grass.ts';
import { windVariable } from './wind-variable.ts';

/** Every caution a landing can raise, in the order in which it is shown. */
export const landingCautions: readonly CautionTest<LandingContext>[] = [
  marginNegative,
  marginThin,
  stageNotKnown,
  flightManualNotUsed,
  flightManualEdge,
  flightManualBeside,
  flightManualSilent,
  flightManualAndPhysicsDiffer,
  fitOutsideRange,
  massAboveMaximumLanding,
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
  conditionCodeTooGood,
  hydroplaning,
  filmCountsAsWet,
  downslope,
  veryShortWetGrassCaution,
  decelerationMarginal,
  antiSkidInoperative,
  reverseCounted,
  referenceSpeedRaised,
  approachSpeedIncrement,
  approachSteep,
  flareAboveScreen,
  balkedLandingClimbLow,
  balkedLandingUnknown,
  densityAltitudeHigh,
  temperatureFarFromStandard,
  pressureExtreme,
  slopeSteep,
  pointAtFullLength,
  runwayChanged,
  aeroplaneChanged,
  assumptionMatters,
  methodIsEstimate,
];
