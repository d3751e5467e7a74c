import type * as z from 'zod';
import { type DetailName, details } from '../../planning/detail/detail.ts';
import type { Fault } from '../../planning/fault.ts';
import { list } from '../reading/allowed.ts';
import { pointerTo } from '../reading/json-pointer.ts';
import { nearestNames } from '../reading/nearest-name.ts';
import { branchesOf, discriminatorOf, type Form, formOf, isObject, type UnionForm } from '../reading/schema-form.ts';
import { pointerSteps } from './pointer-steps.ts';

/**
 * Faults of the pointers that select members of an answer.
 *
 * A pointer may name any member that an answer of this kind can have, whether or not this one has it: one script asks alike of
 * takeoffs with and without distances. What no answer can have is refused, and so is a part of the detail that is not asked for,
 * since no answer to this question could have it. Lists are selected whole, for the place of an item says what it is; and a number
 * with its unit.
 *
 * @param response - schema of the whole answer
 * @see references.Rfc6901
 */
export function selectFaults(
  select: readonly string[],
  response: z.core.$ZodType,
  detail: readonly DetailName[] = [],
): Fault[] {
  return select.flatMap((pointer, i) => {
    const fault = judged(pointer, response) ?? notAskedFor(pointer, detail);
    return fault === undefined ? [] : [{ pointer: pointerTo('/select', i), received: pointer, ...fault }];
  });
}

type Told = Omit<Fault, 'pointer' | 'received'>;

/** So many verdicts are kept: a script selects the same few members again and again. */
const mostKept = 256;
const verdicts = new WeakMap<z.core.$ZodType, Map<string, Told | undefined>>();

/** What is wrong with a pointer, whoever asks; a walk through the schema costs more than reading the question. */
function judged(pointer: string, response: z.core.$ZodType): Told | undefined {
  const kept = verdicts.get(response) ?? new Map<string, Told | undefined>();
  verdicts.set(response, kept);
  if (kept.has(pointer)) return kept.get(pointer);
  const steps = pointerSteps(pointer);
  const verdict = steps === undefined ? notAPointer() : missIn(response, steps);
  if (kept.size >= mostKept) kept.clear();
  kept.set(pointer, verdict);
  return verdict;
}

function notAPointer(): Told {
  return {
    code: 'wrong-type',
    message: 'This is not a JSON pointer.',
    allowed: 'a pointer into the answer as in RFC 6901, such as /distances/takeoffDistance',
  };
}

function notAskedFor(pointer: string, detail: readonly DetailName[]): Told | undefined {
  const name = details.find((one) => pointer === `/${one}` || pointer.startsWith(`/${one}/`));
  if (name === undefined || detail.includes(name)) return undefined;
  return {
    code: 'contradiction',
    message: `The answer has no ${name}: it is not asked for.`,
    hint: `Add "${name}" to detail.`,
  };
}

/** What keeps a pointer from naming a member; undefined where it names one. */
function missIn(schema: z.core.$ZodType, steps: readonly string[]): Told | undefined {
  let forms: readonly Form[] = [formOf(schema)];
  let parent = '';
  for (const step of steps) {
    const whole = wholeBecause(forms);
    if (whole !== undefined) return { code: 'unknown-member', message: whole, allowed: parent };
    const names = [...new Set(forms.flatMap(namesIn))];
    const next = forms.flatMap((form) => memberIn(form, step));
    if (next.length === 0) {
      if (names.length === 0) {
        return { code: 'unknown-member', message: `There is nothing inside ${parent}.`, allowed: parent };
      }
      const near = nearestNames(step, names);
      return {
        code: 'unknown-member',
        message: `No answer has a member ${step} ${parent === '' ? 'at its top' : `in ${parent}`}.`,
        allowed: list(names, 'or'),
        ...(near.length === 0 ? {} : { hint: `Perhaps ${list(near, 'or')}.` }),
      };
    }
    forms = next.flatMap((form) => (form._zod.def.type === 'union' ? branchesOf(form as UnionForm) : [form]));
    if (next.some(isQuantityUnion)) forms = next;
    parent = pointerTo(parent, step);
  }
  return undefined;
}

/** Why what is here cannot be taken apart. */
function wholeBecause(forms: readonly Form[]): string | undefined {
  if (forms.some((form) => isQuantityUnion(form) || (isObject(form) && 'unit' in form._zod.def.shape))) {
    return 'A number travels with its unit: select it whole.';
  }
  return forms.some(({ _zod: { def } }) => def.type === 'array' || def.type === 'tuple')
    ? 'The place of an item says what it is: select the list whole.'
    : undefined;
}

function isQuantityUnion(form: Form): boolean {
  return form._zod.def.type === 'union' && discriminatorOf(form as UnionForm) === 'unit';
}

function namesIn(form: Form): string[] {
  return isObject(form) ? Object.keys(form._zod.def.shape) : [];
}

function memberIn(form: Form, name: string): Form[] {
  const { def } = form._zod;
  if (def.type === 'record') return [formOf(def.valueType)];
  if (def.type === 'unknown') return [form];
  if (!isObject(form) || !Object.hasOwn(form._zod.def.shape, name)) return [];
  return [formOf(form._zod.def.shape[name] as z.core.$ZodType)];
}
