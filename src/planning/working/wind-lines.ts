import type { Conditions } from '../conditions.ts';
import type { Question } from '../question.ts';
import type { Worksheet } from './worksheet.ts';

const speed = { kind: 'speed', direction: 'nearest' } as const;

/**
 * The wind along the runway, and what the rule set credits of it.
 *
 * Of a variable direction the least headwind of the sector is taken, for which there is no formula.
 */
export function windLines(sheet: Worksheet, { weather: { wind }, runway }: Question, conditions: Conditions): void {
  sheet.begin('wind');
  const { headwind, variable } = conditions.wind;
  const along = {
    symbol: 'w',
    name: 'headwind along the runway, tailwind negative',
    value: headwind,
    unit: 'm/s',
  } as const;
  if (wind.kind === 'from') {
    const { speed: blowing, from } = wind;
    const turn = wind.fromReference === runway.directionReference ? 0 : (runway.magneticVariation ?? 0);
    const sign = wind.fromReference === 'true' ? '-' : '+';
    sheet.stated({ symbol: 'W', name: 'wind speed', value: blowing, unit: 'm/s', at: '/weather/wind/speed' });
    sheet.stated({
      symbol: 'psi_W',
      name: 'direction from which the wind blows',
      value: from,
      unit: 'rad',
      at: '/weather/wind/from',
    });
    sheet.stated({
      symbol: 'psi_R',
      name: 'direction of the runway',
      value: runway.direction,
      unit: 'rad',
      at: '/runway/direction',
    });
    if (turn !== 0) {
      sheet.stated({
        symbol: 'variation',
        name: 'magnetic variation, east positive',
        value: turn,
        unit: 'rad',
        at: '/runway/magneticVariation',
      });
    }
    const angle = turn === 0 ? 'psi_W - psi_R' : `psi_W ${sign} variation - psi_R`;
    if (variable) {
      sheet.figure('table', {
        ...along,
        name: `${along.name}: the least of the sector of directions`,
        source: 'Phak',
        shownAs: speed,
      });
    } else sheet.formula({ ...along, formula: `W*cos(${angle})`, source: 'Phak', shownAs: speed });
  } else if (wind.kind === 'variable') {
    sheet.stated({ symbol: 'W', name: 'wind speed', value: wind.speed, unit: 'm/s', at: '/weather/wind/speed' });
    sheet.formula({
      ...along,
      name: `${along.name}: from any direction counts as a tailwind`,
      formula: '-W',
      source: 'Judgement',
      shownAs: speed,
    });
  } else {
    sheet.stated({ ...along, at: wind.kind === 'calm' ? '/weather/wind' : '/weather/wind/headwind' });
  }
  if (conditions.doesNotApply !== undefined) return;
  const { windCredit } = conditions.rules;
  sheet.figure('decided', {
    symbol: 'k_w',
    name: `share of the wind that is credited: ${windCredit.because}`,
    value: headwind > 0 ? windCredit.headwind : windCredit.tailwind,
    source: windCredit.source,
  });
  sheet.formula({
    symbol: 'w_c',
    name: 'credited headwind',
    formula: 'k_w*w',
    value: conditions.creditedHeadwind,
    unit: 'm/s',
    source: windCredit.source,
    shownAs: speed,
  });
}
