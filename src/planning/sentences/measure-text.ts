import { type Direction, type Kind, roundTo, shown, type UnitFamily, unitFor } from '../../units/presentation.ts';

const symbols: Readonly<Record<string, string>> = {
  degC: '°C',
  degF: '°F',
  deltaC: '°C',
  deltaF: '°F',
  percent: '%',
  'kg/m3': 'kg/m³',
  m2: 'm²',
  ft2: 'ft²',
};

/**
 * A number from SI as a sentence writes it: rounded as the gate out rounds it, thousands apart, its unit behind.
 *
 * @param family - the units the answer was asked in
 * @param kind - what the number is
 * @param si - the number in SI, finite
 * @param direction - up for what is required, down for what is available or spare
 * @returns such as '1 255 m', '11.9 kt', '-3.5 °C', '3°'
 */
export function measureText(family: UnitFamily, kind: Kind, si: number, direction: Direction = 'nearest'): string {
  const unit = unitFor(family, kind);
  const number = numberText(shown(family, kind, si, direction));
  return unit === 'deg' ? `${number}°` : `${number} ${symbols[unit] ?? unit}`;
}

/** Per cent of a ratio with so many decimals at most, such as '8.1 %'; a margin goes down. */
export function percentText(ratio: number, decimals = 1, direction: Direction = 'nearest'): string {
  return `${numberText(roundTo(ratio * 100, 10 ** -decimals, direction))} %`;
}

/** A number with its thousands set apart by a space. */
export function numberText(value: number): string {
  const text = String(value);
  if (value > -1000 && value < 1000) return text;
  const point = text.indexOf('.');
  const whole = point < 0 ? text : text.slice(0, point);
  let grouped = point < 0 ? '' : text.slice(point);
  const first = whole.startsWith('-') ? 1 : 0;
  let end = whole.length;
  for (; end - first > 3; end -= 3) grouped = ` ${whole.slice(end - 3, end)}${grouped}`;
  return whole.slice(0, end) + grouped;
}
