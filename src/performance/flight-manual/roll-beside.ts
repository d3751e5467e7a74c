import type { Sheet } from './flight-manual.ts';
import type { ManualAsked, ManualBound } from './manual-figures.ts';
import { offConditions } from './off-conditions.ts';
import { axesOf, readSheet } from './read-sheet.ts';
import { speaksOfSurface } from './speaks-of-surface.ts';

/** A ground roll as printed on another sheet, without the factor that it holds. */
export interface RollBeside {
  /** [m] */
  readonly groundRoll: number;
  readonly edges: readonly ManualBound[];
  readonly outside: readonly ManualBound[];
}

/**
 * The ground roll of the sheet beside one that gives the whole distance alone, for its notes that add a share of the roll.
 *
 * It is for the same surface and configurations; of several the first that holds the point, else the first.
 *
 * @param others - sheets of the manual
 * @throws RangeError where there is none: the gate refuses such a manual
 */
export function rollBeside(sheet: Sheet, asked: ManualAsked, others: readonly Sheet[]): RollBeside {
  const beside = others.filter((other) => givesRollFor(other, sheet)).map((other) => printedRoll(other, sheet, asked));
  const found = beside.find(({ outside }) => outside.length === 0) ?? beside[0];
  if (found === undefined)
    throw new RangeError(`a share of the ground roll is added on ${sheet.id}, and no sheet gives the roll`);
  return found;
}

/** Whether a sheet gives the ground roll for everything that another one is for. */
export function givesRollFor(other: Sheet, { phase, configurations, conditions }: Sheet): boolean {
  return (
    other.outputs.some((output) => output === 'groundRoll') &&
    other.phase === phase &&
    configurations.every((id) => other.configurations.includes(id)) &&
    speaksOfSurface(other.conditions.surface, conditions.surface)
  );
}

function printedRoll(other: Sheet, { notes }: Sheet, asked: ManualAsked): RollBeside {
  const read = readSheet(other, asked);
  const off = offConditions({ ...other, notes }, axesOf(other), asked, read.standardTemperature);
  return {
    groundRoll: (read.outputs.groundRoll ?? Number.NaN) / other.contains.factor,
    edges: [...read.edges, ...off.edges],
    outside: [...read.outside, ...off.outside],
  };
}
