import type { Lapse } from '../../performance/aeroplane.ts';
import { propulsionDefault } from '../../performance/propulsion-defaults.ts';
import { certificationVapourPressure, humidityPowerTerm } from '../../physics/humidity-power-term.ts';
import { pistonPowerRatio } from '../../physics/thrust/piston-power-ratio.ts';
import { discLines } from './disc-lines.ts';
import { memberLine, type Of, setPower, setting, type ThrustAt, type WorkedThrust } from './worked-thrust.ts';
import type { Worksheet } from './worksheet.ts';

type Piston = Of<'fixed-pitch' | 'constant-speed'>;

/** Fixed-pitch propellers: a static thrust that falls with the square of the airspeed. */
export function fixedPitchLines(sheet: Worksheet, worked: WorkedThrust, propulsion: Of<'fixed-pitch'>): ThrustAt {
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

/** Constant-speed propellers: a disc at the power that altitude, temperature and moisture leave. */
export function constantSpeedLines(sheet: Worksheet, worked: WorkedThrust, propulsion: Of<'constant-speed'>): ThrustAt {
  const { power, criticalAltitude } = propulsion;
  pistonLines(sheet, worked, propulsion, criticalAltitude);
  const ratio = pistonPowerRatio(lapseOf(propulsion), worked.air);
  return discLines(sheet, worked, propulsion, `${setPower(worked)}*Phi`, power * worked.fullPowerRatio * ratio);
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
