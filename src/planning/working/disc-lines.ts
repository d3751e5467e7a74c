import type { Disc } from '../../performance/aeroplane.ts';
import { flatRatingDefault } from '../../performance/propulsion-defaults.ts';
import { inducedVelocity, staticThrustFall } from '../../physics/thrust/actuator-disc.ts';
import { turbopropPower } from '../../physics/thrust/turboprop.ts';
import { memberLine, type Of, setPower, setting, type ThrustAt, type WorkedThrust } from './worked-thrust.ts';
import type { Worksheet } from './worksheet.ts';

/** Turboprops: a disc at the lesser of flat-rated and thermodynamic power. */
export function turbopropLines(sheet: Worksheet, worked: WorkedThrust, propulsion: Of<'turboprop'>): ThrustAt {
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
export function discLines(
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
