import {
  landingAirDistance,
  ordinaryMeanRatio,
  ordinaryTime,
  ordinaryTouchdownRatio,
} from '../../performance/landing/landing-air-distance.ts';
import { landingArc } from '../../performance/landing/landing-arc.ts';
import { estimateSpeed, landingEstimate } from '../../performance/landing/landing-estimate.ts';
import type { LandingRun } from '../../performance/landing/landing-run.ts';
import { stopForces } from '../../performance/landing/stop-forces.ts';
import { dragCoefficient } from '../../physics/drag.ts';
import { groundEffect } from '../../physics/ground-effect.ts';
import { aeroplanePointer, configurationPointer } from '../aeroplane-pointer.ts';
import type { PreparedLanding } from '../prepare-landing.ts';
import type { LandingQuestion } from '../question.ts';
import type { Worksheet } from './worksheet.ts';

const distance = { kind: 'distance', direction: 'up' } as const;

/**
 * The way from the screen to touchdown, which is closed: the longer of the arc and the time of an ordinary landing, and the float.
 *
 * @param screen - symbol of the true airspeed at the screen
 */
export function landingFlightLines(
  sheet: Worksheet,
  question: LandingQuestion,
  { run, resolved }: PreparedLanding,
  screen: string,
): void {
  sheet.begin('flight');
  const { procedure = {} } = question;
  const { screenHeight, approachAngle, flareLoadFactor, headwind, referenceSpeed, touchdownSpeed } = run;
  const arc = landingArc(run);
  const air = landingAirDistance(run);
  const configured = (member: string) => configurationPointer(question, member);
  sheet.figure('decided', { symbol: 'h_s', name: 'screen height', value: screenHeight, unit: 'm', source: 'Cfr23s75' });
  sheet.stated({
    symbol: 'gamma',
    name: 'approach angle',
    value: approachAngle,
    unit: 'rad',
    at: procedure.approachAngle === undefined ? configured('approachAngle') : '/procedure/approachAngle',
  });
  sheet.stated({
    symbol: 'n_F',
    name: 'load factor of the flare',
    value: flareLoadFactor,
    at: configured('flareLoadFactor'),
  });
  const flareSpeed = (referenceSpeed + touchdownSpeed) / 2;
  sheet.formula({
    symbol: 'V_F',
    name: 'airspeed of the flare',
    formula: `(${screen} + V_TD_tas)/2`,
    value: flareSpeed,
    unit: 'm/s',
    source: 'Raymer',
  });
  sheet.formula({
    symbol: 'R_F',
    name: 'radius of the flare',
    formula: 'V_F^2/(g0*(n_F - 1))',
    value: arc.radius,
    unit: 'm',
    source: 'Raymer',
  });
  sheet.formula({
    symbol: 'h_F',
    name: 'height at which the flare begins',
    formula: 'R_F*(1 - cos(gamma))',
    value: arc.flareHeight,
    unit: 'm',
    source: 'Raymer',
  });
  const above = arc.flareHeight > screenHeight;
  sheet.formula({
    symbol: 's_F',
    name: 'flare along the runway, through still air',
    formula: above ? 'sqrt(h_s*(2*R_F - h_s))' : 'R_F*sin(gamma)',
    value: arc.flare,
    unit: 'm',
    source: 'Raymer',
  });
  sheet.formula({
    symbol: 's_straight',
    name: 'straight approach from the screen to the flare, through still air',
    formula: above ? '0' : '(h_s - h_F)*cos(gamma)/sin(gamma)',
    value: arc.straight,
    unit: 'm',
    source: 'Raymer',
  });
  sheet.formula({
    symbol: 't_arc',
    name: 'time of both',
    formula: above ? 'R_F*2*asin(sqrt(h_s/(2*R_F)))/V_F' : `(h_s - h_F)/(${screen}*sin(gamma)) + R_F*gamma/V_F`,
    value: arc.time,
    unit: 's',
    source: 'Raymer',
  });
  sheet.formula({
    symbol: 's_arc',
    name: 'both over the ground',
    formula: 's_straight + s_F - w*t_arc',
    value: arc.straight + arc.flare - headwind * arc.time,
    unit: 'm',
    source: 'Raymer',
  });
  const ordinary = ordinaryTime * (ordinaryMeanRatio * referenceSpeed - headwind);
  sheet.formula({
    symbol: 's_ordinary',
    name: 'air distance of an ordinary landing, by its time',
    formula: `${ordinaryTime}*(${ordinaryMeanRatio}*${screen} - w)`,
    value: ordinary,
    unit: 'm',
    source: 'Ac25s32',
  });
  sheet.stated({
    symbol: 'd_F',
    name: 'deceleration in the float over g',
    value: resolved.floatDecelerationRatio,
    at: configured('floatDecelerationRatio'),
  });
  const floatFrom = ordinaryTouchdownRatio * referenceSpeed;
  sheet.formula({
    symbol: 'V_float',
    name: 'airspeed from which it floats',
    formula: `${ordinaryTouchdownRatio}*${screen}`,
    value: floatFrom,
    unit: 'm/s',
    source: 'Ac25s32',
  });
  sheet.formula({
    symbol: 's_float',
    name: 'float over the ground',
    formula:
      floatFrom > touchdownSpeed
        ? 'max(0, (V_float^2 - V_TD_tas^2)/(2*g0*d_F) - s_F)*(1 - w/((V_float + V_TD_tas)/2))'
        : '0',
    value: air.floatDistance,
    unit: 'm',
    source: 'HouseEnergyPath',
  });
  sheet.formula({
    symbol: 's_A',
    name: 'air distance',
    formula: 'max(s_arc, s_ordinary) + s_float',
    value: air.distance,
    unit: 'm',
    source: 'Ac25s32',
    shownAs: distance,
  });
}

/** The deceleration at one speed of the stop, and the estimate of the roll from it. */
export function landingRollLines(sheet: Worksheet, question: LandingQuestion, { run, braking }: PreparedLanding): void {
  sheet.begin('ground');
  const { headwind, slope, freeRollTime, touchdownSpeed } = run;
  const { groundDragCoefficient, inducedDragFactor, groundLiftCoefficient } = run;
  const effect = groundEffect(run.wingHeight / run.span);
  const { procedure = {}, aeroplaneAt, runway } = question;
  sheet.stated({
    symbol: 'slope',
    name:
      run.profile === undefined ? 'slope of the runway, uphill positive' : 'slope of the straight line over the runway',
    value: slope,
    at: run.profile === undefined ? '/runway/slope' : '/runway/slope/profile',
  });
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
    value: stopForces(run, run).deceleration(mean),
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
