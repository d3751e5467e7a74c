import type { Disc, Lapse, Propulsion } from '../../performance/aeroplane.ts';
import type { Air } from '../../performance/air.ts';
import { flatRatingDefault, propulsionDefault } from '../../performance/propulsion-defaults.ts';
import { speedOfSound, standardTemperature } from '../../physics/atmosphere.ts';
import { T0 } from '../../physics/constants.ts';
import { certificationVapourPressure, humidityPowerTerm } from '../../physics/humidity-power-term.ts';
import { inducedVelocity, staticThrustFall } from '../../physics/thrust/actuator-disc.ts';
import { pistonPowerRatio } from '../../physics/thrust/piston-power-ratio.ts';
import type { Thrust } from '../../physics/thrust/thrust.ts';
import { turbopropPower } from '../../physics/thrust/turboprop.ts';
import type { Worksheet } from './worksheet.ts';

/** What the thrust of a run rests on. */
export interface WorkedThrust {
  /** as defined, at full power */
  readonly propulsion: Propulsion;
  readonly engines: number;
  /** pointer to a member of the aeroplane */
  readonly at: (member: string) => string;
  readonly thrustFactor: number;
  /** 1 at full power */
  readonly fullPowerRatio: number;
  readonly air: Air;
  /** of all engines */
  readonly thrust: Thrust;
}

/** Writes the thrust at one true airspeed, whose symbol and value are given. */
export type ThrustAt = (suffix: string, airspeed: number) => void;

/** What the thrust at any airspeed needs; then the thrust at one, by formula. */
export function thrustLines(sheet: Worksheet, worked: WorkedThrust): ThrustAt {
  sheet.begin('thrust');
  const { propulsion, engines, thrustFactor, fullPowerRatio, at } = worked;
  sheet.stated({ symbol: 'N', name: 'engines', value: engines, at: at('/engines') });
  sheet.stated({
    symbol: 'f_T',
    name: 'factor on the thrust',
    value: thrustFactor,
    at: at('/propulsion/thrustFactor'),
  });
  if (fullPowerRatio !== 1) {
    sheet.stated({ symbol: 'f_P', name: 'power over full power', value: fullPowerRatio, at: '/procedure/power' });
  }
  switch (propulsion.kind) {
    case 'fixed-pitch':
      return fixedPitchLines(sheet, worked, propulsion);
    case 'constant-speed': {
      const { power, criticalAltitude } = propulsion;
      pistonLines(sheet, worked, propulsion, criticalAltitude);
      const ratio = pistonPowerRatio(lapseOf(propulsion), worked.air);
      return discLines(sheet, worked, propulsion, `${setPower(worked)}*Phi`, power * fullPowerRatio * ratio);
    }
    case 'turboprop':
      return turbopropLines(sheet, worked, propulsion);
    case 'electric':
      return discLines(sheet, worked, propulsion, setPower(worked), propulsion.power * fullPowerRatio);
    case 'jet':
      return jetLines(sheet, worked, propulsion);
    case 'measured':
      return measuredLines(sheet, worked, propulsion);
  }
}

type Of<Kind> = Extract<Propulsion, { kind: Kind }>;
type Piston = Of<'fixed-pitch' | 'constant-speed'>;

/** The factor of a power setting in a formula; nothing at full power. */
function setting({ fullPowerRatio }: WorkedThrust, power = ''): string {
  return fullPowerRatio === 1 ? '' : `*f_P${power}`;
}

/** Rated power at the setting that is flown. */
function setPower(worked: WorkedThrust): string {
  return `P${setting(worked)}`;
}

/** A member of the propulsion as stated, or what is taken for it. */
function memberLine(
  sheet: Worksheet,
  { propulsion, at }: WorkedThrust,
  symbol: string,
  name: string,
  member: string,
  unit?: 'm' | 'K' | 'W' | 'N',
): number {
  const stated = (propulsion as unknown as Readonly<Record<string, number | undefined>>)[member];
  const value = stated ?? propulsionDefault(propulsion.kind, member);
  sheet.stated({ symbol, name, value, unit, at: at(`/propulsion/${member}`) });
  return value;
}

function lapseOf(propulsion: Piston): Required<Omit<Lapse, 'thrustFactor'>> & { criticalAltitude?: number } {
  const { kind } = propulsion;
  const lapse = {
    altitudeLapseCoefficient:
      propulsion.altitudeLapseCoefficient ?? propulsionDefault(kind, 'altitudeLapseCoefficient'),
    temperatureExponent: propulsion.temperatureExponent ?? propulsionDefault(kind, 'temperatureExponent'),
    humidityFactor: propulsion.humidityFactor ?? propulsionDefault(kind, 'humidityFactor'),
  };
  return kind === 'constant-speed' && propulsion.criticalAltitude !== undefined
    ? { ...lapse, criticalAltitude: propulsion.criticalAltitude }
    : lapse;
}

/** Full-throttle power of a piston engine over its rated power, Phi. */
function pistonLines(sheet: Worksheet, worked: WorkedThrust, propulsion: Piston, criticalAltitude?: number): void {
  const { air, at } = worked;
  memberLine(sheet, worked, 'C', 'fall of power with altitude', 'altitudeLapseCoefficient');
  memberLine(sheet, worked, 'n_T', 'exponent of the fall of power with temperature', 'temperatureExponent');
  const lapse = lapseOf(propulsion);
  const fall = (altitude: string) => `max(0, ((1 - lapseRate*${altitude}/T0)^(pressureExponent - 1) - C)/(1 - C))`;
  let density = fall('PA');
  if (criticalAltitude !== undefined) {
    const member = '/propulsion/criticalAltitude';
    sheet.stated({ symbol: 'PA_c', name: 'critical altitude', value: criticalAltitude, unit: 'm', at: at(member) });
    density = air.pressureAltitude <= criticalAltitude ? '1' : `${fall('PA')}/${fall('PA_c')}`;
  }
  let moisture = '';
  if (air.vapourPressure !== undefined) {
    memberLine(sheet, worked, 'k_h', 'factor on the loss of power by moisture', 'humidityFactor');
    sheet.figure('table', {
      symbol: 'e_ref',
      name: 'vapour pressure of the certification day at the pressure altitude',
      value: certificationVapourPressure(air.pressureAltitude),
      unit: 'Pa',
      source: 'Cfr25s101',
    });
    sheet.formula({
      symbol: 'h_m',
      name: 'what moisture leaves of the power',
      formula: 'max(0, min(1, 1 - k_h*(1 - (p - e)/(p - e_ref))))',
      value: humidityPowerTerm(air.pressure, air.vapourPressure, air.pressureAltitude, lapse.humidityFactor),
      source: 'Cfr25s101',
    });
    moisture = '*h_m';
  }
  sheet.formula({
    symbol: 'Phi',
    name: 'power over the rated power',
    formula: `${density}*(T_std/T)^n_T${moisture}`,
    value: pistonPowerRatio(lapse, air),
    source: 'GaggFerrar1934',
  });
}

function fixedPitchLines(sheet: Worksheet, worked: WorkedThrust, propulsion: Of<'fixed-pitch'>): ThrustAt {
  memberLine(sheet, worked, 'T_s', 'static thrust of one engine', 'staticThrust', 'N');
  memberLine(sheet, worked, 'D_P', 'diameter of the propeller', 'propellerDiameter', 'm');
  memberLine(sheet, worked, 'b_P', 'slope of the propeller polar', 'polarSlopeCoefficient');
  pistonLines(sheet, worked, propulsion);
  return (suffix, airspeed) =>
    sheet.formula({
      symbol: `T_${suffix}`,
      name: `thrust at V_${suffix}`,
      formula: `max(0, N*f_T*(T_s${setting(worked)}*Phi - b_P*rho*D_P^2*max(0, V_${suffix})^2))`,
      value: worked.thrust.at(airspeed),
      unit: 'N',
      source: 'Lowry1995',
    });
}

function turbopropLines(sheet: Worksheet, worked: WorkedThrust, propulsion: Of<'turboprop'>): ThrustAt {
  const { air, at, fullPowerRatio } = worked;
  const lapseExponent = memberLine(
    sheet,
    worked,
    'n_P',
    'exponent of the fall of power with temperature',
    'lapseExponent',
  );
  const flatRating = propulsion.flatRating ?? flatRatingDefault(lapseExponent);
  const member = '/propulsion/flatRating';
  sheet.stated({ symbol: 'dT_F', name: 'flat rating', value: flatRating, unit: 'K', at: at(member) });
  const power = propulsion.power * fullPowerRatio;
  return discLines(
    sheet,
    worked,
    propulsion,
    `${setPower(worked)}*min(1, (p/p0)*((T0 + dT_F)/T)^n_P)`,
    turbopropPower({ power, flatRating, lapseExponent }, air),
  );
}

/**
 * The actuator disc: power, then at each airspeed the induced speed, which solves a cubic, and the thrust.
 *
 * @param formula - of the power of one engine in this air, P being the rated power
 * @param power - its value [W]
 */
function discLines(
  sheet: Worksheet,
  worked: WorkedThrust,
  propulsion: Disc & { readonly kind: 'constant-speed' | 'turboprop' | 'electric'; readonly power: number },
  formula: string,
  power: number,
): ThrustAt {
  const { air, thrust, engines, fullPowerRatio } = worked;
  memberLine(sheet, worked, 'P', 'rated power of one engine', 'power', 'W');
  memberLine(sheet, worked, 'D_P', 'diameter of the propeller', 'propellerDiameter', 'm');
  const profile = memberLine(sheet, worked, 'eta_0', 'share left by the profile drag of the blades', 'profileFactor');
  const kappa = memberLine(sheet, worked, 'kappa', 'excess of the induced power', 'inducedFactor');
  sheet.formula({
    symbol: 'P_a',
    name: 'power of one engine in this air',
    formula,
    value: power,
    unit: 'W',
    source: worked.propulsion.kind === 'turboprop' ? 'Torenbeek1982' : 'McCormick1995',
  });
  const area = (Math.PI / 4) * propulsion.propellerDiameter ** 2;
  const twice = 2 * air.density * area;
  const supply = (profile * power) / twice;
  sheet.formula({
    symbol: 'A_P',
    name: "area of the propeller's disc",
    formula: 'pi/4*D_P^2',
    value: area,
    unit: 'm2',
    source: 'McCormick1995',
  });
  sheet.formula({
    symbol: 'J_P',
    name: 'power over twice the mass flow of unit speed',
    formula: 'eta_0*P_a/(2*rho*A_P)',
    value: supply,
    source: 'McCormick1995',
  });
  const capped = propulsion.staticThrust !== undefined;
  if (propulsion.staticThrust !== undefined) {
    memberLine(sheet, worked, 'T_s', 'known static thrust of one engine', 'staticThrust', 'N');
    const fall = staticThrustFall(power, propulsion.power * fullPowerRatio, air.density);
    sheet.formula({
      symbol: 'T_cap',
      name: 'static thrust of all engines in this air, which caps the thrust',
      formula: `N*T_s${setting(worked, '^(2/3)')}*min(1, ((P_a/(${setPower(worked)}))^2*sigma)^(1/3))`,
      value: engines * propulsion.staticThrust * fullPowerRatio ** (2 / 3) * fall,
      unit: 'N',
      source: 'McCormick1995',
    });
  }
  return (suffix, airspeed) => {
    const ahead = `max(0, V_${suffix})`;
    sheet.equation({
      symbol: `v_${suffix}`,
      name: `induced speed at V_${suffix}`,
      formula: `kappa*v_${suffix}^3 + (1 + kappa)*${ahead}*v_${suffix}^2 + ${ahead}^2*v_${suffix} = J_P`,
      value: supply > 0 ? inducedVelocity(kappa, supply, Math.max(0, airspeed), Math.cbrt(supply / kappa)) : 0,
      unit: 'm/s',
      source: 'McCormick1995',
    });
    const free = `N*f_T*2*rho*A_P*v_${suffix}*(${ahead} + v_${suffix})`;
    sheet.formula({
      symbol: `T_${suffix}`,
      name: `thrust at V_${suffix}`,
      formula: capped ? `min(T_cap, ${free})` : free,
      value: thrust.at(airspeed),
      unit: 'N',
      source: 'McCormick1995',
    });
  };
}

function jetLines(sheet: Worksheet, worked: WorkedThrust, propulsion: Of<'jet'>): ThrustAt {
  const { air, at } = worked;
  memberLine(sheet, worked, 'T_s', 'static thrust of one engine', 'staticThrust', 'N');
  memberLine(sheet, worked, 'dT_F', 'flat rating above the standard temperature', 'flatRating', 'K');
  const { bypassRatio } = propulsion;
  let lapse = '0.49';
  if (bypassRatio !== undefined) {
    sheet.stated({ symbol: 'BPR', name: 'bypass ratio', value: bypassRatio, at: at('/propulsion/bypassRatio') });
    if (bypassRatio >= 5) lapse = '(0.43 + 0.014*min(15, BPR))';
  }
  const ratio =
    (standardTemperature(air.pressureAltitude) + (propulsion.flatRating ?? propulsionDefault('jet', 'flatRating'))) /
    T0;
  sheet.formula({
    symbol: 'TR',
    name: 'temperature ratio up to which the rating holds',
    formula: '(T_std + dT_F)/T0',
    value: ratio,
    source: 'Mattingly2002',
  });
  return (suffix, airspeed) => {
    const mach = `M_at_${suffix}`;
    sheet.formula({
      symbol: mach,
      name: `Mach number at V_${suffix}`,
      formula: `max(0, V_${suffix})/sqrt(1.4*R*T)`,
      value: Math.max(0, airspeed) / speedOfSound(air.temperature),
      source: 'Iso2533',
    });
    const total = `(1 + 0.2*${mach}^2)`;
    sheet.formula({
      symbol: `T_${suffix}`,
      name: `thrust at V_${suffix}`,
      formula: `N*f_T*T_s${setting(worked)}*(p/p0)*${total}^3.5*max(0, 1 - ${lapse}*sqrt(${mach}) - 3*max(0, (T/T0)*${total} - TR)/(1.5 + ${mach}))`,
      value: worked.thrust.at(airspeed),
      unit: 'N',
      source: 'Mattingly2002',
    });
  };
}

/** Measured thrust, between the two rows that enclose the airspeed; their figures stand in the formula. */
function measuredLines(sheet: Worksheet, worked: WorkedThrust, propulsion: Of<'measured'>): ThrustAt {
  const { airspeeds, thrusts, density, densityExponent } = propulsion;
  const at = (member: string) => worked.at(`/propulsion/${member}`);
  sheet.stated({
    symbol: 'rho_m',
    name: 'density at which the thrust was measured',
    value: density,
    unit: 'kg/m3',
    at: at('density'),
  });
  sheet.stated({
    symbol: 'x_m',
    name: 'exponent of the density ratio',
    value: densityExponent,
    at: at('densityExponent'),
  });
  return (suffix, airspeed) => {
    const speed = Math.max(0, airspeed);
    let row = 1;
    while (row < airspeeds.length - 1 && (airspeeds[row] as number) < speed) row++;
    const [v1, v2, t1, t2] = [airspeeds[row - 1], airspeeds[row], thrusts[row - 1], thrusts[row]];
    sheet.formula({
      symbol: `T_${suffix}`,
      name: `thrust at V_${suffix}, between rows ${row} and ${row + 1} of the measured thrust`,
      formula: `N*f_T${setting(worked)}*(rho/rho_m)^x_m*(${t1} + (${t2} - ${t1})*(max(0, V_${suffix}) - ${v1})/(${v2} - ${v1}))`,
      value: worked.thrust.at(airspeed),
      unit: 'N',
      source: 'Judgement',
    });
  };
}
