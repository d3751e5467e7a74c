import { z } from 'zod';
import type { Fault } from '../../planning/fault.ts';
import { allowedBy, discriminatorValues } from './allowed.ts';
import { boundsOf, within } from './bounds.ts';
import type { Collection } from './collect-faults.ts';
import { nearestNames } from './nearest-name.ts';
import { isPlainObject, memberFaults, type Shape } from './object-faults.ts';
import { wrongType } from './scalar-faults.ts';
import { branchesOf, formOf, isObject, type ObjectForm, type UnionForm } from './schema-form.ts';
import { unitMeant } from './unit-meant.ts';

/** Faults of a number with its unit. At a wrong unit no bound is known, so that the number is not judged. */
export function quantityFaults(form: UnionForm, value: unknown, pointer: string, collection: Collection): void {
  const { faults } = collection;
  if (!isPlainObject(value)) {
    const hint = typeof value === 'number' ? 'A number travels with its unit.' : undefined;
    faults.push(wrongType(pointer, value, allowedBy(form), hint));
    return;
  }
  const branches = branchesOf(form).filter(isObject);
  const units = discriminatorValues(form, 'unit');
  const unit = Object.hasOwn(value, 'unit') ? value['unit'] : value[misspeltUnit(value) ?? 'unit'];
  const branch = typeof unit === 'string' ? branches[units.indexOf(unit)] : undefined;
  const shape: Shape = branch?._zod.def.shape ?? { value: z.number(), unit: z.enum(units) };

  const before = faults.length;
  memberFaults(shape, value, pointer, collection);
  for (let i = before; i < faults.length; i++) {
    const fault = faults[i] as Fault;
    if (fault.code === 'unknown-id') faults[i] = unknownUnit(fault, units);
    if (fault.code === 'out-of-range') faults[i] = outOfRange(fault, String(unit), branches, units);
  }
}

function misspeltUnit(value: Record<string, unknown>): string | undefined {
  return Object.keys(value).find((name) => nearestNames(name, ['unit']).length > 0);
}

function unknownUnit(fault: Fault, units: readonly string[]): Fault {
  const { received } = fault;
  const meant = typeof received === 'string' ? unitMeant(received, units) : undefined;
  const { hint: _, ...rest } = fault;
  return {
    ...rest,
    code: 'unknown-unit',
    message: `${JSON.stringify(received)} is not a unit of this quantity.`,
    ...(meant === undefined ? {} : { hint: `Perhaps "${meant}".` }),
  };
}

/** Names the units in which the same number would be within its bounds: a slip of unit is the likelier one. */
function outOfRange(fault: Fault, unit: string, branches: readonly ObjectForm[], units: readonly string[]): Fault {
  const number = fault.received as number;
  const fitting = units.filter((_, i) => {
    const bounded = branches[i]?._zod.def.shape['value'];
    return bounded !== undefined && within(boundsOf(formOf(bounded)), number);
  });
  return {
    ...fault,
    message: `${number} ${unit} is outside the range.`,
    allowed: `${fault.allowed}, in ${unit}`,
    ...(fitting.length === 0 ? {} : { hint: `${number} would fit in ${fitting.join(' or ')}.` }),
  };
}
