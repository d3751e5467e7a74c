import type { Weather, Wind } from '../planning/question.ts';
import type { Observation } from './observation.ts';
import { missingGroup, type ReportFault, type ReportRefused } from './report-fault.ts';
import type { ReportedWind } from './wind-group.ts';

/** What may be given beside a report, in place of what it says. SI. */
export type GivenBeside = Partial<Weather>;

/**
 * The weather of an observation, members given beside it first; a report without a member that is needed is refused.
 *
 * A dew point of the report goes with the report's temperature only: beside another it may lie above it.
 */
export function reportedWeather(observation: Observation, given: GivenBeside = {}): Weather | ReportRefused {
  const end = endOfGroups(observation);
  const faults: ReportFault[] = [];
  const temperature = given.temperature ?? observation.temperature?.value;
  if (temperature === undefined) {
    faults.push(missingGroup(end, 'temperature', 'a group such as 18/09', 'give the temperature beside the report'));
  }
  const pressure = given.pressure ?? qnhOf(observation);
  if (pressure === undefined) {
    faults.push(missingGroup(end, 'QNH', 'a group such as Q1013 or A2992', 'give the pressure beside the report'));
  }
  const wind = given.wind ?? windOf(observation.wind);
  if (typeof wind === 'string') faults.push(withoutWind(observation, wind, end));
  if (temperature === undefined || pressure === undefined || typeof wind === 'string') return { refused: faults };
  const dewPoint = given.dewPoint ?? (given.temperature === undefined ? observation.dewPoint?.value : undefined);
  // tenths of the temperature beside whole degrees of the dew point may cross by what rounding hides
  return {
    temperature,
    ...(dewPoint === undefined ? {} : { dewPoint: Math.min(dewPoint, temperature) }),
    pressure,
    wind,
  };
}

/**
 * A reported wind as planning takes it; by name why there is none.
 *
 * A direction that varies all round may be a tailwind and a crosswind of the full mean at once.
 */
export function windOf(reported: ReportedWind | undefined): Wind | 'not-reported' | 'beyond-scale' {
  if (reported === undefined) return 'not-reported';
  if (reported.kind === 'not-reported' || reported.kind === 'beyond-scale') return reported.kind;
  if (reported.kind === 'calm') return { kind: 'calm' };
  const gust = reported.gust === undefined ? {} : { gust: reported.gust.value };
  if (reported.kind === 'variable') return { kind: 'variable', speed: reported.speed.value, ...gust };
  return {
    kind: 'from',
    from: reported.from.value,
    fromReference: 'true',
    speed: reported.speed.value,
    ...gust,
    ...(reported.sector === undefined ? {} : { variable: reported.sector }),
  };
}

function qnhOf({ qnh }: Observation): Weather['pressure'] | undefined {
  return qnh === undefined ? undefined : { kind: 'qnh', value: qnh.value };
}

function withoutWind({ groups }: Observation, why: 'not-reported' | 'beyond-scale', end: number): ReportFault {
  const group = groups.find(({ as }) => as === 'wind');
  const [allowed, hint] = ['a group such as 27015KT', 'give the wind beside the report'];
  if (group === undefined) return missingGroup(end, 'wind', allowed, hint);
  const says = why === 'beyond-scale' ? 'is beyond what the code can say' : 'reports no wind';
  const message = `${group.token} at character ${group.at} ${says}.`;
  const code = why === 'beyond-scale' ? 'out-of-range' : 'missing';
  return { code, at: group.at, token: group.token, message, received: group.token, allowed, hint };
}

function endOfGroups({ groups }: Observation): number {
  const last = groups.at(-1);
  return last === undefined ? 0 : last.at + last.token.length;
}
