import type * as z from 'zod';
import { boundsOf } from '../../src/contract/reading/bounds.ts';
import { branchesOf, type Form, formOf, isObject, type UnionForm } from '../../src/contract/reading/schema-form.ts';

const found = new Map<z.ZodType, Map<string, readonly [low: number, high: number]>>();

/**
 * The bounds of a number of the contract, read off its schema.
 *
 * @param path - names of members from the schema down, as in 'drag/oswaldFactor'; any name stands for one of a record's; in a
 * union the first branch that has the member is taken
 */
export function boundsAt(schema: z.ZodType, path: string): readonly [low: number, high: number] {
  const ofSchema = found.get(schema) ?? new Map<string, readonly [low: number, high: number]>();
  found.set(schema, ofSchema);
  const known = ofSchema.get(path);
  if (known !== undefined) return known;
  let form = formOf(schema);
  for (const name of path.split('/')) form = memberOf(form, name);
  const { least, most } = boundsOf(form);
  if (least === undefined || most === undefined) throw new Error(`${path} has no bounds`);
  const bounds = [least.value, most.value] as const;
  ofSchema.set(path, bounds);
  return bounds;
}

function memberOf(form: Form, name: string): Form {
  if (form._zod.def.type === 'record') return formOf(form._zod.def.valueType);
  const branches = form._zod.def.type === 'union' ? branchesOf(form as UnionForm) : [form];
  const branch = branches.filter(isObject).find((one) => Object.hasOwn(one._zod.def.shape, name));
  const member = branch?._zod.def.shape[name];
  if (member === undefined) throw new Error(`there is no member ${name}`);
  return formOf(member);
}
