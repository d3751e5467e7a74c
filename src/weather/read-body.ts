import { keptAs, windShearLength } from './kept-group.ts';
import type { ReadAs, ReadGroup } from './observation.ts';
import { narrowed, readQnh } from './pressure-group.ts';
import type { BodyFigures } from './read-remarks.ts';
import { groupFault, isReportFault, type ReportFault } from './report-fault.ts';
import { issueTime, several, type Token } from './report-text.ts';
import { type RunwayState, readRunwayState } from './runway-state-group.ts';
import { readTemperatures } from './temperature-group.ts';
import { type ReportedWind, readSector, readWind, type WindSector } from './wind-group.ts';

/** The body of an observation, as far as it was read. */
export interface Body {
  readonly wind?: ReportedWind;
  readonly figures: BodyFigures;
  readonly runwayStates: readonly RunwayState[];
  readonly groups: readonly ReadGroup[];
  readonly faults: readonly ReportFault[];
  /** of the first group after it */
  readonly next: number;
}

/** The order of what a body tells; a group that comes after its turn is not understood. */
const turns = ['wind', 'sector', 'sky', 'temperature', 'pressure', 'supplement'] as const;
type Turn = (typeof turns)[number];

const bodyEnd = /^(?:RMK|NOSIG|BECMG|TEMPO|INTER|PROB\d{2})$/;

/** The groups from the heading to the trend or the remarks, each in its turn. */
export function readBody(tokens: readonly Token[], first: number): Body {
  const groups: ReadGroup[] = [];
  const faults: ReportFault[] = [];
  const runwayStates: RunwayState[] = [];
  const told = new Map<Turn, string>();
  let wind: ReportedWind | undefined;
  let figures: BodyFigures = {};
  let turn = 0;
  let next = first;

  /** Marks a group as read, where its turn is not over; the turn moves on to it. */
  const inTurn = (of: Turn): boolean => {
    const place = turns.indexOf(of);
    if (place < turn) return false;
    turn = place;
    return true;
  };

  const readOne = (token: Token): ReadAs | ReportFault => {
    const asWind = wind === undefined || turn === 0 ? readWind(token) : undefined;
    if (asWind !== undefined) {
      if (isReportFault(asWind)) return asWind;
      if (wind !== undefined) return again(token, 'wind', told);
      if (!inTurn('wind')) return 'not-understood';
      wind = asWind;
      told.set('wind', token.text);
      return 'wind';
    }
    const kept = keptAs(token.text, tokens[next + 1]?.text);
    if (kept !== undefined) return inTurn(skyward.has(kept) ? 'sky' : 'supplement') ? kept : 'not-understood';
    const sector = readSector(token);
    if (sector !== undefined) {
      if (isReportFault(sector)) return sector;
      const widened = turn === 0 && wind !== undefined ? withSector(wind, sector) : undefined;
      if (widened === undefined || !inTurn('sector')) return 'not-understood';
      wind = widened;
      return 'wind-sector';
    }
    const temperatures = readTemperatures(token);
    if (temperatures !== undefined) {
      if (isReportFault(temperatures)) return temperatures;
      if (told.has('temperature')) return again(token, 'temperature', told);
      if (!inTurn('temperature')) return 'not-understood';
      figures = { ...figures, ...temperatures };
      told.set('temperature', token.text);
      return 'temperature';
    }
    const setting = readQnh(token);
    if (setting !== undefined) {
      if (isReportFault(setting)) return setting;
      if (!inTurn('pressure')) return 'not-understood';
      if (setting.kind === 'not-reported') return 'pressure';
      const qnh = figures.qnh === undefined ? setting.qnh : narrowed(figures.qnh, setting.qnh);
      if (qnh === undefined) return again(token, 'pressure', told);
      figures = { ...figures, qnh };
      told.set('pressure', token.text);
      return 'pressure';
    }
    const state = readRunwayState(token);
    if (state !== undefined) {
      if (isReportFault(state)) return state;
      if (!inTurn('supplement')) return 'not-understood';
      runwayStates.push(state);
      return 'runway-state';
    }
    return issueTime.test(token.text) ? several(token) : 'not-understood';
  };

  while (next < tokens.length) {
    const token = tokens[next] as Token;
    if (bodyEnd.test(token.text)) break;
    const shear = windShearLength(token.text, tokens[next + 1]?.text, tokens[next + 2]?.text);
    if (shear > 0) {
      inTurn('supplement');
      for (const { at, text } of tokens.slice(next, next + shear)) groups.push({ at, token: text, as: 'wind-shear' });
      next += shear;
      continue;
    }
    const read = readOne(token);
    if (typeof read === 'string') groups.push({ at: token.at, token: token.text, as: read });
    else faults.push(read);
    next++;
  }
  return { ...(wind === undefined ? {} : { wind }), figures, runwayStates, groups, faults, next };
}

const skyward: ReadonlySet<string> = new Set(['visibility', 'runway-visual-range', 'weather', 'cloud']);

function withSector(wind: ReportedWind, sector: WindSector): ReportedWind | undefined {
  return wind.kind === 'from' || wind.kind === 'variable' ? { ...wind, sector } : undefined;
}

/** The same thing told twice is a fault where the two differ, since nobody can say which holds. */
function again(token: Token, of: Turn, told: ReadonlyMap<Turn, string>): ReadAs | ReportFault {
  const before = told.get(of);
  return token.text === before
    ? 'not-understood'
    : groupFault(token, 'contradiction', `gives the ${of} a second time, after ${before}`, `one ${of}`);
}
