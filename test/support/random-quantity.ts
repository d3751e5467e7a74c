import type * as z from 'zod';
import { boundsOf } from '../../src/contract/reading/bounds.ts';
import { branchesOf, formOf, type ObjectForm, type UnionForm } from '../../src/contract/reading/schema-form.ts';
import { fromSi, type Quantity, toSi, type Unit, type UnitOf } from '../../src/units/units.ts';
import type { Dice } from './dice.ts';

export interface WrittenQuantity {
  readonly value: number;
  readonly unit: string;
}

interface Branch {
  readonly unit: string;
  readonly low: number;
  readonly high: number;
}

const read = new Map<z.ZodType, Branch[]>();

/** The units a quantity of the contract takes, each with the bounds of its numbers, read off the schema. */
export function unitsWithBounds(schema: z.ZodType): Branch[] {
  const known = read.get(schema);
  if (known !== undefined) return known;
  const found = branchesOf(formOf(schema) as UnionForm).map((branch) => {
    const { shape } = (branch as ObjectForm)._zod.def;
    const { least, most } = boundsOf(formOf(shape['value'] as z.ZodType));
    if (least === undefined || most === undefined) throw new Error('a number of the contract has no bounds');
    const [unit] = (formOf(shape['unit'] as z.ZodType) as z.core.$ZodLiteral<string>)._zod.def.values;
    return { unit: unit as string, low: least.value, high: most.value };
  });
  read.set(schema, found);
  return found;
}

/** Any quantity that a schema takes, in any of its units, often on a bound. */
export function anyQuantity({ pick, within }: Dice, schema: z.ZodType): WrittenQuantity {
  const { unit, low, high } = pick(unitsWithBounds(schema));
  return { value: within(low, high), unit };
}

/** A number in SI as a quantity in any unit of the schema, moved to the nearest bound where it lies outside. */
export function quantityOf(dice: Dice, schema: z.ZodType, kind: Quantity, si: number): WrittenQuantity {
  const { unit, low, high } = dice.pick(unitsWithBounds(schema));
  const value = fromSi(kind, si, unit as UnitOf<Quantity>);
  return { value: Math.min(high, Math.max(low, value)), unit };
}

/** What a quantity is in SI. */
export function inSi(kind: Quantity, { value, unit }: WrittenQuantity): number {
  return toSi(kind, value, unit as Unit as UnitOf<Quantity>);
}
