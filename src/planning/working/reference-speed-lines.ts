import { aeroplanePointer } from '../aeroplane-pointer.ts';
import type { PreparedLanding } from '../prepare-landing.ts';
import type { LandingQuestion } from '../question.ts';
import { referenceSpeedRules } from '../rules/certification/reference-speed.ts';
import { calibratedFrom, kindLines, machOf } from './speed-kind-lines.ts';
import { speedLines } from './speed-lines.ts';
import type { Worksheet } from './worksheet.ts';

const speed = { kind: 'speed', direction: 'nearest' } as const;
const name = 'landing reference speed';

/**
 * The landing reference speed: as stated, or that of the certification basis; then with the increment of the procedure.
 *
 * @returns the symbol of the true airspeed at the screen
 */
export function referenceSpeedLines(sheet: Worksheet, question: LandingQuestion, prepared: PreparedLanding): string {
  const { conditions, resolved, landingSpeeds } = prepared;
  const { air } = conditions;
  const { reference, raised, speeds } = landingSpeeds;
  const schedule = raised === undefined ? resolved.landingReference : undefined;
  if (schedule !== undefined) {
    const worked = { suffix: 'REF', name, member: 'landingReference', schedule, speeds: reference };
    speedLines(sheet, question, worked, air);
  } else basisLines(sheet, question, prepared);

  const increment = resolved.approachSpeedIncrement;
  if (increment === 0) return 'V_REF_tas';
  sheet.stated({
    symbol: 'dV_APP',
    name: 'increment of the approach speed, calibrated',
    value: increment,
    unit: 'm/s',
    at: '/procedure/approachSpeedIncrement',
  });
  const flown = speeds.landingReference;
  sheet.formula({
    symbol: 'V_APP_cas',
    name: 'approach speed, calibrated',
    formula: 'V_REF_cas + dV_APP',
    value: flown.cas,
    unit: 'm/s',
    source: 'Judgement',
    shownAs: speed,
  });
  calibratedFrom(sheet, 'APP', 'approach speed', flown, air);
  return 'V_APP_tas';
}

/** The least speed of the certification basis: over the stall speed, or over the minimum control speed where that is more. */
function basisLines(sheet: Worksheet, question: LandingQuestion, { conditions, landingSpeeds }: PreparedLanding): void {
  const { aeroplane, aeroplaneAt } = question;
  const { air, configuration } = conditions;
  const { maximumLift } = configuration;
  const { reference } = landingSpeeds;
  const { stallRatio, ofMinimumSpeed, controlRatio, phrase, source } =
    referenceSpeedRules[aeroplane.certification.basis];
  const isMinimum = ofMinimumSpeed && maximumLift.kind === 'stall-speed' && maximumLift.definition === 'minimum';
  sheet.figure('decided', {
    symbol: 'k_REF',
    name: `${name} over the stall speed: ${phrase}`,
    value: stallRatio,
    source,
  });
  const vmc = aeroplane.engineOut?.vmc;
  const eas = {
    symbol: 'V_REF_eas',
    name: `${name}, equivalent`,
    value: reference.eas,
    unit: 'm/s',
    shownAs: speed,
  } as const;
  const ofStall = isMinimum ? 'k_REF*k_S*V_S_eas' : 'k_REF*V_S_eas';
  if (vmc === undefined || controlRatio === undefined) sheet.formula({ ...eas, formula: ofStall, source });
  else {
    const at = aeroplanePointer(aeroplaneAt, '/engineOut/vmc');
    sheet.stated({ symbol: 'V_MC', name: 'minimum control speed, calibrated', value: vmc, unit: 'm/s', at });
    sheet.figure('decided', {
      symbol: 'k_MC',
      name: `${name} over the minimum control speed`,
      value: controlRatio,
      source,
    });
    const calibrated = 'k_MC*V_MC';
    const mach = machOf(calibrated);
    sheet.formula({ ...eas, formula: `max(${ofStall}, ${mach}*a0*sqrt(p/p0))`, source });
  }
  kindLines(sheet, 'REF', name, reference, air);
}
