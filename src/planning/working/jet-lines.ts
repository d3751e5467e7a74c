import { propulsionDefault } from '../../performance/propulsion-defaults.ts';
import { speedOfSound, standardTemperature } from '../../physics/atmosphere.ts';
import { T0 } from '../../physics/constants.ts';
import { memberLine, type Of, setting, type ThrustAt, type WorkedThrust } from './worked-thrust.ts';
import type { Worksheet } from './worksheet.ts';

/** Turbofans: pressure, Mach number and the rating's temperature. */
export function jetLines(sheet: Worksheet, worked: WorkedThrust, propulsion: Of<'jet'>): ThrustAt {
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
