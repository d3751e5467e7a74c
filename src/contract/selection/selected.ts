import { isPlainObject } from '../reading/object-faults.ts';
import { pointerSteps } from './pointer-steps.ts';

/** What is selected below a member: all of it, or some members. */
type Selection = 'all' | Map<string, Selection>;

/** Members that every answer carries, whatever is selected. */
const always = ['outcome', 'advisory'] as const;

/**
 * An answer with the selected members only, in the answer's own order, and outcome and advisory always.
 *
 * Nothing is copied but the objects on the way to a selected member; an object of which nothing is there is left out.
 *
 * @param pointers - without a fault of selectFaults
 */
export function selected(answer: object, pointers: readonly string[]): object {
  const selection: Selection = new Map();
  for (const name of always) selection.set(name, 'all');
  for (const pointer of pointers) {
    const steps = pointerSteps(pointer) ?? [];
    if (steps.length === 0) return answer;
    add(selection, steps);
  }
  return picked(answer as Record<string, unknown>, selection);
}

function add(selection: Map<string, Selection>, steps: readonly string[]): void {
  let here = selection;
  for (let i = 0; i < steps.length - 1; i++) {
    const step = steps[i] as string;
    const below = here.get(step) ?? new Map<string, Selection>();
    if (below === 'all') return;
    here.set(step, below);
    here = below;
  }
  here.set(steps.at(-1) as string, 'all');
}

function picked(node: Record<string, unknown>, selection: Map<string, Selection>): Record<string, unknown> {
  const result: Record<string, unknown> = {};
  for (const name in node) {
    const below = selection.get(name);
    if (below === undefined) continue;
    const child = node[name];
    if (below === 'all') result[name] = child;
    else if (isPlainObject(child)) {
      const part = picked(child, below);
      for (const _ in part) {
        result[name] = part;
        break;
      }
    }
  }
  return result;
}
