import type { Check, Factor } from '../answer.ts';
import { countingDistances, type DeclaredDistances } from '../declared-distances.ts';
import type { Question } from '../question.ts';
import type { RuleSet } from '../rules/rule-set.ts';
import type { Worksheet } from './worksheet.ts';

const up = { kind: 'distance', direction: 'up' } as const;
const down = { kind: 'distance', direction: 'down' } as const;

const startsFrom = {
  reference: 'in the credited wind on a paved, dry, level runway',
  credited: 'in the credited wind on the runway as given',
  level: 'in the credited wind on the surface as given, level',
  'flight-manual': 'by the flight manual',
} as const;

/**
 * Each check: the distance, its factors, what is required, available and left.
 *
 * @param declared - of the runway
 * @param phase - which declared distances count
 */
export function checkLines(
  sheet: Worksheet,
  { runway }: Question,
  checks: readonly Check[],
  declared: DeclaredDistances,
  { source, takeoff: { clearwayShare } }: RuleSet,
  phase: 'takeoff' | 'landing',
): void {
  sheet.begin('checks');
  lengthLines(sheet, runway, declared, source, clearwayShare, countingDistances[phase]);
  for (const check of checks) {
    const { code, required, available, margin } = check;
    if (required === undefined) continue;
    if (check.startsFrom === undefined) {
      clearanceLines(sheet, check, required);
      continue;
    }
    requiredLines(sheet, check, { ...check, startsFrom: check.startsFrom, required }, symbolOf(code), code);
    if (check.alternative !== undefined) {
      requiredLines(sheet, check, check.alternative, `${symbolOf(code)}_other`, `${code}, the other reading`);
    }
    if (available === undefined || margin === undefined) continue;
    sheet.formula({
      symbol: `margin_${symbolOf(code)}`,
      name: `margin of ${code}`,
      formula: `${check.against?.toUpperCase()}_available - required_${symbolOf(code)}`,
      value: margin,
      unit: 'm',
      source: check.source,
      shownAs: down,
    });
  }
}

/** A check that is not of a distance on the runway: what is asked for, what the path has, and the difference. */
function clearanceLines(
  sheet: Worksheet,
  { code, of, unit, available, margin, source }: Check,
  required: number,
): void {
  const symbol = symbolOf(code);
  const left = { kind: unit, direction: 'down' } as const;
  const name = `${worded(of)} for ${code}`;
  const asked = { symbol: `required_${symbol}`, name: `${name}, as the rules ask`, value: required } as const;
  sheet.figure('decided', { ...asked, unit: 'm', source, shownAs: { kind: unit, direction: 'up' } });
  if (available === undefined || margin === undefined) return;
  const found = { symbol: `available_${symbol}`, name: `${name}, on the path`, value: available } as const;
  sheet.figure('integral', { ...found, unit: 'm', source, shownAs: left });
  sheet.formula({
    symbol: `margin_${symbol}`,
    name: `margin of ${code}`,
    formula: `available_${symbol} - required_${symbol}`,
    value: margin,
    unit: 'm',
    source,
    shownAs: left,
  });
}

interface Reading {
  readonly startsFrom: keyof typeof startsFrom;
  readonly distance?: number;
  readonly factors: readonly Factor[];
  readonly required: number;
}

function requiredLines(sheet: Worksheet, { of, source }: Check, reading: Reading, symbol: string, name: string): void {
  const { distance, factors, required } = reading;
  if (distance === undefined) return;
  sheet.figure('integral', {
    symbol: `s_${symbol}`,
    name: `${worded(of)} for ${name}, ${startsFrom[reading.startsFrom]}`,
    value: distance,
    unit: 'm',
    source: 'McCormick1995',
    shownAs: up,
  });
  const factorSymbols = factors.map((factor, i) => {
    const factorSymbol = `f_${symbol}_${symbolOf(factor.code)}${factors.findIndex(({ code }) => code === factor.code) === i ? '' : i + 1}`;
    sheet.figure('decided', {
      symbol: factorSymbol,
      name: `factor ${factor.code} of ${name}: ${factor.because}`,
      value: factor.value,
      source: factor.source,
    });
    return factorSymbol;
  });
  sheet.formula({
    symbol: `required_${symbol}`,
    name: `required by ${name}`,
    formula: [`s_${symbol}`, ...factorSymbols].join('*'),
    value: required,
    unit: 'm',
    source,
    shownAs: up,
  });
}

/** The declared distances, and what of them is available. */
function lengthLines(
  sheet: Worksheet,
  { start, declared = {}, lineUp }: Question['runway'],
  { credited }: DeclaredDistances,
  source: RuleSet['source'],
  clearwayShare: number,
  counting: readonly ('tora' | 'toda' | 'asda' | 'lda')[],
): void {
  const offset = start.kind === 'offset' ? start.offset : 0;
  if (start.kind === 'offset') {
    sheet.stated({ symbol: 'x_0', name: 'start offset', value: offset, unit: 'm', at: '/runway/start/offset' });
  }
  const losses = { tora: lineUp?.tora, toda: lineUp?.tora, asda: lineUp?.asda, lda: undefined };
  if (lineUp !== undefined && counting.includes('tora')) {
    sheet.stated({
      symbol: 'x_T',
      name: 'line-up loss of TORA and TODA',
      value: lineUp.tora,
      unit: 'm',
      at: '/runway/lineUp/tora',
    });
    sheet.stated({
      symbol: 'x_A',
      name: 'line-up loss of ASDA',
      value: lineUp.asda,
      unit: 'm',
      at: '/runway/lineUp/asda',
    });
  }
  for (const name of counting) {
    const length = declared[name];
    const available = credited[name];
    if (length === undefined || available === undefined) continue;
    const symbol = name.toUpperCase();
    sheet.stated({ symbol, name: `${symbol} as declared`, value: length, unit: 'm', at: `/runway/declared/${name}` });
    const published = start.kind === 'offset' ? `max(0, ${symbol} - x_0)` : symbol;
    const left = losses[name] === undefined ? published : `max(0, ${published} - ${name === 'asda' ? 'x_A' : 'x_T'})`;
    const capped = name === 'toda' && credited.tora !== undefined;
    sheet.formula({
      symbol: `${symbol}_available`,
      name: `${symbol} available`,
      formula: capped ? `min(${left}, ${1 + clearwayShare}*TORA_available)` : left,
      value: available,
      unit: 'm',
      source: capped ? 'Annex14' : source,
      shownAs: down,
    });
  }
}

function symbolOf(code: string): string {
  return code.replaceAll('-', '_');
}

function worded(of: string): string {
  return of.replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);
}
