import { rollAcceleration, rollForces } from '../../performance/takeoff/roll-forces.ts';
import { estimateSpeeds, takeoffEstimate } from '../../performance/takeoff/takeoff-estimate.ts';
import type { TakeoffRun } from '../../performance/takeoff/takeoff-run.ts';
import { dragCoefficient } from '../../physics/drag.ts';
import { groundEffect, leastHeightRatio } from '../../physics/ground-effect.ts';
import { aeroplanePointer, configurationPointer } from '../aeroplane-pointer.ts';
import type { Question } from '../question.ts';
import type { ThrustAt } from './worked-thrust.ts';
import type { Worksheet } from './worksheet.ts';

/** What of a definition decides lift and drag, as the resolved configuration has it. */
export interface WorkedDrag {
  readonly groundDragIncrement: number;
  readonly airDragIncrement: number;
}

/** The wing and its drag, on the ground and in the air. */
export function dragLines(
  sheet: Worksheet,
  question: Question,
  { groundDragIncrement, airDragIncrement }: WorkedDrag,
  run: Pick<
    TakeoffRun,
    'span' | 'wingHeight' | 'inducedDragFactor' | 'groundLiftCoefficient' | 'groundDragCoefficient'
  >,
): void {
  const { aeroplane, aeroplaneAt } = question;
  const at = (member: string) => aeroplanePointer(aeroplaneAt, member);
  const configured = (member: string) => configurationPointer(question, member);
  const { zeroLiftCoefficient, oswaldFactor } = aeroplane.drag;
  sheet.begin('ground');
  sheet.stated({ symbol: 'b', name: 'span', value: run.span, unit: 'm', at: at('/wing/span') });
  sheet.stated({
    symbol: 'h_W',
    name: 'height of the wing above the runway',
    value: run.wingHeight,
    unit: 'm',
    at: at('/wing/heightAboveGround'),
  });
  sheet.stated({
    symbol: 'CD_0',
    name: 'zero-lift drag coefficient',
    value: zeroLiftCoefficient,
    at: at('/drag/zeroLiftCoefficient'),
  });
  sheet.stated({ symbol: 'e_O', name: 'Oswald factor', value: oswaldFactor, at: at('/drag/oswaldFactor') });
  sheet.stated({
    symbol: 'dCD_G',
    name: 'drag increment on the ground',
    value: groundDragIncrement,
    at: configured('groundDragIncrementCoefficient'),
  });
  sheet.stated({
    symbol: 'dCD_A',
    name: 'drag increment in the air',
    value: airDragIncrement,
    at: configured('airDragIncrementCoefficient'),
  });
  sheet.stated({
    symbol: 'CL_G',
    name: 'lift coefficient in the roll',
    value: run.groundLiftCoefficient,
    at: configured('groundLiftCoefficient'),
  });
  sheet.formula({
    symbol: 'K',
    name: 'induced drag factor',
    formula: 'S/(pi*b^2*e_O)',
    value: run.inducedDragFactor,
    source: 'AndersonIntroduction',
  });
  effectLine(sheet, 'G', 'on the ground', 'h_W/b', run.wingHeight / run.span);
  sheet.formula({
    symbol: 'CD_G',
    name: 'drag coefficient in the roll',
    formula: 'CD_0 + dCD_G + phi_G*K*CL_G^2',
    value: dragCoefficient(
      run.groundDragCoefficient,
      run.inducedDragFactor,
      run.groundLiftCoefficient,
      groundEffect(run.wingHeight / run.span),
    ),
    source: 'AndersonIntroduction',
  });
}

/** Factor of the ground effect on the induced drag at a height over the span. */
export function effectLine(sheet: Worksheet, suffix: string, where: string, ratio: string, value: number): void {
  const r = `max(${leastHeightRatio}, ${ratio})`;
  sheet.formula({
    symbol: `phi_${suffix}`,
    name: `ground effect on the induced drag, ${where}`,
    formula: `min(1, 1 - (1 - 1.32*${r})/(1.05 + 7.4*${r}))`,
    value: groundEffect(value),
    source: 'Wieselsberger1922',
  });
}

/** The one slope of the runway; where it has a profile, the one that planning takes for the whole. */
export function slopeLine(sheet: Worksheet, { slope, profile }: Pick<TakeoffRun, 'slope' | 'profile'>): void {
  const throughout = { name: 'slope of the runway, uphill positive', at: '/runway/slope' };
  const overall = { name: 'slope of the straight line over the runway', at: '/runway/slope/profile' };
  sheet.stated({ symbol: 'slope', value: slope, ...(profile === undefined ? throughout : overall) });
}

/** The acceleration at two speeds of the takeoff roll, and the estimate of the roll from them. */
export function takeoffRollLines(sheet: Worksheet, question: Question, run: TakeoffRun, thrustAt: ThrustAt): void {
  const { mass, headwind, rollingFriction, rotationTime } = run;
  sheet.stated({
    symbol: 'mu',
    name: 'rolling friction',
    value: rollingFriction,
    at: '/runway/surface/rollingFrictionCoefficient',
  });
  slopeLine(sheet, run);
  sheet.stated({
    symbol: 't_R',
    name: 'time of the rotation',
    value: rotationTime,
    unit: 's',
    at: configurationPointer(question, 'rotationTime'),
  });
  const { contaminantDrag } = run;
  if (contaminantDrag !== undefined) {
    sheet.figure('table', {
      symbol: 'k_C',
      name: 'drag of the contaminant over the square of the ground speed',
      value: contaminantDrag,
      unit: 'kg/m',
      source: 'HouseContaminant',
    });
  }
  const displaced = (suffix: number) => (contaminantDrag === undefined ? '' : ` - k_C*(V_${suffix} - w)^2`);
  const forces = rollForces(run);
  const speeds = estimateSpeeds(run);
  [1, 2].forEach((suffix, i) => {
    const airspeed = speeds[i] as number;
    const square = airspeed * Math.abs(airspeed);
    const sign = suffix === 1 ? '-' : '+';
    sheet.formula({
      symbol: `V_${suffix}`,
      name: `airspeed ${suffix} of the two at which the acceleration is taken`,
      formula: `w + sqrt((1 ${sign} 1/sqrt(3))/2)*(V_LOF_tas - w)`,
      value: airspeed,
      unit: 'm/s',
      source: 'AbramowitzStegun',
    });
    const pressure = `0.5*rho*V_${suffix}*abs(V_${suffix})*S`;
    sheet.formula({
      symbol: `D_${suffix}`,
      name: `drag at V_${suffix}`,
      formula: `${pressure}*CD_G`,
      value: forces.drag * square * mass,
      unit: 'N',
      source: 'McCormick1995',
    });
    sheet.formula({
      symbol: `L_${suffix}`,
      name: `lift at V_${suffix}`,
      formula: `${pressure}*CL_G`,
      value: forces.lift * square * mass,
      unit: 'N',
      source: 'McCormick1995',
    });
    thrustAt(String(suffix), airspeed);
    sheet.formula({
      symbol: `a_${suffix}`,
      name: `acceleration at V_${suffix}`,
      formula: `(T_${suffix} - D_${suffix}${displaced(suffix)} - mu*max(0, m*g0 - L_${suffix}))/m - g0*slope`,
      value: rollAcceleration(forces, airspeed),
      unit: 'm/s2',
      source: 'McCormick1995',
    });
  });
  const { groundRoll } = takeoffEstimate(run);
  if (!Number.isFinite(groundRoll) || headwind >= run.liftOffSpeed) return;
  sheet.formula({
    symbol: 's_G_estimate',
    name: 'ground roll, estimated from the accelerations at two speeds',
    formula: '(V_LOF_tas - w)^2*(1/a_1 + 1/a_2)/4 + max(0, V_R_tas - w)*t_R',
    value: groundRoll,
    unit: 'm',
    source: 'AndersonIntroduction',
  });
}
