import { parseMetar } from 'metar-taf-parser';
import { describe, expect, it } from 'vitest';
import { fromSi } from '../../src/units/units.ts';
import type { Observation } from '../../src/weather/observation.ts';
import { observed } from './observed.ts';
import { wellFormed } from './well-formed.ts';

/** The figures both readers give: degrees, m/s, degC and Pa, rounded to what is well below a unit of the code. */
interface Figures {
  readonly from: number | undefined;
  readonly speed: number | undefined;
  readonly gust: number | undefined;
  readonly temperature: number | undefined;
  readonly dewPoint: number | undefined;
  readonly setting: number | undefined;
}

const metresPerSecond: Readonly<Record<string, number>> = {
  KT: 1852 / 3600,
  'm/s': 1,
  MPS: 1,
  'km/h': 1 / 3.6,
  KMH: 1 / 3.6,
};
const rounded = (value: number | undefined) => (value === undefined ? undefined : Math.round(value * 100) / 100);

function oracleFigures(report: string): Figures {
  const { wind, temperature, dewPoint, altimeter } = parseMetar(report.replace('=', '').trim().replace(/ +/g, ' '));
  const scale = wind === undefined ? 1 : (metresPerSecond[wind.unit] as number);
  return {
    from: rounded(wind?.degrees),
    speed: rounded(wind === undefined ? undefined : wind.speed * scale),
    gust: rounded(wind?.gust === undefined ? undefined : wind.gust * scale),
    temperature: rounded(temperature),
    dewPoint: rounded(dewPoint),
    setting: rounded(
      altimeter === undefined ? undefined : altimeter.value * (altimeter.unit === 'hPa' ? 100 : 3386.389),
    ),
  };
}

function ourFigures({ wind, temperature, dewPoint, qnh }: Observation): Figures {
  const degC = (kelvin: number | undefined) =>
    rounded(kelvin === undefined ? undefined : fromSi('temperature', kelvin, 'degC'));
  const blowing = wind?.kind === 'from' || wind?.kind === 'variable' ? wind : undefined;
  return {
    from: wind?.kind === 'from' ? rounded(fromSi('angle', wind.from.value, 'deg')) : undefined,
    speed: wind?.kind === 'calm' ? 0 : rounded(blowing?.speed.value),
    gust: rounded(blowing?.gust?.value),
    temperature: degC(temperature?.value),
    dewPoint: degC(dewPoint?.value),
    setting: rounded(qnh?.value),
  };
}

const calm = 'the other has a direction for a calm';
const tenths = 'we take the tenths of the remarks, the other leaves them there';
const secondWind = 'the other takes a later wind in place of the first';
const kmh = 'the other reads kilometres an hour as knots, and their last figures only';
const beyond = 'we have no figure for a wind beyond the scale';
const half = 'the other wants a dew point beside the temperature';

/** Where the two differ, by station, and why we keep ours. */
const differences: Readonly<Record<string, readonly [members: readonly (keyof Figures)[], because: string]>> = {
  ZZAC: [['from'], calm],
  ZZCC: [['from'], calm],
  ZZCG: [['from', 'speed'], beyond],
  ZZDA: [['speed'], kmh],
  ZZDB: [['speed', 'gust'], kmh],
  ZZDC: [['from'], calm],
  ZZEA: [['temperature', 'dewPoint'], tenths],
  ZZEB: [['temperature'], tenths],
  ZZEC: [['temperature'], tenths],
  ZZED: [['from', 'temperature', 'dewPoint'], `${calm}; ${tenths}`],
  ZZEF: [['temperature'], half],
  ZZEH: [['speed'], 'the other drops a figure of a speed of three'],
  ZZEJ: [['from', 'speed'], beyond],
  ZZHA: [['setting'], 'we narrow whole hectopascals by the hundredths of an inch of the remarks'],
  ZZJC: [['temperature'], half],
  ZZJD: [['temperature'], half],
  ZZKA: [['temperature', 'dewPoint'], 'the other takes a temperature after its turn'],
  ZZKB: [['from', 'speed'], 'the other takes a wind after its turn'],
  ZZKD: [['from', 'speed'], secondWind],
  ZZLA: [['from', 'speed', 'gust'], secondWind],
  ZZLB: [['from', 'speed', 'gust'], 'the other takes the figures of a runway state for a wind'],
};

describe('well-formed reports beside a general-purpose parser', () => {
  const stationOf = (report: string) => observed(report).station;

  it('names only differences that there are', () => {
    const stations = wellFormed.map(({ report }) => stationOf(report));
    expect(Object.keys(differences).filter((station) => !stations.includes(station))).toEqual([]);
  });

  it.each(wellFormed)('$report', ({ report }) => {
    const [ours, others] = [ourFigures(observed(report)), oracleFigures(report)];
    const members = (Object.keys(ours) as (keyof Figures)[]).filter((name) => ours[name] !== others[name]);
    expect(members, JSON.stringify({ ours, others })).toEqual(differences[stationOf(report)]?.[0] ?? []);
  });
});
