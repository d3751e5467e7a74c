import { describe, expect, it } from 'vitest';
import { toSi } from '../../src/units/units.ts';
import type { Coded } from '../../src/weather/coded.ts';
import { readQnh } from '../../src/weather/pressure-group.ts';
import { readTemperatures } from '../../src/weather/temperature-group.ts';
import { readWind } from '../../src/weather/wind-group.ts';
import {
  calmSpeeds,
  cutSettings,
  type RoundedReport,
  roundedDirections,
  roundedSettings,
  roundedTemperatures,
} from '../published/report-rounding.ts';
import { expectNear } from '../support/near.ts';

const token = (text: string) => ({ text, at: 0 });
const temperatureOf = (group: string) => (readTemperatures(token(group)) as { temperature: Coded }).temperature;
const qnhOf = (group: string) => (readQnh(token(group)) as { qnh: Coded }).qnh;
const fromOf = (group: string) => (readWind(token(group)) as { from: Coded }).from;
const speedOf = (group: string) => (readWind(token(group)) as { speed: Coded }).speed;

/** The truth lies within what its group stands for, and not within what a group beside it does. */
function expectWritten(
  { truth, group, beside }: RoundedReport,
  toUnit: (v: number) => number,
  of: (group: string) => Coded,
) {
  const value = toUnit(truth);
  const within = ({ low, high }: Coded) => value >= low && value < high;
  expect(within(of(group)), group).toBe(true);
  for (const other of beside) expect(within(of(other)), other).toBe(false);
}

describe('what a report rounds', () => {
  it.each(roundedTemperatures)('$title', (row) => {
    expectWritten(row, (degrees) => toSi('temperature', degrees, 'degC'), temperatureOf);
  });
  it.each(roundedSettings)('$title', (row) => {
    expectWritten(row, (hectopascals) => toSi('pressure', hectopascals, 'hPa'), qnhOf);
  });
  it.each(cutSettings)('$title', (row) => {
    expectWritten(row, (inches) => toSi('pressure', inches, 'inHg'), qnhOf);
  });
  it.each(roundedDirections)('$title', (row) => {
    expectWritten(row, (degrees) => toSi('angle', degrees, 'deg'), fromOf);
  });
  it.each(calmSpeeds)('$title', (row) => {
    const value = toSi('speed', row.truth, 'kt');
    expect(value).toBeLessThan(speedOf(row.group).high);
    expect(speedOf(row.group)).toMatchObject({ value: 0, low: 0 });
  });

  it('ends where the next group begins', () => {
    expectNear(temperatureOf('18/').low, 273.15 + 17.5, 1e-9);
    expectNear(temperatureOf('18/').high, 273.15 + 18.5, 1e-9);
    expectNear(temperatureOf('M00/').low, 272.65, 1e-9);
    expectNear(temperatureOf('M00/').high, 273.15, 1e-9);
    expectNear(temperatureOf('00/').high, 273.65, 1e-9);
    expect(qnhOf('Q1013')).toEqual({ value: 101_300, low: 101_300, high: 101_400 });
    expectNear(qnhOf('A2992').high - qnhOf('A2992').low, 33.86389, 1e-6);
    expectNear(speedOf('27015KT').low, (14.5 * 1852) / 3600, 1e-12);
    expectNear(speedOf('27015MPS').high, 15.5, 1e-12);
    expectNear(speedOf('00000MPS').high, 0.5, 1e-12);
    expectNear(speedOf('00000KMH').high, 2 / 3.6, 1e-12);
  });
});
