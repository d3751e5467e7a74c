import type { Configuration, ScheduledSpeed } from '../../performance/aeroplane.ts';
import type { Air } from '../../performance/air.ts';
import { maximumLiftCoefficient, minimumToOneG } from '../../performance/speeds/maximum-lift-coefficient.ts';
import { aeroplanePointer, configurationPointer } from '../aeroplane-pointer.ts';
import type { SpeedSet } from '../answer.ts';
import type { Question } from '../question.ts';
import { calibratedFrom, indicatedLine, kindLines } from './speed-kind-lines.ts';
import type { Worksheet } from './worksheet.ts';

const speed = { kind: 'speed', direction: 'nearest' } as const;

/** One speed of the procedure. */
export interface WorkedSpeed {
  /** 'LOF' in 'V_LOF' */
  readonly suffix: string;
  readonly name: string;
  /** the member of the configuration's speeds that states it, and what it states */
  readonly member: string;
  readonly schedule: ScheduledSpeed;
  readonly speeds: SpeedSet;
}

/** Greatest lift coefficient and stall speed. */
export function stallLines(
  sheet: Worksheet,
  question: Question,
  { maximumLift }: Configuration,
  stall: SpeedSet,
  air: Air,
): void {
  sheet.begin('speeds');
  const { aeroplane, aeroplaneAt, mass } = question;
  const { area } = aeroplane.wing;
  const at = configurationPointer(question, 'maximumLift');
  sheet.stated({ symbol: 'm', name: 'mass', value: mass, unit: 'kg', at: '/mass' });
  sheet.stated({
    symbol: 'S',
    name: 'wing area',
    value: area,
    unit: 'm2',
    at: aeroplanePointer(aeroplaneAt, '/wing/area'),
  });
  const greatest = {
    symbol: 'CL_max',
    name: 'greatest lift coefficient',
    value: maximumLiftCoefficient(maximumLift, area),
  } as const;
  if (maximumLift.kind === 'coefficient') sheet.stated({ ...greatest, at: `${at}/coefficient` });
  else {
    const minimum = maximumLift.definition === 'minimum';
    sheet.stated({
      symbol: 'V_S_stated',
      name: minimum ? 'stated minimum speed in the stall' : 'stated 1-g stall speed',
      value: maximumLift.cas,
      unit: 'm/s',
      at: `${at}/stallSpeed`,
    });
    sheet.stated({
      symbol: 'm_S',
      name: 'mass at which it is stated',
      value: maximumLift.mass,
      unit: 'kg',
      at: `${at}/mass`,
    });
    if (minimum) {
      sheet.figure('decided', {
        symbol: 'k_S',
        name: 'minimum speed in the stall over the 1-g stall speed',
        value: minimumToOneG,
        source: 'Amendment25n108',
      });
    }
    const stated = minimum ? '(V_S_stated/k_S)' : 'V_S_stated';
    sheet.formula({ ...greatest, formula: `2*m_S*g0/(rho0*S*${stated}^2)`, source: 'Cfr25s103' });
  }
  sheet.formula({
    symbol: 'V_S_eas',
    name: '1-g stall speed, equivalent',
    formula: 'sqrt(2*m*g0/(rho0*S*CL_max))',
    value: stall.eas,
    unit: 'm/s',
    source: 'Cfr25s103',
    shownAs: speed,
  });
  kindLines(sheet, 'S', 'stall speed', stall, air);
  indicatedLine(sheet, 'S', 'stall speed', stall, aeroplane.airspeedCalibration);
}

/** A speed of the procedure, from its schedule to all its kinds. */
export function speedLines(
  sheet: Worksheet,
  question: Question,
  { suffix, name, member, schedule, speeds }: WorkedSpeed,
  air: Air,
): void {
  const at = configurationPointer(question, `speeds/${member}`);
  if (schedule.kind === 'stall-ratio') {
    sheet.stated({ symbol: `k_${suffix}`, name: `${name} over the stall speed`, value: schedule.ratio, at });
    sheet.formula({
      symbol: `V_${suffix}_eas`,
      name: `${name}, equivalent`,
      formula: `k_${suffix}*V_S_eas`,
      value: speeds.eas,
      unit: 'm/s',
      source: 'AndersonIntroduction',
      shownAs: speed,
    });
    kindLines(sheet, suffix, name, speeds, air);
  } else {
    sheet.stated({
      symbol: `V_${suffix}_stated`,
      name: `stated ${name}, calibrated`,
      value: schedule.cas,
      unit: 'm/s',
      at: `${at}/cas`,
    });
    sheet.stated({
      symbol: `m_${suffix}`,
      name: 'mass at which it is stated',
      value: schedule.mass,
      unit: 'kg',
      at: `${at}/mass`,
    });
    sheet.formula({
      symbol: `V_${suffix}_cas`,
      name: `${name}, calibrated`,
      formula: `V_${suffix}_stated*sqrt(m/m_${suffix})`,
      value: speeds.cas,
      unit: 'm/s',
      source: 'AndersonIntroduction',
      shownAs: speed,
    });
    calibratedFrom(sheet, suffix, name, speeds, air);
  }
  indicatedLine(sheet, suffix, name, speeds, question.aeroplane.airspeedCalibration);
}
