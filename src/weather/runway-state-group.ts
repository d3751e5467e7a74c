import { groupFault, type ReportFault } from './report-fault.ts';
import type { Token } from './report-text.ts';

/** What lies on a runway by the eight-figure code of reports until 2021, or by condition codes in thirds. @see references.Wmo306, reg. 15.13 */
export interface RunwayState {
  /** designator, or every runway, or the last report repeated */
  readonly runway: string | 'all' | 'repeated';
  readonly cleared?: true;
  readonly closedBySnow?: true;
  readonly deposit?: (typeof deposits)[number];
  /** share of the runway that is covered, up to */
  readonly extent?: number;
  /** [m] */
  readonly depth?: number;
  /** true where the depth is such that the runway is not in use */
  readonly notInUse?: true;
  readonly braking?:
    | { readonly coefficient: number }
    | { readonly action: (typeof brakingActions)[number] }
    | { readonly unreliable: true };
  /** of the thirds, from the threshold on */
  readonly conditionCodes?: readonly [number, number, number];
}

const deposits = [
  'clear and dry',
  'damp',
  'wet or water patches',
  'rime or frost',
  'dry snow',
  'wet snow',
  'slush',
  'ice',
  'compacted or rolled snow',
  'frozen ruts or ridges',
] as const;
const brakingActions = ['poor', 'medium to poor', 'medium', 'medium to good', 'good'] as const;
const extents: Readonly<Record<string, number>> = { 1: 0.1, 2: 0.25, 5: 0.5, 9: 1 };

const stateForm = /^R(\d{2}[LCR]?)\/(?:([\d/])([\d/])(\d\d|\/\/)(\d\d|\/\/)|(CLRD)(?:\d\d|\/\/))$/;
const oldForm = /^(\d{2})([\d/])([\d/])(\d\d|\/\/)(\d\d|\/\/)$/;
const snowForm = /^(?:R(\d{2}[LCR]?)?\/)?SNOCLO$/;
const codesForm = /^R(\d{2}[LCR]?)\/([0-6])\/([0-6])\/([0-6])$/;

/** The state of a runway; undefined where the group does not tell one. */
export function readRunwayState(token: Token): RunwayState | ReportFault | undefined {
  const snow = snowForm.exec(token.text);
  if (snow !== null) return designated(token, snow[1] ?? '88', { closedBySnow: true });
  const codes = codesForm.exec(token.text);
  if (codes !== null) {
    const [, runway, first, middle, last] = codes as unknown as [string, string, string, string, string];
    return designated(token, runway, { conditionCodes: [Number(first), Number(middle), Number(last)] });
  }
  const found = stateForm.exec(token.text) ?? oldForm.exec(token.text);
  if (found === null) return undefined;
  const [, runway, deposit, extent, depth, braking, cleared] = found as unknown as string[];
  if (cleared !== undefined) return designated(token, runway as string, { cleared: true });
  return designated(token, runway as string, {
    ...depositOf(deposit as string),
    ...extentOf(extent as string),
    ...depthOf(depth as string),
    ...brakingOf(braking as string),
  });
}

/** 88 is every runway, 99 the last report repeated; of parallel runways 50 more is the right one in the old code. */
function designated(token: Token, figures: string, state: Omit<RunwayState, 'runway'>): RunwayState | ReportFault {
  if (figures === '88') return { runway: 'all', ...state };
  if (figures === '99') return { runway: 'repeated', ...state };
  const number = Number(figures.slice(0, 2));
  if (number >= 51 && number <= 86) return { runway: `${String(number - 50).padStart(2, '0')}R`, ...state };
  if (number >= 1 && number <= 36) return { runway: figures, ...state };
  return groupFault(token, 'out-of-range', `names a runway ${figures}`, '01 to 36, 51 to 86, 88 or 99');
}

function depositOf(figure: string): Pick<RunwayState, 'deposit'> {
  return figure === '/' ? {} : { deposit: deposits[Number(figure)] as (typeof deposits)[number] };
}

function extentOf(figure: string): Pick<RunwayState, 'extent'> {
  const extent = extents[figure];
  return extent === undefined ? {} : { extent };
}

/** 00 is less than 1 mm, to 90 in mm, 92 to 98 in steps of 5 cm from 10 cm on. */
function depthOf(figures: string): Pick<RunwayState, 'depth' | 'notInUse'> {
  if (figures === '//' || figures === '91') return {};
  const figure = Number(figures);
  if (figure === 99) return { notInUse: true };
  return { depth: figure <= 90 ? figure / 1000 : (figure - 90) * 0.05 };
}

function brakingOf(figures: string): Pick<RunwayState, 'braking'> {
  if (figures === '//') return {};
  const figure = Number(figures);
  if (figure <= 90) return { braking: { coefficient: figure / 100 } };
  const action = brakingActions[figure - 91];
  if (action !== undefined) return { braking: { action } };
  return figure === 99 ? { braking: { unreliable: true } } : {};
}
