import type { Form } from './schema-form.ts';

interface Bound {
  readonly value: number;
  /** whether the bound itself is outside */
  readonly open: boolean;
}

/** What a schema's checks ask of a number, of a text's length or of a list's length. */
export interface Bounds {
  readonly least?: Bound;
  readonly most?: Bound;
  readonly whole: boolean;
  readonly multipleOf?: number;
  readonly format?: string;
  readonly pattern?: RegExp;
}

interface Check {
  readonly check?: string;
  readonly value?: number;
  readonly inclusive?: boolean;
  readonly minimum?: number;
  readonly maximum?: number;
  readonly length?: number;
  readonly format?: string;
  readonly pattern?: RegExp;
}

/** Reads the bounds off a schema's own checks, so that a fault tells what the judge holds. */
export function boundsOf(form: Form): Bounds {
  const def = form._zod.def as Check & { checks?: readonly { _zod: { def: Check } }[] };
  const bounds: { -readonly [K in keyof Bounds]: Bounds[K] } = { whole: false };
  for (const check of [def, ...(def.checks ?? []).map((one) => one._zod.def)]) {
    switch (check.check) {
      case 'greater_than':
        bounds.least = tighter(bounds.least, { value: check.value as number, open: !check.inclusive }, 1);
        break;
      case 'less_than':
        bounds.most = tighter(bounds.most, { value: check.value as number, open: !check.inclusive }, -1);
        break;
      case 'min_length':
        bounds.least = tighter(bounds.least, { value: check.minimum as number, open: false }, 1);
        break;
      case 'max_length':
        bounds.most = tighter(bounds.most, { value: check.maximum as number, open: false }, -1);
        break;
      case 'length_equals':
        bounds.least = { value: check.length as number, open: false };
        bounds.most = bounds.least;
        break;
      case 'multiple_of':
        bounds.multipleOf = check.value as number;
        break;
      case 'number_format':
        bounds.whole ||= check.format === 'safeint';
        break;
      case 'string_format':
        if (check.format !== undefined) bounds.format = check.format;
        if (check.pattern !== undefined) bounds.pattern = check.pattern;
        break;
    }
  }
  return bounds;
}

export function within(bounds: Bounds, value: number): boolean {
  const { least, most } = bounds;
  return (
    (least === undefined || (least.open ? value > least.value : value >= least.value)) &&
    (most === undefined || (most.open ? value < most.value : value <= most.value))
  );
}

function tighter(held: Bound | undefined, found: Bound, sign: 1 | -1): Bound {
  if (held === undefined) return found;
  if (held.value === found.value) return held.open ? held : found;
  return (found.value - held.value) * sign > 0 ? found : held;
}
