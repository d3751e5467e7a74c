import type { ReferenceKey } from '../references.ts';

/** A number of nature or of a standard: never without its unit and its source. */
export interface Constant {
  readonly value: number;
  readonly unit: string;
  readonly source: ReferenceKey;
}

function constant(value: number, unit: string, source: ReferenceKey): Constant {
  return { value, unit, source };
}

const gravity = 9.80665;
const seaLevelTemperature = 288.15;
const gasConstant = 287.05287;
const heatRatio = 1.4;
const gradient = 0.0065;

/** Every constant of the air in one edition, for the list of sources; the formulas use the bare numbers below. */
export const constants = {
  g0: constant(gravity, 'm/s2', 'Iso2533'),
  p0: constant(101_325, 'Pa', 'Iso2533'),
  T0: constant(seaLevelTemperature, 'K', 'Iso2533'),
  rho0: constant(1.225, 'kg/m3', 'Iso2533'),
  R: constant(gasConstant, 'J/(kg K)', 'Iso2533'),
  gamma: constant(heatRatio, '1', 'Iso2533'),
  /** fall of temperature with geopotential altitude up to the tropopause */
  lapseRate: constant(gradient, 'K/m', 'Iso2533'),
  tropopause: constant(11_000, 'm', 'Iso2533'),
  tropopauseTemperature: constant(216.65, 'K', 'Iso2533'),
  /** speed of sound at sea level, sqrt(gamma R T0) = 340.294 */
  a0: constant(Math.sqrt(heatRatio * gasConstant * seaLevelTemperature), 'm/s', 'Iso2533'),
  /** g0/(R L), 5.25588 */
  pressureExponent: constant(gravity / (gasConstant * gradient), '1', 'Iso2533'),
  /** ratio of the molar masses of water vapour and dry air */
  vapourMassRatio: constant(0.622, '1', 'Cipm2007'),
  /** 1 - vapourMassRatio */
  vapourDeficit: constant(0.378, '1', 'Cipm2007'),
} as const;

export const g0 = constants.g0.value;
export const p0 = constants.p0.value;
export const T0 = constants.T0.value;
export const rho0 = constants.rho0.value;
export const R = constants.R.value;
export const gamma = constants.gamma.value;
export const lapseRate = constants.lapseRate.value;
export const tropopause = constants.tropopause.value;
export const tropopauseTemperature = constants.tropopauseTemperature.value;
export const a0 = constants.a0.value;
export const pressureExponent = constants.pressureExponent.value;
export const vapourMassRatio = constants.vapourMassRatio.value;
export const vapourDeficit = constants.vapourDeficit.value;
