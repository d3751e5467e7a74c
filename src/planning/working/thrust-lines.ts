import { discLines, turbopropLines } from './disc-lines.ts';
import { jetLines } from './jet-lines.ts';
import { constantSpeedLines, fixedPitchLines } from './piston-lines.ts';
import { type Of, setPower, setting, type ThrustAt, type WorkedThrust } from './worked-thrust.ts';
import type { Worksheet } from './worksheet.ts';

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
    case 'constant-speed':
      return constantSpeedLines(sheet, worked, propulsion);
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
