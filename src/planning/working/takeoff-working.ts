import { aeroplanePointer } from '../aeroplane-pointer.ts';
import type { TakeoffAnswer } from '../answer.ts';
import { declaredDistances } from '../declared-distances.ts';
import { isPhysicsByName } from '../method.ts';
import type { PreparedTakeoff } from '../prepare-takeoff.ts';
import type { TakeoffQuestion } from '../question.ts';
import { airLines, constantLines } from './air-lines.ts';
import { checkLines } from './check-lines.ts';
import { takeoffFlightLines } from './flight-lines.ts';
import { dragLines, takeoffRollLines } from './ground-lines.ts';
import { manualLines } from './manual-lines.ts';
import { stallLines } from './speed-lines.ts';
import { takeoffSpeedLines } from './takeoff-speed-lines.ts';
import { thrustLines } from './thrust-lines.ts';
import { windLines } from './wind-lines.ts';
import type { WorkingLine } from './working-line.ts';
import { Worksheet } from './worksheet.ts';

const distance = { kind: 'distance', direction: 'up' } as const;

/**
 * The working of a takeoff: every quantity behind the answer in the order of the work, each with where it comes from.
 *
 * It calls again what the answer was made with and adds words; from its lines alone each speed, the estimates of roll and air
 * distance and what each check requires can be worked out by hand.
 *
 * @param prepared - of the same question
 */
export function takeoffWorking(
  question: TakeoffQuestion,
  prepared: PreparedTakeoff,
  answer: TakeoffAnswer,
): readonly WorkingLine[] {
  const { conditions, flown, resolved, speeds, power, run } = prepared;
  const { air, configuration, ruleSet } = conditions;
  const { aeroplane, aeroplaneAt, runway } = question;
  const manual = isPhysicsByName(question) ? undefined : answer.basis.flightManual;
  const sheet = new Worksheet(answer.basis.assumed);
  constantLines(sheet);
  airLines(sheet, question, air);
  windLines(sheet, question, conditions);
  stallLines(sheet, question, configuration, speeds.stall, air);
  const worked = [
    { suffix: 'R', name: 'rotation speed', member: 'rotation', schedule: resolved.rotation },
    { suffix: 'LOF', name: 'lift-off speed', member: 'liftOff', schedule: resolved.liftOff },
    { suffix: 'scr', name: 'speed at the screen', member: 'screen', schedule: resolved.screen },
  ] as const;
  takeoffSpeedLines(sheet, question, configuration, worked, prepared, air);
  if (isComputed(prepared)) {
    const thrustAt = thrustLines(sheet, {
      propulsion: aeroplane.propulsion,
      engines: aeroplane.engines,
      at: (member) => aeroplanePointer(aeroplaneAt, member),
      thrustFactor: power.thrustFactor,
      fullPowerRatio: flown.fullPowerRatio,
      air,
      thrust: run.thrust,
    });
    dragLines(sheet, question, resolved, run);
    takeoffRollLines(sheet, question, run, thrustAt);
    takeoffFlightLines(sheet, question, run, thrustAt);
    if (manual === undefined) distanceLines(sheet, flown.rollingStartAllowance, answer);
  }
  const { distances } = answer;
  if (manual !== undefined && distances !== undefined) {
    const whole = { symbol: 's_T', name: 'takeoff distance', value: distances.takeoffDistance.value };
    manualLines(sheet, manual, distances, whole);
  }
  if (answer.assessment !== undefined) {
    const { clearwayShare } = ruleSet.takeoff;
    const declared = declaredDistances(runway, clearwayShare);
    checkLines(sheet, question, answer.assessment.checks, declared, ruleSet, 'takeoff');
  }
  return sheet.lines;
}

/** Where physics does not speak of the surface, or measured thrust not of the speeds, there is no run to work out. */
function isComputed({ run: { thrust, headwind, liftOffSpeed, screenSpeed }, friction }: PreparedTakeoff): boolean {
  if (friction.actual === undefined) return false;
  if (thrust.domain === undefined) return true;
  const [lowest, highest] = thrust.domain;
  return Math.max(0, headwind) >= lowest && Math.max(liftOffSpeed, screenSpeed) <= highest;
}

/** The distances of the answer, which integrals give. */
function distanceLines(sheet: Worksheet, rollingStartAllowance: number, { distances }: TakeoffAnswer): void {
  if (distances === undefined) return;
  const { groundRoll, airDistance, takeoffDistance } = distances;
  const roll = { symbol: 's_G', name: 'ground roll', value: groundRoll.value, unit: 'm', shownAs: distance } as const;
  if (rollingStartAllowance === 0) {
    sheet.figure('integral', { ...roll, name: `${roll.name}, integrated over the airspeed`, source: 'McCormick1995' });
  } else {
    sheet.figure('integral', {
      symbol: 's_standing',
      name: 'ground roll from standing, integrated over the airspeed',
      value: groundRoll.value - rollingStartAllowance,
      unit: 'm',
      source: 'McCormick1995',
    });
    sheet.stated({
      symbol: 's_rolling',
      name: 'what a rolling start takes over one from standing',
      value: rollingStartAllowance,
      unit: 'm',
      at: '/procedure/start',
    });
    sheet.formula({ ...roll, formula: 's_standing + s_rolling', source: 'Judgement' });
  }
  sheet.figure('integral', {
    symbol: 's_A',
    name: 'air distance, integrated over the height',
    value: airDistance.value,
    unit: 'm',
    source: 'HouseEnergyPath',
    shownAs: distance,
  });
  sheet.formula({
    symbol: 's_T',
    name: 'takeoff distance',
    formula: 's_G + s_A',
    value: takeoffDistance.value,
    unit: 'm',
    source: 'McCormick1995',
    shownAs: distance,
  });
}
