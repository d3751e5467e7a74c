import type { Configuration } from '../../performance/aeroplane.ts';
import type { Air } from '../../performance/air.ts';
import { aeroplanePointer } from '../aeroplane-pointer.ts';
import type { SpeedSet } from '../answer.ts';
import type { Question } from '../question.ts';
import { takeoffSpeedRule } from '../rules/certification/takeoff-speed-rule.ts';
import type { TakeoffSpeeds } from '../takeoff-speeds.ts';
import { indicatedLine, kindLines, machOf } from './speed-kind-lines.ts';
import { speedLines, type WorkedSpeed } from './speed-lines.ts';
import type { Worksheet } from './worksheet.ts';

const speed = { kind: 'speed', direction: 'nearest' } as const;

/** Speeds of a takeoff as they are worked: each of the schedule, and what the certification basis makes of it. */
export function takeoffSpeedLines(
  sheet: Worksheet,
  question: Question,
  { maximumLift }: Configuration,
  worked: readonly (Omit<WorkedSpeed, 'speeds'> & { readonly member: 'rotation' | 'liftOff' | 'screen' })[],
  { speeds, scheduled }: Pick<TakeoffSpeeds, 'speeds' | 'scheduled'>,
  air: Air,
): void {
  const isRaised = speeds !== scheduled;
  const control = isRaised ? controlLines(sheet, question) : undefined;
  const isMinimum = maximumLift.kind === 'stall-speed' && maximumLift.definition === 'minimum';
  const stall = isMinimum && takeoffSpeedRule(question.aeroplane)?.ofMinimumSpeed ? 'k_S*V_S_eas' : 'V_S_eas';
  for (const one of worked) {
    const { suffix, member } = one;
    const suffixed = isRaised ? `${suffix}_sch` : suffix;
    const name = isRaised ? `${one.name} of the schedule` : one.name;
    speedLines(sheet, question, { ...one, name, suffix: suffixed, speeds: scheduled[member] }, air);
    if (!isRaised) continue;
    const least =
      member === 'liftOff' ? 'V_R_eas + V_LOF_sch_eas - V_R_sch_eas' : leastOf(sheet, question, one, stall, control);
    raisedLine(sheet, question, one, least, speeds[member], air);
  }
}

function controlLines(sheet: Worksheet, { aeroplane, aeroplaneAt }: Question): string | undefined {
  const vmc = aeroplane.engineOut?.vmc;
  if (vmc === undefined) return undefined;
  const at = aeroplanePointer(aeroplaneAt, '/engineOut/vmc');
  sheet.stated({ symbol: 'V_MC', name: 'minimum control speed, calibrated', value: vmc, unit: 'm/s', at });
  return 'V_MC';
}

/** The greater of the speed of the schedule and what the basis asks for, as a formula. */
function leastOf(
  sheet: Worksheet,
  { aeroplane }: Question,
  { suffix, name, member }: { readonly suffix: string; readonly name: string; readonly member: string },
  stall: string,
  control: string | undefined,
): string {
  const rule = takeoffSpeedRule(aeroplane);
  const terms = [`V_${suffix}_sch_eas`];
  if (rule !== undefined && member !== 'liftOff') {
    const { stallRatio, controlRatio } = rule[member as 'rotation' | 'screen'];
    if (stallRatio !== undefined) {
      const symbol = `k_${suffix}_S`;
      sheet.figure('decided', {
        symbol,
        name: `least ${name} over the stall speed`,
        value: stallRatio,
        source: rule.source,
      });
      terms.push(`${symbol}*${stall}`);
    }
    if (control !== undefined) {
      const symbol = `k_${suffix}_MC`;
      const least = `least ${name} over the minimum control speed`;
      sheet.figure('decided', { symbol, name: least, value: controlRatio, source: rule.source });
      terms.push(`${machOf(`${symbol}*${control}`)}*a0*sqrt(p/p0)`);
    }
  }
  if (member === 'screen') terms.push('V_LOF_eas');
  return `max(${terms.join(', ')})`;
}

function raisedLine(
  sheet: Worksheet,
  { aeroplane }: Question,
  { suffix, name }: { readonly suffix: string; readonly name: string },
  formula: string,
  speeds: SpeedSet,
  air: Air,
): void {
  const source = takeoffSpeedRule(aeroplane)?.source ?? 'Judgement';
  sheet.formula({
    symbol: `V_${suffix}_eas`,
    name: `${name}, equivalent`,
    formula,
    value: speeds.eas,
    unit: 'm/s',
    source,
    shownAs: speed,
  });
  kindLines(sheet, suffix, name, speeds, air);
  indicatedLine(sheet, suffix, name, speeds, aeroplane.airspeedCalibration);
}
