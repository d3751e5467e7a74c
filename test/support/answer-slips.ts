import type { UnitFamily } from '../../src/units/presentation.ts';

/** The units in which each family answers, by the contract; what is shared by all stands last. */
const units: Record<UnitFamily, readonly string[]> = {
  'm-kt-kg': ['m', 'ft', 'kt', 'kg', 'degC', 'hPa', 'N', 'kW'],
  'ft-kt-lb': ['ft', 'in', 'kt', 'lb', 'degC', 'inHg', 'lbf', 'hp'],
  si: ['m', 'm/s', 'kg', 'K', 'Pa', 'N', 'W'],
};
const shared = ['deltaC', 'kg/m3', 'percent', 'deg', 's', 'ft/min', 'MJ', 'J', 'm2', 'ft2'];

interface Quantity {
  readonly value: number;
  readonly unit: string;
}
interface Banded extends Quantity {
  readonly low: number;
  readonly high: number;
}
interface Check {
  readonly code: string;
  readonly result: string;
  readonly why?: string;
  readonly startsFrom?: string;
  readonly distance?: Quantity;
  readonly factors: readonly { readonly value: number; readonly source: string }[];
  readonly required?: Quantity;
  readonly available?: Quantity;
  readonly margin?: Quantity;
  readonly marginPercent?: number;
}

/** An answer to a takeoff or a landing as a caller sees it: what the slips need of it. */
export interface SeenAnswer {
  readonly outcome: string;
  readonly advisory: { readonly sentence: string; readonly cautions: readonly { code: string; at?: string }[] };
  readonly distances?: Readonly<Record<string, unknown>>;
  readonly assessment?: { readonly checks: readonly Check[]; readonly governing?: string };
  readonly shortfall?: readonly unknown[];
  readonly basis: { readonly assumed: readonly { at: string }[]; readonly notGiven: readonly string[] };
  readonly question: { readonly units: UnitFamily; readonly rounding: 'safe' | 'none' };
}

/** What must hold in every answer whatever the numbers, and does not hold in this one. */
export function answerSlips(answer: SeenAnswer): string[] {
  return [...numberSlips(answer), ...distanceSlips(answer), ...checkSlips(answer), ...outcomeSlips(answer)];
}

/** Finite numbers without a negative zero, no null, units of the family that was asked for, each thing said once. */
function numberSlips({ question, ...shown }: SeenAnswer): string[] {
  const slips: string[] = [];
  const known = new Set([...units[question.units], ...shared]);
  const walk = (node: unknown, at: string) => {
    if (node === null || Object.is(node, -0) || (typeof node === 'number' && !Number.isFinite(node))) {
      slips.push(`${at} is ${Object.is(node, -0) ? '-0' : node}`);
    }
    if (typeof node === 'string' && /NaN|Infinity|undefined|\[object/.test(node)) slips.push(`${at} says ${node}`);
    if (typeof node !== 'object' || node === null) return;
    const { unit } = node as { unit?: unknown };
    if (typeof unit === 'string' && !known.has(unit)) slips.push(`${at} is in ${unit}`);
    for (const [name, inner] of Object.entries(node)) walk(inner, `${at}/${name}`);
  };
  walk(shown, '');
  const { advisory, basis } = shown;
  for (const list of [
    advisory.cautions.map(({ code, at }) => `${code} at ${at}`),
    basis.assumed.map(({ at }) => at),
    basis.notGiven,
  ]) {
    if (new Set(list).size < list.length) slips.push(`twice the same in ${list.join(', ')}`);
  }
  return slips;
}

/** Nothing is negative, bands hold their values, and the whole is the sum of its parts. */
function distanceSlips({ distances, question }: SeenAnswer): string[] {
  if (distances === undefined) return [];
  const { groundRoll, airDistance, takeoffDistance, landingDistance } = distances as Record<string, Banded>;
  const whole = (takeoffDistance ?? landingDistance) as Banded;
  const slips = [groundRoll as Banded, airDistance as Banded, whole]
    .filter(({ value, low, high }) => !(low >= 0 && low <= value && value <= high))
    .map((banded) => `a band ${JSON.stringify(banded)}`);
  const apart = Math.abs((groundRoll?.value ?? 0) + (airDistance?.value ?? 0) - whole.value);
  if (apart > tolerance(question, whole)) slips.push(`parts ${apart} ${whole.unit} off the whole`);
  return slips;
}

/** Three numbers rounded up by a step of 1 m or 5 ft may be two steps apart, unrounded ones not at all. */
function tolerance({ rounding }: SeenAnswer['question'], { value, unit }: Quantity): number {
  return rounding === 'none' ? 1e-9 * Math.abs(value) : unit === 'ft' ? 10 : 2;
}

/** A margin is what is available less what is required, and its sign is the result. */
function checkSlips({ assessment, question }: SeenAnswer): string[] {
  const slips: string[] = [];
  for (const check of assessment?.checks ?? []) {
    const { code, required, available, margin, marginPercent, result, why, distance, factors } = check;
    if (result === 'not-assessed') {
      if (why === undefined || margin !== undefined) slips.push(`${code} is not assessed and does not say why`);
      continue;
    }
    // any climb at all is asked for: there is no share of nothing
    const isOfNothing = code.startsWith('climb-') && required?.value === 0;
    if (required && available && margin && isOfNothing) {
      if (margin.value > 0 !== (result === 'passes')) slips.push(`${code} ${result} by ${margin.value}`);
      continue;
    }
    if (!(required && available && margin && marginPercent !== undefined)) {
      slips.push(`${code} lacks a number`);
      continue;
    }
    const passes = result === 'passes';
    if (margin.value >= 0 !== passes || marginPercent >= 0 !== passes)
      slips.push(`${code} ${result} by ${margin.value}`);
    const left = available.value - required.value;
    if (Math.abs(left - margin.value) > tolerance(question, available)) slips.push(`${code} has ${left} left`);
    if (new Set([required.unit, available.unit, margin.unit]).size > 1) slips.push(`${code} mixes units`);
    if (distance === undefined) continue;
    const product = factors.reduce((sum, { value }) => sum * value, distance.value);
    if (question.rounding === 'none' && Math.abs(product / required.value - 1) > 1e-9) {
      slips.push(`${code} requires ${required.value}, its factors make ${product}`);
    }
    if (distance.value > required.value) slips.push(`${code} requires less than the distance`);
  }
  return slips;
}

/** Outcomes with no run to the end: they have a shortfall and no distance. */
const unreached = /^(never-.*|outside-.*|ground-speed-not-positive)$/;
/** Outcomes that another reason than the run may leave without distances. */
const beside = ['no-data-for-this-surface', 'rule-set-does-not-apply'];

/** The outcome is the one that distances, shortfall and checks show. */
function outcomeSlips({ outcome, distances, shortfall, assessment, advisory }: SeenAnswer): string[] {
  const slips: string[] = [];
  const checks = assessment?.checks ?? [];
  const results = new Set(checks.map(({ result }) => result));
  const says = (right: boolean, what: string) => {
    if (!right) slips.push(`${outcome} ${what}`);
  };
  says(/[.]$/.test(advisory.sentence), `is told as ${advisory.sentence}`);
  if (!beside.includes(outcome)) says(unreached.test(outcome) === (shortfall !== undefined), 'and its shortfall');
  says(shortfall === undefined || distances === undefined, 'with distances beside a shortfall');
  // where physics does not speak of the runway, factors on a paved, dry, level one may
  const byFactors = distances === undefined && checks.some(({ startsFrom }) => startsFrom === 'reference');
  if (!beside.includes(outcome) && !byFactors) {
    says(unreached.test(outcome) === (distances === undefined), 'and its distances');
  }
  if (outcome.startsWith('enough')) says(results.size === 1 && results.has('passes'), `with ${[...results]}`);
  if (outcome === 'not-enough') says(results.has('fails'), `with ${[...results]}`);
  if (outcome === 'nothing-to-compare') says(!results.has('fails'), `with ${[...results]}`);
  const governing = checks.find(({ code }) => code === assessment?.governing);
  says(assessment?.governing === undefined || governing !== undefined, 'is governed by no check');
  const least = Math.min(...checks.map(({ marginPercent }) => marginPercent ?? Number.POSITIVE_INFINITY));
  if (governing !== undefined) says((governing.marginPercent ?? 0) <= least + 1e-6, 'is not governed by the least');
  if (outcome === 'enough') says(least >= 10 - 1e-6, `with ${least} %`);
  return slips;
}
