import type { Fault } from '../../planning/fault.ts';
import { allowedBy, quoted } from './allowed.ts';
import { boundsOf, within } from './bounds.ts';
import { nearestNames } from './nearest-name.ts';
import type { Form } from './schema-form.ts';

/** Longest piece of a received text that a fault repeats. */
const longestReceived = 64;

/** What was received, if it is a scalar: structures are never echoed. */
export function receivedOf(value: unknown): { received?: string | number | boolean } {
  if (typeof value === 'string') return { received: shortened(value) };
  if (typeof value === 'boolean' || (typeof value === 'number' && Number.isFinite(value))) return { received: value };
  return {};
}

export function shortened(text: string): string {
  if (text.length <= longestReceived) return text;
  return `${text.slice(0, longestReceived).replace(/[\ud800-\udbff]$/, '')}…`;
}

export function wrongType(pointer: string, value: unknown, allowed: string, hint?: string): Fault {
  return {
    pointer,
    code: 'wrong-type',
    message: `${kindOf(value)} stands where ${allowed} belongs.`,
    ...receivedOf(value),
    allowed,
    ...(hint === undefined ? {} : { hint }),
  };
}

function kindOf(value: unknown): string {
  if (value === null) return 'null';
  if (Array.isArray(value)) return 'A list';
  if (typeof value === 'object') return 'An object';
  return typeof value === 'string' ? 'Text' : typeof value === 'number' ? 'A number' : String(value);
}

export function numberFault(form: Form, value: unknown, pointer: string): Fault[] {
  const allowed = allowedBy(form);
  if (typeof value !== 'number') {
    const numeric = typeof value === 'string' && value.trim() !== '' && Number.isFinite(Number(value));
    return [wrongType(pointer, value, allowed, numeric ? 'Write the number without quotation marks.' : undefined)];
  }
  if (!Number.isFinite(value)) {
    return [{ pointer, code: 'not-finite', message: 'The number is too large to be held.', allowed }];
  }
  const bounds = boundsOf(form);
  if (bounds.whole && !Number.isSafeInteger(value)) return [wrongType(pointer, value, allowed)];
  const fits =
    within(bounds, value) && (bounds.multipleOf === undefined || Number.isInteger(value / bounds.multipleOf));
  return fits
    ? []
    : [{ pointer, code: 'out-of-range', message: `${value} is outside the range.`, received: value, allowed }];
}

export function textFault(form: Form, value: unknown, pointer: string): Fault[] {
  const allowed = allowedBy(form);
  if (typeof value !== 'string') return [wrongType(pointer, value, allowed)];
  const bounds = boundsOf(form);
  if (!within(bounds, value.length)) {
    const message = `The text has ${value.length} characters.`;
    return [{ pointer, code: 'out-of-range', message, ...receivedOf(value), allowed }];
  }
  if (bounds.pattern === undefined || bounds.pattern.test(value)) return [];
  const message = 'The text is not in the form that belongs here.';
  return [{ pointer, code: 'wrong-type', message, ...receivedOf(value), allowed }];
}

/** A word of a closed list; the nearest ones are offered. */
export function wordFault(form: Form, value: unknown, pointer: string): Fault[] {
  const { def } = form._zod;
  const words = def.type === 'literal' ? def.values : def.type === 'enum' ? Object.values(def.entries) : [];
  if (words.some((word) => word === value)) return [];
  const allowed = allowedBy(form);
  if (!words.some((word) => typeof word === typeof value)) return [wrongType(pointer, value, allowed)];
  return [unknownWord(pointer, value, words, allowed)];
}

export function unknownWord(pointer: string, value: unknown, words: readonly unknown[], allowed: string): Fault {
  const near =
    typeof value === 'string'
      ? nearestNames(
          value,
          words.filter((word) => typeof word === 'string'),
        )
      : [];
  return {
    pointer,
    code: 'unknown-id',
    message: `${quoted(typeof value === 'string' ? shortened(value) : value)} is not in the closed list.`,
    ...receivedOf(value),
    allowed,
    ...(near.length === 0 ? {} : { hint: `Perhaps ${near.map(quoted).join(' or ')}.` }),
  };
}
