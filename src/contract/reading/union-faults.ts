import { allowedBy, discriminatorValues, list, oneOf, quoted } from './allowed.ts';
import type { Collection } from './collect-faults.ts';
import { pointerTo } from './json-pointer.ts';
import { nearestNames } from './nearest-name.ts';
import { isPlainObject, missing } from './object-faults.ts';
import { quantityFaults } from './quantity-faults.ts';
import { unknownWord, wrongType } from './scalar-faults.ts';
import {
  branchesOf,
  discriminatorOf,
  type Form,
  isObject,
  isOptional,
  membersOf,
  type UnionForm,
} from './schema-form.ts';

/** Faults of a value that may take several forms: those of the one form it was meant to be. */
export function unionFaults(form: UnionForm, value: unknown, pointer: string, collection: Collection): void {
  const discriminator = discriminatorOf(form);
  if (discriminator === 'unit') quantityFaults(form, value, pointer, collection);
  else if (discriminator !== undefined) kindFaults(form, discriminator, value, pointer, collection);
  else choiceFaults(form, value, pointer, collection);
}

/** Branches told apart by a word in one member. */
function kindFaults(form: UnionForm, member: string, value: unknown, pointer: string, collection: Collection): void {
  if (!isPlainObject(value)) {
    collection.faults.push(wrongType(pointer, value, allowedBy(form)));
    return;
  }
  const branch = branchesOf(form).find((one) => one._zod.propValues?.[member]?.has(value[member] as string));
  if (branch !== undefined) {
    collection.collect(branch, value, pointer);
    return;
  }
  const words = discriminatorValues(form, member);
  const at = pointerTo(pointer, member);
  const allowed = oneOf(words.map(quoted));
  if (!Object.hasOwn(value, member)) collection.faults.push(missing(at, member, allowed));
  else if (typeof value[member] !== 'string') collection.faults.push(wrongType(at, value[member], allowed));
  else collection.faults.push(unknownWord(at, value[member], words, allowed));
}

/** Branches told apart by their type, and among objects by the members that only one of them has. */
function choiceFaults(form: UnionForm, value: unknown, pointer: string, { faults, collect }: Collection): void {
  const branches = branchesOf(form);
  const objects = branches.filter((branch) => membersOf(branch).length > 0);
  if (isPlainObject(value) && objects.length > 0) {
    const names = Object.keys(value);
    const marks = objects.map((branch) => marksOf(branch, objects));
    const marked = objects.filter((_, i) => names.some((name) => marks[i]?.has(name)));
    const meant =
      marked.length === 0
        ? (objects.find((_, i) => names.some((name) => nearestNames(name, marks[i] as Set<string>).length > 0)) ??
          objects.find((_, i) => marks[i]?.size === 0))
        : marked[0];
    if (meant !== undefined && marked.length < 2) collect(meant, value, pointer);
    else faults.push(notExactlyOne(pointer, objects, marks, names));
    return;
  }
  const fitting = branches.filter((branch) => takes(branch, value));
  if (fitting.length === 1 && words(fitting[0] as Form).length === 0) {
    collect(fitting[0] as Form, value, pointer);
    return;
  }
  const known = fitting.flatMap(words);
  if (known.includes(value)) return;
  const allowed = allowedBy(form);
  faults.push(known.length > 0 ? unknownWord(pointer, value, known, allowed) : wrongType(pointer, value, allowed));
}

function notExactlyOne(pointer: string, objects: readonly Form[], marks: readonly Set<string>[], names: string[]) {
  const first = objects.map((branch, i) => [...(marks[i] as Set<string>)].find((name) => required(branch, name)));
  const choices = first.filter((name) => name !== undefined);
  const given = names.filter((name) => marks.some((own) => own.has(name)));
  return {
    pointer,
    code: 'exactly-one-of' as const,
    message:
      given.length === 0
        ? `None of ${list(choices, 'and')} is given.`
        : `${list(given.slice(0, 6), 'and')} do not go together.`,
    allowed: `exactly one of ${list(choices, 'or')}`,
  };
}

/** The members that only this branch has. */
function marksOf(branch: Form, branches: readonly Form[]): Set<string> {
  const others = new Set(branches.filter((other) => other !== branch).flatMap(membersOf));
  return new Set(membersOf(branch).filter((name) => !others.has(name)));
}

function required(branch: Form, name: string): boolean {
  return isObject(branch) ? !isOptional(branch._zod.def.shape[name] as Form) : true;
}

function words(branch: Form): unknown[] {
  const { def } = branch._zod;
  return def.type === 'literal' ? [...def.values] : def.type === 'enum' ? Object.values(def.entries) : [];
}

function takes(branch: Form, value: unknown): boolean {
  const { type } = branch._zod.def;
  if (type === 'literal' || type === 'enum') return words(branch).some((word) => typeof word === typeof value);
  if (type === 'array' || type === 'tuple') return Array.isArray(value);
  if (type === 'record') return isPlainObject(value);
  return type === (value === null ? 'null' : typeof value);
}
