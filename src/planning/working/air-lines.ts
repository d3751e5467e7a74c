import type { Air } from '../../performance/air.ts';
import { standardTemperature } from '../../physics/atmosphere.ts';
import type { Question } from '../question.ts';
import type { Worksheet } from './worksheet.ts';

const altitude = { kind: 'altitude', direction: 'nearest' } as const;

/** The constants of the air that later lines use. */
export function constantLines(sheet: Worksheet): void {
  sheet.begin('constants');
  sheet.constant('g0', 'standard acceleration of free fall');
  sheet.constant('p0', 'standard pressure at sea level');
  sheet.constant('T0', 'standard temperature at sea level');
  sheet.constant('rho0', 'standard density at sea level');
  sheet.constant('R', 'gas constant of dry air');
  sheet.constant('lapseRate', 'fall of the standard temperature with altitude, up to 11 000 m');
  sheet.constant('pressureExponent', 'g0/(R lapseRate)');
  sheet.constant('a0', 'standard speed of sound at sea level');
}

/** The air: pressure altitude, pressure, density, density altitude. */
export function airLines(sheet: Worksheet, { weather, runway }: Pick<Question, 'weather' | 'runway'>, air: Air): void {
  sheet.begin('air');
  sheet.stated({ symbol: 'T', name: 'temperature', value: weather.temperature, unit: 'K', at: '/weather/temperature' });
  pressureLines(sheet, weather.pressure, runway.elevation, air);
  sheet.formula({
    symbol: 'T_std',
    name: 'standard temperature at the pressure altitude',
    formula: 'T0 - lapseRate*PA',
    value: standardTemperature(air.pressureAltitude),
    unit: 'K',
    source: 'Iso2533',
  });
  const { dewPoint, vapourPressure } = air;
  if (dewPoint !== undefined && vapourPressure !== undefined) {
    sheet.stated({ symbol: 'T_dew', name: 'dew point', value: dewPoint, unit: 'K', at: '/weather/dewPoint' });
    sheet.formula({
      symbol: 'e',
      name: 'vapour pressure',
      formula: '611.2*exp(17.62*(T_dew - 273.15)/(243.12 + T_dew - 273.15))',
      value: vapourPressure,
      unit: 'Pa',
      source: 'Wmo8',
    });
  }
  sheet.formula({
    symbol: 'rho',
    name: 'density',
    formula: vapourPressure === undefined ? 'p/(R*T)' : '(p - 0.378*e)/(R*T)',
    value: air.density,
    unit: 'kg/m3',
    source: vapourPressure === undefined ? 'Iso2533' : 'Wmo8',
    shownAs: { kind: 'density', direction: 'nearest' },
  });
  sheet.formula({
    symbol: 'sigma',
    name: 'density over that of the standard atmosphere at sea level',
    formula: 'rho/rho0',
    value: air.densityRatio,
    source: 'Iso2533',
  });
  sheet.formula({
    symbol: 'DA',
    name: 'density altitude',
    formula: '(T0/lapseRate)*(1 - sigma^(1/(pressureExponent - 1)))',
    value: air.densityAltitude,
    unit: 'm',
    source: 'Iso2533',
    shownAs: altitude,
  });
}

function pressureLines(
  sheet: Worksheet,
  given: Question['weather']['pressure'],
  elevation: number,
  { pressure, pressureAltitude }: Air,
): void {
  const pa = { symbol: 'PA', name: 'pressure altitude', value: pressureAltitude, unit: 'm' } as const;
  const p = { symbol: 'p', name: 'pressure', value: pressure, unit: 'Pa' } as const;
  const at = `/weather/pressure/${given.kind}`;
  if (given.kind === 'stationPressure') {
    sheet.stated({ ...p, at });
    const formula = '(T0/lapseRate)*(1 - (p/p0)^(1/pressureExponent))';
    sheet.formula({ ...pa, formula, source: 'Iso2533', shownAs: altitude });
    return;
  }
  if (given.kind === 'pressureAltitude') sheet.stated({ ...pa, at });
  else {
    sheet.stated({
      symbol: 'h',
      name: 'elevation of the runway',
      value: elevation,
      unit: 'm',
      at: '/runway/elevation',
    });
    sheet.stated({ symbol: 'QNH', name: 'altimeter setting', value: given.value, unit: 'Pa', at });
    const formula = 'h + (T0/lapseRate)*(1 - (QNH/p0)^(1/pressureExponent))';
    sheet.formula({ ...pa, formula, source: 'Iso2533', shownAs: altitude });
  }
  const formula = 'p0*(1 - lapseRate*PA/T0)^pressureExponent';
  sheet.formula({ ...p, formula, source: 'Iso2533', shownAs: { kind: 'pressure', direction: 'nearest' } });
}
