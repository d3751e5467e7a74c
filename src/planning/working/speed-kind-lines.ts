import type { AirspeedCalibration } from '../../performance/aeroplane.ts';
import type { Air } from '../../performance/air.ts';
import { machFromEas } from '../../physics/airspeed.ts';
import type { SpeedSet } from '../answer.ts';
import type { Worksheet } from './worksheet.ts';

const speed = { kind: 'speed', direction: 'nearest' } as const;

/** The Mach number of a calibrated airspeed, as a formula. */
export function machOf(calibrated: string): string {
  return `sqrt(5*(((p0/p)*((1 + 0.2*(${calibrated}/a0)^2)^3.5 - 1) + 1)^(2/7) - 1))`;
}

/** Mach number, equivalent and true airspeed of a calibrated one that stands above. */
export function calibratedFrom(sheet: Worksheet, suffix: string, name: string, speeds: SpeedSet, air: Air): void {
  sheet.formula({
    symbol: `M_${suffix}`,
    name: `Mach number of the ${name}`,
    formula: machOf(`V_${suffix}_cas`),
    value: machFromEas(speeds.eas, air.pressure),
    source: 'GraceyRp1046',
  });
  sheet.formula({
    symbol: `V_${suffix}_eas`,
    name: `${name}, equivalent`,
    formula: `M_${suffix}*a0*sqrt(p/p0)`,
    value: speeds.eas,
    unit: 'm/s',
    source: 'GraceyRp1046',
    shownAs: speed,
  });
  trueLine(sheet, suffix, name, speeds);
}

/** True and calibrated airspeed of an equivalent one. */
export function kindLines(sheet: Worksheet, suffix: string, name: string, speeds: SpeedSet, { pressure }: Air): void {
  trueLine(sheet, suffix, name, speeds);
  sheet.formula({
    symbol: `M_${suffix}`,
    name: `Mach number of the ${name}`,
    formula: `V_${suffix}_eas/(a0*sqrt(p/p0))`,
    value: machFromEas(speeds.eas, pressure),
    source: 'GraceyRp1046',
  });
  sheet.formula({
    symbol: `V_${suffix}_cas`,
    name: `${name}, calibrated`,
    formula: `a0*sqrt(5*(((p/p0)*((1 + 0.2*M_${suffix}^2)^3.5 - 1) + 1)^(2/7) - 1))`,
    value: speeds.cas,
    unit: 'm/s',
    source: 'GraceyRp1046',
    shownAs: speed,
  });
}

function trueLine(sheet: Worksheet, suffix: string, name: string, { tas }: SpeedSet): void {
  sheet.formula({
    symbol: `V_${suffix}_tas`,
    name: `${name}, true`,
    formula: `V_${suffix}_eas/sqrt(sigma)`,
    value: tas,
    unit: 'm/s',
    source: 'Cfr1s1',
    shownAs: speed,
  });
}

/** Indicated airspeed between two rows of the aeroplane's calibration, whose figures stand in the formula. */
export function indicatedLine(
  sheet: Worksheet,
  suffix: string,
  name: string,
  { cas, ias }: SpeedSet,
  calibration: AirspeedCalibration | undefined,
): void {
  if (ias === undefined || calibration === undefined) return;
  const { indicated, calibrated } = calibration;
  let row = 1;
  while (row < calibrated.length - 1 && (calibrated[row] as number) < cas) row++;
  const [i1, i2, c1, c2] = [indicated[row - 1], indicated[row], calibrated[row - 1], calibrated[row]];
  sheet.formula({
    symbol: `V_${suffix}_ias`,
    name: `${name}, indicated, between rows ${row} and ${row + 1} of the aeroplane's calibration`,
    formula: `${i1} + (${i2} - ${i1})*(V_${suffix}_cas - ${c1})/(${c2} - ${c1})`,
    value: ias,
    unit: 'm/s',
    source: 'Cfr1s1',
    shownAs: speed,
  });
}
