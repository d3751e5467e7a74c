import { allowedBy } from './allowed.ts';
import { boundsOf, within } from './bounds.ts';
import type { Collection } from './collect-faults.ts';
import { pointerTo } from './json-pointer.ts';
import { wrongType } from './scalar-faults.ts';
import type { Form } from './schema-form.ts';

/** Faults of a list: its length first, else those of its items. */
export function listFaults(form: Form, value: unknown, pointer: string, { faults, collect }: Collection): void {
  const allowed = allowedBy(form);
  if (!Array.isArray(value)) {
    faults.push(wrongType(pointer, value, allowed));
    return;
  }
  const { def } = form._zod;
  const fits = def.type === 'tuple' ? value.length === def.items.length : within(boundsOf(form), value.length);
  if (!fits) {
    faults.push({ pointer, code: 'out-of-range', message: `The list has ${value.length} items.`, allowed });
    return;
  }
  value.forEach((item, index) => {
    const schema = def.type === 'tuple' ? def.items[index] : def.type === 'array' ? def.element : undefined;
    if (schema !== undefined) collect(schema, item, pointerTo(pointer, index));
  });
}
