import type { LandingAnswer } from '../answer.ts';
import { declaredDistances } from '../declared-distances.ts';
import { isPhysicsByName } from '../method.ts';
import type { PreparedLanding } from '../prepare-landing.ts';
import type { LandingQuestion } from '../question.ts';
import { airLines, constantLines } from './air-lines.ts';
import { checkLines } from './check-lines.ts';
import { dragLines } from './ground-lines.ts';
import { landingFlightLines } from './landing-flight-lines.ts';
import { landingRollLines } from './landing-roll-lines.ts';
import { manualLines } from './manual-lines.ts';
import { referenceSpeedLines } from './reference-speed-lines.ts';
import { speedLines, stallLines } from './speed-lines.ts';
import { windLines } from './wind-lines.ts';
import type { WorkingLine } from './working-line.ts';
import { Worksheet } from './worksheet.ts';

const distance = { kind: 'distance', direction: 'up' } as const;

/**
 * The working of a landing: every quantity behind the answer in the order of the work, each with where it comes from.
 *
 * It calls again what the answer was made with and adds words; from its lines alone each speed, the air distance, the estimate of
 * the roll and what each check requires can be worked out by hand.
 *
 * @param prepared - of the same question
 */
export function landingWorking(
  question: LandingQuestion,
  prepared: PreparedLanding,
  answer: LandingAnswer,
): readonly WorkingLine[] {
  const { conditions, resolved, landingSpeeds, braking, run } = prepared;
  const { air, configuration, ruleSet } = conditions;
  const { stall, touchdown } = landingSpeeds.speeds;
  const manual = isPhysicsByName(question) ? undefined : answer.basis.flightManual;
  const sheet = new Worksheet(answer.basis.assumed);
  constantLines(sheet);
  airLines(sheet, question, air);
  windLines(sheet, question, conditions);
  stallLines(sheet, question, configuration, stall, air);
  const screen = referenceSpeedLines(sheet, question, prepared);
  const worked = { name: 'touchdown speed', member: 'touchdown', schedule: resolved.touchdown, speeds: touchdown };
  speedLines(sheet, question, { suffix: 'TD', ...worked }, air);
  if (braking.actual !== undefined && run.headwind < run.touchdownSpeed) {
    landingFlightLines(sheet, question, prepared, screen);
    dragLines(sheet, question, resolved, run);
    landingRollLines(sheet, question, prepared);
    if (manual === undefined) distanceLines(sheet, answer);
  }
  const { distances } = answer;
  if (manual !== undefined && distances !== undefined) {
    const whole = { symbol: 's_L', name: 'landing distance', value: distances.landingDistance.value };
    manualLines(sheet, manual, distances, whole);
  }
  if (answer.assessment !== undefined) {
    const declared = declaredDistances(question.runway, ruleSet.takeoff.clearwayShare);
    checkLines(sheet, question, answer.assessment.checks, declared, ruleSet, 'landing');
  }
  return sheet.lines;
}

/** The roll of the answer, which an integral gives, and the whole. */
function distanceLines(sheet: Worksheet, { distances }: LandingAnswer): void {
  if (distances === undefined) return;
  sheet.figure('integral', {
    symbol: 's_G',
    name: 'ground roll, integrated over the airspeed',
    value: distances.groundRoll.value,
    unit: 'm',
    source: 'McCormick1995',
    shownAs: distance,
  });
  sheet.formula({
    symbol: 's_L',
    name: 'landing distance',
    formula: 's_A + s_G',
    value: distances.landingDistance.value,
    unit: 'm',
    source: 'McCormick1995',
    shownAs: distance,
  });
}
