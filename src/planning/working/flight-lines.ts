import { climbForces, climbGradient, energySine } from '../../performance/takeoff/climb-forces.ts';
import { pullUpRadius } from '../../performance/takeoff/pull-up-arc.ts';
import { takeoffEstimate } from '../../performance/takeoff/takeoff-estimate.ts';
import type { TakeoffRun } from '../../performance/takeoff/takeoff-run.ts';
import { groundEffect } from '../../physics/ground-effect.ts';
import { aeroplanePointer, configurationPointer } from '../aeroplane-pointer.ts';
import type { Question } from '../question.ts';
import { effectLine } from './ground-lines.ts';
import type { ThrustAt } from './worked-thrust.ts';
import type { Worksheet } from './worksheet.ts';

/** The climb at half the screen height, and the estimate of the air distance from it. */
export function takeoffFlightLines(sheet: Worksheet, question: Question, run: TakeoffRun, thrustAt: ThrustAt): void {
  sheet.begin('flight');
  const { screenHeight, pullUpLoadFactor, span, wingHeight } = run;
  const climb = climbForces(run);
  const square = climb.square + (climb.growth * screenHeight) / 2;
  const airspeed = Math.sqrt(square);
  const gradient = climbGradient(climb, screenHeight / 2);
  const sine = energySine(climb, gradient);
  sheet.stated({
    symbol: 'h_s',
    name: 'screen height',
    value: screenHeight,
    unit: 'm',
    at: aeroplanePointer(question.aeroplaneAt, '/certification/screenHeight'),
  });
  sheet.stated({
    symbol: 'n_A',
    name: 'load factor of the pull-up',
    value: pullUpLoadFactor,
    at: configurationPointer(question, 'pullUpLoadFactor'),
  });
  sheet.formula({
    symbol: 'V_h',
    name: 'airspeed at half the screen height',
    formula: 'sqrt(V_LOF_tas^2 + max(0, V_scr_tas^2 - V_LOF_tas^2)/2)',
    value: airspeed,
    unit: 'm/s',
    source: 'HouseEnergyPath',
  });
  effectLine(sheet, 'h', 'at half the screen height', '(h_W + h_s/2)/b', (wingHeight + screenHeight / 2) / span);
  const phi = groundEffect((wingHeight + screenHeight / 2) / span);
  sheet.formula({
    symbol: 'D_h',
    name: 'drag there',
    formula: '0.5*rho*V_h^2*S*(CD_0 + dCD_A) + phi_h*K*(m*g0)^2/(0.5*rho*V_h^2*S)',
    value: (climb.zeroLift * square + (phi * climb.induced) / square) / climb.perWeight,
    unit: 'N',
    source: 'AndersonIntroduction',
  });
  thrustAt('h', airspeed);
  sheet.formula({
    symbol: 'gamma_h',
    name: 'climb gradient there, less an uphill slope',
    formula: '(T_h - D_h)/(m*g0) - max(0, slope)',
    value: gradient,
    source: 'HouseEnergyPath',
  });
  sheet.formula({
    symbol: 'sin_E',
    name: 'sine of the path angle that energy allows while speed is gained',
    formula: 'min(sqrt(0.5), gamma_h/(1 + max(0, V_scr_tas^2 - V_LOF_tas^2)/(2*g0*h_s)))',
    value: sine,
    source: 'HouseEnergyPath',
  });
  const { airDistance } = takeoffEstimate(run);
  if (!(Number.isFinite(airDistance) && sine > 0)) return;
  const radius = pullUpRadius(run.liftOffSpeed, pullUpLoadFactor);
  sheet.formula({
    symbol: 'R_A',
    name: 'radius of the pull-up',
    formula: 'V_LOF_tas^2/(g0*(n_A - 1))',
    value: radius,
    unit: 'm',
    source: 'Raymer',
  });
  const cosine = Math.sqrt(1 - sine * sine);
  sheet.formula({
    symbol: 'cos_E',
    name: 'its cosine',
    formula: 'sqrt(1 - sin_E^2)',
    value: cosine,
    source: 'HouseEnergyPath',
  });
  const still =
    radius * (1 - cosine) < screenHeight ? '(R_A*sin_E/(1 + cos_E) + h_s*cos_E/sin_E)' : 'sqrt(h_s*(2*R_A - h_s))';
  sheet.formula({
    symbol: 's_A_estimate',
    name: 'air distance, estimated from the climb at half the screen height',
    formula: `${still}*(1 - w/V_h)`,
    value: airDistance,
    unit: 'm',
    source: 'Raymer',
  });
}
