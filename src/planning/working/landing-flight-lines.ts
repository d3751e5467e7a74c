import {
  landingAirDistance,
  ordinaryMeanRatio,
  ordinaryTime,
  ordinaryTouchdownRatio,
} from '../../performance/landing/landing-air-distance.ts';
import { landingArc } from '../../performance/landing/landing-arc.ts';
import type { LandingRun } from '../../performance/landing/landing-run.ts';
import { configurationPointer } from '../aeroplane-pointer.ts';
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
  const { floatDecelerationRatio } = resolved;
  if (floatDecelerationRatio !== undefined) floatLines(sheet, question, run, floatDecelerationRatio, screen);
  sheet.formula({
    symbol: 's_A',
    name: 'air distance',
    formula: floatDecelerationRatio === undefined ? 's_arc' : 'max(s_arc, s_ordinary) + s_float',
    value: air.distance,
    unit: 'm',
    source: floatDecelerationRatio === undefined ? 'HouseFit' : 'Ac25s32',
    shownAs: distance,
  });
}

/** The time and the float of an aeroplane whose flare nobody has fitted. */
function floatLines(
  sheet: Worksheet,
  question: LandingQuestion,
  run: LandingRun,
  floatDecelerationRatio: number,
  screen: string,
): void {
  const { referenceSpeed, touchdownSpeed, headwind } = run;
  const air = landingAirDistance(run);
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
    value: floatDecelerationRatio,
    at: configurationPointer(question, 'floatDecelerationRatio'),
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
}
