import { isPlainObject } from '../reading/object-faults.ts';

/** Lists of the flight manual whose members can be left out one by one. */
const sheetLists = ['tables', 'speedTables', 'graphs'] as const;
export type SheetList = (typeof sheetLists)[number];

/** What of a definition is left, and which of its sheets they were. */
export interface Remainder {
  readonly tree: Record<string, unknown>;
  /** per list, the number that each sheet left has in the definition as it came */
  readonly numbers: Readonly<Record<SheetList, number[]>>;
  /** pointers into the definition as it came */
  readonly leftOut: string[];
}

/** A definition as it came, nothing left out yet; the tree is a copy. */
export function remainderOf(definition: Record<string, unknown>): Remainder {
  const tree = structuredClone(definition);
  const numbersOf = (list: SheetList) => {
    const sheets = isPlainObject(tree['flightManual']) ? tree['flightManual'][list] : undefined;
    return Array.isArray(sheets) ? sheets.map((_, i) => i) : [];
  };
  return {
    tree,
    numbers: { tables: numbersOf('tables'), speedTables: numbersOf('speedTables'), graphs: numbersOf('graphs') },
    leftOut: [],
  };
}

/** A pointer into the remainder as one into the definition as it came. */
export function asItCame({ numbers }: Remainder, pointer: string): string {
  const [root, manual, list, number, ...rest] = pointer.split('/');
  if (manual !== 'flightManual' || !isSheetList(list) || number === undefined) return pointer;
  const [first] = [numbers[list][Number(number)]];
  return first === undefined ? pointer : [root, manual, list, first, ...rest].join('/');
}

/**
 * Leaves out what pointers of the remainder point at: a whole sheet of the flight manual, else the member, or the whole list
 * that it is part of.
 *
 * @returns false where nothing could be left out
 */
export function leaveOut(remainder: Remainder, pointers: readonly string[]): boolean {
  const { tree, leftOut } = remainder;
  const sheets: Record<SheetList, Set<number>> = { tables: new Set(), speedTables: new Set(), graphs: new Set() };
  let any = false;
  for (const pointer of pointers) {
    const steps = stepsOf(pointer);
    const [manual, list, number] = steps;
    if (manual === 'flightManual' && isSheetList(list) && number !== undefined) {
      sheets[list].add(Number(number));
      continue;
    }
    const found = memberAt(tree, steps);
    if (found === undefined) continue;
    delete found.parent[found.name];
    leftOut.push(asItCame(remainder, `/${found.path.join('/')}`));
    any = true;
  }
  for (const list of sheetLists) {
    const manual = tree['flightManual'];
    if (!isPlainObject(manual) || !Array.isArray(manual[list])) continue;
    const given = manual[list] as unknown[];
    for (const i of [...sheets[list]].sort((a, b) => b - a)) {
      if (i >= given.length) continue;
      leftOut.push(`/flightManual/${list}/${remainder.numbers[list][i]}`);
      given.splice(i, 1);
      remainder.numbers[list].splice(i, 1);
      any = true;
    }
  }
  if (isEmptyManual(tree['flightManual'])) delete tree['flightManual'];
  return any;
}

/** The member at a pointer, or the list that holds it, with the object that it is a member of. */
function memberAt(tree: Record<string, unknown>, steps: readonly string[]) {
  let parent = tree;
  for (const [i, name] of steps.entries()) {
    if (!Object.hasOwn(parent, name)) return undefined;
    const next = parent[name];
    if (i === steps.length - 1 || !isPlainObject(next)) return { parent, name, path: steps.slice(0, i + 1) };
    parent = next;
  }
  return undefined;
}

function isEmptyManual(manual: unknown): boolean {
  return (
    isPlainObject(manual) &&
    sheetLists.some((list) => Array.isArray(manual[list])) &&
    sheetLists.every((list) => manual[list] === undefined || (manual[list] as unknown[]).length === 0)
  );
}

function stepsOf(pointer: string): string[] {
  return pointer
    .split('/')
    .slice(1)
    .map((step) => step.replaceAll('~1', '/').replaceAll('~0', '~'));
}

function isSheetList(name: string | undefined): name is SheetList {
  return sheetLists.some((list) => list === name);
}
