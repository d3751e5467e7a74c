import { constants } from '../../physics/constants.ts';
import type { ReferenceKey } from '../../references.ts';
import type { Assumption } from '../answer.ts';
import type { ShownAs, WorkingLine, WorkingOrigin, WorkingPart, WorkingUnit } from './working-line.ts';

/** A line that follows from others. */
export interface Derived {
  readonly symbol: string;
  readonly name: string;
  readonly formula: string;
  readonly value: number;
  readonly unit?: WorkingUnit | undefined;
  readonly source: ReferenceKey;
  readonly shownAs?: ShownAs;
}

/** A line that rests on nothing above it. */
export interface Stated {
  readonly symbol: string;
  readonly name: string;
  readonly value: number;
  readonly unit?: WorkingUnit | undefined;
  /** pointer to where the question or the aeroplane states it, or could */
  readonly at: string;
}

const functions = new Set(['sqrt', 'ln', 'exp', 'sin', 'cos', 'asin', 'min', 'max', 'abs']);

/** A working under construction: lines in the order in which they are written down. */
export class Worksheet {
  readonly lines: WorkingLine[] = [];
  readonly #assumed: ReadonlyMap<string, Assumption>;
  #part: WorkingPart = 'constants';

  /** @param assumed - what the answer says it assumed: a stated line at the same place is marked so */
  constructor(assumed: readonly Assumption[]) {
    this.#assumed = new Map(assumed.map((assumption) => [assumption.at, assumption]));
  }

  begin(part: WorkingPart): void {
    this.#part = part;
  }

  stated({ symbol, name, value, unit, at }: Stated): void {
    const assumption = this.#assumed.get(at);
    const origin = assumption === undefined ? 'given' : 'assumed';
    this.#add(origin, { symbol, name, value, unit, at, source: assumption?.source });
  }

  constant(symbol: keyof typeof constants, name: string): void {
    const { value, unit, source } = constants[symbol];
    this.#add('constant', { symbol, name, value, unit: unit === '1' ? undefined : (unit as WorkingUnit), source });
  }

  /** A figure that somebody decided or measured, which neither the question nor the aeroplane states. */
  figure(origin: 'decided' | 'table' | 'integral', line: Omit<Derived, 'formula'>): void {
    this.#add(origin, line);
  }

  formula(line: Derived): void {
    this.#add('formula', line);
  }

  /** A line whose value solves an equation. */
  equation(line: Derived): void {
    this.#add('equation', line);
  }

  #add(origin: WorkingOrigin, line: Omit<WorkingLine, 'part' | 'origin' | 'from'>): void {
    const { symbol, name, value, unit, formula, at, source, shownAs } = line;
    this.lines.push({
      part: this.#part,
      symbol,
      name,
      value,
      unit,
      origin,
      formula,
      from: formula === undefined ? [] : symbolsIn(formula).filter((used) => used !== symbol),
      at,
      source,
      shownAs,
    });
  }
}

/** The symbols of a formula, each once, functions and pi left out. */
function symbolsIn(formula: string): string[] {
  const words = formula.match(/[A-Za-z]\w*/g) ?? [];
  return [...new Set(words)].filter((word) => word !== 'pi' && !functions.has(word));
}
