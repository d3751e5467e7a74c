import { a0, p0, rho0 } from './constants.ts';

/**
 * Impact pressure of a subsonic Mach number, over the static pressure.
 *
 * q_c/p = (1 + 0.2 M^2)^3.5 - 1
 *
 * @param mach - 0 to 1
 * @returns ratio
 * @see references.GraceyRp1046, eq. for subsonic flow, gamma 1.4
 */
export function impactPressureRatio(mach: number): number {
  return Math.expm1(3.5 * Math.log1p(0.2 * mach * mach));
}

/** The inverse of impactPressureRatio: M = sqrt(5 ((q_c/p + 1)^(2/7) - 1)). @see references.GraceyRp1046 */
export function machOfImpactPressureRatio(ratio: number): number {
  return Math.sqrt(5 * Math.expm1((2 / 7) * Math.log1p(ratio)));
}

/**
 * Mach number of a calibrated airspeed.
 *
 * q_c = p0 ((1 + 0.2 (CAS/a0)^2)^3.5 - 1); M = sqrt(5 ((q_c/p + 1)^(2/7) - 1))
 *
 * @param cas - [m/s], 0 or more
 * @param pressure - static [Pa], above 0
 * @returns Mach number, or 'not-subsonic' where the speed or the result exceeds 1
 * @see references.GraceyRp1046; references.Cfr1s1
 */
export function machFromCas(cas: number, pressure: number): number | 'not-subsonic' {
  requireSpeed('cas', cas);
  requirePressure(pressure);
  if (cas > a0) return 'not-subsonic';
  const mach = machOfImpactPressureRatio((impactPressureRatio(cas / a0) * p0) / pressure);
  return mach > 1 ? 'not-subsonic' : mach;
}

/** The inverse of machFromCas; arguments and outcomes likewise. @see references.GraceyRp1046 */
export function casFromMach(mach: number, pressure: number): number | 'not-subsonic' {
  requireSpeed('mach', mach);
  requirePressure(pressure);
  if (mach > 1) return 'not-subsonic';
  const atSeaLevel = machOfImpactPressureRatio((impactPressureRatio(mach) * pressure) / p0);
  return atSeaLevel > 1 ? 'not-subsonic' : atSeaLevel * a0;
}

/**
 * Equivalent airspeed of a calibrated one: EAS = M a0 sqrt(p/p0).
 *
 * Needs no temperature: rho0 EAS^2 = gamma p M^2.
 *
 * @param cas - [m/s], 0 or more
 * @param pressure - static [Pa], above 0
 * @returns [m/s], or 'not-subsonic'
 * @see references.GraceyRp1046; references.Cfr1s1
 */
export function easFromCas(cas: number, pressure: number): number | 'not-subsonic' {
  const mach = machFromCas(cas, pressure);
  return mach === 'not-subsonic' ? mach : easFromMach(mach, pressure);
}

/** The inverse of easFromCas; arguments and outcomes likewise. @see references.GraceyRp1046 */
export function casFromEas(eas: number, pressure: number): number | 'not-subsonic' {
  return casFromMach(machFromEas(eas, pressure), pressure);
}

/** EAS = M a0 sqrt(p/p0) [m/s] of a Mach number and a static pressure [Pa]. @see references.GraceyRp1046 */
export function easFromMach(mach: number, pressure: number): number {
  requirePressure(pressure);
  return mach * a0 * Math.sqrt(pressure / p0);
}

/** Mach number of an equivalent airspeed [m/s] at a static pressure [Pa]. @see references.GraceyRp1046 */
export function machFromEas(eas: number, pressure: number): number {
  requireSpeed('eas', eas);
  requirePressure(pressure);
  return eas / (a0 * Math.sqrt(pressure / p0));
}

/**
 * True airspeed of an equivalent one: TAS = EAS/sqrt(rho/rho0).
 *
 * @param eas - [m/s]
 * @param density - of the air as it is, moisture included [kg/m3], above 0
 * @returns [m/s]
 * @see references.Cfr1s1, equivalent airspeed
 */
export function tasFromEas(eas: number, density: number): number {
  requireDensity(density);
  return eas / Math.sqrt(density / rho0);
}

/** The inverse of tasFromEas. @see references.Cfr1s1, equivalent airspeed */
export function easFromTas(tas: number, density: number): number {
  requireDensity(density);
  return tas * Math.sqrt(density / rho0);
}

function requireSpeed(name: string, speed: number): void {
  if (!(speed >= 0)) throw new RangeError(`${name} must be 0 or more: ${speed}`);
}

function requirePressure(pressure: number): void {
  if (!(pressure > 0)) throw new RangeError(`pressure must be above 0 Pa: ${pressure}`);
}

function requireDensity(density: number): void {
  if (!(density > 0)) throw new RangeError(`density must be above 0 kg/m3: ${density}`);
}
