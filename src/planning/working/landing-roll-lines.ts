import { estimateSpeed, landingEstimate } from '../../performance/landing/landing-estimate.ts';
import type { LandingRun } from '../../performance/landing/landing-run.ts';
import { deceleration, stopForces } from '../../performance/landing/stop-forces.ts';
import { dragCoefficient } from '../../physics/drag.ts';
import { groundEffect } from '../../physics/ground-effect.ts';
import { aeroplanePointer, configurationPointer } from '../aeroplane-pointer.ts';
import type { PreparedLanding } from '../prepare-landing.ts';
import type { LandingQuestion } from '../question.ts';
import { slopeLine } from './ground-lines.ts';
import type { Worksheet } from './worksheet.ts';

/** The deceleration at one speed of the stop, and the estimate of the roll from it. */
export function landingRollLines(sheet: Worksheet, question: LandingQuestion, { run, braking }: PreparedLanding): void {
  sheet.begin('ground');
  const { headwind, freeRollTime, touchdownSpeed } = run;
  const { groundDragCoefficient, inducedDragFactor, groundLiftCoefficient } = run;
  const effect = groundEffect(run.wingHeight / run.span);
  const { procedure = {}, aeroplaneAt, runway } = question;
  slopeLine(sheet, run);
  sheet.stated({
    symbol: 't_F',
    name: 'time from touchdown to braking',
    value: freeRollTime,
    unit: 's',
    at:
      procedure.reactionTime === undefined ? configurationPointer(question, 'freeRollTime') : '/procedure/reactionTime',
  });
  const mean = estimateSpeed(run);
  const square = mean * Math.abs(mean);
  sheet.formula({
    symbol: 'V_m',
    name: 'airspeed at which the deceleration is taken',
    formula: 'w + sqrt(0.5)*(V_TD_tas - w)',
    value: mean,
    unit: 'm/s',
    source: 'AndersonPerformance',
  });
  const groundSpeed = mean - headwind;
  const stated = runway.surface.brakingFrictionCoefficient;
  if (stated !== undefined) {
    sheet.stated({
      symbol: 'mu_B',
      name: 'braking friction',
      value: stated,
      at: '/runway/surface/brakingFrictionCoefficient',
    });
  } else {
    sheet.figure('table', {
      symbol: 'mu_B',
      name: `braking friction at V_m over the ground, the share of the weight on the braked wheels included: ${braking.surface}`,
      value: run.braking.at(groundSpeed),
      source: run.braking.kinks.length > 0 ? 'Cfr25s109' : 'HouseFriction',
    });
  }
  const push = thrustLine(sheet, question, run, groundSpeed, aeroplaneAt);
  const { contaminantDrag } = run;
  let displaced = '';
  if (contaminantDrag !== undefined && groundSpeed < contaminantDrag.below) {
    displaced = ' + k_C*(V_m - w)^2';
    sheet.figure('table', {
      symbol: 'k_C',
      name: 'what the contaminant is counted to hold back, over the square of the ground speed',
      value: contaminantDrag.perSquare,
      unit: 'kg/m',
      source: 'HouseContaminant',
    });
  }
  const pressure = '0.5*rho*V_m*abs(V_m)*S';
  const half = 0.5 * run.density * run.wingArea * square;
  sheet.formula({
    symbol: 'D_m',
    name: 'drag there',
    formula: `${pressure}*CD_G`,
    value: half * dragCoefficient(groundDragCoefficient, inducedDragFactor, groundLiftCoefficient, effect),
    unit: 'N',
    source: 'McCormick1995',
  });
  sheet.formula({
    symbol: 'L_m',
    name: 'lift there',
    formula: `${pressure}*CL_G`,
    value: half * groundLiftCoefficient,
    unit: 'N',
    source: 'McCormick1995',
  });
  sheet.formula({
    symbol: 'd_m',
    name: 'deceleration there',
    formula: `(mu_B*max(0, m*g0 - L_m) + D_m${displaced} ${push})/m + g0*slope`,
    value: deceleration(stopForces(run, run), mean),
    unit: 'm/s2',
    source: 'McCormick1995',
  });
  sheet.formula({
    symbol: 's_free',
    name: 'roll before braking',
    formula: '(V_TD_tas - w)*t_F',
    value: (touchdownSpeed - headwind) * freeRollTime,
    unit: 'm',
    source: 'Raymer',
  });
  const { groundRoll } = landingEstimate(run);
  if (!(Number.isFinite(groundRoll) && groundSpeed > 0)) return;
  sheet.formula({
    symbol: 's_G_estimate',
    name: 'ground roll, estimated from the deceleration at one speed',
    formula: 's_free + (V_TD_tas - w)^2/(2*d_m)',
    value: groundRoll,
    unit: 'm',
    source: 'AndersonPerformance',
  });
}

/** Idle thrust, or reverse thrust above its cut-off speed; returns the term of the deceleration. */
function thrustLine(
  sheet: Worksheet,
  question: LandingQuestion,
  { idleThrust, reverseThrust }: LandingRun,
  groundSpeed: number,
  aeroplaneAt: string,
): string {
  if (reverseThrust !== undefined && groundSpeed >= reverseThrust.cutOffSpeed) {
    const at = aeroplanePointer(aeroplaneAt, '/reverseThrust/thrust');
    sheet.stated({ symbol: 'T_rev', name: 'reverse thrust', value: reverseThrust.thrust, unit: 'N', at });
    return '+ T_rev';
  }
  const at = configurationPointer(question, 'idleThrust');
  sheet.stated({ symbol: 'T_idle', name: 'idle thrust', value: idleThrust, unit: 'N', at });
  return '- T_idle';
}
